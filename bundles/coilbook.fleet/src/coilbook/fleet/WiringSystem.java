package coilbook.fleet;

/** The wiring system a circuit is taken from (IEC 60364-1 terms; the names with voltages are common practice). */
public enum WiringSystem implements Labelled {
    SINGLE_PHASE("single phase"),
    SPLIT_PHASE("single phase three-wire"),
    STAR("three-phase star"),
    DELTA("three-phase delta"),
    HIGH_LEG("delta with high leg");

    private final String label;

    WiringSystem(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
