package coilbook.workbench.internal.grid.access;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.grid.GridRegion;
import org.eclipse.nebula.widgets.nattable.tooltip.NatTableContentTooltip;
import org.eclipse.swt.widgets.Event;

import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;

/** Tooltips: of a heading, what the column holds and whether it is computed; of a cell, its whole text where it is cut. */
public final class HeadingTips extends NatTableContentTooltip {

    private final CellText text;
    private final StationsPresenter rows;

    public HeadingTips(NatTable table, CellText text, StationsPresenter rows) {
        super(table, GridRegion.COLUMN_HEADER, GridRegion.BODY);
        this.text = text;
        this.rows = rows;
    }

    @Override
    protected String getText(Event event) {
        int column = natTable.getColumnPositionByX(event.x);
        int row = natTable.getRowPositionByY(event.y);
        if (column > 0 && row == 0) {
            var at = StationColumns.at(natTable.getColumnIndexByPosition(column));
            return text.headingHelp(at, rows.isEditable(at));
        }
        return super.getText(event);
    }
}
