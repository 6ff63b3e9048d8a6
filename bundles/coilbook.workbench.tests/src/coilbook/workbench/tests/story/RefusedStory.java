package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.swt.widgets.Label;

import coilbook.register.StatusColumn;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.tests.support.GridUser;
import coilbook.workbench.tests.support.WindowRun;

/** A coil that the catalogue does not have is refused in words, and the cell keeps what it had. */
public final class RefusedStory implements Story {

    private static final int ROW = 3;

    @Override
    public String name() {
        return "what a cell cannot hold is said and not recorded";
    }

    @Override
    public void play(WindowRun window) throws Exception {
        NatTable grid = window.grid();
        Session session = window.service(Session.class);
        String step = window.get(() -> session.steps().undo());
        GridUser.type(window, grid, ROW, "no such coil");
        window.await("it is said", () -> words(grid).contains("no such coil"), () -> words(grid));
        String cell = window.get(() -> GridUser.cell(grid, StatusColumn.COIL_TYPE, ROW));
        assertEquals(-1, cell.indexOf("no such"), cell);
        assertEquals(step, window.get(() -> session.steps().undo()), "no step was recorded");
    }

    private static String words(NatTable grid) {
        StringBuilder words = new StringBuilder();
        WindowRun.each(grid.getShell(), Label.class, label -> words.append(label.isVisible() ? label.getText() + "\n" : ""));
        return words.toString();
    }
}
