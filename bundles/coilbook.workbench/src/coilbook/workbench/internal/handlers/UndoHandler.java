package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.FileQuestions;
import jakarta.inject.Named;

/** Edit › Undo. */
public final class UndoHandler {

    @CanExecute
    boolean canExecute(Session session) {
        return session.steps().undo() != null;
    }

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell, FileQuestions questions) {
        questions.undo(shell);
    }
}
