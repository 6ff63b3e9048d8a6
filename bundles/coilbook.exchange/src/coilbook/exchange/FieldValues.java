package coilbook.exchange;

import java.util.AbstractMap;
import java.util.AbstractSet;
import java.util.Iterator;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Set;

import coilbook.fleet.Field;

/**
 * An unmodifiable map from field to value in the order it was filled, in two arrays: a list of 100,000 stations yields a million patches, and hash tables
 * for them would not fit beside a register in the heap. Values may be {@code null}.
 */
final class FieldValues extends AbstractMap<Field, Object> {

    private final Field[] fields;
    private final Object[] values;

    private FieldValues(Field[] fields, Object[] values) {
        this.fields = fields;
        this.values = values;
    }

    static FieldValues of(Map<Field, Object> map) {
        if (map instanceof FieldValues same) {
            return same;
        }
        Field[] fields = new Field[map.size()];
        Object[] values = new Object[fields.length];
        int i = 0;
        for (Entry<Field, Object> entry : map.entrySet()) {
            fields[i] = entry.getKey();
            values[i++] = entry.getValue();
        }
        return new FieldValues(fields, values);
    }

    private int find(Object field) {
        for (int i = 0; i < fields.length; i++) {
            if (fields[i] == field) {
                return i;
            }
        }
        return -1;
    }

    @Override
    public Object get(Object field) {
        int i = find(field);
        return i < 0 ? null : values[i];
    }

    @Override
    public boolean containsKey(Object field) {
        return find(field) >= 0;
    }

    @Override
    public int size() {
        return fields.length;
    }

    @Override
    public Set<Entry<Field, Object>> entrySet() {
        return new AbstractSet<>() {
            @Override
            public Iterator<Entry<Field, Object>> iterator() {
                return new EntryIterator();
            }

            @Override
            public int size() {
                return fields.length;
            }
        };
    }

    private final class EntryIterator implements Iterator<Entry<Field, Object>> {

        private int next;

        @Override
        public boolean hasNext() {
            return next < fields.length;
        }

        @Override
        public Entry<Field, Object> next() {
            if (next >= fields.length) {
                throw new NoSuchElementException();
            }
            Entry<Field, Object> entry = new SimpleImmutableEntry<>(fields[next], values[next]);
            next++;
            return entry;
        }
    }
}
