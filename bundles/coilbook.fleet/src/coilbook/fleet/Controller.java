package coilbook.fleet;

/** What switches drivers: a timer or a PLC output; voltages and currents at its output. */
public record Controller(@Column(value = "Site", key = true, refersTo = Site.class) String site,
        @Column(value = "Controller", key = true) String code, @Column("Output type") String outputType,
        @Column("Polarity") SignalPolarity polarity,
        @Column(value = "On voltage", unit = Unit.VOLT, min = -300, max = 300) Datum onVoltage,
        @Column(value = "Off voltage", unit = Unit.VOLT, min = -300, max = 300) Datum offVoltage,
        @Column(value = "Leakage", unit = Unit.MILLIAMPERE, min = 0, max = 10) Datum leakage,
        @Column(value = "Output current", unit = Unit.MILLIAMPERE, min = 0, max = 100) Datum outputCurrent,
        @Column(value = "Shortest pulse", unit = Unit.MILLISECOND, min = 0, max = 3600) Datum shortestPulse,
        @Column("Isolated") Boolean isolated, @Column("Common bonded to earth") Boolean commonBonded,
        @Column("Fed from the driver") Boolean fedFromDriver,
        @Column(value = "Supply voltage needed", unit = Unit.VOLT, min = 0, max = 300) Datum supplyVoltage,
        @Column(value = "Supply current needed", unit = Unit.MILLIAMPERE, min = 0, max = 10) Datum supplyCurrent,
        @Column(value = "Note", personal = true) String note) implements Row {
}
