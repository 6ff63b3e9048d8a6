package coilbook.fleet;

/** The current a coil is rated for. */
public enum CoilKind implements Labelled {
    DC("DC"),
    AC("AC"),
    AC_OR_DC("AC or DC");

    private final String label;

    CoilKind(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
