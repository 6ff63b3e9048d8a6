package coilbook.electrics.internal;

/**
 * Watches the coil current of one on-time, from stretch to stretch: peak, troughs, thresholds. Times count from switch-on, s.
 */
final class Observer {

    /** A later crest counts as higher only beyond rounding, so that of equal crests the first is the peak. */
    private static final double HIGHER = 1 + 1e-12;

    private final double pullIn;
    private final double dropOut;
    private final double holdStart;
    private final double openingDelay;

    double peak;
    double timeOfPeak;
    double minimumAfterPeak;
    double holdMinimum;
    double minimumAfterOpening;
    double timeToPullIn;
    private double holdsFluxAt;
    private double fluxLostAt;
    private double belowSince;
    private double longestBelow;
    private boolean judged;

    Observer(double pullIn, double dropOut, double holdStart, double openingDelay) {
        this.pullIn = pullIn;
        this.dropOut = dropOut;
        this.holdStart = holdStart;
        this.openingDelay = openingDelay;
    }

    /** Switch-on with the given current and the current that stands for the flux of pull-in. */
    void begin(double current, double holdsFlux) {
        timeToPullIn = Double.NaN;
        fluxLostAt = Double.NaN;
        holdsFluxAt = holdsFlux;
        holdMinimum = Double.POSITIVE_INFINITY;
        peak = current;
        timeOfPeak = 0;
        forgetTroughs(current);
        if (current >= pullIn) {
            timeToPullIn = 0;
        }
    }

    /** The plunger moved in: the current drops, the flux does not. */
    void plungerClosed(double time, double current, double holdsFlux) {
        if (Double.isNaN(timeToPullIn)) {
            timeToPullIn = time;
        }
        holdsFluxAt = holdsFlux * (1 - 1e-9);
        minimumAfterPeak = Math.min(minimumAfterPeak, current);
    }

    /** A stretch of a piece that began at the given time; a, b since then, with current and slope at both. */
    void stretch(Piece piece, double base, double a, double currentA, double slopeA, double b, double currentB, double slopeB) {
        if (slopeA > 0 != slopeB > 0 && slopeA != 0 && slopeB != 0) {
            double turn = Roots.slopeVanishes(piece, a, slopeA, b, slopeB);
            double currentTurn = piece.current;
            monotone(piece, base, a, currentA, turn, currentTurn);
            monotone(piece, base, turn, currentTurn, b, currentB);
        } else {
            monotone(piece, base, a, currentA, b, currentB);
        }
    }

    private void monotone(Piece piece, double base, double a, double currentA, double b, double currentB) {
        if (Double.isNaN(timeToPullIn) && currentB >= pullIn) {
            timeToPullIn = base + (currentA >= pullIn ? a : Roots.currentCrosses(piece, pullIn, a, currentA, b, currentB));
        }
        if (!Double.isNaN(timeToPullIn) && Double.isNaN(fluxLostAt) && currentB < holdsFluxAt) {
            fluxLostAt = base + (currentA <= holdsFluxAt ? a : Roots.currentCrosses(piece, holdsFluxAt, a, currentA, b, currentB));
        }
        if (base + b >= holdStart) {
            holdMinimum = Math.min(holdMinimum, leastFrom(piece, base, a, currentA, currentB, holdStart));
        }
        if (currentB > peak * HIGHER) {
            peak = currentB;
            timeOfPeak = base + b;
            forgetTroughs(currentB);
        } else {
            minimumAfterPeak = Math.min(minimumAfterPeak, currentB);
        }
        judge(piece, base, a, currentA, b, currentB);
    }

    private void judge(Piece piece, double base, double a, double currentA, double b, double currentB) {
        double from = Double.isNaN(timeToPullIn) ? timeOfPeak : Math.max(timeOfPeak, timeToPullIn + openingDelay);
        if (base + b < from) {
            return;
        }
        minimumAfterOpening = Math.min(minimumAfterOpening, leastFrom(piece, base, a, currentA, currentB, from));
        judged = true;
        if (Double.isNaN(dropOut)) {
            return;
        }
        double start = Math.max(a, from - base);
        if (currentB < dropOut) {
            if (Double.isNaN(belowSince)) {
                belowSince = base
                        + (currentA <= dropOut ? start : Math.max(start, Roots.currentCrosses(piece, dropOut, a, currentA, b, currentB)));
            }
        } else if (currentA < dropOut) {
            if (Double.isNaN(belowSince)) {
                belowSince = base + start;
            }
            endBelow(base + Roots.currentCrosses(piece, dropOut, a, currentA, b, currentB));
        }
    }

    private static double leastFrom(Piece piece, double base, double a, double currentA, double currentB, double from) {
        if (currentB <= currentA) {
            return currentB;
        }
        if (base + a >= from) {
            return currentA;
        }
        piece.at(from - base);
        return piece.current;
    }

    private void forgetTroughs(double current) {
        minimumAfterPeak = current;
        minimumAfterOpening = Double.POSITIVE_INFINITY;
        belowSince = Double.NaN;
        longestBelow = 0;
        judged = false;
    }

    private void endBelow(double time) {
        if (!Double.isNaN(belowSince)) {
            longestBelow = Math.max(longestBelow, time - belowSince);
            belowSince = Double.NaN;
        }
    }

    /** Switch-off. */
    void end(double time) {
        endBelow(time);
        if (!Double.isNaN(timeToPullIn) && Double.isNaN(fluxLostAt)) {
            fluxLostAt = time;
        }
    }

    double heldAtPullIn() {
        return Double.isNaN(timeToPullIn) ? Double.NaN : Math.max(0, fluxLostAt - timeToPullIn);
    }

    double minimumAfterOpening() {
        return judged ? minimumAfterOpening : Double.NaN;
    }

    double longestBelowDropOut() {
        return judged && !Double.isNaN(dropOut) ? longestBelow : Double.NaN;
    }
}
