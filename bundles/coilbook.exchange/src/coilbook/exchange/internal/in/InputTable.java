package coilbook.exchange.internal.in;

import coilbook.fleet.CoilbookException;

/** One sheet of a workbook, or a whole delimited file. */
interface InputTable {

    /** The sheet's name; empty for a delimited file. */
    String name();

    /** Whether numbers written as text follow the habit of decimal commas, so that {@code 1.234} may mean one thousand. */
    boolean commaDecimals();

    /** Hands over every row that is not wholly blank, in order. May be called again. */
    void read(RowSink sink) throws CoilbookException;
}
