package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.swt.widgets.Shell;

import coilbook.help.HelpPage;
import coilbook.workbench.internal.WorkbenchIds;
import coilbook.workbench.internal.window.PageDialog;
import jakarta.inject.Named;

/** Help › a page to read. */
public final class HelpPageHandler {

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell, @Named(WorkbenchIds.PAGE) String page) {
        HelpPage shown = HelpPage.valueOf(page);
        new PageDialog(shell, shown.title(), shown.text()).open();
    }
}
