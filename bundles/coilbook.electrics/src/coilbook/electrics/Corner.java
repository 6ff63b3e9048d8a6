package coilbook.electrics;

/** The corners at which a station is looked at; a margin is given at the one where it is least. */
public enum Corner {
    /** Lowest mains; winding hot: steady at this duty, highest ambient, resistance at + tolerance. Pull-in, hold, recovery. */
    LOW_HOT("low, hot winding"),
    /** Lowest mains; winding at the lowest ambient, resistance at − tolerance. Hold of a line-capacitor driver. */
    LOW_COLD("low, cold winding"),
    /** Highest mains; winding at the lowest ambient, resistance at − tolerance. Output current, bus stress, insulation. */
    HIGH_COLD("high"),
    /** Highest mains and ambient; resistance at − tolerance if voltage-driven, + if current-driven. Winding temperature, dissipation. */
    HOT("hot"),
    /** Nominal mains, ambient and resistance. */
    NOMINAL("nominal");

    private final String label;

    Corner(String label) {
        this.label = label;
    }

    public String label() {
        return label;
    }
}
