package coilbook.fleet;

/** What a driver's output does when shorted. */
public enum ShortCircuitBehaviour implements Labelled {
    LIMITS("limits current"),
    FUSES("blows a fuse"),
    RESISTOR("limited by the series resistor"),
    NONE("not protected");

    private final String label;

    ShortCircuitBehaviour(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
