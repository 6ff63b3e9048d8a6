package coilbook.workbench.internal.grid.keys;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.config.AbstractUiBindingConfiguration;
import org.eclipse.nebula.widgets.nattable.config.ConfigRegistry;
import org.eclipse.nebula.widgets.nattable.coordinate.PositionCoordinate;
import org.eclipse.nebula.widgets.nattable.edit.command.EditCellCommand;
import org.eclipse.nebula.widgets.nattable.filterrow.FilterRowHeaderComposite;
import org.eclipse.nebula.widgets.nattable.layer.cell.ILayerCell;
import org.eclipse.nebula.widgets.nattable.selection.SelectionLayer;
import org.eclipse.nebula.widgets.nattable.sort.SortDirectionEnum;
import org.eclipse.nebula.widgets.nattable.sort.command.SortColumnCommand;
import org.eclipse.nebula.widgets.nattable.ui.binding.UiBindingRegistry;
import org.eclipse.nebula.widgets.nattable.ui.matcher.KeyEventMatcher;
import org.eclipse.swt.SWT;

import coilbook.register.StatusRow;

/** What the mouse does on headings, for the keyboard: Ctrl+F filters the column of the focused cell, Alt+Up and Alt+Down sort by it. */
public final class GridKeys extends AbstractUiBindingConfiguration {

    private static final int FILTER_ROW = 1;

    private final SelectionLayer selection;
    private final FilterRowHeaderComposite<StatusRow> filter;
    private final ConfigRegistry registry;

    public GridKeys(SelectionLayer selection, FilterRowHeaderComposite<StatusRow> filter, ConfigRegistry registry) {
        this.selection = selection;
        this.filter = filter;
        this.registry = registry;
    }

    @Override
    public void configureUiBindings(UiBindingRegistry bindings) {
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.MOD1, 'f'), (table, event) -> editFilter(table));
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.MOD3, SWT.ARROW_UP), (table, event) -> sort(SortDirectionEnum.ASC, false));
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.MOD3, SWT.ARROW_DOWN), (table, event) -> sort(SortDirectionEnum.DESC, false));
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.MOD3 | SWT.MOD2, SWT.ARROW_UP),
                (table, event) -> sort(SortDirectionEnum.ASC, true));
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.MOD3 | SWT.MOD2, SWT.ARROW_DOWN),
                (table, event) -> sort(SortDirectionEnum.DESC, true));
    }

    private int column() {
        PositionCoordinate anchor = selection.getSelectionAnchor();
        return anchor.getColumnPosition();
    }

    private void sort(SortDirectionEnum direction, boolean accumulate) {
        int index = column();
        for (int position = 0; index >= 0 && position < filter.getColumnCount(); position++) {
            if (filter.getColumnIndexByPosition(position) == index) {
                filter.doCommand(new SortColumnCommand(filter, position, accumulate, direction));
                return;
            }
        }
    }

    private void editFilter(NatTable table) {
        int index = column();
        for (int position = 1; index >= 0 && position < table.getColumnCount(); position++) {
            if (table.getColumnIndexByPosition(position) == index) {
                ILayerCell cell = table.getCellByPosition(position, FILTER_ROW);
                table.doCommand(new EditCellCommand(table, registry, cell));
                return;
            }
        }
    }
}
