package coilbook.fleet;

/**
 * A mains supply at a site. Nominal voltage is what stands between the conductors the drivers are connected to, before any transformer
 * of this circuit. Tolerances, where given, override the market's band (fractions: 0.1 is 10 %).
 */
public record Circuit(@Column(value = "Site", key = true, refersTo = Site.class) String site,
        @Column(value = "Circuit", key = true) String code, @Column("Wiring system") WiringSystem system,
        @Column("Connection") Connection connection,
        @Column(value = "Nominal voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum nominalVoltage,
        @Column(value = "Nominal frequency", unit = Unit.HERTZ, min = 10, max = 400) Datum nominalFrequency,
        @Column(value = "Tolerance below", unit = Unit.PERCENT, min = 0, max = 0.5) Datum toleranceBelow,
        @Column(value = "Tolerance above", unit = Unit.PERCENT, min = 0, max = 0.5) Datum toleranceAbove,
        @Column("Protective device") String protectiveDevice,
        @Column(value = "Protective device rating", unit = Unit.AMPERE, min = 0, above = true, max = 10000) Datum protectiveRating,
        @Column(value = "Inrush withstand", unit = Unit.AMPERE, min = 0, above = true, max = 100000) Datum inrushWithstand,
        @Column(value = "Other load", unit = Unit.AMPERE, min = 0, max = 10000) Datum otherLoad,
        @Column("NEC rules") Boolean necRules,
        @Column(value = "Transformer type", refersTo = TransformerType.class) String transformerType,
        @Column("Transformer use") TransformerUse transformerUse, @Column(value = "Note", personal = true) String note) implements Row {
}
