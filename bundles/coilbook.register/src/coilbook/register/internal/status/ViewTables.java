package coilbook.register.internal.status;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

import org.jooq.DSLContext;
import org.jooq.DataType;
import org.jooq.Field;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.impl.DSL;
import org.jooq.impl.SQLDataType;

import coilbook.register.StatusColumn;

/** The tables of the view file. It is disposable, so they are made as they are needed and never migrated. */
final class ViewTables {

    /** Rises with every alteration of these tables; a file of another version is made anew. */
    static final int VERSION = 1;
    /** The most findings of one station. */
    static final int FINDINGS = 1024;

    static final Table<Record> STATE = DSL.table(DSL.name("coilbook_view"));
    static final Field<Integer> VIEW_VERSION = DSL.field(DSL.name("view_version"), SQLDataType.INTEGER.notNull());
    static final Field<String> ENGINE = DSL.field(DSL.name("engine"), SQLDataType.VARCHAR(400).notNull());
    static final Field<String> REGISTER_ID = DSL.field(DSL.name("register_id"), SQLDataType.VARCHAR(36).notNull());
    static final Field<Long> SEQ = DSL.field(DSL.name("seq"), SQLDataType.BIGINT.notNull());
    static final Field<LocalDate> STATE_DAY = DSL.field(DSL.name("judged_on"), SQLDataType.LOCALDATE);

    static final Table<Record> STATUS = DSL.table(DSL.name("status"));
    static final Field<Long> ID = DSL.field(DSL.name("id"), SQLDataType.BIGINT.notNull());
    static final Field<String> FINGERPRINT = DSL.field(DSL.name("fingerprint"), SQLDataType.VARCHAR(64).notNull());
    static final Field<LocalDate> JUDGED_ON = DSL.field(DSL.name("judged_on"), SQLDataType.LOCALDATE.notNull());
    static final Field<LocalDate> RECHECK_ON = DSL.field(DSL.name("recheck_on"), SQLDataType.LOCALDATE);
    static final Field<Integer> RANK = DSL.field(DSL.name("verdict_rank"), SQLDataType.INTEGER.notNull());

    static final Table<Record> FINDING = DSL.table(DSL.name("finding"));
    /** The station's number times {@link #FINDINGS}, and which of its findings: those of a station lie together. */
    static final Field<Long> FINDING_ID = DSL.field(DSL.name("id"), SQLDataType.BIGINT.notNull());
    static final Field<String> CRITERION = DSL.field(DSL.name("criterion"), SQLDataType.VARCHAR(200).notNull());
    static final Field<Integer> VERDICT = DSL.field(DSL.name("verdict"), SQLDataType.INTEGER.notNull());
    static final Field<Boolean> HAZARD = DSL.field(DSL.name("hazard"), SQLDataType.BOOLEAN.notNull());
    static final Field<Boolean> CONCEDED = DSL.field(DSL.name("conceded"), SQLDataType.BOOLEAN.notNull());
    static final Field<Double> FOUND = DSL.field(DSL.name("found"), SQLDataType.DOUBLE);
    static final Field<Double> BOUND = DSL.field(DSL.name("bound"), SQLDataType.DOUBLE);
    static final Field<String> UNIT = DSL.field(DSL.name("unit"), SQLDataType.VARCHAR(40).notNull());
    static final Field<String> CORNER = DSL.field(DSL.name("corner"), SQLDataType.VARCHAR(80).notNull());
    static final Field<String> SENTENCE = DSL.field(DSL.name("sentence"), SQLDataType.VARCHAR(100000).notNull());
    static final Field<Integer> PROVENANCE = DSL.field(DSL.name("provenance"), SQLDataType.INTEGER);
    static final Field<String> NUMBERS = DSL.field(DSL.name("numbers"), SQLDataType.VARCHAR(100000).notNull());
    static final Field<String> MISSING = DSL.field(DSL.name("missing"), SQLDataType.VARCHAR(100000).notNull());

    static final List<Field<?>> FINDING_FIELDS = List.of(FINDING_ID, CRITERION, VERDICT, HAZARD, CONCEDED, FOUND, BOUND, UNIT, CORNER,
            SENTENCE,
            PROVENANCE, NUMBERS, MISSING);

    private static final List<Field<?>> COLUMNS = columns();

    private ViewTables() {
    }

    private static List<Field<?>> columns() {
        List<Field<?>> columns = new ArrayList<>();
        for (StatusColumn column : StatusColumn.values()) {
            DataType<?> type = switch (column.type()) {
                case INTEGER -> SQLDataType.INTEGER;
                case QUANTITY -> SQLDataType.DOUBLE;
                default -> SQLDataType.VARCHAR(12100);
            };
            columns.add(DSL.field(DSL.name(column.id()), type));
        }
        return List.copyOf(columns);
    }

    static Field<?> column(StatusColumn column) {
        return COLUMNS.get(column.ordinal());
    }

    @SuppressWarnings("unchecked")
    static Field<String> text(StatusColumn column) {
        return (Field<String>) column(column);
    }

    /** The columns that a person sees, in their order. */
    static List<Field<?>> shown() {
        return COLUMNS;
    }

    /** All columns of a status row: its own, then the shown. */
    static List<Field<?>> statusFields() {
        List<Field<?>> fields = new ArrayList<>(List.of(ID, FINGERPRINT, JUDGED_ON, RECHECK_ON, RANK));
        fields.addAll(COLUMNS);
        return fields;
    }

    static void create(DSLContext dsl) {
        dsl.createTable(STATE).columns(VIEW_VERSION, ENGINE, REGISTER_ID, SEQ, STATE_DAY).execute();
        dsl.createTable(STATUS).columns(statusFields()).primaryKey(ID).execute();
        dsl.createTable(FINDING).columns(FINDING_FIELDS).primaryKey(FINDING_ID).execute();
        dsl.createIndex(DSL.name("status_place")).on(STATUS, text(StatusColumn.SITE), text(StatusColumn.LINE), text(StatusColumn.STATION))
                .execute();
    }
}
