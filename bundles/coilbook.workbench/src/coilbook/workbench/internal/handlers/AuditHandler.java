package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.CanExecute;
import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.FileQuestions;
import jakarta.inject.Named;

/** File › Audit workbook. */
public final class AuditHandler {

    @CanExecute
    boolean canExecute(Session session) {
        return session.fleet() != null;
    }

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell, FileQuestions questions) {
        questions.audit(shell);
    }
}
