package coilbook.fleet;

import java.math.BigDecimal;

/** A catalogue entry of the cable between driver and coil; conductor resistance is that of one conductor at 20 °C. */
public record CableType(@Column(value = "Type", key = true) String code, @Column("Maker") String maker, @Column("Status") TypeStatus status,
        @Column(value = "Cross-section", unit = Unit.SQUARE_MILLIMETRE, min = 0, above = true, max = 1) Datum crossSection,
        @Column(value = "Conductor resistance", unit = Unit.OHM_PER_KILOMETRE, min = 0, above = true, max = 100) Datum conductorResistance,
        @Column(value = "Rated voltage", unit = Unit.VOLT, min = 0, above = true, max = 1e5) Datum ratedVoltage,
        @Column(value = "Temperature rating", unit = Unit.CELSIUS, min = -60, max = 500) Datum temperatureRating,
        @Column(value = "Price a metre", min = 0) BigDecimal price,
        @Column(value = "Labour", unit = Unit.MINUTE, min = 0, max = 360000) Datum labour, @Column("Source") String source)
        implements Row {
}
