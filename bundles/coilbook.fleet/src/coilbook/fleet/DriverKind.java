package coilbook.fleet;

/** What a driver does between mains and coil; the kinds and the data that decide them stand in the help under <em>Driver kinds</em>. */
public enum DriverKind implements Labelled {
    LINE_CAPACITOR("line-capacitor"),
    TWO_LEVEL("two-level"),
    CURRENT_REGULATED("current-regulated"),
    FIXED_DC("fixed-dc"),
    RECTIFIED_AC("rectified-ac"),
    DIRECT_AC("direct-ac");

    private final String label;

    DriverKind(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
