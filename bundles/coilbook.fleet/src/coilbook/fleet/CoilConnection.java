package coilbook.fleet;

/** How coils may be joined on one driver channel. */
public enum CoilConnection implements Labelled {
    SINGLE("single"),
    SERIES("series"),
    PARALLEL("parallel");

    private final String label;

    CoilConnection(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
