package coilbook.fleet;

import java.math.BigDecimal;
import java.util.List;

/** A catalogue entry of a valve: its delays count from pull-in current to open and from drop-out current to closed. */
public record ValveType(@Column(value = "Type", key = true) String code, @Column("Maker") String maker, @Column("Status") TypeStatus status,
        @Column("Family") String family,
        @Column(value = "Opening delay", unit = Unit.MILLISECOND, min = 0, max = 10) Datum openingDelay,
        @Column(value = "Closing delay", unit = Unit.MILLISECOND, min = 0, max = 10) Datum closingDelay,
        @Column(value = "Highest cycle rate", unit = Unit.PER_SECOND, min = 0, above = true, max = 10000) Datum highestRate,
        @Column(value = "Highest fluid temperature", unit = Unit.CELSIUS, min = -60, max = 500) Datum highestFluidTemperature,
        @Column(value = "Highest fluid pressure", unit = Unit.BAR, min = 0, above = true, max = 1e9) Datum highestFluidPressure,
        @Column("Coil families") List<String> coilFamilies,
        @Column(value = "Expected life", min = 0, above = true, max = 1e12) Datum expectedLifeCycles,
        @Column(value = "Price", min = 0) BigDecimal price,
        @Column(value = "Labour", unit = Unit.MINUTE, min = 0, max = 360000) Datum labour,
        @Column(value = "Stock on hand", min = 0, max = 1e6) Integer stock, @Column("Source") String source) implements Row {
}
