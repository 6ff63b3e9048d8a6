package coilbook.exchange.internal.in;

import coilbook.exchange.internal.ExchangeSheets;

/** Reads what a workbook's summary says of its scope: a label, the answer in the next filled cell of its row. */
final class SummaryReader implements RowSink {

    private static final int ROWS = 200;

    private boolean marked;
    private boolean partial;
    private boolean pastDate;

    @Override
    public void row(int number, Cell[] cells) {
        if (number > ROWS) {
            return;
        }
        String label = null;
        for (Cell cell : cells) {
            if (cell == null) {
                continue;
            }
            String text = Texts.strip(cell.shown());
            if (label == null) {
                label = text;
                continue;
            }
            if (label.equalsIgnoreCase(ExchangeSheets.PART_OF_FLEET)) {
                marked = true;
                partial |= text.equalsIgnoreCase(ExchangeSheets.YES);
            } else if (label.equalsIgnoreCase(ExchangeSheets.PAST_DATE)) {
                marked = true;
                pastDate |= text.equalsIgnoreCase(ExchangeSheets.YES);
            }
            return;
        }
    }

    /** Whether the sheet carries our marks at all. */
    boolean isMarked() {
        return marked;
    }

    boolean isPartial() {
        return partial;
    }

    boolean isPastDate() {
        return pastDate;
    }
}
