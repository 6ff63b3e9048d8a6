package coilbook.workbench.internal.stations;

import java.util.LinkedHashMap;
import java.util.Map;

import coilbook.register.StatusRow;

/**
 * The rows that were looked at last, by id, so that scrolling back and sorting need not ask the register again. Rows that may have changed are still
 * shown until their successors arrive: a grid that blanks at every edit cannot be read.
 */
final class RowCache {

    private record Entry(StatusRow row, long age) {
    }

    /** Forgets the row that was looked at longest ago. */
    private static final class Recent extends LinkedHashMap<Long, Entry> {

        private static final long serialVersionUID = 1L;
        private final int capacity;

        Recent(int capacity) {
            super(1024, 0.75f, true);
            this.capacity = capacity;
        }

        @Override
        protected boolean removeEldestEntry(Map.Entry<Long, Entry> eldest) {
            return size() > capacity;
        }
    }

    private final Map<Long, Entry> rows;
    private long age;

    RowCache(int capacity) {
        rows = new Recent(capacity);
    }

    /** The row, perhaps of before the last change; {@code null} if it has to be fetched. */
    StatusRow get(long id) {
        Entry entry = rows.get(id);
        return entry == null ? null : entry.row;
    }

    /** Whether the row is there and no change came after it was asked for. */
    boolean isFresh(long id) {
        Entry entry = rows.get(id);
        return entry != null && entry.age == age;
    }

    /** The present age, to be handed back with the rows that are asked for now. */
    long age() {
        return age;
    }

    /** Takes a row that was asked for at an age; {@code null} for one that is gone, which is then not asked for again. */
    void put(long id, StatusRow row, long asked) {
        Entry before = rows.get(id);
        if (before == null || before.age <= asked) {
            rows.put(id, new Entry(row, asked));
        }
    }

    /** Says that rows may have changed. */
    void touch() {
        age++;
    }

    void clear() {
        rows.clear();
        age++;
    }

    int size() {
        return rows.size();
    }
}
