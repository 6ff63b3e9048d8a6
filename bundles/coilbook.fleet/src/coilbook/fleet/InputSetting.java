package coilbook.fleet;

/** One way a driver type's input can be strapped: nominal voltage, window and frequency range; a transformer-fed input has a rated flux. */
public record InputSetting(@Column(value = "Driver type", key = true, refersTo = DriverType.class) String driverType,
        @Column(value = "Setting", key = true) String code, @Column("Description") String description,
        @Column(value = "Nominal voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum nominalVoltage,
        @Column(value = "Lowest voltage", unit = Unit.VOLT, min = 0, max = 1000) Datum lowestVoltage,
        @Column(value = "Highest voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum highestVoltage,
        @Column(value = "Lowest frequency", unit = Unit.HERTZ, min = 0, max = 1000) Datum lowestFrequency,
        @Column(value = "Highest frequency", unit = Unit.HERTZ, min = 0, above = true, max = 1000) Datum highestFrequency,
        @Column("Transformer-fed") Boolean transformerFed, @Column("As delivered") Boolean asDelivered) implements Row {
}
