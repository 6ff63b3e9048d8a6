package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.SQLException;

import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.register.JournalEntry;

/** Computes the journal's chain of digests again from the rows, to find what was altered behind the register's back. */
public final class JournalCheck {

    private static final int STEP = 1000;

    private final Codecs codecs;
    private final Journal journal = new Journal();

    public JournalCheck(Codecs codecs) {
        this.codecs = codecs;
    }

    /** The first sequence whose digest does not agree with its rows, or 0. */
    public long firstBroken(Connection connection) throws SQLException {
        String previous = Journal.NO_DIGEST;
        long seq = 0;
        for (var entries = journal.after(connection, seq, STEP); !entries.isEmpty(); entries = journal.after(connection, seq, STEP)) {
            for (JournalEntry entry : entries) {
                if (entry.seq() != seq + 1 || !digest(connection, entry, previous).equals(entry.digest())) {
                    return seq + 1;
                }
                seq = entry.seq();
                previous = entry.digest();
            }
        }
        return 0;
    }

    private String digest(Connection connection, JournalEntry entry, String previous) throws SQLException {
        RowDigest digest = ChangeWriter.entryDigest(entry, previous);
        for (Journal.Part part : journal.parts(connection, entry.seq() - 1, entry.seq())) {
            add(connection, part.kind(), part, digest);
        }
        return digest.hex();
    }

    private <R extends Row> void add(Connection connection, Kind<R> kind, Journal.Part part, RowDigest digest) throws SQLException {
        Versions<R> versions = new Versions<>(codecs.of(kind));
        digest.add(kind.id());
        var opened = versions.opened(connection, part);
        opened.forEach(version -> digest.add(version.rowId()).add(version.key()).addAll(kind.values(version.row())));
        digest.add(opened.size());
        digest.add(versions.closed(connection, part).stream().map(Versions.Version::versionId).toList());
    }
}
