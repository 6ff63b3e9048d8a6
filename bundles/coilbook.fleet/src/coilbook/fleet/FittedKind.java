package coilbook.fleet;

/** The kinds of part that sit at a station. */
public enum FittedKind implements Labelled {
    VALVE("valve"),
    COIL("coil"),
    DRIVER("driver"),
    CABLE("cable");

    private final String label;

    FittedKind(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
