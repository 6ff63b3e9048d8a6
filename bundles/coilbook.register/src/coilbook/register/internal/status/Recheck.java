package coilbook.register.internal.status;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

import org.jooq.Record4;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Progress;
import coilbook.register.internal.read.LoadedStation;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.Sought;

/**
 * Judges batches of stations on all cores while the next batch is read, and writes what is new. One object serves one run.
 */
final class Recheck implements AutoCloseable {

    /** How many stations a core takes at once. */
    private static final int SLICE = 25;
    /** How many batches wait to be written while others are read. */
    private static final int AHEAD = 2;

    private final Database view;
    private final StatusWriter writer;
    private final Judging judging;
    private final Fingerprints fingerprints;
    private final LocalDate today;
    private final Progress progress;
    private final long total;
    private final ExecutorService cores;
    private final Deque<Batch> waiting = new ArrayDeque<>();
    private final Set<Long> seen = new HashSet<>();
    private final Set<String> absent;
    private long looked;
    private long judged;

    /** @param sought the codes that are looked for, or an empty list for all stations */
    Recheck(Database view, StatusWriter writer, Judging judging, LocalDate today, Collection<String> sought, long total,
            Progress progress) {
        this.absent = new HashSet<>(sought);
        this.view = view;
        this.writer = writer;
        this.judging = judging;
        this.fingerprints = new Fingerprints(judging.version());
        this.today = today;
        this.total = total;
        this.progress = progress;
        this.cores = Executors.newFixedThreadPool(Runtime.getRuntime().availableProcessors(), work -> {
            Thread thread = new Thread(work, "judging");
            thread.setDaemon(true);
            return thread;
        });
    }

    /** What is known of a row before. */
    private record Known(String fingerprint, LocalDate judgedOn, LocalDate recheckOn) {

        boolean stands(String now, LocalDate today) {
            return fingerprint.equals(now) && !judgedOn.isAfter(today) && (recheckOn == null || recheckOn.isAfter(today));
        }
    }

    private record Batch(int stations, List<Future<List<StatusWriter.Line>>> slices) {
    }

    /** Takes the next batch of stations. */
    void take(List<LoadedStation> batch) throws SQLException, CoilbookException {
        checkCancelled();
        Map<Long, Known> known = known(batch);
        List<Future<List<StatusWriter.Line>>> slices = new ArrayList<>();
        for (int i = 0; i < batch.size(); i += SLICE) {
            List<LoadedStation> slice = batch.subList(i, Math.min(batch.size(), i + SLICE));
            slices.add(cores.submit(() -> judge(slice, known)));
        }
        for (LoadedStation station : batch) {
            seen.add(station.id());
            absent.remove(station.view().code());
        }
        waiting.add(new Batch(batch.size(), slices));
        while (waiting.size() > AHEAD) {
            writeOldest();
        }
    }

    private void checkCancelled() throws CoilbookException {
        if (progress.isCancelled()) {
            throw new CoilbookException(Reason.CANCELLED, "Cancelled. What was judged so far is kept; the rest is judged the next time.");
        }
    }

    private Map<Long, Known> known(List<LoadedStation> batch) throws SQLException {
        Map<Long, Known> known = new HashMap<>();
        try (Connection connection = view.connection()) {
            long[] ids = batch.stream().mapToLong(LoadedStation::id).toArray();
            for (Record4<Long, String, LocalDate, LocalDate> line : Database.dsl(connection)
                    .select(ViewTables.ID, ViewTables.FINGERPRINT, ViewTables.JUDGED_ON, ViewTables.RECHECK_ON).from(Sought.numbers(ids))
                    .join(ViewTables.STATUS).on(ViewTables.ID.eq(Sought.NUMBER)).fetch()) {
                known.put(line.value1(), new Known(line.value2(), line.value3(), line.value4()));
            }
        }
        return known;
    }

    private List<StatusWriter.Line> judge(List<LoadedStation> slice, Map<Long, Known> known) {
        List<StatusWriter.Line> lines = new ArrayList<>();
        for (LoadedStation station : slice) {
            Known before = known.get(station.id());
            String fingerprint = fingerprints.of(station.view());
            if (!progress.isCancelled() && (before == null || !before.stands(fingerprint, today))) {
                Judged result = judging.judge(station.view());
                LocalDate recheckOn = earlier(result.recheckOn(), station.turnsOn());
                lines.add(new StatusWriter.Line(station.id(), before != null, fingerprint, today, recheckOn, StatusValues.rank(result),
                        StatusValues.of(station.view(), result), result.findings()));
            }
        }
        return lines;
    }

    private static LocalDate earlier(LocalDate one, LocalDate other) {
        return one == null || other != null && other.isBefore(one) ? other : one;
    }

    private void writeOldest() throws SQLException, CoilbookException {
        Batch batch = waiting.remove();
        List<StatusWriter.Line> lines = new ArrayList<>();
        try {
            for (Future<List<StatusWriter.Line>> slice : batch.slices()) {
                lines.addAll(slice.get());
            }
        } catch (ExecutionException e) {
            if (e.getCause() instanceof Error error) {
                throw error;
            }
            throw new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CoilbookException(Reason.CANCELLED, "Interrupted. What was judged so far is kept; the rest is judged the next time.",
                    e);
        }
        if (!lines.isEmpty()) {
            writer.write(lines);
        }
        looked += batch.stations();
        judged += lines.size();
        progress.report("Checking", looked, Math.max(total, looked));
    }

    /** Writes what still waits.
     *
     * @return how many stations were computed
     */
    long finish() throws SQLException, CoilbookException {
        while (!waiting.isEmpty()) {
            writeOldest();
        }
        checkCancelled();
        return judged;
    }

    /** The numbers of the stations taken. */
    Set<Long> seen() {
        return seen;
    }

    /** The codes that were sought and are not there. */
    Set<String> absent() {
        return absent;
    }

    @Override
    public void close() {
        cores.shutdownNow();
    }
}
