package coilbook.exchange.internal.in;

import coilbook.fleet.CoilbookException;

/** Counts the cells of one sheet against the limit. */
final class CellCount {

    private final String file;
    private final String sheet;
    private long cells;

    CellCount(String file, String sheet) {
        this.file = file;
        this.sheet = sheet;
    }

    void add(long more) throws CoilbookException {
        cells += more;
        if (cells > InputLimits.CELLS) {
            throw Refusal.of(file, sheet, "has more than " + InputLimits.CELLS + " filled cells, which is the limit; split it", null);
        }
    }
}
