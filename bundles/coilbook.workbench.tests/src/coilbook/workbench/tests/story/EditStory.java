package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.swt.custom.StyledText;

import coilbook.fleet.Progress;
import coilbook.jobs.Demo;
import coilbook.jobs.EditSession;
import coilbook.jobs.Editing;
import coilbook.register.OpenMode;
import coilbook.register.Register;
import coilbook.register.Registers;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.tests.support.GridUser;
import coilbook.workbench.tests.support.Latency;
import coilbook.workbench.tests.support.Services;
import coilbook.workbench.tests.support.WindowRun;

/** Editing in the window over a real register: the row is judged again, the pane beside it tells why, undo takes it back, and the window never waits. */
public final class EditStory implements Story {

    private static final int STATIONS = 60;
    private static final long SEED = 7;
    private static final long MOST_MS = 250;

    private final Plan plan;

    private EditStory(Plan plan) {
        this.plan = plan;
    }

    @Override
    public String name() {
        return "a coil typed into the grid is judged at once, and undo brings the old one back";
    }

    /** A coil that changes a station's verdict, found by the same edit on a copy of the register without any window. */
    private record Plan(String station, String coil, String other, String verdict, String otherVerdict) {
    }

    /** Makes the person's own register, and finds what to type. */
    public static EditStory prepare(Path base) throws Exception {
        Demo demo = Services.get(Demo.class);
        try (Register register = Services.get(Registers.class).open(base, OpenMode.CREATE_NEW)) {
            demo.fill(register, STATIONS, SEED, Progress.NONE);
        }
        try (Register copy = Services.get(Registers.class).temporary()) {
            demo.fill(copy, STATIONS, SEED, Progress.NONE);
            EditSession session = Services.get(Editing.class).open(copy, "copy");
            copy.status().bringUpToDate(java.time.LocalDate.now(), Progress.NONE);
            for (StatusRow row : copy.status().rows(copy.status().ids(StatusQuery.all()))) {
                String coil = (String) row.get(StatusColumn.COIL_TYPE);
                for (String other : coil == null ? List.<String>of() : session.choices(row.station(), StatusColumn.COIL_TYPE)) {
                    if (other.equals(coil)) {
                        continue;
                    }
                    StatusRow after = session.edit(row.station(), StatusColumn.COIL_TYPE, other, Progress.NONE).rows().get(0);
                    session.undo(Progress.NONE);
                    if (!after.get(StatusColumn.VERDICT).equals(row.get(StatusColumn.VERDICT))) {
                        return new EditStory(new Plan(row.station(), coil, other, (String) row.get(StatusColumn.VERDICT),
                                (String) after.get(StatusColumn.VERDICT)));
                    }
                }
            }
        }
        throw new AssertionError("no coil of the demo fleet changes a verdict");
    }

    /** What was typed, undone and typed again is in the file, not only on the screen. */
    public void checkFile(Path base) throws Exception {
        try (Register register = Services.get(Registers.class).open(base, OpenMode.EXISTING)) {
            register.status().bringUpToDate(java.time.LocalDate.now(), Progress.NONE);
            StatusRow row = register.status().rows(register.status().ids(StatusQuery.all())).stream()
                    .filter(r -> r.station().equals(plan.station)).findFirst().orElseThrow();
            assertEquals(plan.other, row.get(StatusColumn.COIL_TYPE));
            assertEquals(plan.otherVerdict, row.get(StatusColumn.VERDICT));
        }
    }

    @Override
    public void play(WindowRun window) throws Exception {
        NatTable grid = window.grid();
        Session session = window.service(Session.class);
        window.await("the register is shown", () -> session.station() != null && GridUser.row(grid, plan.station) > 0, () -> codes(grid));
        StyledText why = window.get(() -> WindowRun.find(grid.getShell(), StyledText.class));
        window.idle();
        try (Latency latency = new Latency(window.display())) {
            int row = window.get(() -> GridUser.row(grid, plan.station));
            GridUser.click(window, grid, 1, row);
            window.await("why tells of the station", () -> why.getText().startsWith(plan.station), why::getText);
            String before = window.get(why::getText);
            String verdict = window.get(() -> GridUser.verdict(grid, row));
            assertTrue(verdict.endsWith(plan.verdict) || verdict.endsWith("hazard"), verdict);

            GridUser.type(window, grid, row, plan.other);
            window.await("the coil is changed and the verdict with it",
                    () -> plan.other.equals(GridUser.cell(grid, StatusColumn.COIL_TYPE, row))
                            && !verdict.equals(GridUser.verdict(grid, row)),
                    () -> GridUser.cell(grid, StatusColumn.COIL_TYPE, row) + ", " + GridUser.verdict(grid, row));
            window.await("why tells another story", () -> why.getText().startsWith(plan.station) && !why.getText().equals(before),
                    why::getText);
            assertNotEquals(before, window.get(why::getText));

            window.await("the step can be taken back", () -> session.steps().undo() != null);
            window.choose("Edit", "Undo: " + session.steps().undo().substring(0, 9));
            window.await("the old coil and verdict are back",
                    () -> plan.coil.equals(GridUser.cell(grid, StatusColumn.COIL_TYPE, row)) && verdict.equals(GridUser.verdict(grid, row)),
                    () -> GridUser.cell(grid, StatusColumn.COIL_TYPE, row) + ", " + GridUser.verdict(grid, row));
            window.await("why tells the old story", () -> why.getText().equals(before), why::getText);

            window.await("the step can be done again", () -> session.steps().redo() != null);
            window.choose("Edit", "Redo: ");
            window.await("the other coil is back", () -> plan.other.equals(GridUser.cell(grid, StatusColumn.COIL_TYPE, row)));
            assertTrue(latency.probes() > 20, "the watcher looked " + latency.probes() + " times");
            assertTrue(latency.worst() <= MOST_MS, "the window was held up for " + latency.worst() + " ms in" + latency.stack());
        }
    }

    private static String codes(NatTable grid) {
        StringBuilder codes = new StringBuilder();
        for (int position = 2; position < grid.getRowCount(); position++) {
            codes.append(grid.getDataValueByPosition(1, position)).append(' ');
        }
        return codes.toString();
    }
}
