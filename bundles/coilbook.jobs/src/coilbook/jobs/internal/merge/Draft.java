package coilbook.jobs.internal.merge;

import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.RowPatch;
import coilbook.fleet.Field;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;

/** One row of the register on its way from what it is to what the files say; {@code before} is {@code null} for a new one. */
final class Draft {

    final Kind<?> kind;
    final Row before;
    final Map<Field, RowPatch.Source> statedBy = new HashMap<>();
    final Set<RowPatch.Source> lines = new LinkedHashSet<>();
    Row after;
    /** The line that is about this row, once one was read. */
    RowPatch.Source primary;
    /** Whether it was named in passing by lists only, and the catalogue lacked it. */
    boolean incomplete;

    Draft(Kind<?> kind, Row before) {
        this.kind = kind;
        this.before = before;
        this.after = before;
    }

    boolean isNew() {
        return before == null;
    }

    boolean isChanged() {
        return after != null && !after.equals(before);
    }
}
