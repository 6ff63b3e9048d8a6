package coilbook.workbench.internal.grid.edit;

import java.util.function.Consumer;

import org.eclipse.nebula.widgets.nattable.config.IConfigRegistry;
import org.eclipse.nebula.widgets.nattable.edit.config.RenderErrorHandling;
import org.eclipse.nebula.widgets.nattable.edit.editor.ICellEditor;

/** A text that a cell cannot hold is marked while it is typed, and what was expected is said over the grid. */
public final class EditProblems extends RenderErrorHandling {

    private final Consumer<String> notice;

    /** @param notice takes the words, or {@code null} when all is well again */
    public EditProblems(Consumer<String> notice) {
        this.notice = notice;
    }

    @Override
    public void displayError(ICellEditor cellEditor, IConfigRegistry configRegistry, Exception e) {
        super.displayError(cellEditor, configRegistry, e);
        notice.accept(e.getMessage());
    }

    @Override
    public void removeError(ICellEditor cellEditor) {
        super.removeError(cellEditor);
        notice.accept(null);
    }
}
