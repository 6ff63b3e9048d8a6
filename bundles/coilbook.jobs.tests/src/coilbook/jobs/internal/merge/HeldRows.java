package coilbook.jobs.internal.merge;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Timed;

/** Rows in memory, as a merge sees a register. */
final class HeldRows implements PresentRows {

    private final Map<String, Row> rows = new LinkedHashMap<>();

    HeldRows(Row... held) {
        for (Row row : held) {
            rows.put(id(Kind.of(row), row.key()), row);
        }
    }

    private static String id(Kind<?> kind, String key) {
        return kind.id() + " " + key;
    }

    void apply(List<RowChange> changes) {
        for (RowChange change : changes) {
            if (change.before() != null && !change.before().equals(rows.get(id(change.kind(), change.key())))) {
                throw new AssertionError("the row before is not the row held: " + change);
            }
            if (change.after() == null) {
                rows.remove(id(change.kind(), change.key()));
            } else {
                rows.put(id(change.kind(), change.key()), change.after());
            }
        }
    }

    @Override
    public Row find(Kind<?> kind, String key) {
        return rows.get(id(kind, key));
    }

    @Override
    public List<Timed> intervals(Kind<?> kind, String subject) {
        List<Timed> found = new ArrayList<>();
        for (Row row : rows.values()) {
            if (Kind.of(row) == kind && Intervals.subject(kind, row).equals(subject)) {
                found.add((Timed) row);
            }
        }
        return found;
    }
}
