package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;

import coilbook.exchange.internal.in.MergedCells.Region;
import coilbook.fleet.CoilbookException;

/** Gives every cell that a merged region covers the value of the region's first cell, also in rows that the file leaves out. */
final class MergedRows implements RowSink {

    private final RowSink next;
    private final List<Region> regions;
    private final List<Active> active = new ArrayList<>();
    private final CellCount count;
    private int upcoming;
    private int last;

    private record Active(Region region, Cell value) {
    }

    MergedRows(RowSink next, List<Region> regions, CellCount count) {
        this.next = next;
        this.regions = regions;
        this.count = count;
    }

    @Override
    public void row(int number, Cell[] cells) throws CoilbookException {
        fillUpTo(number);
        next.row(number, covered(number, cells));
        last = number;
    }

    /** Ends the sheet: regions may reach below its last row. */
    void finish() throws CoilbookException {
        int end = last;
        for (Active each : active) {
            end = Math.max(end, each.region.lastRow());
        }
        fillUpTo(end + 1);
    }

    private void fillUpTo(int number) throws CoilbookException {
        for (int row = last + 1; row < number && !active.isEmpty(); row++) {
            Cell[] filled = covered(row, new Cell[0]);
            if (filled.length > 0) {
                next.row(row, filled);
            }
            last = row;
        }
    }

    private Cell[] covered(int number, Cell[] cells) throws CoilbookException {
        Cell[] filled = cells;
        while (upcoming < regions.size() && regions.get(upcoming).firstRow() <= number) {
            Region region = regions.get(upcoming++);
            Cell value = region.firstRow() == number && region.firstColumn() < cells.length ? cells[region.firstColumn()] : null;
            if (value != null) {
                active.add(new Active(region, value));
            }
        }
        for (Iterator<Active> iterator = active.iterator(); iterator.hasNext();) {
            Active each = iterator.next();
            if (each.region.lastRow() < number) {
                iterator.remove();
            } else {
                filled = fill(filled, each);
            }
        }
        return filled;
    }

    private Cell[] fill(Cell[] cells, Active each) throws CoilbookException {
        int to = Math.min(each.region.lastColumn(), InputLimits.COLUMNS - 1);
        count.add(to - each.region.firstColumn() + 1L);
        Cell[] wide = cells.length > to ? cells : Arrays.copyOf(cells, to + 1);
        Arrays.fill(wide, each.region.firstColumn(), to + 1, each.value);
        return wide;
    }
}
