package coilbook.fleet;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * The only way to alter the register: who changed which rows, when and why, as one step that happens wholly or not at all.
 *
 * @param who the person, never blank
 * @param when the instant it was recorded
 * @param why the step in words, as undo shows it
 * @param rows what happens to each row; no row twice
 */
public record Change(String who, Instant when, String why, List<RowChange> rows) {

    public Change {
        Objects.requireNonNull(when, "when");
        if (who == null || who.isBlank() || why == null || why.isBlank()) {
            throw new IllegalArgumentException("a change says who made it and why");
        }
        rows = List.copyOf(rows);
    }

    /**
     * Checks every row that the change leaves behind, and that no row is changed twice.
     *
     * @throws InvalidValue for the first value that its column cannot hold
     */
    public void validate() throws InvalidValue {
        Set<String> seen = new HashSet<>(rows.size() * 2);
        for (RowChange row : rows) {
            if (row.after() != null) {
                row.kind().validate(row.after());
            }
            if (!seen.add(row.kind().id() + "\u0000" + row.key())) {
                throw new InvalidValue(row.kind().sheet(), row.key(), "each row once in one change");
            }
        }
    }

    /** The change that puts everything back, to be recorded as a change of its own. */
    public Change compensating(String by, Instant at) {
        List<RowChange> back = new ArrayList<>(rows.size());
        for (RowChange row : rows) {
            back.add(row.reversed());
        }
        Collections.reverse(back);
        return new Change(by, at, "Undo: " + why, back);
    }
}
