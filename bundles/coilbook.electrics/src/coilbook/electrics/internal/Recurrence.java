package coilbook.electrics.internal;

/**
 * Notices that the circuit has come back to the state of one half-wave before, so that later half-waves need not be computed. The tolerance is
 * rounding, so that nothing is lost by it; without it a long cycle of a settled circuit would be computed half-wave by half-wave.
 */
final class Recurrence {

    private static final double TOLERANCE = 1e-12;

    private final double length;
    private final double busTolerance;
    private final double currentTolerance;
    private final double[] totals = Totals.snapshot();
    private double time;
    private double bus;
    private double current;

    Recurrence(double length, double busScale, double currentScale) {
        this.length = length;
        busTolerance = TOLERANCE * busScale;
        currentTolerance = TOLERANCE * currentScale;
        time = Double.NaN;
    }

    void forget() {
        time = Double.NaN;
    }

    /** True if the state is that of one length ago. */
    boolean met(double now, double busNow, double currentNow) {
        return Math.abs(now - time - length) < 1e-9 * length && Math.abs(busNow - bus) < busTolerance
                && Math.abs(currentNow - current) < currentTolerance;
    }

    void note(double now, double busNow, double currentNow, Totals soFar) {
        time = now;
        bus = busNow;
        current = currentNow;
        soFar.copyTo(totals);
    }

    double length() {
        return length;
    }

    double[] totals() {
        return totals;
    }
}
