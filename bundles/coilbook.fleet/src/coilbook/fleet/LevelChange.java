package coilbook.fleet;

/** How a two-level driver goes from pull-in to hold: an ideal source at the hold voltage, or freewheeling into the clamp until the hold current is met. */
public enum LevelChange implements Labelled {
    SOURCE("source"),
    FREEWHEEL("freewheel");

    private final String label;

    LevelChange(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
