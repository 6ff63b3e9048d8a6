package coilbook.fleet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.time.Instant;
import java.util.List;

import org.junit.jupiter.api.Test;

class ChangeTest {

    private static final Instant WHEN = Instant.parse("2026-03-01T10:00:00Z");

    private static Line line(String code, double speed) {
        return new Line("S1", code, null, Datum.nameplate(speed), null);
    }

    @Test
    void aChangeThatLeavesAnImpossibleValueIsRefused() {
        Change change = new Change("A. Person", WHEN, "Faster", List.of(RowChange.insert(line("L1", -2))));
        InvalidValue refused = assertThrows(InvalidValue.class, change::validate);
        assertEquals("Line speed", refused.column());
    }

    @Test
    void aRowChangesOnceAndKeepsItsKey() {
        Change twice = new Change("A. Person", WHEN, "Twice", List.of(RowChange.insert(line("L1", 1)), RowChange.insert(line("L1", 2))));
        assertThrows(InvalidValue.class, twice::validate);
        Line one = line("L1", 1);
        Line other = line("L2", 1);
        assertThrows(IllegalArgumentException.class, () -> RowChange.replace(one, other));
    }

    @Test
    void compensatingPutsEveryRowBackInReverseOrder() {
        Line before = line("L1", 1);
        Line after = line("L1", 2);
        Line added = line("L2", 3);
        Change change = new Change("A. Person", WHEN, "Faster", List.of(RowChange.replace(before, after), RowChange.insert(added)));
        Change back = change.compensating("B. Person", WHEN);
        assertEquals(List.of(RowChange.remove(added), RowChange.replace(after, before)), back.rows());
        assertEquals("Undo: Faster", back.why());
    }

    @Test
    void somebodyMadeItForSomeReason() {
        assertThrows(IllegalArgumentException.class, () -> new Change(" ", WHEN, "Faster", List.of()));
        assertThrows(IllegalArgumentException.class, () -> new Change("A. Person", WHEN, "", List.of()));
    }
}
