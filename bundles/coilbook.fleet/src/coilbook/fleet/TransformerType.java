package coilbook.fleet;

import java.math.BigDecimal;

/** A catalogue entry of an external transformer; regulation is the fall of secondary voltage from no load to full load, as a fraction. */
public record TransformerType(@Column(value = "Type", key = true) String code, @Column("Maker") String maker,
        @Column("Status") TypeStatus status,
        @Column(value = "Primary voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum primaryVoltage,
        @Column(value = "Secondary voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum secondaryVoltage,
        @Column(value = "Rating", unit = Unit.VOLT_AMPERE, min = 0, above = true, max = 1e6) Datum rating,
        @Column(value = "Regulation", unit = Unit.PERCENT, min = 0, max = 0.5) Datum regulation,
        @Column(value = "Lowest frequency", unit = Unit.HERTZ, min = 1, max = 1000) Datum lowestFrequency,
        @Column("Safety isolating") Boolean safetyIsolating, @Column(value = "Price", min = 0) BigDecimal price,
        @Column(value = "Labour", unit = Unit.MINUTE, min = 0, max = 360000) Datum labour,
        @Column(value = "Stock on hand", min = 0, max = 1e6) Integer stock, @Column("Source") String source) implements Row {
}
