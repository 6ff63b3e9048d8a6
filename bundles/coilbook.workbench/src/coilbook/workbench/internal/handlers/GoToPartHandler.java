package coilbook.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.e4.ui.workbench.modeling.EPartService;

import coilbook.workbench.internal.WorkbenchIds;
import jakarta.inject.Named;

/** Moves the focus to a part, by the keyboard. */
public final class GoToPartHandler {

    @Execute
    void execute(EPartService parts, @Named(WorkbenchIds.PART) String part) {
        parts.showPart(part, EPartService.PartState.ACTIVATE);
    }
}
