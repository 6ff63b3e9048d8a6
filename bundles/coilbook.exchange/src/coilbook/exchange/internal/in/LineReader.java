package coilbook.exchange.internal.in;

/** Turns the lines of a table into what they say of rows. */
interface LineReader {

    /** A line under the headings that is neither blank, nor a total, nor a heading again. */
    void line(int row, Cell[] cells);
}
