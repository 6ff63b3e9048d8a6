package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.data.IDataProvider;

/** The corner over the row numbers, one cell beside headings and filter row: the word at its foot says what the filter row is. */
public final class CornerDataProvider implements IDataProvider {

    private final String filter;

    public CornerDataProvider(String filter) {
        this.filter = filter;
    }

    @Override
    public Object getDataValue(int columnIndex, int rowIndex) {
        return filter;
    }

    @Override
    public void setDataValue(int columnIndex, int rowIndex, Object newValue) {
        throw new UnsupportedOperationException("the corner is not edited");
    }

    @Override
    public int getColumnCount() {
        return 1;
    }

    @Override
    public int getRowCount() {
        return 1;
    }
}
