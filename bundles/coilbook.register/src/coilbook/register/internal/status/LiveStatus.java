package coilbook.register.internal.status;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;

import org.jooq.Condition;
import org.jooq.Cursor;
import org.jooq.Record1;
import org.jooq.Record2;
import org.jooq.Record5;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.register.internal.read.Snapshot;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.store.Database;

/** The status rows of today, kept in step with the journal. */
public final class LiveStatus implements Status {

    private final Truth truth;
    private final Database view;
    private final Judging judging;
    private final Translation translation;
    private final StatusReader reader;
    private final StatusWriter writer;
    private final Object judgingLock = new Object();
    private volatile State state;
    private volatile List<Place> places;

    /** Which state of the register the rows reflect; day {@code null} = none yet. */
    private record State(long seq, LocalDate day) {
    }

    /** Turns what the database throws into words. */
    public interface Translation {
        <T> T of(Work<T> work) throws CoilbookException;
    }

    /** Work on the databases. */
    public interface Work<T> {
        T run() throws SQLException, CoilbookException;
    }

    /**
     * @param view an empty database, or one that a former run left
     */
    public LiveStatus(Truth truth, Database view, Judging judging, Translation translation) throws SQLException {
        this.truth = truth;
        this.view = view;
        this.judging = judging;
        this.translation = translation;
        this.reader = new StatusReader(view);
        this.writer = new StatusWriter(view, judging.version(), truth.registerId());
        this.state = new State(0, null);
    }

    /** Makes the tables of an empty database. */
    public void create() throws SQLException {
        try (Connection connection = view.connection()) {
            ViewTables.create(Database.dsl(connection));
        }
        writer.reached(0, null);
    }

    /** Takes over what a former run left.
     *
     * @return false if it is of no use: of another version, of another register, or ahead of the register
     */
    public boolean resume() throws SQLException {
        try (Connection connection = view.connection()) {
            Record5<Integer, String, String, Long, LocalDate> line = Database.dsl(connection)
                    .select(ViewTables.VIEW_VERSION, ViewTables.ENGINE, ViewTables.REGISTER_ID, ViewTables.SEQ, ViewTables.STATE_DAY)
                    .from(ViewTables.STATE).fetchOne();
            if (line == null || line.value1() != ViewTables.VERSION || !line.value2().equals(judging.version())
                    || !line.value3().equals(truth.registerId())) {
                return false;
            }
            state = new State(line.value4(), line.value5());
            return line.value4() <= truth.head();
        }
    }

    /** The sequence that the rows reflect. */
    public long seq() {
        return state.seq();
    }

    /** The table by which a view file is known. */
    public static String mark() {
        return ViewTables.STATE.getName().toUpperCase(java.util.Locale.ROOT);
    }

    @Override
    public boolean isUpToDate(LocalDate today) throws CoilbookException {
        State now = state;
        if (now.day() == null || now.seq() != truth.head()) {
            return false;
        }
        return now.day().equals(today) || translation.of(() -> due(today).isEmpty());
    }

    /** Stations whose verdict the passing of time may have turned, or that were judged on a later day than this. */
    private List<String> due(LocalDate today) throws SQLException {
        Condition due = ViewTables.RECHECK_ON.le(today).or(ViewTables.JUDGED_ON.gt(today));
        try (Connection connection = view.connection()) {
            return Database.dsl(connection).select(ViewTables.text(StatusColumn.STATION)).from(ViewTables.STATUS).where(due)
                    .fetch(ViewTables.text(StatusColumn.STATION));
        }
    }

    @Override
    public long bringUpToDate(LocalDate today, Progress progress) throws CoilbookException {
        synchronized (judgingLock) {
            return isUpToDate(today) && today.equals(state.day()) ? 0 : translation.of(() -> judge(today, progress));
        }
    }

    private long judge(LocalDate today, Progress progress) throws SQLException, CoilbookException {
        long head = truth.head();
        State before = state;
        progress.report("Checking", 0, 0);
        Set<String> affected = before.day() == null ? null : Affected.between(truth, before.seq(), head);
        if (affected != null && !today.equals(before.day())) {
            affected = new TreeSet<>(affected);
            affected.addAll(due(today));
        }
        long judged = run(FleetScope.all(), affected, new Snapshot(head, today), progress);
        writer.reached(head, today);
        state = new State(head, today);
        return judged;
    }

    private long run(FleetScope scope, Collection<String> affected, Snapshot snapshot, Progress progress)
            throws SQLException, CoilbookException {
        long count = affected == null ? truth.countStations(snapshot.known()) : affected.size();
        Collection<String> sought = affected == null ? List.of() : affected;
        try (Recheck recheck = new Recheck(view, writer, judging, snapshot.trueOn(), sought, count, progress)) {
            if (affected == null) {
                truth.stations(scope, snapshot, recheck::take);
            } else {
                truth.stations(affected, snapshot, recheck::take);
            }
            long judged = recheck.finish();
            writer.remove(affected == null ? notIn(recheck.seen()) : ofStations(recheck.absent()));
            return judged;
        } finally {
            places = null;
        }
    }

    /** Fills an empty view with one past state of part of the fleet. */
    void fillWith(FleetScope scope, Snapshot snapshot, Progress progress) throws SQLException, CoilbookException {
        run(scope, null, snapshot, progress);
        state = new State(snapshot.known(), snapshot.trueOn());
    }

    /** The numbers of rows whose station is no longer there, from one scan. */
    private List<Long> notIn(Set<Long> seen) throws SQLException {
        List<Long> gone = new ArrayList<>();
        try (Connection connection = view.connection();
                Cursor<Record1<Long>> rows = Database.dsl(connection).select(ViewTables.ID)
                        .from(ViewTables.STATUS).fetchLazy()) {
            for (Record1<Long> row : rows) {
                if (!seen.contains(row.value1())) {
                    gone.add(row.value1());
                }
            }
        }
        return gone;
    }

    private List<Long> ofStations(Set<String> codes) throws SQLException {
        if (codes.isEmpty()) {
            return List.of();
        }
        List<Long> gone = new ArrayList<>();
        try (Connection connection = view.connection();
                Cursor<Record2<Long, String>> rows = Database.dsl(connection)
                        .select(ViewTables.ID, ViewTables.text(StatusColumn.STATION)).from(ViewTables.STATUS).fetchLazy()) {
            for (Record2<Long, String> row : rows) {
                if (codes.contains(row.value2())) {
                    gone.add(row.value1());
                }
            }
        }
        return gone;
    }

    @Override
    public long[] ids(StatusQuery query) throws CoilbookException {
        return translation.of(() -> reader.ids(query));
    }

    @Override
    public List<StatusRow> rows(long[] ids) throws CoilbookException {
        return translation.of(() -> reader.rows(ids));
    }

    @Override
    public void each(StatusQuery query, Consumer<StatusRow> consumer) throws CoilbookException {
        translation.of(() -> {
            reader.each(query, consumer);
            return null;
        });
    }

    @Override
    public void findings(FleetScope scope, Consumer<StationFinding> consumer) throws CoilbookException {
        translation.of(() -> {
            reader.findings(scope, consumer);
            return null;
        });
    }

    @Override
    public Counts counts(FleetScope scope) throws CoilbookException {
        return translation.of(() -> reader.counts(scope));
    }

    @Override
    public List<Place> places() throws CoilbookException {
        List<Place> known = places;
        if (known == null) {
            known = translation.of(() -> {
                try (Connection connection = truth.connection()) {
                    return PlaceTree.of(truth.groups(connection, state.seq()), reader.byLine());
                }
            });
            places = known;
        }
        return known;
    }
}
