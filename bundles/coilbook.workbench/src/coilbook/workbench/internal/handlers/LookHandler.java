package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.core.di.annotations.Optional;
import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;

import coilbook.workbench.internal.WorkbenchIds;
import coilbook.workbench.internal.window.Look;
import jakarta.inject.Named;

/** View › Light, View › Dark. */
public final class LookHandler {

    @Execute
    void execute(Look look, @Optional IThemeEngine engine, @Named(WorkbenchIds.LOOK) String chosen) {
        look.choose("dark".equals(chosen), engine);
    }
}
