package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.window.FileQuestions;
import jakarta.inject.Named;

/** File › Bring in a spreadsheet. */
public final class BringInHandler {

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell, FileQuestions questions) {
        questions.bringIn(shell);
    }
}
