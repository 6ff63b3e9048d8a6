package coilbook.jobs.internal.edit;

import java.util.EnumMap;
import java.util.Map;

import coilbook.fleet.Circuit;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.register.StatusColumn;

/** Which columns of the Stations grid can be typed into, and which row and field each one stands for. */
public final class EditColumns {

    /**
     * Where a column's value is kept.
     *
     * @param part the kind of part for a fitting's columns; else {@code null}
     */
    record Target(Class<? extends Row> row, String field, FittedKind part) {
    }

    private static final Map<StatusColumn, Target> TARGETS = new EnumMap<>(StatusColumn.class);

    static {
        TARGETS.put(StatusColumn.DESCRIPTION, new Target(Station.class, "description", null));
        TARGETS.put(StatusColumn.CABLE_LENGTH, new Target(Station.class, "cable_length", null));
        TARGETS.put(StatusColumn.CIRCUIT, new Target(Supply.class, "circuit", null));
        TARGETS.put(StatusColumn.MAINS_VOLTAGE, new Target(Circuit.class, "nominal_voltage", null));
        TARGETS.put(StatusColumn.MAINS_FREQUENCY, new Target(Circuit.class, "nominal_frequency", null));
        TARGETS.put(StatusColumn.VALVE_TYPE, new Target(Fitting.class, "type", FittedKind.VALVE));
        TARGETS.put(StatusColumn.COIL_TYPE, new Target(Fitting.class, "type", FittedKind.COIL));
        TARGETS.put(StatusColumn.DRIVER_TYPE, new Target(Fitting.class, "type", FittedKind.DRIVER));
        TARGETS.put(StatusColumn.CABLE_TYPE, new Target(Fitting.class, "type", FittedKind.CABLE));
        TARGETS.put(StatusColumn.COIL_SERIAL, new Target(Fitting.class, "serial", FittedKind.COIL));
        TARGETS.put(StatusColumn.DRIVER_SERIAL, new Target(Fitting.class, "serial", FittedKind.DRIVER));
        TARGETS.put(StatusColumn.INPUT_SETTING, new Target(SettingChoice.class, "setting", null));
        TARGETS.put(StatusColumn.CYCLE_RATE, new Target(Duty.class, "cycle_rate", null));
        TARGETS.put(StatusColumn.ON_TIME, new Target(Duty.class, "on_time", null));
    }

    private EditColumns() {
    }

    public static boolean isEditable(StatusColumn column) {
        return TARGETS.containsKey(column);
    }

    /** Whether a column's values are codes of the catalogue or of the site. */
    public static boolean hasChoices(StatusColumn column) {
        Target target = TARGETS.get(column);
        return target != null && ("type".equals(target.field()) || target.row() == Supply.class || target.row() == SettingChoice.class);
    }

    /** Where the column's value is kept, or {@code null} for a computed or fixed one. */
    static Target target(StatusColumn column) {
        return TARGETS.get(column);
    }
}
