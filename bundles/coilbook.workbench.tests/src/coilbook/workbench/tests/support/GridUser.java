package coilbook.workbench.tests.support;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.viewport.command.ShowColumnInViewportCommand;
import org.eclipse.nebula.widgets.nattable.widget.NatCombo;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Text;

import coilbook.register.StatusColumn;

/** What a person does with mouse and keys in the grid, and sees there. */
public final class GridUser {

    private GridUser() {
    }

    /** The grid's row that shows a station, or -1 if it is not in view. */
    public static int row(NatTable grid, String station) {
        for (int position = 2; position < grid.getRowCount(); position++) {
            if (station.equals(grid.getDataValueByPosition(1, position))) {
                return position;
            }
        }
        return -1;
    }

    private static int position(NatTable grid, StatusColumn column) {
        for (int position = 1; position < grid.getColumnCount(); position++) {
            if (grid.getColumnIndexByPosition(position) == column.ordinal()) {
                return position;
            }
        }
        return -1;
    }

    public static String cell(NatTable grid, StatusColumn column, int row) {
        int position = position(grid, column);
        return position < 0 ? "" : String.valueOf(grid.getDataValueByPosition(position, row));
    }

    public static String verdict(NatTable grid, int row) {
        return String.valueOf(grid.getDataValueByPosition(2, row));
    }

    public static void click(WindowRun window, NatTable grid, int column, int row) {
        window.run(() -> {
            Rectangle bounds = grid.getCellByPosition(column, row).getBounds();
            Event event = new Event();
            event.button = 1;
            event.x = bounds.x + bounds.width / 2;
            event.y = bounds.y + bounds.height / 2;
            grid.setFocus();
            grid.notifyListeners(SWT.MouseDown, event);
            grid.notifyListeners(SWT.MouseUp, event);
        });
    }

    /** Goes to the coil of a row, opens the cell with F2, types and presses Enter. */
    public static void type(WindowRun window, NatTable grid, int row, String coil) throws InterruptedException {
        window.run(() -> grid.doCommand(new ShowColumnInViewportCommand(StatusColumn.DRIVER_TYPE.ordinal())));
        window.await("the coil column is in view", () -> position(grid, StatusColumn.COIL_TYPE) > 0);
        click(window, grid, window.get(() -> position(grid, StatusColumn.COIL_TYPE)), row);
        window.run(() -> {
            Event key = new Event();
            key.keyCode = SWT.F2;
            grid.notifyListeners(SWT.KeyDown, key);
        });
        window.await("the drop-down is open", () -> WindowRun.find(grid, NatCombo.class) != null);
        window.run(() -> {
            Text text = WindowRun.find(WindowRun.find(grid, NatCombo.class), Text.class);
            text.setText(coil);
            Event enter = new Event();
            enter.keyCode = SWT.CR;
            enter.character = SWT.CR;
            text.notifyListeners(SWT.KeyDown, enter);
        });
    }
}
