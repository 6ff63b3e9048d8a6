package coilbook.electrics.internal;

import coilbook.electrics.IllegalCaseException;

/**
 * Walks along a piece in panels of Gauss points: the points serve both for the integrals and to see where the piece ends, whose time is then
 * refined to the last bits.
 */
final class Walker {

    static final int LAST = Gauss.POINTS + 1;
    /** Panels allowed in one cycle: beyond that a circuit swings so fast and so long that it is no driver and coil. */
    private static final long WORK_LIMIT = 3_000_000;

    private final double[] time = new double[LAST + 1];
    private final double[] current = new double[LAST + 1];
    private final double[] slope = new double[LAST + 1];
    private final double[] bus = new double[LAST + 1];
    private final double[] drawn = new double[LAST + 1];
    private final double[] rectified = new double[LAST + 1];
    private final double[] mains = new double[LAST + 1];
    private final double[] margin = new double[LAST + 1];
    private final double[] node = new double[LAST + 1];
    private final double[] weight = new double[LAST + 1];

    private final Totals totals;
    private final Observer observer;
    private long work;
    private boolean ended;
    double busPeak;
    double drawnPeak;

    Walker(Totals totals, Observer observer) {
        this.totals = totals;
        this.observer = observer;
        for (int point = 0; point < Gauss.POINTS; point++) {
            node[point + 1] = Gauss.node(point);
            weight[point + 1] = Gauss.weight(point);
        }
        node[LAST] = 1;
    }

    void clear() {
        work = 0;
        busPeak = 0;
        drawnPeak = 0;
    }

    /** True if the last walk met the end of its piece before the time allowed. */
    boolean ended() {
        return ended;
    }

    /**
     * Follows a piece that begins at a time since switch-on, for at most the given length; ends before {@code blind} are not looked for.
     * Gives how far it went and leaves the piece set to that time.
     */
    double walk(Piece piece, double base, double length, double blind, boolean coil, boolean hold) throws IllegalCaseException {
        ended = false;
        piece.at(0);
        record(piece, 0, 0);
        double a = 0;
        while (a < length) {
            double panel = Math.min(piece.panel(a), length - a);
            if (length - a - panel < 1e-3 * panel) {
                panel = length - a;
            }
            if (panel == piece.standardPanel()) {
                fillStandard(piece, a, panel);
            } else {
                fill(piece, a, panel);
            }
            int late = firstLate(piece, blind);
            if (late > 0) {
                double end = Roots.marginEnds(piece, time[late - 1], margin[late - 1], time[late], margin[late]);
                ended = true;
                panel = end - a;
                if (panel <= 0) {
                    piece.at(a);
                    return a;
                }
                fill(piece, a, panel);
            }
            collect(piece, base, panel, coil, hold);
            a = ended ? a + panel : Math.min(length, a + panel);
            if (ended) {
                piece.at(a);
                return a;
            }
            shift();
        }
        piece.at(length);
        return length;
    }

    /** Panels walked since last cleared. */
    long work() {
        return work;
    }

    private void count() throws IllegalCaseException {
        if (++work > WORK_LIMIT) {
            throw new IllegalCaseException("circuit", "a circuit that swings too fast for its duty", "slower swings or a shorter cycle");
        }
    }

    /** A panel of the piece's own standard length: its points follow from the first without exponentials. */
    private void fillStandard(Piece piece, double a, double panel) throws IllegalCaseException {
        count();
        piece.beginStandard(a, bus[0], current[0]);
        for (int index = 1; index <= LAST; index++) {
            piece.standardPoint(index);
            record(piece, index, a + node[index] * panel);
        }
    }

    private void fill(Piece piece, double a, double panel) throws IllegalCaseException {
        count();
        for (int index = 1; index <= LAST; index++) {
            double at = a + node[index] * panel;
            piece.at(at);
            record(piece, index, at);
        }
    }

    private void record(Piece piece, int index, double at) {
        time[index] = at;
        current[index] = piece.current;
        slope[index] = piece.slope;
        bus[index] = piece.bus;
        drawn[index] = piece.drawn;
        rectified[index] = piece.rectified;
        mains[index] = piece.mains;
        margin[index] = piece.margin();
    }

    /** Index of the first point at which the piece no longer holds, or 0. A dip between points is looked for at the foot of a parabola. */
    private int firstLate(Piece piece, double blind) {
        for (int index = 1; index <= LAST; index++) {
            if (!(margin[index] > 0) && time[index] > blind) {
                return index;
            }
            if (index > 1 && margin[index - 1] < margin[index] && margin[index - 1] <= margin[index - 2] && time[index - 1] > blind
                    && dips(piece, index - 1)) {
                return index;
            }
        }
        return 0;
    }

    /** Looks at the foot of the parabola through three points; if the margin is used up there, moves the next point to it. */
    private boolean dips(Piece piece, int middle) {
        double left = time[middle - 1] - time[middle];
        double right = time[middle + 1] - time[middle];
        double riseLeft = (margin[middle - 1] - margin[middle]) / left;
        double riseRight = (margin[middle + 1] - margin[middle]) / right;
        double curvature = (riseRight - riseLeft) / (right - left);
        double tilt = riseLeft - curvature * left;
        if (!(curvature > 0) || margin[middle] - 0.25 * tilt * tilt / curvature > 0.1 * margin[middle]) {
            return false;
        }
        double foot = time[middle] - 0.5 * tilt / curvature;
        if (!(foot > time[middle - 1] && foot < time[middle + 1])) {
            return false;
        }
        piece.at(foot);
        if (piece.margin() > 0) {
            return false;
        }
        if (foot < time[middle]) {
            time[middle] = time[middle - 1];
            margin[middle] = margin[middle - 1];
        }
        time[middle + 1] = foot;
        margin[middle + 1] = piece.margin();
        return true;
    }

    private void collect(Piece piece, double base, double panel, boolean coil, boolean hold) {
        double charge = 0;
        double currentSquare = 0;
        double busSquare = 0;
        double drawnSquare = 0;
        double rectifiedCharge = 0;
        double energy = 0;
        for (int index = 1; index < LAST; index++) {
            double share = weight[index];
            charge += share * current[index];
            currentSquare += share * current[index] * current[index];
            busSquare += share * bus[index] * bus[index];
            drawnSquare += share * drawn[index] * drawn[index];
            rectifiedCharge += share * rectified[index];
            energy += share * drawn[index] * mains[index];
        }
        if (coil) {
            totals.add(Totals.SWITCH, panel * charge);
            totals.add(Totals.CURRENT_SQUARE, panel * currentSquare);
            if (hold) {
                totals.add(Totals.HOLD_CURRENT, panel * charge);
                totals.add(Totals.HOLD_SQUARE, panel * currentSquare);
            }
        }
        totals.add(Totals.BUS_SQUARE, panel * busSquare);
        totals.add(Totals.DRAWN_SQUARE, panel * drawnSquare);
        totals.add(Totals.RECTIFIER, panel * rectifiedCharge);
        totals.add(Totals.SOURCE_ENERGY, panel * energy);
        busPeak = Math.max(busPeak, crest(bus));
        drawnPeak = Math.max(drawnPeak, crest(drawn));
        if (coil) {
            for (int index = 1; index <= LAST; index++) {
                observer.stretch(piece, base, time[index - 1], current[index - 1], slope[index - 1], time[index], current[index],
                        slope[index]);
            }
        }
    }

    /** Highest of the points, or the head of the parabola through three where it stands higher. */
    private double crest(double[] value) {
        int top = 0;
        for (int index = 1; index <= LAST; index++) {
            if (value[index] > value[top]) {
                top = index;
            }
        }
        if (top == 0 || top == LAST) {
            return value[top];
        }
        double left = time[top - 1] - time[top];
        double right = time[top + 1] - time[top];
        double riseLeft = (value[top - 1] - value[top]) / left;
        double riseRight = (value[top + 1] - value[top]) / right;
        double curvature = (riseRight - riseLeft) / (right - left);
        double tilt = riseLeft - curvature * left;
        return curvature < 0 ? value[top] - 0.25 * tilt * tilt / curvature : value[top];
    }

    private void shift() {
        time[0] = time[LAST];
        current[0] = current[LAST];
        slope[0] = slope[LAST];
        bus[0] = bus[LAST];
        drawn[0] = drawn[LAST];
        rectified[0] = rectified[LAST];
        mains[0] = mains[LAST];
        margin[0] = margin[LAST];
    }
}
