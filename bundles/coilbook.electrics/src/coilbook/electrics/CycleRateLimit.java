package coilbook.electrics;

/**
 * Highest cycle rate, 1/s, by each of the four limits; infinite where a limit does not apply.
 *
 * @param windingTemperature at which the mean winding temperature meets its limit, hot corner
 * @param sourceRecovery up to which every cycle still reaches the pull-in current, low corner
 * @param release at which the off-time is just the release time and the valve's closing delay
 * @param valve what the valve's mechanics allow
 */
public record CycleRateLimit(Derived windingTemperature, Derived sourceRecovery, Derived release, Derived valve) {

    /** Which limit. */
    public enum Ruling {
        WINDING_TEMPERATURE("winding temperature"), SOURCE_RECOVERY("source recovery"), RELEASE_TIME("release time"),
        VALVE_MECHANICS("valve mechanics"), NONE("none");

        private final String label;

        Ruling(String label) {
            this.label = label;
        }

        public String label() {
            return label;
        }
    }

    /** The lowest of the limits that are known. */
    public Derived highest() {
        return switch (ruling()) {
            case WINDING_TEMPERATURE, NONE -> windingTemperature;
            case SOURCE_RECOVERY -> sourceRecovery;
            case RELEASE_TIME -> release;
            case VALVE_MECHANICS -> valve;
        };
    }

    /** The limit that rules, among those known. */
    public Ruling ruling() {
        Ruling ruling = Ruling.NONE;
        double least = Double.POSITIVE_INFINITY;
        Derived[] limits = { windingTemperature, sourceRecovery, release, valve };
        for (int index = 0; index < limits.length; index++) {
            if (limits[index].value() < least) {
                least = limits[index].value();
                ruling = Ruling.values()[index];
            }
        }
        return ruling;
    }
}
