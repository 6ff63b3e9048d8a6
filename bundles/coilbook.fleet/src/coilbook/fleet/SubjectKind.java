package coilbook.fleet;

/** What a reading was taken on. */
public enum SubjectKind implements Labelled {
    STATION("station"),
    ITEM("item"),
    CIRCUIT("circuit");

    private final String label;

    SubjectKind(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
