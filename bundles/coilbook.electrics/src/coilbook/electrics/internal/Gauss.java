package coilbook.electrics.internal;

/** Gauss–Legendre rule of eight points on [0, 1]. Source: Abramowitz and Stegun, table 25.4. */
final class Gauss {

    static final int POINTS = 8;

    private static final double[] HALF_NODE = { 0.1834346424956498, 0.5255324099163290, 0.7966664774136267, 0.9602898564975363 };
    private static final double[] HALF_WEIGHT = { 0.3626837833783620, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763 };

    private Gauss() {
    }

    /** Node of a point 0 to 7, ascending. */
    static double node(int point) {
        return point < 4 ? 0.5 * (1 - HALF_NODE[3 - point]) : 0.5 * (1 + HALF_NODE[point - 4]);
    }

    /** Weight of a point; the weights add up to 1. */
    static double weight(int point) {
        return 0.5 * (point < 4 ? HALF_WEIGHT[3 - point] : HALF_WEIGHT[point - 4]);
    }
}
