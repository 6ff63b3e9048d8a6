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
        return refine(piece, QUANTITY_MARGIN, 0, a, b);
    }

    static double currentCrosses(Piece piece, double level, double a, double b) {
        return refine(piece, QUANTITY_CURRENT, level, a, b);
    }

    static double slopeVanishes(Piece piece, double a, double b) {
        return refine(piece, QUANTITY_SLOPE, 0, a, b);
    }

    /** Regula falsi with the Illinois change, bisecting where it stalls; to the last bits of the time. */
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
        double tolerance = 4 * Math.ulp(Math.max(Math.abs(a), Math.abs(b)));
        for (int step = 0; step < 120 && b - a > tolerance && fb != 0; step++) {
            double width = b - a;
            double c = step % 6 == 5 ? 0.5 * (a + b) : a + width * (fa / (fa - fb));
            if (!(c > a && c < b)) {
                c = 0.5 * (a + b);
            }
            double fc = value(piece, quantity, level, c);
            if (fc > 0 == fa > 0) {
                a = c;
                fa = fc;
                if (side == 1) {
                    fb *= 0.5;
                }
                side = 1;
            } else {
                b = c;
                fb = fc;
                if (side == -1) {
                    fa *= 0.5;
                }
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
