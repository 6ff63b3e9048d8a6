package coilbook.workbench.internal.handlers;

import java.util.List;

import org.eclipse.e4.ui.di.AboutToShow;
import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.model.application.commands.MCommand;
import org.eclipse.e4.ui.model.application.ui.menu.MHandledMenuItem;
import org.eclipse.e4.ui.model.application.ui.menu.MMenuElement;
import org.eclipse.e4.ui.workbench.modeling.EModelService;

import coilbook.workbench.internal.WorkbenchIds;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.model.Steps;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.FileQuestions;

/** The Edit menu's undo and redo, with the names of the steps; made anew each time the menu is shown. */
public final class StepsMenu {

    private static final int LONGEST = 70;

    @AboutToShow
    void show(List<MMenuElement> items, EModelService models, MApplication application, Session session) {
        Texts texts = Texts.of(FileQuestions.class);
        Steps steps = session.steps();
        items.add(item(models, application, WorkbenchIds.UNDO, label(texts, "undo", steps.undo())));
        items.add(item(models, application, WorkbenchIds.REDO, label(texts, "redo", steps.redo())));
    }

    private static String label(Texts texts, String key, String step) {
        if (step == null) {
            return texts.get(key + ".none");
        }
        String shown = step.length() > LONGEST ? step.substring(0, LONGEST - 1) + "…" : step;
        // an ampersand would be taken for the mark of a mnemonic
        return texts.get(key + ".step", shown.replace("&", "&&"));
    }

    private static MHandledMenuItem item(EModelService models, MApplication application, String command, String label) {
        MHandledMenuItem item = models.createModelElement(MHandledMenuItem.class);
        item.setElementId(command + ".item");
        item.setLabel(label);
        for (MCommand known : application.getCommands()) {
            if (command.equals(known.getElementId())) {
                item.setCommand(known);
            }
        }
        return item;
    }
}
