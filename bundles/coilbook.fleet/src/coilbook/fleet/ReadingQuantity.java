package coilbook.fleet;

/** What is measured in the field, with the unit in which it is noted. */
public enum ReadingQuantity implements Labelled {
    WINDING_RESISTANCE("winding resistance", Unit.OHM), INSULATION_RESISTANCE("insulation resistance", Unit.MEGAOHM),
    EARTH_CONTINUITY("earth continuity", Unit.OHM), MAINS_VOLTAGE("mains voltage", Unit.VOLT),
    MAINS_FREQUENCY("mains frequency", Unit.HERTZ), ON_TIME("on-time", Unit.MILLISECOND), CYCLE_RATE("cycle rate", Unit.PER_SECOND),
    AMBIENT_TEMPERATURE("ambient temperature", Unit.CELSIUS), COIL_TEMPERATURE("unpowered coil temperature", Unit.CELSIUS),
    BODY_TEMPERATURE("body temperature", Unit.CELSIUS), WINDING_INDUCTANCE("winding inductance", Unit.MILLIHENRY),
    PULL_IN_CURRENT("pull-in current", Unit.AMPERE), DROP_OUT_CURRENT("drop-out current", Unit.AMPERE),
    HOLD_VOLTAGE("hold voltage", Unit.VOLT), COUNTER("counter", Unit.NONE);

    private final String label;
    private final Unit unit;

    ReadingQuantity(String label, Unit unit) {
        this.label = label;
        this.unit = unit;
    }

    /** The unit in which the value of a reading is shown and typed. */
    public Unit unit() {
        return unit;
    }

    @Override
    public String label() {
        return label;
    }
}
