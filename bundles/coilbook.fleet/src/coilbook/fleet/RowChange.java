package coilbook.fleet;

import java.util.Objects;

/**
 * What a {@link Change} does to one row: before {@code null} means a new row, after {@code null} a removed one. Both keys are equal: a row
 * with another key is another row.
 */
public record RowChange(Row before, Row after) {

    public RowChange {
        if (before == null && after == null) {
            throw new IllegalArgumentException("a row change needs a row");
        }
        if (before != null && after != null) {
            if (before.getClass() != after.getClass()) {
                throw new IllegalArgumentException("a row cannot become one of another kind");
            }
            if (!before.key().equals(after.key())) {
                throw new IllegalArgumentException("a row keeps its key: " + before.key() + " is not " + after.key());
            }
        }
    }

    public static RowChange insert(Row row) {
        return new RowChange(null, Objects.requireNonNull(row));
    }

    public static RowChange replace(Row before, Row after) {
        return new RowChange(Objects.requireNonNull(before), Objects.requireNonNull(after));
    }

    public static RowChange remove(Row row) {
        return new RowChange(Objects.requireNonNull(row), null);
    }

    /** The row that exists: after, else before. */
    public Row row() {
        return after != null ? after : before;
    }

    public Kind<?> kind() {
        return Kind.of(row());
    }

    public String key() {
        return row().key();
    }

    public RowChange reversed() {
        return new RowChange(after, before);
    }
}
