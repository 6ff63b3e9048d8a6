package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.viewport.command.ShowRowInViewportCommand;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;

import coilbook.workbench.tests.support.GridUser;
import coilbook.workbench.tests.support.WindowRun;

/** A click on a heading sorts, Ctrl+F filters, and the status line says how many are left. */
public final class SortFilterStory implements Story {

    private static final int HEADING = 0;
    private static final int FIRST = 2;

    @Override
    public String name() {
        return "a click on a heading sorts, Ctrl+F filters the column, and a button shows all again";
    }

    @Override
    public void play(WindowRun window) throws Exception {
        NatTable grid = window.grid();
        window.run(() -> grid.doCommand(new ShowRowInViewportCommand(0)));
        window.idle();
        String first = window.get(() -> station(grid));
        GridUser.click(window, grid, 1, HEADING);
        window.idle();
        GridUser.click(window, grid, 1, HEADING);
        window.idle();
        window.run(() -> grid.doCommand(new ShowRowInViewportCommand(0)));
        window.await("the stations stand the other way round", () -> station(grid).compareTo(first) > 0, () -> station(grid));

        GridUser.click(window, grid, 1, FIRST);
        String site = window.get(() -> station(grid)).split("/")[0];
        window.run(() -> {
            Event key = new Event();
            key.stateMask = SWT.MOD1;
            key.keyCode = 'f';
            grid.notifyListeners(SWT.KeyDown, key);
        });
        window.await("the filter is open", () -> WindowRun.find(grid, Text.class) != null);
        window.run(() -> {
            Text text = WindowRun.find(grid, Text.class);
            text.setText(site);
            Event enter = new Event();
            enter.keyCode = SWT.CR;
            enter.character = SWT.CR;
            text.notifyListeners(SWT.KeyDown, enter);
        });
        window.await("fewer stations are shown than there are", () -> shown(grid)[0] < shown(grid)[1], () -> words(grid));
        int[] filtered = window.get(() -> shown(grid));
        assertTrue(filtered[0] > 0 && station(window, grid).startsWith(site), window.get(() -> words(grid)));
        window.run(() -> WindowRun.each(grid.getShell(), Button.class, button -> {
            if (button.getText().equals("Clear filters")) {
                button.notifyListeners(SWT.Selection, new Event());
            }
        }));
        window.await("all are shown again", () -> shown(grid)[0] == shown(grid)[1], () -> words(grid));
    }

    private static String station(NatTable grid) {
        return String.valueOf(grid.getDataValueByPosition(1, FIRST));
    }

    private static String station(WindowRun window, NatTable grid) throws InterruptedException {
        window.await("the first row is read", () -> station(grid).contains("/"), () -> station(grid));
        return window.get(() -> station(grid));
    }

    /** The numbers of the status line: shown, of how many. */
    private static int[] shown(NatTable grid) {
        String[] parts = words(grid).split(" ");
        return parts.length < 3 ? new int[] { 0, 0 } : new int[] { number(parts[0]), number(parts[2]) };
    }

    private static int number(String text) {
        return Integer.parseInt(text.replaceAll("\\D", ""));
    }

    private static String words(NatTable grid) {
        StringBuilder words = new StringBuilder();
        WindowRun.each(grid.getShell(), Label.class,
                label -> words.append(label.getText().contains("stations shown") ? label.getText() : ""));
        return words.toString();
    }
}
