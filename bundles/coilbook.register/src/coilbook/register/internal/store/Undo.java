package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.register.JournalEntry;

/** Reads a recorded Change back from the versions it opened and closed, and turns it round. */
final class Undo {

    private final Codecs codecs;
    private final Journal journal;
    private final Connection connection;
    private final long seq;
    /** The numbers of the rows, by kind and key, so that a row that comes back keeps its own. */
    private final Map<String, Long> identities = new HashMap<>();

    Undo(Codecs codecs, Journal journal, Connection connection, long seq) {
        this.codecs = codecs;
        this.journal = journal;
        this.connection = connection;
        this.seq = seq;
    }

    Map<String, Long> identities() {
        return identities;
    }

    /** What the Change did. */
    Change change() throws SQLException, CoilbookException {
        JournalEntry entry = entry();
        List<RowChange> rows = new ArrayList<>(entry.rows());
        for (Journal.Part part : journal.parts(connection, seq - 1, seq)) {
            read(part.kind(), part, rows, false);
        }
        return new Change(entry.who(), entry.when(), entry.why(), rows);
    }

    private JournalEntry entry() throws CoilbookException {
        JournalEntry entry = journal.entry(connection, seq);
        if (entry == null) {
            throw new CoilbookException(Reason.BAD_INPUT, "There is no change number " + seq + ".");
        }
        return entry;
    }

    /**
     * The Change that takes it back.
     *
     * @throws CoilbookException if it was taken back already, or a later Change touched the same rows
     */
    Change compensating(String who) throws SQLException, CoilbookException {
        JournalEntry entry = entry();
        long already = journal.compensationOf(connection, seq);
        if (already > 0) {
            throw new CoilbookException(Reason.BAD_INPUT,
                    "Change " + seq + " (" + entry.why() + ") was undone already by change " + already + ".");
        }
        List<RowChange> rows = new ArrayList<>(entry.rows());
        for (Journal.Part part : journal.parts(connection, seq - 1, seq)) {
            read(part.kind(), part, rows, true);
        }
        return new Change(entry.who(), entry.when(), entry.why(), rows).compensating(who, Instant.now());
    }

    private <R extends Row> void read(Kind<R> kind, Journal.Part part, List<RowChange> rows, boolean untouched)
            throws SQLException, CoilbookException {
        Versions<R> versions = new Versions<>(codecs.of(kind));
        Map<String, Versions.Version<R>> before = new HashMap<>();
        for (Versions.Version<R> version : versions.closed(connection, part)) {
            before.put(version.key(), version);
            identities.put(ChangeWriter.identity(kind, version.key()), version.rowId());
        }
        for (Versions.Version<R> version : versions.opened(connection, part)) {
            if (untouched && version.to() != 0) {
                throw touched(kind, version.key(), version.to());
            }
            Versions.Version<R> old = before.remove(version.key());
            rows.add(new RowChange(old == null ? null : old.row(), version.row()));
        }
        if (untouched && !before.isEmpty()) {
            checkNotBack(versions, kind, before);
        }
        before.values().forEach(version -> rows.add(RowChange.remove(version.row())));
    }

    /** A row that the Change removed and a later one brought again cannot come back. */
    private <R extends Row> void checkNotBack(Versions<R> versions, Kind<R> kind, Map<String, Versions.Version<R>> removed)
            throws SQLException, CoilbookException {
        List<String> lookups = removed.keySet().stream().map(KindTable.of(kind)::lookupOf).distinct().toList();
        List<Versions.Version<R>> later = new ArrayList<>();
        versions.lookedUp(connection, lookups, KindTable.FROM.gt(seq), version -> {
            if (removed.containsKey(version.key())) {
                later.add(version);
            }
        });
        if (!later.isEmpty()) {
            throw touched(kind, later.get(0).key(), later.get(0).from());
        }
    }

    private CoilbookException touched(Kind<?> kind, String key, long by) {
        JournalEntry later = journal.entry(connection, by);
        return new CoilbookException(Reason.BAD_INPUT,
                "Change " + seq + " cannot be undone: change " + by + " (" + later.why() + ", by " + later.who() + " on "
                        + later.when().atOffset(ZoneOffset.UTC).toLocalDate() + ") touched " + kind.sheet() + " " + key
                        + " later. Undo that one first.");
    }
}
