package coilbook.workbench.internal.grid.access;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.coordinate.PositionCoordinate;
import org.eclipse.nebula.widgets.nattable.selection.SelectionLayer;
import org.eclipse.nebula.widgets.nattable.selection.event.ISelectionEvent;
import org.eclipse.swt.accessibility.ACC;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleControlAdapter;
import org.eclipse.swt.accessibility.AccessibleControlEvent;
import org.eclipse.swt.accessibility.AccessibleEvent;

import coilbook.register.StatusColumn;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.text.Texts;

/** The grid paints its cells itself, so that a screen reader sees one blank control: this tells it the focused cell. */
public final class GridAccess {

    private final SelectionLayer selection;
    private final StationsPresenter rows;
    private final CellText text;
    private final Texts texts = Texts.of(StationsPresenter.class);

    private GridAccess(SelectionLayer selection, StationsPresenter rows, CellText text) {
        this.selection = selection;
        this.rows = rows;
        this.text = text;
    }

    /** Makes a grid speak. */
    public static void install(NatTable table, SelectionLayer selection, StationsPresenter rows, CellText text) {
        GridAccess access = new GridAccess(selection, rows, text);
        table.getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = access.spoken();
            }
        });
        table.getAccessible().addAccessibleControlListener(new AccessibleControlAdapter() {
            @Override
            public void getRole(AccessibleControlEvent event) {
                event.detail = ACC.ROLE_TABLE;
            }

            @Override
            public void getValue(AccessibleControlEvent event) {
                event.result = access.spoken();
            }
        });
        selection.addLayerListener(event -> {
            if (event instanceof ISelectionEvent && !table.isDisposed()) {
                table.getAccessible().sendEvent(ACC.EVENT_NAME_CHANGED, null);
                table.getAccessible().sendEvent(ACC.EVENT_VALUE_CHANGED, null);
            }
        });
    }

    private String spoken() {
        PositionCoordinate anchor = selection.getSelectionAnchor();
        if (anchor.getRowPosition() < 0 || anchor.getColumnPosition() < 0) {
            return texts.get("accessible");
        }
        StatusColumn column = StationColumns.at(anchor.getColumnPosition());
        return text.spoken(column, rows.row(anchor.getRowPosition()), rows.isEditable(column));
    }
}
