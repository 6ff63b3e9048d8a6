package coilbook.electrics.internal;

/** Finds where a quantity of a piece crosses a level, between two times that bracket it. */
final class Roots {

    private static final int QUANTITY_MARGIN = 0;
    private static final int QUANTITY_CURRENT = 1;
    private static final int QUANTITY_SLOPE = 2;

    private Roots() {
    }

    /** First time at which the margin is used up; the piece is left set to it. Margin is positive at a (or a is the start), not at b. */
    static double marginEnds(Piece piece, double a, double b) {
        piece.at(a);
        double from = piece.margin() > 0 ? a : opens(piece, a, b);
        return refine(piece, QUANTITY_MARGIN, 0, from, b);
    }

    /** A piece may begin on the edge of its margin: a time after a at which the margin has opened, or a if it has not. */
    private static double opens(Piece piece, double a, double b) {
        double step = b - a;
        for (int halving = 0; halving < 40; halving++) {
            step *= 0.5;
            piece.at(a + step);
            if (piece.margin() > 0) {
                return a + step;
            }
        }
        return a;
    }

    static double currentCrosses(Piece piece, double level, double a, double b) {
        return refine(piece, QUANTITY_CURRENT, level, a, b);
    }

    static double slopeVanishes(Piece piece, double a, double b) {
        return refine(piece, QUANTITY_SLOPE, 0, a, b);
    }

    /** Regula falsi with the change of Anderson and Björck, bisecting where it stalls; to the last bits of the time. */
    private static double refine(Piece piece, int quantity, double level, double from, double to) {
        double a = from;
        double b = to;
        double fa = value(piece, quantity, level, a);
        double fb = value(piece, quantity, level, b);
        if (fa == 0 || fa > 0 == fb > 0) {
            double end = fa == 0 || quantity == QUANTITY_MARGIN ? a : b;
            piece.at(end);
            return end;
        }
        int side = 0;
        int steps = 0;
        double halfBefore = 0.5 * (b - a);
        double tolerance = 4 * Math.ulp(Math.max(Math.abs(a), Math.abs(b)));
        for (int step = 0; step < 400 && b - a > tolerance && fb != 0; step++) {
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
            if (fc > 0 == fa > 0) {
                if (side == 1) {
                    fb *= 1 - fc / fa > 0.5 ? 1 - fc / fa : 0.5;
                }
                a = c;
                fa = fc;
                side = 1;
            } else {
                if (side == -1) {
                    fa *= 1 - fc / fb > 0.5 ? 1 - fc / fb : 0.5;
                }
                b = c;
                fb = fc;
                side = -1;
            }
        }
        piece.at(b);
        return b;
    }

    private static double value(Piece piece, int quantity, double level, double time) {
        piece.at(time);
        return switch (quantity) {
            case QUANTITY_MARGIN -> piece.margin();
            case QUANTITY_CURRENT -> piece.current - level;
            default -> piece.slope;
        };
    }
}
