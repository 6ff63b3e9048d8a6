package coilbook.register.internal.read;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.List;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.RowChange;
import coilbook.register.FleetScope;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.Journal;
import coilbook.register.internal.store.KindTable;

import org.jooq.impl.DSL;

/** The register's own rows, for reading: the state at any sequence, with the rows that stations share held between readings. */
public final class Truth {

    private final Database database;
    private final Codecs codecs;
    private final Journal journal;
    private final String registerId;
    private volatile long head;
    /** The sequence of the latest Change of a row that stations share. */
    private long groupsChanged;
    private GroupRows groups;
    private long groupsKnown = -1;

    public Truth(Database database, Codecs codecs, Journal journal, String registerId, long head) {
        this.database = database;
        this.codecs = codecs;
        this.journal = journal;
        this.registerId = registerId;
        this.head = head;
        this.groupsChanged = head;
    }

    public Connection connection() throws SQLException {
        return database.connection();
    }

    public Codecs codecs() {
        return codecs;
    }

    public Journal journal() {
        return journal;
    }

    public String registerId() {
        return registerId;
    }

    /** The latest acknowledged sequence. */
    public long head() {
        return head;
    }

    /** Takes note of a Change that was just recorded. */
    public synchronized void recorded(long seq, Change change) {
        for (RowChange row : change.rows()) {
            if (GroupRows.KINDS.contains(row.kind().type())) {
                groupsChanged = seq;
                break;
            }
        }
        head = seq;
    }

    /** The shared rows as they were known at a sequence. */
    public synchronized GroupRows groups(Connection connection, long known) throws SQLException {
        if (known < groupsChanged) {
            return GroupRows.load(connection, codecs, known);
        } else if (groups == null || groupsKnown < groupsChanged) {
            groups = GroupRows.load(connection, codecs, known);
            groupsKnown = known;
        }
        return groups;
    }

    /** Takes what was read of a batch of stations; may end the reading by an exception. */
    public interface Taker {
        void take(List<LoadedStation> batch) throws SQLException, CoilbookException;
    }

    /** Every station of a scope in the order of their codes. */
    public void stations(FleetScope scope, Snapshot snapshot, Taker taker) throws SQLException, CoilbookException {
        try (Connection connection = connection()) {
            GroupRows shared = groups(connection, snapshot.known());
            StationViews views = new StationViews(codecs);
            new StationWalk(codecs).each(connection, scope, shared, snapshot.known(),
                    batch -> taker.take(views.of(connection, batch, shared, snapshot)));
        }
    }

    /** The stations of these codes, as far as they are there. */
    public void stations(java.util.Collection<String> codes, Snapshot snapshot, Taker taker) throws SQLException, CoilbookException {
        try (Connection connection = connection()) {
            GroupRows shared = groups(connection, snapshot.known());
            StationViews views = new StationViews(codecs);
            new StationWalk(codecs).each(connection, codes, snapshot.known(),
                    batch -> taker.take(views.of(connection, batch, shared, snapshot)));
        }
    }

    /** How many stations there were at a sequence. */
    public long countStations(long known) throws SQLException {
        try (Connection connection = connection()) {
            return Database.dsl(connection).select(DSL.count()).from(KindTable.of(coilbook.fleet.Station.class).table())
                    .where(KindTable.knownAt(known))
                    .fetchOne(0, Long.class);
        }
    }

    /** The state that was known at a sequence, on a day. */
    public Snapshot snapshot(long known, LocalDate trueOn) {
        return new Snapshot(known, trueOn);
    }
}
