package coilbook.electrics.internal;

/** States at switch-on and at the end of the cycle, at evenly spaced phases of the rectified half-wave. Units V, A. */
final class PhaseStates {

    private final double[] source;
    private final double[] current;
    private final boolean[] closed;
    private final double[] sourceEnd;
    private final double[] currentEnd;
    private final boolean[] closedEnd;
    private double sourceScale;
    private double currentScale;

    PhaseStates(int count, double source, double current, boolean closed) {
        this.source = new double[count];
        this.current = new double[count];
        this.closed = new boolean[count];
        sourceEnd = new double[count];
        currentEnd = new double[count];
        closedEnd = new boolean[count];
        for (int index = 0; index < count; index++) {
            this.source[index] = source;
            this.current[index] = current;
            this.closed[index] = closed;
        }
    }

    int count() {
        return source.length;
    }

    double source(int index) {
        return source[index];
    }

    double current(int index) {
        return current[index];
    }

    boolean closed(int index) {
        return closed[index];
    }

    void end(int index, double sourceNow, double currentNow, boolean closedNow) {
        sourceEnd[index] = sourceNow;
        currentEnd[index] = currentNow;
        closedEnd[index] = closedNow;
        sourceScale = Math.max(sourceScale, Math.abs(sourceNow));
        currentScale = Math.max(currentScale, Math.abs(currentNow));
    }

    /** Hands each phase the state in which the cycle one step before ended; gives the largest change, as a share of full scale. */
    double shift(double step) {
        double moved = 0;
        for (int index = 0; index < source.length; index++) {
            double place = place(index, step);
            double newSource = between(sourceEnd, place);
            double newCurrent = between(currentEnd, place);
            moved = Math.max(moved, change(index, newSource, newCurrent));
            source[index] = newSource;
            current[index] = newCurrent;
            closed[index] = closedEnd[(int) Math.rint(place) % source.length];
        }
        return moved;
    }

    /** The change that the next shift would make. */
    double movesNext(double step) {
        double moves = 0;
        for (int index = 0; index < source.length; index++) {
            double place = place(index, step);
            moves = Math.max(moves, change(index, between(sourceEnd, place), between(currentEnd, place)));
        }
        return moves;
    }

    /** True if a change is rounding. */
    boolean settled(double moves) {
        return moves < 1e-9;
    }

    private double change(int index, double newSource, double newCurrent) {
        double ofSource = sourceScale > 0 ? Math.abs(newSource - source[index]) / sourceScale : 0;
        double ofCurrent = currentScale > 0 ? Math.abs(newCurrent - current[index]) / currentScale : 0;
        return Math.max(ofSource, ofCurrent);
    }

    /** Place among the phases, from 0 to below their count, at which the cycle before was switched on. */
    private double place(int index, double step) {
        int count = source.length;
        double place = (index - step / Math.PI * count) % count;
        return place < 0 ? place + count : place;
    }

    /** Cubic through the four nearest phases, round the circle. */
    private double between(double[] value, double place) {
        int count = value.length;
        int index = (int) Math.floor(place);
        double x = place - index;
        double left = value[index % count];
        if (x < 1e-12 || count < 4) {
            return x < 0.5 ? left : value[(index + 1) % count];
        }
        double before = value[(index + count - 1) % count];
        double right = value[(index + 1) % count];
        double after = value[(index + 2) % count];
        double cubic = left + 0.5 * x * (right - before
                + x * (2 * before - 5 * left + 4 * right - after + x * (3 * (left - right) + after - before)));
        double least = Math.min(Math.min(before, left), Math.min(right, after));
        double most = Math.max(Math.max(before, left), Math.max(right, after));
        return Math.max(least, Math.min(most, cubic));
    }
}
