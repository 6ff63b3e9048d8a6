package coilbook.workbench.internal.grid.keys;

import java.util.Arrays;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;

import org.eclipse.nebula.widgets.nattable.command.ILayerCommandHandler;
import org.eclipse.nebula.widgets.nattable.coordinate.Range;
import org.eclipse.nebula.widgets.nattable.copy.command.CopyDataToClipboardCommand;
import org.eclipse.nebula.widgets.nattable.layer.ILayer;
import org.eclipse.nebula.widgets.nattable.selection.SelectionLayer;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.widgets.Display;

import coilbook.register.StatusRow;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.text.Texts;

/**
 * Copies the selected cells as text with tabs. At most as many as are surely in memory: the stock handler would ask for every cell of a million rows on
 * the window's thread, and copy blanks where rows have not come.
 */
public final class CopyCells implements ILayerCommandHandler<CopyDataToClipboardCommand> {

    private static final int MOST_ROWS = 2_000;

    private final SelectionLayer selection;
    private final StationsPresenter rows;
    private final CellText text;
    private final Consumer<String> notice;
    private final Texts texts = Texts.of(CopyCells.class);

    public CopyCells(SelectionLayer selection, StationsPresenter rows, CellText text, Consumer<String> notice) {
        this.selection = selection;
        this.rows = rows;
        this.text = text;
        this.notice = notice;
    }

    @Override
    public boolean doCommand(ILayer layer, CopyDataToClipboardCommand command) {
        if (selection.getSelectedRowCount() > MOST_ROWS) {
            notice.accept(texts.get("tooMany", MOST_ROWS));
            return true;
        }
        Set<Integer> positions = new TreeSet<>();
        for (Range range : selection.getSelectedRowPositions()) {
            positions.addAll(range.getMembers());
        }
        int[] columns = selection.getSelectedColumnPositions();
        StringBuilder copied = new StringBuilder();
        for (int position : positions) {
            StatusRow row = rows.row(position);
            if (row == null) {
                notice.accept(texts.get("notRead"));
                return true;
            }
            copied.append(copied.isEmpty() ? "" : System.lineSeparator());
            copied.append(Arrays.stream(columns).mapToObj(column -> cell(row, column, position))
                    .collect(java.util.stream.Collectors.joining("\t")));
        }
        if (!copied.isEmpty()) {
            Clipboard clipboard = new Clipboard(Display.getCurrent());
            clipboard.setContents(new Object[] { copied.toString() }, new Transfer[] { TextTransfer.getInstance() });
            clipboard.dispose();
        }
        return true;
    }

    private String cell(StatusRow row, int column, int position) {
        if (!selection.isCellPositionSelected(column, position)) {
            return "";
        }
        String cell = text.cell(StationColumns.at(column), row);
        boolean quote = cell.indexOf('\t') >= 0 || cell.indexOf('\n') >= 0 || cell.indexOf('"') >= 0;
        return quote ? '"' + cell.replace("\"", "\"\"") + '"' : cell;
    }

    @Override
    public Class<CopyDataToClipboardCommand> getCommandClass() {
        return CopyDataToClipboardCommand.class;
    }
}
