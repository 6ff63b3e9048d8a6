package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.workbench.IWorkbench;

/** File › Quit. */
public final class QuitHandler {

    @Execute
    void execute(IWorkbench workbench) {
        workbench.close();
    }
}
