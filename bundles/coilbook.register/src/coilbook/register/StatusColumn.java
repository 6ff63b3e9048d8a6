package coilbook.register;

import coilbook.fleet.FieldType;
import coilbook.fleet.Unit;

/** The columns of a status row, in the order in which the Stations grid and sheet show them. Computed ones cannot be edited. */
public enum StatusColumn {
    STATION("Station", FieldType.TEXT, Unit.NONE, false), VERDICT("Verdict", FieldType.TEXT, Unit.NONE, true),
    HAZARDS("Hazards", FieldType.INTEGER, Unit.NONE, true), NONCONFORMITIES("Nonconformities", FieldType.INTEGER, Unit.NONE, true),
    OBSERVATIONS("Observations", FieldType.INTEGER, Unit.NONE, true), UNDETERMINED("Undetermined", FieldType.INTEGER, Unit.NONE, true),
    CONCEDED("Conceded", FieldType.INTEGER, Unit.NONE, true), CUSTOMER("Customer", FieldType.TEXT, Unit.NONE, false),
    SITE("Site", FieldType.TEXT, Unit.NONE, false), LINE("Line", FieldType.TEXT, Unit.NONE, false),
    TAG("Tag", FieldType.TEXT, Unit.NONE, false), DESCRIPTION("Description", FieldType.TEXT, Unit.NONE, false),
    COUNTRY("Country", FieldType.TEXT, Unit.NONE, false), CIRCUIT("Circuit", FieldType.TEXT, Unit.NONE, false),
    MAINS_VOLTAGE("Mains voltage", FieldType.QUANTITY, Unit.VOLT, false),
    MAINS_FREQUENCY("Mains frequency", FieldType.QUANTITY, Unit.HERTZ, false),
    VALVE_TYPE("Valve type", FieldType.TEXT, Unit.NONE, false), COIL_TYPE("Coil type", FieldType.TEXT, Unit.NONE, false),
    COIL_SERIAL("Coil serial", FieldType.TEXT, Unit.NONE, false), DRIVER_TYPE("Driver type", FieldType.TEXT, Unit.NONE, false),
    DRIVER_SERIAL("Driver serial", FieldType.TEXT, Unit.NONE, false),
    INPUT_SETTING("Input setting", FieldType.TEXT, Unit.NONE, false), CABLE_TYPE("Cable type", FieldType.TEXT, Unit.NONE, false),
    CABLE_LENGTH("Cable length", FieldType.QUANTITY, Unit.METRE, false),
    CYCLE_RATE("Cycle rate", FieldType.QUANTITY, Unit.PER_SECOND, false),
    ON_TIME("On-time", FieldType.QUANTITY, Unit.MILLISECOND, false),
    WINDING_READING("Winding resistance at 20 °C", FieldType.QUANTITY, Unit.OHM, true),
    PEAK_CURRENT("Peak current", FieldType.QUANTITY, Unit.AMPERE, true),
    PULL_IN_MARGIN("Pull-in margin", FieldType.QUANTITY, Unit.PERCENT, true),
    HOLD_CURRENT("Hold current", FieldType.QUANTITY, Unit.AMPERE, true),
    HOLD_MARGIN("Hold margin", FieldType.QUANTITY, Unit.PERCENT, true),
    AVERAGE_POWER("Winding power", FieldType.QUANTITY, Unit.WATT, true),
    WINDING_TEMPERATURE("Winding temperature", FieldType.QUANTITY, Unit.CELSIUS, true),
    TEMPERATURE_MARGIN("Temperature margin", FieldType.QUANTITY, Unit.KELVIN, true),
    HIGHEST_RATE("Highest cycle rate", FieldType.QUANTITY, Unit.PER_SECOND, true),
    RULING_LIMIT("Ruling limit", FieldType.TEXT, Unit.NONE, true), PROVENANCE("Weakest provenance", FieldType.TEXT, Unit.NONE, true);

    private final String heading;
    private final FieldType type;
    private final Unit unit;
    private final boolean computed;

    StatusColumn(String heading, FieldType type, Unit unit, boolean computed) {
        this.heading = heading;
        this.type = type;
        this.unit = unit;
        this.computed = computed;
    }

    public String heading() {
        return heading;
    }

    /** TEXT, INTEGER or QUANTITY (a Double in SI). */
    public FieldType type() {
        return type;
    }

    public Unit unit() {
        return unit;
    }

    public boolean isComputed() {
        return computed;
    }

    /** The column's name in storage. */
    public String id() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
