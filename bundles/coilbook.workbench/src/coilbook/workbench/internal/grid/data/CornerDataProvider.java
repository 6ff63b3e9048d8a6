package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.data.IDataProvider;

/** The corner over the row numbers: blank beside the headings, and beside the filter row the word that says what that row is. */
public final class CornerDataProvider implements IDataProvider {

    private static final int ROWS = 2;

    private final String filter;

    public CornerDataProvider(String filter) {
        this.filter = filter;
    }

    @Override
    public Object getDataValue(int columnIndex, int rowIndex) {
        return rowIndex == 0 ? "" : filter;
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
        return ROWS;
    }
}
