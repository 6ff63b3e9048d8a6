package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;

import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.FileQuestions;

/** Edit › Redo. */
public final class RedoHandler {

    @CanExecute
    boolean canExecute(Session session) {
        return session.steps().redo() != null;
    }

    @Execute
    void execute(FileQuestions questions) {
        questions.redo();
    }
}
