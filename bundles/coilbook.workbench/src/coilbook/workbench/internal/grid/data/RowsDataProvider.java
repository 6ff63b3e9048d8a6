package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.data.IDataProvider;

import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;

/** The texts of the cells. Asking for a row that is not in memory fetches it and shows it as pending. */
public final class RowsDataProvider implements IDataProvider {

    private final StationsPresenter rows;
    private final CellText text;

    public RowsDataProvider(StationsPresenter rows, CellText text) {
        this.rows = rows;
        this.text = text;
    }

    @Override
    public Object getDataValue(int columnIndex, int rowIndex) {
        return text.cell(StationColumns.at(columnIndex), rows.row(rowIndex));
    }

    @Override
    public void setDataValue(int columnIndex, int rowIndex, Object newValue) {
        StatusColumn column = StationColumns.at(columnIndex);
        StatusRow row = rows.row(rowIndex);
        String typed = newValue == null ? "" : newValue.toString().strip();
        if (row != null && !typed.equals(text.cell(column, row))) {
            rows.edit(rowIndex, column, typed);
        }
    }

    @Override
    public int getColumnCount() {
        return StationColumns.count();
    }

    @Override
    public int getRowCount() {
        return rows.rowCount();
    }
}
