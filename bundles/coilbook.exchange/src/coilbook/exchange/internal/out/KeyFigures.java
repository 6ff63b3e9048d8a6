package coilbook.exchange.internal.out;

import java.util.Arrays;
import java.util.List;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;

/** Writes a station's key figures: formula and value where there is a closed form that gives the computed value, else the value alone. */
final class KeyFigures {

    private static final int LEAST_WIDTH = 10;
    private static final String RULED_BY = "Cycle rate ruled by";

    private KeyFigures() {
    }

    static List<Column> columns() {
        List<Column> columns = new java.util.ArrayList<>(Arrays.stream(KeyFigure.values())
                .map(figure -> Column.computed(figure.heading(), Math.max(LEAST_WIDTH, FieldCells.longestWord(figure.heading()) + 3)))
                .toList());
        columns.add(Column.computed(RULED_BY, 20));
        return columns;
    }

    static void write(SheetOut out, FigureCase of) {
        for (KeyFigure figure : KeyFigure.values()) {
            write(out, of, figure);
        }
        boolean known = of.electrics() != null && of.electrics().cycleRate().highest().known();
        out.text(known ? of.electrics().cycleRate().ruling().label() : "", Use.COMPUTED_TEXT);
    }

    private static void write(SheetOut out, FigureCase of, KeyFigure figure) {
        double value = of.electrics() == null ? Double.NaN : figure.value(of);
        if (Double.isNaN(value)) {
            out.skip();
            return;
        } else if (Double.isInfinite(value)) {
            out.text(noSuchValue(figure), Use.COMPUTED_TEXT);
            return;
        }
        Expr form = figure.form(of);
        boolean closed = form != null && form.isPresent() && Math.abs(form.value() - value) <= figure.tolerance(value);
        double written = closed ? form.value() : value;
        double shown = ExchangeSheets.shown(figure.unit(), written);
        of.wrote(figure, out.column(), written);
        if (closed) {
            out.formula(form.shownIn(figure.unit()), shown, Use.COMPUTED);
        } else {
            out.number(shown, Use.COMPUTED);
        }
    }

    /** What an infinite value means. */
    private static String noSuchValue(KeyFigure figure) {
        return switch (figure) {
            case TIME_TO_PULL_IN -> "not reached";
            case HOLD_MEAN, HOLD_MINIMUM, HOLD_MARGIN -> "not applicable";
            case RELEASE_TIME -> "not before the next";
            case DECAY_TIME -> "never";
            case HIGHEST_RATE -> "no limit";
            default -> "no steady value";
        };
    }
}
