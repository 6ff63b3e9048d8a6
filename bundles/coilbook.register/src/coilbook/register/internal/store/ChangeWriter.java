package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.jooq.impl.DSL;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.register.JournalEntry;

/**
 * Writes a Change into an open transaction: checks that every row is what the Change says it was, closes versions, opens versions, appends to the
 * journal. The caller commits, or takes everything back.
 */
final class ChangeWriter {

    private static final int BATCH = 1000;

    private final Codecs codecs;
    private final Journal journal;
    private final Connection connection;
    private final Change change;
    private final Map<String, Long> identities;
    private final JournalEntry last;
    private final long seq;
    private final Progress progress;
    private int done;

    /**
     * @param last the entry before, or {@code null}
     * @param identities the number of rows that come back under their old one, by kind and key; else empty
     */
    ChangeWriter(Codecs codecs, Journal journal, Connection connection, Change change, Map<String, Long> identities, JournalEntry last,
            Progress progress) {
        this.codecs = codecs;
        this.journal = journal;
        this.connection = connection;
        this.change = change;
        this.identities = identities;
        this.last = last;
        this.seq = last == null ? 1 : last.seq() + 1;
        this.progress = progress;
    }

    static String identity(Kind<?> kind, String key) {
        return kind.id() + "\u0000" + key;
    }

    JournalEntry write(long compensates) throws SQLException, CoilbookException {
        validate();
        References references = new References(codecs);
        references.checkNew(connection, change, seq - 1);
        String previous = last == null ? Journal.NO_DIGEST : last.digest();
        Instant when = Journal.recorded(change.when());
        if (last != null && when.isBefore(last.when())) {
            when = last.when();
        }
        RowDigest digest = entryDigest(new JournalEntry(seq, change.who(), when, change.why(), compensates, change.rows().size(), ""),
                previous);
        List<Journal.Part> parts = new ArrayList<>();
        Map<Kind<?>, List<RowChange>> byKind = new HashMap<>();
        change.rows().forEach(row -> byKind.computeIfAbsent(row.kind(), kind -> new ArrayList<>()).add(row));
        for (Kind<?> kind : Kind.ALL) {
            if (byKind.containsKey(kind)) {
                parts.add(write(kind, byKind.get(kind), digest));
            }
        }
        references.checkGone(connection, change, seq);
        JournalEntry entry = new JournalEntry(seq, change.who(), when, change.why(), compensates, change.rows().size(), digest.hex());
        journal.append(connection, entry, previous, parts);
        return entry;
    }

    /** The digest of an entry before its rows. */
    static RowDigest entryDigest(JournalEntry entry, String previous) {
        return new RowDigest().add(previous).add(entry.seq()).add(entry.who()).add(ChronoUnit.MICROS.between(Instant.EPOCH, entry.when()))
                .add(entry.why()).add(entry.compensates()).add(entry.rows());
    }

    private void validate() throws CoilbookException {
        RowChange current = null;
        try {
            change.validate();
            for (RowChange row : change.rows()) {
                current = row;
                if (row.after() != null) {
                    codecs.of(row.kind()).checkStorable(row.after());
                }
            }
        } catch (InvalidValue e) {
            RowChange row = current == null ? invalid() : current;
            throw row == null ? Refusal.of(change.rows().get(0).kind(), e.value(), e.column(), "", "expected " + e.expected())
                    : Refusal.of(row.kind(), row.key(), e.column(), e.value(), "expected " + e.expected());
        }
        if (change.rows().isEmpty()) {
            throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, "There is nothing to change.");
        }
    }

    private RowChange invalid() {
        for (RowChange row : change.rows()) {
            try {
                if (row.after() != null) {
                    row.kind().validate(row.after());
                }
            } catch (InvalidValue e) {
                return row;
            }
        }
        return null;
    }

    private <R extends Row> Journal.Part write(Kind<R> kind, List<RowChange> rows, RowDigest digest)
            throws SQLException, CoilbookException {
        RowCodec<R> codec = codecs.of(kind);
        Versions<R> versions = new Versions<>(codec);
        long firstVersion = versions.nextVersion(connection);
        Map<String, Versions.Version<R>> present = firstVersion == 1 ? Map.of() : present(versions, kind, rows);
        List<Long> closing = new ArrayList<>();
        for (RowChange row : rows) {
            Versions.Version<R> version = present.get(row.key());
            checkBefore(codec, row, version);
            if (version != null) {
                closing.add(version.versionId());
            }
        }
        close(kind, closing);
        int opened = open(codec, rows, present, firstVersion, digest);
        Collections.sort(closing);
        digest.add(closing);
        return new Journal.Part(seq, kind, firstVersion, opened, closing.size());
    }

    private <R extends Row> Map<String, Versions.Version<R>> present(Versions<R> versions, Kind<R> kind, List<RowChange> rows)
            throws SQLException {
        Set<String> keys = new HashSet<>(rows.size() * 2);
        Set<String> lookups = new HashSet<>();
        KindTable<R> table = KindTable.of(kind);
        for (RowChange row : rows) {
            keys.add(row.key());
            lookups.add(table.lookupOf(row.key()));
        }
        Map<String, Versions.Version<R>> present = new HashMap<>();
        versions.lookedUp(connection, lookups, KindTable.knownAt(seq - 1), version -> {
            if (keys.contains(version.key())) {
                present.put(version.key(), version);
            }
        });
        return present;
    }

    private static <R extends Row> void checkBefore(RowCodec<R> codec, RowChange row, Versions.Version<R> version)
            throws CoilbookException {
        Kind<?> kind = row.kind();
        if (row.before() == null && version != null) {
            throw Refusal.stale(kind, row.key(), "it is there already");
        } else if (row.before() != null && version == null) {
            throw Refusal.stale(kind, row.key(), "it is no longer there");
        } else if (row.before() != null && !codec.same(row.before(), version.row())) {
            throw Refusal.stale(kind, row.key(), "it was changed by someone else meanwhile; look at it again");
        }
    }

    private void close(Kind<?> kind, List<Long> versions) throws SQLException {
        String sql = Database.renderer().update(KindTable.of(kind).table()).set(KindTable.TO, DSL.param("to", Long.class))
                .where(KindTable.VERSION.eq(DSL.param("version", Long.class))).getSQL();
        try (PreparedStatement statement = connection.prepareStatement(sql)) {
            int waiting = 0;
            for (long version : versions) {
                statement.setLong(1, seq);
                statement.setLong(2, version);
                statement.addBatch();
                if (++waiting % BATCH == 0) {
                    statement.executeBatch();
                }
            }
            statement.executeBatch();
        }
    }

    private <R extends Row> int open(RowCodec<R> codec, List<RowChange> rows, Map<String, Versions.Version<R>> present, long firstVersion,
            RowDigest digest) throws SQLException, CoilbookException {
        Kind<R> kind = codec.table().kind();
        int opened = 0;
        digest.add(kind.id());
        try (PreparedStatement statement = connection.prepareStatement(insertion(codec.table()))) {
            for (RowChange row : rows) {
                if (row.after() != null) {
                    long version = firstVersion + opened++;
                    Versions.Version<R> old = present.get(row.key());
                    long id = old != null ? old.rowId() : identities.getOrDefault(identity(kind, row.key()), version);
                    statement.setLong(1, version);
                    statement.setLong(2, id);
                    statement.setString(3, row.key());
                    statement.setLong(4, seq);
                    statement.setNull(5, java.sql.Types.BIGINT);
                    codec.bind(statement, 6, row.after());
                    statement.addBatch();
                    digest.add(id).add(row.key()).addAll(kind.values(row.after()));
                    if (opened % BATCH == 0) {
                        statement.executeBatch();
                        progress.check();
                        progress.report("Recording", done + opened, change.rows().size());
                    }
                }
            }
            statement.executeBatch();
        }
        done += rows.size();
        progress.check();
        progress.report("Recording", done, change.rows().size());
        digest.add(opened);
        return opened;
    }

    private static String insertion(KindTable<?> table) {
        Object[] parameters = new Object[table.fields().size()];
        Arrays.setAll(parameters, i -> DSL.param("p" + i, table.fields().get(i)));
        return Database.renderer().insertInto(table.table()).columns(table.fields()).values(parameters).getSQL();
    }
}
