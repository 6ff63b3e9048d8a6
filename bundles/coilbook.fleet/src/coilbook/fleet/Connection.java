package coilbook.fleet;

/** Between which conductors a circuit is connected. */
public enum Connection implements Labelled {
    LINE_TO_NEUTRAL("line to neutral"),
    LINE_TO_LINE("line to line");

    private final String label;

    Connection(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
