package coilbook.register.internal.store;

import java.time.LocalDateTime;

import org.jooq.Field;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.impl.DSL;
import org.jooq.impl.SQLDataType;

/** The tables beside those of the kinds: the mark by which a register is known, the journal, and what each Change did to each kind. */
public final class Tables {

    /** Which schema a file holds and which register it is. */
    public static final class Mark {
        public static final Table<Record> TABLE = DSL.table(DSL.name("coilbook_register"));
        public static final Field<Integer> SCHEMA_VERSION = DSL.field(DSL.name("schema_version"), SQLDataType.INTEGER.notNull());
        public static final Field<String> REGISTER_ID = DSL.field(DSL.name("register_id"), SQLDataType.VARCHAR(36).notNull());

        private Mark() {
        }
    }

    /** One line a Change. */
    public static final class Journal {
        public static final Table<Record> TABLE = DSL.table(DSL.name("journal"));
        public static final Field<Long> SEQ = DSL.field(DSL.name("seq"), SQLDataType.BIGINT.notNull());
        public static final Field<String> WHO = DSL.field(DSL.name("who"), SQLDataType.VARCHAR(4000).notNull());
        /** In UTC. */
        public static final Field<LocalDateTime> RECORDED_AT = DSL.field(DSL.name("recorded_at"), SQLDataType.LOCALDATETIME(6).notNull());
        public static final Field<String> WHY = DSL.field(DSL.name("why"), SQLDataType.VARCHAR(4000).notNull());
        public static final Field<Long> COMPENSATES = DSL.field(DSL.name("compensates"), SQLDataType.BIGINT.notNull());
        public static final Field<Integer> ROW_COUNT = DSL.field(DSL.name("row_count"), SQLDataType.INTEGER.notNull());
        public static final Field<String> PREVIOUS_DIGEST = DSL.field(DSL.name("previous_digest"), SQLDataType.VARCHAR(64).notNull());
        public static final Field<String> DIGEST = DSL.field(DSL.name("digest"), SQLDataType.VARCHAR(64).notNull());

        private Journal() {
        }
    }

    /** Which versions of a kind a Change opened: they have consecutive numbers; those it closed carry its sequence. */
    public static final class JournalKind {
        public static final Table<Record> TABLE = DSL.table(DSL.name("journal_kind"));
        public static final Field<Long> SEQ = DSL.field(DSL.name("seq"), SQLDataType.BIGINT.notNull());
        public static final Field<String> KIND = DSL.field(DSL.name("kind"), SQLDataType.VARCHAR(80).notNull());
        public static final Field<Long> FIRST_VERSION = DSL.field(DSL.name("first_version"), SQLDataType.BIGINT.notNull());
        public static final Field<Integer> OPENED = DSL.field(DSL.name("opened"), SQLDataType.INTEGER.notNull());
        public static final Field<Integer> CLOSED = DSL.field(DSL.name("closed"), SQLDataType.INTEGER.notNull());

        private JournalKind() {
        }
    }

    private Tables() {
    }
}
