package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.data.IDataProvider;

import coilbook.workbench.internal.stations.CellText;

/** The headings with their units. */
public final class HeadingsDataProvider implements IDataProvider {

    private final CellText text;

    public HeadingsDataProvider(CellText text) {
        this.text = text;
    }

    @Override
    public Object getDataValue(int columnIndex, int rowIndex) {
        return text.heading(StationColumns.at(columnIndex));
    }

    @Override
    public void setDataValue(int columnIndex, int rowIndex, Object newValue) {
        throw new UnsupportedOperationException("a heading is not edited");
    }

    @Override
    public int getColumnCount() {
        return StationColumns.count();
    }

    @Override
    public int getRowCount() {
        return 1;
    }
}
