package coilbook.exchange.internal.in;

import coilbook.fleet.CoilbookException;

/** Takes the rows of a table one by one, so that no table is ever held whole. */
@FunctionalInterface
interface RowSink {

    /**
     * @param number counted from 1 as spreadsheet programs show it
     * @param cells from the first column on; {@code null} where blank
     */
    void row(int number, Cell[] cells) throws CoilbookException;
}
