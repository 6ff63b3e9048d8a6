package coilbook.fleet;

/** Sourcing (PNP) or sinking (NPN), of an output or of an input; an isolated input may take either. */
public enum SignalPolarity implements Labelled {
    SOURCING("sourcing"),
    SINKING("sinking"),
    EITHER("either");

    private final String label;

    SignalPolarity(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
