package coilbook.fleet;

/** How the mains reach the coil without a capacitor. */
public enum Rectification implements Labelled {
    FULL_WAVE("full-wave"),
    HALF_WAVE("half-wave");

    private final String label;

    Rectification(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
