package coilbook.fleet;

/** Where a piece is in its life. */
public enum ItemStatus implements Labelled {
    IN_SERVICE("in service"),
    IN_STOCK("in stock"),
    SCRAPPED("scrapped");

    private final String label;

    ItemStatus(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
