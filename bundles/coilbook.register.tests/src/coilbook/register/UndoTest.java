package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;

/** What was recorded can be taken back, also after the register was closed, unless something later builds on it. */
class UndoTest {

    private static final Kind<Line> LINE = Kind.of(Line.class);

    @TempDir
    Path folder;

    private static List<Row> all(Register register) throws Exception {
        List<Row> rows = new ArrayList<>();
        for (Kind<?> kind : Kind.ALL) {
            register.read(kind, rows::add);
        }
        return rows;
    }

    @Test
    void aChangeOfTenThousandRowsIsTakenBackAfterReopening() throws Exception {
        Path base = folder.resolve("r");
        long seq;
        List<Row> before;
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(10)), Progress.NONE);
            register.apply(FleetFixture.inserting(FleetFixture.stations(0, 10_000)), Progress.NONE);
            before = all(register);
            List<RowChange> edits = new ArrayList<>();
            register.read(Kind.of(Duty.class), duty -> edits.add(RowChange.replace(duty,
                    new Duty(duty.station(), duty.validFrom(), null, Datum.measured(7), null, null, null, null, null, null, null))));
            assertEquals(10_000, edits.size());
            seq = register.apply(FleetFixture.change("All duties", edits), Progress.NONE);
        }
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            assertEquals(seq, register.undoable().seq());
            assertEquals(7, register.find(Kind.of(Duty.class), "S003/L00/=K003001/2025-01-01").cycleRate().value());
            long back = register.undo(seq, "someone", Progress.NONE);
            assertEquals(before, all(register));
            JournalEntry entry = register.journal(back - 1, 1).get(0);
            assertEquals(seq, entry.compensates());
            assertEquals("someone", entry.who());
            assertEquals("Undo: All duties", entry.why());
            assertEquals(seq - 1, register.undoable().seq());
        }
    }

    @Test
    void whatALaterChangeTouchedIsNotTakenBack() throws Exception {
        try (Register register = FleetFixture.registers().temporary()) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(1)), Progress.NONE);
            long first = register.apply(FleetFixture.inserting(List.of(SampleRows.bare(Line.class, "site", "S000", "code", "A"))),
                    Progress.NONE);
            Line line = register.find(LINE, "S000/A");
            long second = register.apply(FleetFixture.change("Speed",
                    List.of(RowChange.replace(line, LINE.with(line, LINE.field("speed"), Datum.measured(3))))), Progress.NONE);
            CoilbookException refused = assertThrows(CoilbookException.class, () -> register.undo(first, "x", Progress.NONE));
            assertEquals(Reason.BAD_INPUT, refused.reason());
            assertTrue(refused.getMessage().contains("change " + second) && refused.getMessage().contains("S000/A")
                    && refused.getMessage().contains("Speed"), refused.getMessage());
            assertEquals(3, register.find(LINE, "S000/A").speed().value(), "nothing changed");
            register.undo(second, "x", Progress.NONE);
            CoilbookException again = assertThrows(CoilbookException.class, () -> register.undo(second, "x", Progress.NONE));
            assertTrue(again.getMessage().contains("already"), again.getMessage());
            assertThrows(CoilbookException.class, () -> register.undo(99, "x", Progress.NONE));
        }
    }

    @Test
    void whatLaterRowsReferToIsNotTakenBack() throws Exception {
        try (Register register = FleetFixture.registers().temporary()) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(1)), Progress.NONE);
            long lines = register.apply(FleetFixture.inserting(List.of(SampleRows.bare(Line.class, "site", "S000", "code", "A"))),
                    Progress.NONE);
            register.apply(FleetFixture.inserting(List.of(SampleRows.bare(Station.class, "site", "S000", "line", "A", "tag", "1"))),
                    Progress.NONE);
            CoilbookException refused = assertThrows(CoilbookException.class, () -> register.undo(lines, "x", Progress.NONE));
            assertTrue(refused.getMessage().contains("S000/A/1"), refused.getMessage());
        }
    }

    @Test
    void aRemovedRowComesBackAsTheSame() throws Exception {
        try (Register register = FleetFixture.registers().temporary()) {
            List<Row> rows = FleetFixture.shared(1);
            rows.addAll(FleetFixture.stations(0, 1));
            register.apply(FleetFixture.inserting(rows), Progress.NONE);
            register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE);
            long[] ids = register.status().ids(StatusQuery.all());
            List<RowChange> removals = FleetFixture.stations(0, 1).stream().filter(row -> !(row instanceof Line)).map(RowChange::remove)
                    .toList();
            long seq = register.apply(FleetFixture.change("Remove", removals), Progress.NONE);
            register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE);
            assertEquals(0, register.status().ids(StatusQuery.all()).length);
            register.undo(seq, "x", Progress.NONE);
            register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE);
            assertEquals(ids[0], register.status().ids(StatusQuery.all())[0], "the number of the row stays");
        }
    }

    @Test
    void theFirstTablesAreNotOfferedForUndo() throws Exception {
        List<Row> first = List.of(SampleRows.bare(Customer.class, "code", "X"));
        try (Register register = FleetFixture.registers(() -> first).temporary()) {
            assertEquals(1, register.head());
            assertEquals("First tables", register.journal(0, 1).get(0).why());
            assertNull(register.undoable());
        }
    }
}
