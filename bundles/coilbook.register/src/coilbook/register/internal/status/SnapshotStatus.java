package coilbook.register.internal.status;

import java.sql.SQLException;
import java.time.LocalDate;
import java.util.List;
import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.PastStatus;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.register.internal.read.Snapshot;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.store.Database;

/** Status rows of one past state, in a database of their own that lives in memory. */
public final class SnapshotStatus implements PastStatus {

    private final Database view;
    private final LiveStatus status;
    private final LocalDate day;
    private final LiveStatus.Translation translation;

    private SnapshotStatus(Database view, LiveStatus status, LocalDate day, LiveStatus.Translation translation) {
        this.view = view;
        this.status = status;
        this.day = day;
        this.translation = translation;
    }

    /** Computes and judges the stations of a scope as they were. */
    public static SnapshotStatus of(Truth truth, Judging judging, LiveStatus.Translation translation, Snapshot snapshot, FleetScope scope,
            Progress progress) throws SQLException, CoilbookException {
        Database view = Database.inMemory();
        boolean complete = false;
        try {
            LiveStatus status = new LiveStatus(truth, view, judging, translation);
            status.create();
            status.fillWith(scope, snapshot, progress);
            complete = true;
            return new SnapshotStatus(view, status, snapshot.trueOn(), translation);
        } finally {
            if (!complete) {
                view.close();
            }
        }
    }

    @Override
    public boolean isUpToDate(LocalDate today) {
        return day.equals(today);
    }

    /** Nothing is ever behind: the past does not change.
     *
     * @throws IllegalArgumentException for another day
     */
    @Override
    public long bringUpToDate(LocalDate today, Progress progress) {
        if (!day.equals(today)) {
            throw new IllegalArgumentException("these status rows are those of " + day);
        }
        return 0;
    }

    @Override
    public long[] ids(StatusQuery query) throws CoilbookException {
        return status.ids(query);
    }

    @Override
    public List<StatusRow> rows(long[] ids) throws CoilbookException {
        return status.rows(ids);
    }

    @Override
    public void each(StatusQuery query, Consumer<StatusRow> consumer) throws CoilbookException {
        status.each(query, consumer);
    }

    @Override
    public void findings(FleetScope scope, Consumer<StationFinding> consumer) throws CoilbookException {
        status.findings(scope, consumer);
    }

    @Override
    public Counts counts(FleetScope scope) throws CoilbookException {
        return status.counts(scope);
    }

    @Override
    public List<Place> places() throws CoilbookException {
        return status.places();
    }

    @Override
    public void close() throws CoilbookException {
        translation.of(() -> {
            view.close();
            return null;
        });
    }
}
