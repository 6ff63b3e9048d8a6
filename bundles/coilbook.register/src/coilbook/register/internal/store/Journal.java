package coilbook.register.internal.store;

import java.sql.Connection;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.time.temporal.ChronoUnit;
import java.util.Comparator;
import java.util.List;

import org.jooq.Condition;
import org.jooq.Record;
import org.jooq.impl.DSL;

import coilbook.fleet.Kind;
import coilbook.register.JournalEntry;
import coilbook.register.internal.store.Tables.JournalKind;

/** Reads and writes the journal. Every method takes the connection it works on, so that it takes part in the caller's transaction. */
public final class Journal {

    /** What a Change did to a kind. */
    public record Part(long seq, Kind<?> kind, long firstVersion, int opened, int closed) {
    }

    /** The digest before the first entry. */
    static final String NO_DIGEST = "0".repeat(64);

    /** The last entry, or {@code null}. */
    public JournalEntry last(Connection connection) {
        return one(connection, Tables.Journal.SEQ.eq(DSL.select(DSL.max(Tables.Journal.SEQ)).from(Tables.Journal.TABLE)));
    }

    /** The entry of a sequence, or {@code null}. */
    public JournalEntry entry(Connection connection, long seq) {
        return one(connection, Tables.Journal.SEQ.eq(seq));
    }

    private static JournalEntry one(Connection connection, Condition condition) {
        Record line = Database.dsl(connection).select(columns()).from(Tables.Journal.TABLE).where(condition).fetchOne();
        return line == null ? null : entry(line);
    }

    private static org.jooq.Field<?>[] columns() {
        return new org.jooq.Field<?>[] { Tables.Journal.SEQ, Tables.Journal.WHO, Tables.Journal.RECORDED_AT, Tables.Journal.WHY,
                Tables.Journal.COMPENSATES, Tables.Journal.ROW_COUNT, Tables.Journal.DIGEST };
    }

    private static JournalEntry entry(Record line) {
        return new JournalEntry(line.get(Tables.Journal.SEQ), line.get(Tables.Journal.WHO),
                line.get(Tables.Journal.RECORDED_AT).toInstant(ZoneOffset.UTC), line.get(Tables.Journal.WHY),
                line.get(Tables.Journal.COMPENSATES), line.get(Tables.Journal.ROW_COUNT), line.get(Tables.Journal.DIGEST));
    }

    /** Entries after a sequence, the oldest first. */
    public List<JournalEntry> after(Connection connection, long seq, int max) {
        return Database.dsl(connection).select(columns()).from(Tables.Journal.TABLE).where(Tables.Journal.SEQ.gt(seq))
                .orderBy(Tables.Journal.SEQ)
                .limit(max).fetch(Journal::entry);
    }

    /** The sequence that took back another, or 0. */
    public long compensationOf(Connection connection, long seq) {
        Long found = Database.dsl(connection).select(DSL.max(Tables.Journal.SEQ)).from(Tables.Journal.TABLE)
                .where(Tables.Journal.COMPENSATES.eq(seq))
                .fetchOne(0, Long.class);
        return found == null ? 0 : found;
    }

    /** The latest sequence recorded at or before an instant. */
    public long knownAt(Connection connection, Instant instant) {
        Long seq = Database.dsl(connection).select(DSL.max(Tables.Journal.SEQ)).from(Tables.Journal.TABLE)
                .where(Tables.Journal.RECORDED_AT.le(stored(instant))).fetchOne(0, Long.class);
        return seq == null ? 0 : seq;
    }

    /** What the Changes of a span of sequences did to each kind, in their order and in that of the kinds. */
    public List<Part> parts(Connection connection, long after, long upTo) {
        List<Part> parts = Database.dsl(connection)
                .select(JournalKind.SEQ, JournalKind.KIND, JournalKind.FIRST_VERSION, JournalKind.OPENED, JournalKind.CLOSED)
                .from(JournalKind.TABLE)
                .where(JournalKind.SEQ.gt(after).and(JournalKind.SEQ.le(upTo)))
                .fetch(line -> new Part(line.value1(), kind(line.value2()), line.value3(), line.value4(), line.value5()));
        parts.sort(Comparator.comparingLong(Part::seq).thenComparing(part -> Kind.ALL.indexOf(part.kind())));
        return parts;
    }

    private static Kind<?> kind(String id) {
        return Kind.ALL.stream().filter(kind -> kind.id().equals(id)).findFirst().orElseThrow();
    }

    void append(Connection connection, JournalEntry entry, String previousDigest, List<Part> parts) {
        Database.dsl(connection).insertInto(Tables.Journal.TABLE)
                .columns(Tables.Journal.SEQ, Tables.Journal.WHO, Tables.Journal.RECORDED_AT, Tables.Journal.WHY, Tables.Journal.COMPENSATES,
                        Tables.Journal.ROW_COUNT, Tables.Journal.PREVIOUS_DIGEST, Tables.Journal.DIGEST)
                .values(entry.seq(), entry.who(), stored(entry.when()), entry.why(), entry.compensates(), entry.rows(), previousDigest,
                        entry.digest())
                .execute();
        for (Part part : parts) {
            Database.dsl(connection).insertInto(JournalKind.TABLE)
                    .columns(JournalKind.SEQ, JournalKind.KIND, JournalKind.FIRST_VERSION, JournalKind.OPENED, JournalKind.CLOSED)
                    .values(part.seq(), part.kind().id(), part.firstVersion(), part.opened(), part.closed()).execute();
        }
    }

    /** The instant as the journal keeps it, to the microsecond. */
    static Instant recorded(Instant instant) {
        return instant.truncatedTo(ChronoUnit.MICROS);
    }

    private static LocalDateTime stored(Instant instant) {
        return LocalDateTime.ofInstant(recorded(instant), ZoneOffset.UTC);
    }
}
