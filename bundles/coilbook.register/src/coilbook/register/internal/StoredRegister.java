package coilbook.register.internal;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;

import org.jooq.Condition;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.StationView;
import coilbook.fleet.Timed;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.JournalEntry;
import coilbook.register.PastStatus;
import coilbook.register.Register;
import coilbook.register.Status;
import coilbook.register.internal.read.Snapshot;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.status.Judging;
import coilbook.register.internal.status.LiveStatus;
import coilbook.register.internal.status.SnapshotStatus;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.RegisterStore;
import coilbook.register.internal.store.Versions;

/** A register on its databases. Failures of the database leave it as words. */
final class StoredRegister implements Register {

    private final String name;
    private final RegisterStore store;
    private final Truth truth;
    private final LiveStatus status;
    private final Judging judging;
    private final Closing closing;

    /** What is to be done once the register is no longer used. */
    interface Closing {
        void close() throws SQLException;
    }

    StoredRegister(String name, RegisterStore store, Truth truth, LiveStatus status, Judging judging, Closing closing) {
        this.name = name;
        this.store = store;
        this.truth = truth;
        this.status = status;
        this.judging = judging;
        this.closing = closing;
    }

    @Override
    public String name() {
        return name;
    }

    private <T> T translating(Failures.Work<T> work) throws CoilbookException {
        return Failures.translating(name, work);
    }

    @Override
    public long apply(Change change, Progress progress) throws CoilbookException {
        return translating(() -> store.apply(change, progress, truth::recorded));
    }

    @Override
    public long undo(long seq, String who, Progress progress) throws CoilbookException {
        return translating(() -> store.undo(seq, who, progress, truth::recorded));
    }

    @Override
    public JournalEntry undoable() throws CoilbookException {
        return translating(() -> {
            try (Connection connection = truth.connection()) {
                Set<Long> undone = new HashSet<>();
                for (long seq = truth.head(); seq > 0; seq--) {
                    JournalEntry entry = truth.journal().entry(connection, seq);
                    if (entry.compensates() > 0) {
                        undone.add(entry.compensates());
                    } else if (!undone.contains(seq)) {
                        return seq == 1 && entry.why().equals(H2Registers.FIRST_TABLES) ? null : entry;
                    }
                }
                return null;
            }
        });
    }

    @Override
    public long head() {
        return truth.head();
    }

    @Override
    public List<JournalEntry> journal(long afterSeq, int max) throws CoilbookException {
        return translating(() -> {
            try (Connection connection = truth.connection()) {
                return truth.journal().after(connection, afterSeq, max);
            }
        });
    }

    @Override
    public Change change(long seq) throws CoilbookException {
        return translating(() -> store.change(seq));
    }

    @Override
    public <R extends Row> R find(Kind<R> kind, String key) throws CoilbookException {
        return translating(() -> {
            KindTable<R> table = KindTable.of(kind);
            List<R> found = new ArrayList<>(1);
            try (Connection connection = truth.connection()) {
                Condition here = KindTable.KEY.eq(key).and(KindTable.knownAt(truth.head()));
                new Versions<>(truth.codecs().of(kind)).lookedUp(connection, List.of(table.lookupOf(key)), here,
                        version -> found.add(version.row()));
            }
            return found.isEmpty() ? null : found.get(0);
        });
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, Consumer<R> consumer) throws CoilbookException {
        read(kind, truth.head(), consumer);
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, AsOf asOf, Consumer<R> consumer) throws CoilbookException {
        LocalDate day = asOf.trueOn();
        read(kind, known(asOf), row -> {
            if (!(row instanceof Timed timed) || timed.trueOn(day)) {
                consumer.accept(row);
            }
        });
    }

    private long known(AsOf asOf) throws CoilbookException {
        return asOf.knownAt() == null ? truth.head() : translating(() -> {
            try (Connection connection = truth.connection()) {
                return Math.min(truth.head(), truth.journal().knownAt(connection, asOf.knownAt()));
            }
        });
    }

    /** Rows come by the lookup column, whose index gives the order; those with the same are put in order here. */
    private <R extends Row> void read(Kind<R> kind, long known, Consumer<R> consumer) throws CoilbookException {
        KindTable<R> table = KindTable.of(kind);
        translating(() -> {
            List<Versions.Version<R>> together = new ArrayList<>();
            try (Connection connection = truth.connection()) {
                new Versions<>(truth.codecs().of(kind)).each(connection, KindTable.knownAt(known), List.of(table.lookup()), version -> {
                    if (!together.isEmpty() && !table.lookupOf(version.key()).equals(table.lookupOf(together.get(0).key()))) {
                        hand(together, consumer);
                    }
                    together.add(version);
                });
                hand(together, consumer);
            }
            return null;
        });
    }

    private static <R extends Row> void hand(List<Versions.Version<R>> together, Consumer<R> consumer) {
        together.sort(Comparator.comparing(Versions.Version::key));
        together.forEach(version -> consumer.accept(version.row()));
        together.clear();
    }

    private Snapshot snapshot(AsOf asOf) throws CoilbookException {
        return new Snapshot(known(asOf), asOf.trueOn());
    }

    @Override
    public StationView station(String code, AsOf asOf) throws CoilbookException {
        Snapshot snapshot = snapshot(asOf);
        List<StationView> found = new ArrayList<>(1);
        translating(() -> {
            truth.stations(List.of(code), snapshot, batch -> batch.forEach(station -> found.add(station.view())));
            return null;
        });
        return found.isEmpty() ? null : found.get(0);
    }

    @Override
    public void stations(FleetScope scope, AsOf asOf, Consumer<StationView> consumer) throws CoilbookException {
        Snapshot snapshot = snapshot(asOf);
        translating(() -> {
            truth.stations(scope, snapshot, batch -> batch.forEach(station -> consumer.accept(station.view())));
            return null;
        });
    }

    @Override
    public Status status() {
        return status;
    }

    @Override
    public PastStatus statusAsOf(AsOf asOf, FleetScope scope, Progress progress) throws CoilbookException {
        Snapshot snapshot = snapshot(asOf);
        return translating(() -> SnapshotStatus.of(truth, judging, new InWords(name), snapshot, scope, progress));
    }

    @Override
    public void close() throws CoilbookException {
        translating(() -> {
            closing.close();
            return null;
        });
    }

    /** Translates for the status rows. */
    record InWords(String register) implements LiveStatus.Translation {

        @Override
        public <T> T of(LiveStatus.Work<T> work) throws CoilbookException {
            return Failures.translating(register, work::run);
        }
    }
}
