package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.Statement;
import java.util.List;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.Datum;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.RowChange;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.JournalCheck;

/** Each entry's digest covers the entry, its rows and the digest before: what is altered behind the register's back shows. */
class JournalChainTest {

    @TempDir
    Path folder;
    private Path base;

    @BeforeEach
    void makeHistory() throws Exception {
        base = folder.resolve("r");
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(RowRoundTripTest.oneOfEach()), Progress.NONE);
            Line line = register.find(Kind.of(Line.class), "S/L");
            Line other = Kind.of(Line.class).with(line, Kind.of(Line.class).field("speed"), Datum.assumed(-0.0 + 1.25));
            long seq = register.apply(FleetFixture.change("Speed", List.of(RowChange.replace(line, other))), Progress.NONE);
            register.undo(seq, "x", Progress.NONE);
            List<JournalEntry> entries = register.journal(0, 10);
            assertEquals(3, entries.stream().map(JournalEntry::digest).distinct().count());
            assertNotEquals(entries.get(0).digest(), entries.get(2).digest());
            assertEquals(64, entries.get(0).digest().length());
        }
    }

    private long firstBroken(String... alterations) throws Exception {
        try (Database database = Database.open(base.toString(), false);
                Connection connection = database.connection();
                Statement statement = connection.createStatement()) {
            for (String sql : alterations) {
                assertEquals(1, statement.executeUpdate(sql), sql);
            }
            return new JournalCheck(new Codecs()).firstBroken(connection);
        }
    }

    @Test
    void anUntouchedChainHolds() throws Exception {
        assertEquals(0, firstBroken());
    }

    @Test
    void anAlteredRowShows() throws Exception {
        assertEquals(1, firstBroken("update coil_type set resistance20 = resistance20 * 1.0000001"));
    }

    @Test
    void anAlteredProvenanceShows() throws Exception {
        assertEquals(2, firstBroken("update line set speed_prov = 1 where seq_from = 2"));
    }

    @Test
    void anAlteredReasonShows() throws Exception {
        assertEquals(2, firstBroken("update journal set why = 'other' where seq = 2"));
    }

    @Test
    void aReopenedVersionShows() throws Exception {
        assertEquals(2, firstBroken("update line set seq_to = null where seq_to = 2"));
    }

    @Test
    void aMissingEntryShows() throws Exception {
        assertEquals(2, firstBroken("delete from journal where seq = 2"));
    }
}
