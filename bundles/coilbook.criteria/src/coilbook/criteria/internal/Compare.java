package coilbook.criteria.internal;

import coilbook.criteria.Verdict;

/** Comparisons with a relative tolerance of 1e-9, so that a limit met exactly is met whatever the last digit of a double says. */
public final class Compare {

    private static final double TOLERANCE = 1e-9;

    private Compare() {
    }

    public static boolean atMost(double value, double limit) {
        double size = Math.max(Math.abs(value), Math.abs(limit));
        return value <= limit || Double.isFinite(size) && value - limit <= TOLERANCE * size;
    }

    public static boolean atLeast(double value, double limit) {
        return atMost(limit, value);
    }

    public static boolean within(double value, double from, double to) {
        return atLeast(value, from) && atMost(value, to);
    }

    /** A value that may not exceed a limit: a nonconformity above it, an observation within the margin (a fraction of the limit) below it. */
    public static Verdict ceiling(double value, double limit, double margin) {
        return !atMost(value, limit) ? Verdict.NONCONFORMITY
                : atMost(value, limit * (1 - margin)) ? Verdict.CONFORMITY : Verdict.OBSERVATION;
    }

    /** A value that may not fall below a limit: a nonconformity below it, an observation within the margin (a fraction of the limit) above it. */
    public static Verdict floor(double value, double limit, double margin) {
        return !atLeast(value, limit) ? Verdict.NONCONFORMITY
                : atLeast(value, limit * (1 + margin)) ? Verdict.CONFORMITY : Verdict.OBSERVATION;
    }

    /** A temperature that may not exceed a limit, with a margin in K. */
    public static Verdict temperature(double celsius, double limit, double kelvin) {
        return !atMost(celsius, limit) ? Verdict.NONCONFORMITY : atMost(celsius, limit - kelvin) ? Verdict.CONFORMITY : Verdict.OBSERVATION;
    }
}
