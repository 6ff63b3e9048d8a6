package coilbook.electrics;

/** Stable ids of the data that derived values ask for. */
public final class Data {

    public static final String MAINS_NOMINAL_VOLTAGE = "mains.nominal-voltage";
    public static final String MAINS_LOWEST_VOLTAGE = "mains.lowest-voltage";
    public static final String MAINS_HIGHEST_VOLTAGE = "mains.highest-voltage";
    public static final String MAINS_FREQUENCY = "mains.frequency";
    public static final String DRIVER_KIND = "driver.kind";
    public static final String SERIES_RESISTANCE = "driver.series-resistance";
    public static final String CAPACITANCE = "driver.capacitance";
    public static final String PULL_IN_VOLTAGE = "driver.pull-in-voltage";
    public static final String PULL_IN_TIME = "driver.pull-in-time";
    public static final String HOLD_VOLTAGE = "driver.hold-voltage";
    public static final String OUTPUT_VOLTAGE = "driver.output-voltage";
    public static final String BUS_VOLTAGE = "driver.bus-voltage";
    public static final String PEAK_CURRENT = "driver.peak-current";
    public static final String PEAK_TIME = "driver.peak-time";
    public static final String HOLD_CURRENT = "driver.hold-current";
    public static final String EFFICIENCY = "driver.efficiency";
    public static final String POWER_FACTOR = "driver.power-factor";
    public static final String COIL_RESISTANCE = "coil.resistance";
    public static final String INDUCTANCE = "coil.inductance";
    public static final String PULL_IN_CURRENT = "coil.pull-in-current";
    public static final String DROP_OUT_CURRENT = "coil.drop-out-current";
    public static final String THERMAL_RESISTANCE = "coil.thermal-resistance";
    public static final String INSULATION_CLASS = "coil.insulation-class";
    public static final String AMBIENT = "station.ambient";
    public static final String DUTY_RATE = "duty.rate";
    public static final String DUTY_ON_TIME = "duty.on-time";
    public static final String VALVE_HIGHEST_RATE = "valve.highest-rate";
    public static final String VALVE_CLOSING_DELAY = "valve.closing-delay";

    private Data() {
    }
}
