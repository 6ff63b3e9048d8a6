package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import org.eclipse.e4.core.contexts.IEclipseContext;
import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.selection.command.SelectRowsCommand;
import org.eclipse.nebula.widgets.nattable.viewport.command.ShowColumnInViewportCommand;
import org.eclipse.nebula.widgets.nattable.viewport.command.ShowRowInViewportCommand;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Shell;
import coilbook.register.StatusColumn;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.Look;
import coilbook.workbench.tests.support.LayoutWalker;
import coilbook.workbench.tests.support.WindowRun;

/**
 * Walks the layout of the window in every look and with awkward data; where the system property {@code coilbook.screens} names a folder, pictures of it are
 * kept there.
 */
public final class LayoutStory implements Story {

    /** The system property that names the folder for the pictures. */
    public static final String PROPERTY = "coilbook.screens";
    private static final String NONE = "none";
    private static final String FOLDER = System.getProperty(PROPERTY, NONE);

    private final List<String> faults = new ArrayList<>();
    private int looked;

    @Override
    public String name() {
        return "nothing is cut off or overlaps in any look";
    }

    @Override
    public void play(WindowRun window) throws Exception {
        walk(window);
        NatTable grid = window.grid();
        assertEquals("Filter", window.get(() -> grid.getDataValueByPosition(0, 1)), "the filter row says what it is");
        assertTrue(looked > 200, "only " + looked + " controls were looked at");
        assertEquals(List.of(), faults);
    }

    private void walk(WindowRun window) throws Exception {
        Shell shell = window.shell();
        NatTable grid = window.grid();
        Session session = window.service(Session.class);
        FleetWork work = window.service(FleetWork.class);
        Look look = window.service(Look.class);
        IEclipseContext context = window.context();
        window.run(() -> shell.setBounds(0, 0, 1400, 880));
        for (boolean dark : new boolean[] { false, true }) {
            window.run(() -> look.choose(dark, context.get(IThemeEngine.class)));
            String name = dark ? "dark-" : "light-";
            window.run(() -> session.open(null));
            picture(window, name + "beginning");
            window.run(() -> work.openDemo(error -> faults.add(error.getMessage())));
            window.await("the demo fleet is open", () -> session.fleet() != null && session.station() != null, faults::toString);
            select(window, grid, session);
            picture(window, name + "demo");
            window.run(() -> grid.doCommand(new ShowColumnInViewportCommand(StatusColumn.HOLD_CURRENT.ordinal() - StationColumns.FROZEN)));
            picture(window, name + "demo-electrics");
            window.run(() -> grid.doCommand(new ShowColumnInViewportCommand(0)));
            window.run(() -> shell.setSize(1000, 700));
            picture(window, name + "demo-small");
            window.run(() -> shell.setSize(1400, 880));
            for (String fleet : List.of("long-120", "fleet-100000")) {
                window.run(() -> work.open(Path.of(fleet), false, () -> {
                }, error -> faults.add(error.getMessage())));
                window.await(fleet + " is open", () -> fleet.equals(session.fleet().name()) && session.station() != null, faults::toString);
                picture(window, name + fleet);
            }
        }
    }

    /** The first station with the worst verdict, by sorting as a person would. */
    private static void select(WindowRun window, NatTable grid, Session session) throws Exception {
        window.idle();
        String before = window.get(session::station);
        window.run(() -> grid.doCommand(new org.eclipse.nebula.widgets.nattable.sort.command.SortColumnCommand(grid,
                StatusColumn.HAZARDS.ordinal() + 1, false, org.eclipse.nebula.widgets.nattable.sort.SortDirectionEnum.DESC)));
        window.idle();
        window.run(() -> grid.doCommand(new ShowRowInViewportCommand(0)));
        window.idle();
        window.run(() -> grid
                .doCommand(new SelectRowsCommand(grid, 1, 2, false, false)));
        window.idle();
        window.await("another station may be selected", () -> session.station() != null, () -> before);
    }

    private void picture(WindowRun window, String name) throws Exception {
        window.idle();
        Shell shell = window.shell();
        window.run(() -> {
            shell.forceActive();
            LayoutWalker walker = LayoutWalker.walk(shell);
            walker.faults().forEach(fault -> faults.add(name + ": " + fault));
            looked += walker.looked();
            shell.redraw();
            shell.update();
        });
        window.idle();
        if (!FOLDER.equals(NONE)) {
            Files.createDirectories(Path.of(FOLDER));
            Rectangle bounds = window.get(shell::getBounds);
            int zoom = window.get(() -> shell.getMonitor().getZoom());
            Path file = Path.of(FOLDER).resolve(zoom + "-" + name + ".png");
            String crop = bounds.width * zoom / 100 + "x" + bounds.height * zoom / 100 + "+" + bounds.x * zoom / 100 + "+"
                    + bounds.y * zoom / 100;
            Process grab = new ProcessBuilder("import", "-silent", "-window", "root", "-crop", crop, "+repage", file.toString()).inheritIO()
                    .start();
            assertEquals(0, grab.waitFor(), "import kept " + file);
        }
    }
}
