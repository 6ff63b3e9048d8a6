package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.Instant;
import java.util.Map;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.JournalEntry;

/** Records Changes and takes them back: one transaction each, forced to the disk before it is acknowledged. Only one writes at a time. */
public final class RegisterStore {

    private final Database database;
    private final Codecs codecs;
    private final Journal journal;
    private final Room room;
    private JournalEntry last;

    /** Whether there is room for so many more rows. */
    public interface Room {

        /** Where nothing runs out. */
        Room ENDLESS = rows -> {
        };

        void check(int rows) throws CoilbookException;
    }

    public RegisterStore(Database database, Codecs codecs, Journal journal, Room room) throws SQLException {
        this.database = database;
        this.room = room;
        this.codecs = codecs;
        this.journal = journal;
        try (Connection connection = database.connection()) {
            this.last = journal.last(connection);
        }
    }

    /** The latest sequence. */
    public synchronized long head() {
        return last == null ? 0 : last.seq();
    }

    /** Told once a Change is on the disk, before another can be recorded. */
    public interface Recorded {
        void take(long seq, Change change);
    }

    /** Records a Change. */
    public synchronized long apply(Change change, Progress progress, Recorded recorded) throws SQLException, CoilbookException {
        return write(change, Map.of(), 0, progress, recorded);
    }

    /** Takes a Change back. */
    public synchronized long undo(long seq, String who, Progress progress, Recorded recorded) throws SQLException, CoilbookException {
        Undo undo;
        Change back;
        try (Connection connection = database.connection()) {
            undo = new Undo(codecs, journal, connection, seq);
            back = undo.compensating(who);
        }
        return write(back, undo.identities(), seq, progress, recorded);
    }

    /** What a Change did. */
    public Change change(long seq) throws SQLException, CoilbookException {
        try (Connection connection = database.connection()) {
            return new Undo(codecs, journal, connection, seq).change();
        }
    }

    /** The instant to record now, never before the latest. */
    public static Instant now() {
        return Journal.recorded(Instant.now());
    }

    private long write(Change change, Map<String, Long> identities, long compensates, Progress progress, Recorded recorded)
            throws SQLException, CoilbookException {
        room.check(change.rows().size());
        JournalEntry before = last;
        JournalEntry entry = database.<JournalEntry, CoilbookException>inTransaction(
                connection -> new ChangeWriter(codecs, journal, connection, change, identities, before, progress).write(compensates));
        database.forceToDisk();
        last = entry;
        recorded.take(entry.seq(), change);
        return entry.seq();
    }
}
