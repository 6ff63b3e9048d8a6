package coilbook.workbench.internal.grid.edit;

import java.util.List;

import org.eclipse.nebula.widgets.nattable.edit.editor.ComboBoxCellEditor;
import org.eclipse.nebula.widgets.nattable.edit.editor.IComboBoxDataProvider;
import org.eclipse.nebula.widgets.nattable.widget.NatCombo;
import org.eclipse.swt.widgets.Composite;

import coilbook.workbench.internal.grid.data.StationColumns;

/**
 * A drop-down of catalogue entries that can also be typed. The entries come from the register, which must not be asked on the window's thread: the
 * list opens with what is known and is filled when the rest arrives.
 */
final class ChoiceCellEditor extends ComboBoxCellEditor {

    private static final int ROWS_SHOWN = 12;

    ChoiceCellEditor(ChoiceLists choices) {
        super(new IComboBoxDataProvider() {
            @Override
            public List<?> getValues(int columnIndex, int rowIndex) {
                return choices.known(rowIndex, StationColumns.at(columnIndex));
            }
        }, ROWS_SHOWN);
        setFreeEdit(true);
        setShowDropdownFilter(false);
        choices.onArrival((row, column, list) -> {
            NatCombo combo = getEditorControl();
            if (combo != null && !combo.isDisposed() && layerCell != null && getRowIndex() == row && getColumnIndex() == column.ordinal()) {
                combo.setItems(list.toArray(String[]::new));
            }
        });
    }

    @Override
    public NatCombo createEditorControl(Composite parent) {
        NatCombo combo = super.createEditorControl(parent);
        combo.setData("org.eclipse.e4.ui.css.id", "coilbook-choice");
        return combo;
    }
}
