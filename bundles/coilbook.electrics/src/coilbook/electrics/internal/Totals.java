package coilbook.electrics.internal;

import java.util.Arrays;

/** Integrals over one cycle, kept in one array so that a repeating half-wave can be added many times at once. */
final class Totals {

    static final int CURRENT_SQUARE = 0;
    static final int HOLD_CURRENT = 1;
    static final int HOLD_SQUARE = 2;
    /** Charge through the clamp. */
    static final int CLAMP = 3;
    /** Charge through the closed switch. */
    static final int SWITCH = 4;
    /** Charge through the rectifier, freewheeling through the bridge included. */
    static final int RECTIFIER = 5;
    static final int DRAWN_SQUARE = 6;
    static final int SOURCE_ENERGY = 7;
    static final int BUS_SQUARE = 8;
    private static final int COUNT = 9;

    private final double[] sum = new double[COUNT];

    void clear() {
        Arrays.fill(sum, 0);
    }

    void add(int index, double value) {
        sum[index] += value;
    }

    double get(int index) {
        return sum[index];
    }

    void copyTo(double[] snapshot) {
        System.arraycopy(sum, 0, snapshot, 0, COUNT);
    }

    /** Adds what has come since the snapshot once more for each repetition. */
    void repeatSince(double[] snapshot, double repetitions) {
        for (int index = 0; index < COUNT; index++) {
            sum[index] += repetitions * (sum[index] - snapshot[index]);
        }
    }

    static double[] snapshot() {
        return new double[COUNT];
    }
}
