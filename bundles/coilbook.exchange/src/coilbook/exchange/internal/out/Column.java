package coilbook.exchange.internal.out;

import coilbook.exchange.internal.ExchangeSheets;

/**
 * A column of a sheet that goes out.
 *
 * @param heading as written, the unit in square brackets
 * @param width in characters; never measured from the cells, which costs more than writing them
 * @param computed whether import passes it over
 */
record Column(String heading, int width, boolean computed) {

    /** Room for the mark of a computed column. */
    private static final int LEAST_COMPUTED = 13;

    static Column of(String heading, int width) {
        return new Column(heading, width, false);
    }

    /** A computed column; the heading gets its mark here. */
    static Column computed(String heading, int width) {
        return new Column(heading + ExchangeSheets.COMPUTED, Math.max(width, LEAST_COMPUTED), true);
    }
}
