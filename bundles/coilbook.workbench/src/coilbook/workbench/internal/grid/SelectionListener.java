package coilbook.workbench.internal.grid;

import org.eclipse.nebula.widgets.nattable.coordinate.PositionCoordinate;
import org.eclipse.nebula.widgets.nattable.layer.ILayerListener;
import org.eclipse.nebula.widgets.nattable.layer.event.ILayerEvent;
import org.eclipse.nebula.widgets.nattable.selection.SelectionLayer;
import org.eclipse.nebula.widgets.nattable.selection.event.ISelectionEvent;

import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.grid.edit.ChoiceLists;
import coilbook.workbench.internal.stations.StationsPresenter;

/** Tells the presenter which row is looked at, and fetches the drop-down of the cell before it is opened. */
final class SelectionListener implements ILayerListener {

    private final SelectionLayer selection;
    private final StationsPresenter rows;
    private final ChoiceLists choices;

    SelectionListener(SelectionLayer selection, StationsPresenter rows, ChoiceLists choices) {
        this.selection = selection;
        this.rows = rows;
        this.choices = choices;
    }

    @Override
    public void handleLayerEvent(ILayerEvent event) {
        if (!(event instanceof ISelectionEvent)) {
            return;
        }
        PositionCoordinate anchor = selection.getSelectionAnchor();
        int count = selection.getSelectedRowCount();
        if (anchor.getRowPosition() >= 0 && count > 0) {
            rows.select(anchor.getRowPosition(), count);
            choices.prepare(anchor.getRowPosition(), StationColumns.at(anchor.getColumnPosition()));
        }
    }
}
