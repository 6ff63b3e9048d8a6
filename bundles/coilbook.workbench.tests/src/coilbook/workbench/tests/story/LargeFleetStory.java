package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.viewport.command.ShowRowInViewportCommand;

import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.tests.support.Latency;
import coilbook.workbench.tests.support.WindowRun;

/** The grid over a hundred thousand stations. */
public final class LargeFleetStory implements Story {

    private static final long MOST_MS = 250;

    @Override
    public String name() {
        return "a hundred thousand rows are scrolled without holding the window up";
    }

    @Override
    public void play(WindowRun window) throws Exception {
        NatTable grid = window.grid();
        Session session = window.service(Session.class);
        FleetWork work = window.service(FleetWork.class);
        window.run(() -> work.open(Path.of("fleet-100000"), false, () -> {
        }, error -> {
            throw new IllegalStateException(error);
        }));
        window.await("the large fleet is shown", () -> "fleet-100000".equals(session.fleet().name()) && session.station() != null);
        window.idle();
        try (Latency latency = new Latency(window.display())) {
            for (int row : List.of(99_000, 50_000, 123, 77_777, 0)) {
                window.run(() -> grid.doCommand(new ShowRowInViewportCommand(row)));
                window.await("row " + row + " is read", () -> shows(grid, row),
                        () -> grid.getDataValueByPosition(1, 4));
            }
            assertTrue(latency.probes() > 3, "the watcher looked");
            assertTrue(latency.worst() <= MOST_MS, "the window was held up for " + latency.worst() + " ms in" + latency.stack());
        }
    }

    private static boolean shows(NatTable grid, int row) {
        String code = String.format("PLT%03d/L%d/=V%d", row / 40, 1 + row / 10 % 4, row % 10 + 1);
        for (int position = 2; position < grid.getRowCount(); position++) {
            if (code.equals(grid.getDataValueByPosition(1, position))) {
                return true;
            }
        }
        return false;
    }
}
