package coilbook.workbench.internal.grid.edit;

import java.util.List;

import org.eclipse.nebula.widgets.nattable.config.AbstractRegistryConfiguration;
import org.eclipse.nebula.widgets.nattable.config.IConfigRegistry;
import org.eclipse.nebula.widgets.nattable.config.IEditableRule;
import org.eclipse.nebula.widgets.nattable.data.validate.DataValidator;
import org.eclipse.nebula.widgets.nattable.data.validate.ValidationFailedException;
import org.eclipse.nebula.widgets.nattable.edit.EditConfigAttributes;
import org.eclipse.nebula.widgets.nattable.edit.action.KeyEditAction;
import org.eclipse.nebula.widgets.nattable.edit.action.MouseEditAction;
import org.eclipse.nebula.widgets.nattable.edit.editor.TextCellEditor;
import org.eclipse.nebula.widgets.nattable.grid.GridRegion;
import org.eclipse.nebula.widgets.nattable.style.DisplayMode;
import org.eclipse.nebula.widgets.nattable.ui.binding.UiBindingRegistry;
import org.eclipse.nebula.widgets.nattable.ui.matcher.CellEditorMouseEventMatcher;
import org.eclipse.nebula.widgets.nattable.ui.matcher.KeyEventMatcher;
import org.eclipse.nebula.widgets.nattable.ui.matcher.LetterOrDigitKeyEventMatcher;
import org.eclipse.nebula.widgets.nattable.ui.matcher.MouseEventMatcher;
import org.eclipse.swt.SWT;

import coilbook.workbench.internal.grid.data.CellLabels;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.CellText;

/** Editing in place: F2, typing and a double click open a cell; a single click only selects. */
public final class EditConfiguration extends AbstractRegistryConfiguration {

    private final CellText text;
    private final ChoiceLists choices;
    private final EditProblems problems;

    public EditConfiguration(CellText text, ChoiceLists choices, EditProblems problems) {
        this.text = text;
        this.choices = choices;
        this.problems = problems;
    }

    @Override
    public void configureRegistry(IConfigRegistry registry) {
        registry.registerConfigAttribute(EditConfigAttributes.CELL_EDITABLE_RULE, IEditableRule.NEVER_EDITABLE);
        registry.registerConfigAttribute(EditConfigAttributes.CELL_EDITABLE_RULE, IEditableRule.ALWAYS_EDITABLE, DisplayMode.EDIT,
                CellLabels.EDITABLE);
        registry.registerConfigAttribute(EditConfigAttributes.CELL_EDITABLE_RULE, IEditableRule.ALWAYS_EDITABLE, DisplayMode.EDIT,
                GridRegion.FILTER_ROW);
        registry.registerConfigAttribute(EditConfigAttributes.CELL_EDITOR, new TextCellEditor(false, true), DisplayMode.EDIT,
                CellLabels.EDITABLE);
        registry.registerConfigAttribute(EditConfigAttributes.CELL_EDITOR, new ChoiceCellEditor(choices), DisplayMode.EDIT,
                CellLabels.CHOICE);
        registry.registerConfigAttribute(EditConfigAttributes.DATA_VALIDATOR, new DataValidator() {
            @Override
            public boolean validate(int columnIndex, int rowIndex, Object newValue) {
                String problem = text.problem(StationColumns.at(columnIndex), newValue == null ? null : newValue.toString());
                if (problem != null) {
                    throw new ValidationFailedException(problem);
                }
                return true;
            }
        }, DisplayMode.EDIT, CellLabels.EDITABLE);
        for (String label : List.of(CellLabels.EDITABLE, CellLabels.CHOICE)) {
            registry.registerConfigAttribute(EditConfigAttributes.VALIDATION_ERROR_HANDLER, problems, DisplayMode.EDIT, label);
            registry.registerConfigAttribute(EditConfigAttributes.CONVERSION_ERROR_HANDLER, problems, DisplayMode.EDIT, label);
        }
        // a cell whose text is refused keeps its editor open instead of losing what was typed
        registry.registerConfigAttribute(EditConfigAttributes.OPEN_ADJACENT_EDITOR, Boolean.FALSE, DisplayMode.EDIT, CellLabels.EDITABLE);
    }

    @Override
    public void configureUiBindings(UiBindingRegistry bindings) {
        bindings.registerKeyBinding(new KeyEventMatcher(SWT.NONE, SWT.F2), new KeyEditAction());
        bindings.registerKeyBinding(new LetterOrDigitKeyEventMatcher(), new KeyEditAction());
        bindings.registerKeyBinding(new LetterOrDigitKeyEventMatcher(SWT.MOD2), new KeyEditAction());
        bindings.registerDoubleClickBinding(new CellEditorMouseEventMatcher(GridRegion.BODY), new MouseEditAction());
        bindings.registerFirstSingleClickBinding(new MouseEventMatcher(SWT.NONE, GridRegion.FILTER_ROW, MouseEventMatcher.LEFT_BUTTON),
                new MouseEditAction());
    }
}
