package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.services.IServiceConstants;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.PageDialog;
import jakarta.inject.Named;

/** Help › Keyboard. */
public final class KeyboardHandler {

    @Execute
    void execute(@Named(IServiceConstants.ACTIVE_SHELL) Shell shell) {
        Texts texts = Texts.of(PageDialog.class);
        new PageDialog(shell, texts.get("keyboard"), texts.get("keys")).open();
    }
}
