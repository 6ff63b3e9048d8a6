package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.PageDialog;
import jakarta.inject.Named;

/** Help › About. */
public final class AboutHandler {

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell) {
        Texts texts = Texts.of(PageDialog.class);
        MessageDialog.openInformation(shell, texts.get("about"),
                texts.get("about.text", Runtime.version().toString(), System.getProperty("os.name")));
    }
}
