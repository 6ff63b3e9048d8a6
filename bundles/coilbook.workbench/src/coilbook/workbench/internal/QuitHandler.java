package coilbook.workbench.internal;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.workbench.IWorkbench;

/** Closes the window and ends the program. */
public final class QuitHandler {

    @Execute
    public void quit(IWorkbench workbench) {
        workbench.close();
    }
}
