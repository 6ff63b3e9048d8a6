package coilbook.fleet;

/** Where a value comes from, the strongest first; a verdict carries the weakest provenance it rests on. */
public enum Provenance implements Labelled {
    MEASURED("measured"), NAMEPLATE("nameplate"), CATALOGUE("catalogue"), ESTIMATED("estimated by rule"), ASSUMED("assumed");

    private final String label;

    Provenance(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }

    /** The weaker of the two; {@code null} counts as the strongest, so that folding may start from nothing. */
    public static Provenance weaker(Provenance one, Provenance other) {
        if (one == null) {
            return other;
        }
        return other == null || one.compareTo(other) >= 0 ? one : other;
    }
}
