package coilbook.fleet;

/** How stations share a transformer of a circuit. */
public enum TransformerUse implements Labelled {
    NONE("none"),
    CIRCUIT("one for the circuit"),
    STATION("one a station");

    private final String label;

    TransformerUse(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
