package coilbook.fleet;

/**
 * The band in which a country's supply voltage must lie, for nominal voltages from {@code nominalFrom} to {@code nominalTo}. The country {@code *}
 * is what counts where no row fits. Lowest and highest are fractions of nominal (0.9, 1.1).
 */
public record MarketTolerance(@Column(value = "Country", key = true) String country,
        @Column(value = "Nominal from", key = true, unit = Unit.VOLT, min = 0, max = 1000) Datum nominalFrom,
        @Column(value = "Nominal to", unit = Unit.VOLT, min = 0, max = 1000, required = true) Datum nominalTo,
        @Column(value = "Lowest", unit = Unit.PERCENT, min = 0, max = 1, required = true) Datum lowest,
        @Column(value = "Highest", unit = Unit.PERCENT, min = 1, max = 2, required = true) Datum highest,
        @Column("Standard") String standard, @Column("Source") String source) implements Row {
}
