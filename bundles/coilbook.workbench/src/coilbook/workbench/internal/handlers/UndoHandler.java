package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;

import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.FileQuestions;

/** Edit › Undo. */
public final class UndoHandler {

    @CanExecute
    boolean canExecute(Session session) {
        return session.steps().undo() != null;
    }

    @Execute
    void execute(FileQuestions questions) {
        questions.undo();
    }
}
