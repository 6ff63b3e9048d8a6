package coilbook.jobs.internal;

import java.util.List;
import java.util.function.Consumer;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.StationView;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.JournalEntry;
import coilbook.register.PastStatus;
import coilbook.register.Register;
import coilbook.register.Status;

/**
 * A register as it was true on a day, for reading: what writes a report of today writes one of that day through it. Closing it lets go of the day's status
 * rows and leaves the register open.
 */
public final class PastRegister implements Register {

    private final Register register;
    private final AsOf asOf;
    private final PastStatus status;

    public PastRegister(Register register, AsOf asOf, FleetScope scope, Progress progress) throws CoilbookException {
        this.register = register;
        this.asOf = asOf;
        this.status = register.statusAsOf(asOf, scope, progress);
    }

    @Override
    public String name() {
        return register.name();
    }

    @Override
    public long apply(Change change, Progress progress) {
        throw readOnly();
    }

    @Override
    public long undo(long seq, String who, Progress progress) {
        throw readOnly();
    }

    private static UnsupportedOperationException readOnly() {
        return new UnsupportedOperationException("the past is for reading");
    }

    @Override
    public JournalEntry undoable() {
        return null;
    }

    @Override
    public long head() throws CoilbookException {
        return register.head();
    }

    @Override
    public List<JournalEntry> journal(long afterSeq, int max) throws CoilbookException {
        return register.journal(afterSeq, max);
    }

    @Override
    public Change change(long seq) throws CoilbookException {
        return register.change(seq);
    }

    @Override
    public <R extends Row> R find(Kind<R> kind, String key) throws CoilbookException {
        return register.find(kind, key);
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, Consumer<R> consumer) throws CoilbookException {
        register.read(kind, asOf, consumer);
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, AsOf other, Consumer<R> consumer) throws CoilbookException {
        register.read(kind, other, consumer);
    }

    @Override
    public StationView station(String code, AsOf other) throws CoilbookException {
        return register.station(code, other);
    }

    @Override
    public void stations(FleetScope scope, AsOf other, Consumer<StationView> consumer) throws CoilbookException {
        register.stations(scope, other, consumer);
    }

    @Override
    public Status status() {
        return status;
    }

    @Override
    public PastStatus statusAsOf(AsOf other, FleetScope scope, Progress progress) throws CoilbookException {
        return register.statusAsOf(other, scope, progress);
    }

    @Override
    public void close() throws CoilbookException {
        status.close();
    }
}
