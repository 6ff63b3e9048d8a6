package coilbook.electrics.internal;

/** Finds where a quantity of a piece crosses a level, between two times that bracket it, and leaves the piece set to that time. */
final class Roots {

    private static final int MARGIN = 0;
    private static final int CURRENT = 1;
    private static final int SLOPE = 2;

    /** Relative to the time since the piece began. */
    private static final double TIME_TOLERANCE = 2e-14;
    /** Relative to the quantity at the ends of the bracket. */
    private static final double VALUE_TOLERANCE = 1e-14;
    /** At a crest the current hardly depends on the time. */
    private static final double CREST_TOLERANCE = 1e-6;

    private Roots() {
    }

    /** Time at which the margin, positive at a or just after, is used up. Both margins as found by the caller. */
    static double marginEnds(Piece piece, double a, double marginA, double b, double marginB) {
        if (marginA > 0) {
            return refine(piece, MARGIN, 0, a, marginA, b, marginB);
        }
        double step = b - a;
        for (int halving = 0; halving < 40; halving++) {
            step *= 0.5;
            double margin = value(piece, MARGIN, 0, a + step);
            if (margin > 0) {
                return refine(piece, MARGIN, 0, a + step, margin, b, marginB);
            }
        }
        piece.at(a);
        return a;
    }

    static double currentCrosses(Piece piece, double level, double a, double currentA, double b, double currentB) {
        return refine(piece, CURRENT, level, a, currentA - level, b, currentB - level);
    }

    static double slopeVanishes(Piece piece, double a, double slopeA, double b, double slopeB) {
        return refine(piece, SLOPE, 0, a, slopeA, b, slopeB);
    }

    /** Regula falsi with the change of Anderson and Björck, bisecting where it stalls. */
    private static double refine(Piece piece, int quantity, double level, double from, double valueFrom, double to, double valueTo) {
        double a = from;
        double b = to;
        double fa = valueFrom;
        double fb = valueTo;
        double enough = VALUE_TOLERANCE * Math.max(Math.abs(fa), Math.abs(fb));
        if (Math.abs(fa) <= enough || fa > 0 == fb > 0) {
            piece.at(Math.abs(fa) <= Math.abs(fb) ? a : b);
            return Math.abs(fa) <= Math.abs(fb) ? a : b;
        }
        int side = 0;
        int steps = 0;
        double halfBefore = 0.5 * (b - a);
        double tolerance = (quantity == SLOPE ? CREST_TOLERANCE : TIME_TOLERANCE) * b;
        for (int step = 0; step < 400 && b - a > tolerance; step++) {
            double c = a + (b - a) * (fa / (fa - fb));
            if (steps == 3) {
                c = b - a > halfBefore ? 0.5 * (a + b) : c;
                halfBefore = 0.5 * (b - a);
                steps = 0;
            }
            steps++;
            if (!(c > a && c < b)) {
                c = 0.5 * (a + b);
            }
            double fc = value(piece, quantity, level, c);
            if (Math.abs(fc) <= enough) {
                return c;
            }
            if (fc > 0 == fa > 0) {
                fb *= side == 1 ? scale(fc, fa) : 1;
                a = c;
                fa = fc;
                side = 1;
            } else {
                fa *= side == -1 ? scale(fc, fb) : 1;
                b = c;
                fb = fc;
                side = -1;
            }
        }
        piece.at(b);
        return b;
    }

    private static double scale(double value, double before) {
        double rest = 1 - value / before;
        return rest > 0 ? rest : 0.5;
    }

    private static double value(Piece piece, int quantity, double level, double time) {
        piece.at(time);
        return switch (quantity) {
            case MARGIN -> piece.margin();
            case CURRENT -> piece.current - level;
            default -> piece.slope;
        };
    }
}
