package coilbook.register.internal.store;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.jooq.Condition;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.impl.DSL;
import org.jooq.impl.SQLDataType;

import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;

/**
 * The table of a kind: one line a row version. A version is present while its {@code seq_to} is empty; the row's identity is the number of its first
 * version.
 *
 * @param <R> the record
 */
public final class KindTable<R extends Row> {

    public static final org.jooq.Field<Long> VERSION = DSL.field(DSL.name("version_id"), SQLDataType.BIGINT.notNull());
    public static final org.jooq.Field<Long> ROW = DSL.field(DSL.name("row_id"), SQLDataType.BIGINT.notNull());
    public static final org.jooq.Field<String> KEY = DSL.field(DSL.name("row_key"), SQLDataType.VARCHAR(8000).notNull());
    public static final org.jooq.Field<Long> FROM = DSL.field(DSL.name("seq_from"), SQLDataType.BIGINT.notNull());
    public static final org.jooq.Field<Long> TO = DSL.field(DSL.name("seq_to"), SQLDataType.BIGINT);

    /** Every kind's table, in the order of the kinds. */
    public static final List<KindTable<?>> ALL = Kind.ALL.stream().<KindTable<?>>map(KindTable::make).toList();

    private static final Map<Kind<?>, KindTable<?>> BY_KIND = ALL.stream()
            .collect(Collectors.toUnmodifiableMap(KindTable::kind, Function.identity()));

    private final Kind<R> kind;
    private final Table<Record> table;
    private final List<StoredColumn> columns;
    private final List<org.jooq.Field<?>> valueFields;
    private final List<org.jooq.Field<?>> fields;
    private final int lookupPart;
    private final org.jooq.Field<String> lookup;

    private KindTable(Kind<R> kind) {
        this.kind = kind;
        this.table = DSL.table(DSL.name(kind.id()));
        this.columns = kind.fields().stream().map(StoredColumn::of).toList();
        List<org.jooq.Field<?>> values = new ArrayList<>();
        for (StoredColumn column : columns) {
            values.add(column.value());
            if (column.provenance() != null) {
                values.add(column.provenance());
            }
        }
        this.valueFields = List.copyOf(values);
        List<org.jooq.Field<?>> all = new ArrayList<>(List.of(VERSION, ROW, KEY, FROM, TO));
        all.addAll(values);
        this.fields = List.copyOf(all);
        this.lookupPart = lookupPart(kind);
        this.lookup = lookupPart < 0 ? KEY : text(kind.keyFields().get(lookupPart));
    }

    private static <R extends Row> KindTable<R> make(Kind<R> kind) {
        return new KindTable<>(kind);
    }

    /** Rows that belong to a station or a subject are found through it, so that one index serves both. */
    private static int lookupPart(Kind<?> kind) {
        for (int i = 0; i < kind.keyFields().size(); i++) {
            String id = kind.keyFields().get(i).id();
            if (id.equals("station") || id.equals("subject")) {
                return i;
            }
        }
        return -1;
    }

    @SuppressWarnings("unchecked")
    public static <R extends Row> KindTable<R> of(Kind<R> kind) {
        return (KindTable<R>) BY_KIND.get(kind);
    }

    public static <R extends Row> KindTable<R> of(Class<R> type) {
        return of(Kind.of(type));
    }

    public Kind<R> kind() {
        return kind;
    }

    public Table<Record> table() {
        return table;
    }

    public List<StoredColumn> columns() {
        return columns;
    }

    /** The columns of the values alone, in the order of the fields, each quantity followed by its provenance. */
    public List<org.jooq.Field<?>> valueFields() {
        return valueFields;
    }

    /** Number, row, key, from, to, and then the values. */
    public List<org.jooq.Field<?>> fields() {
        return fields;
    }

    /** The indexed column through which a row is found. */
    public org.jooq.Field<String> lookup() {
        return lookup;
    }

    /** What stands in the lookup column of the row with that key. Parts other than the looked-up one hold no slash. */
    public String lookupOf(String key) {
        if (lookupPart < 0) {
            return key;
        }
        int start = 0;
        for (int i = 0; i < lookupPart; i++) {
            start = key.indexOf('/', start) + 1;
        }
        int end = key.length();
        for (int i = kind.keyFields().size() - 1; i > lookupPart && end > start; i--) {
            end = key.lastIndexOf('/', end - 1);
        }
        return end < start ? key : key.substring(start, end);
    }

    /** The column of a text field. */
    @SuppressWarnings("unchecked")
    public org.jooq.Field<String> text(Field field) {
        if (field.type() != FieldType.TEXT && field.type() != FieldType.TERM) {
            throw new IllegalArgumentException(field + " is no text");
        }
        for (StoredColumn column : columns) {
            if (column.field() == field) {
                return (org.jooq.Field<String>) column.value();
            }
        }
        throw new IllegalArgumentException(kind + " has no column " + field);
    }

    /** The column of the text field with that id. */
    public org.jooq.Field<String> text(String fieldId) {
        return text(kind.field(fieldId));
    }

    /** What was known at a sequence. The form keeps the database from taking the index over closed versions for the open ones. */
    public static Condition knownAt(long seq) {
        return FROM.le(seq).and(TO.isNull().or(TO.gt(seq)));
    }

    @Override
    public String toString() {
        return kind.id();
    }
}
