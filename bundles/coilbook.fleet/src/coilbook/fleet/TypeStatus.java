package coilbook.fleet;

/** Where a catalogue entry stands with its maker; <em>incomplete</em> entries were named by a list that said too little about them. */
public enum TypeStatus implements Labelled {
    CURRENT("current"),
    SUPERSEDED("superseded"),
    WITHDRAWN("withdrawn"),
    INCOMPLETE("incomplete");

    private final String label;

    TypeStatus(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }
}
