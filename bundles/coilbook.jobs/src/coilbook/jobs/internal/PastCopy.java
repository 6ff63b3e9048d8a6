package coilbook.jobs.internal;

import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Timed;
import coilbook.register.Register;

/**
 * Puts what was true until the end of a day, as it is known now, into a temporary register, so that another date needs no second way of computing. Rows
 * that began later, and readings taken later, stay out; what ended earlier comes along, since it was the past then too.
 */
public final class PastCopy {

    private static final int ROWS_A_CHANGE = 20_000;

    private PastCopy() {
    }

    public static void fill(Register target, Register source, LocalDate day, Instant now, Progress progress) throws CoilbookException {
        for (Kind<?> kind : Kind.ALL) {
            progress.report("Looking back to " + day, Kind.ALL.indexOf(kind), Kind.ALL.size());
            progress.check();
            copy(target, source, kind, day, now);
        }
    }

    private static <R extends Row> void copy(Register target, Register source, Kind<R> kind, LocalDate day, Instant now)
            throws CoilbookException {
        List<RowChange> batch = new ArrayList<>();
        CoilbookException[] failed = new CoilbookException[1];
        source.read(kind, row -> {
            if (failed[0] == null && wasKnownBy(row, day)) {
                Row held = target(target, kind, row, failed);
                if (!row.equals(held)) {
                    batch.add(held == null ? RowChange.insert(row) : RowChange.replace(held, row));
                }
                if (batch.size() >= ROWS_A_CHANGE) {
                    apply(target, batch, day, now, failed);
                }
            }
        });
        apply(target, batch, day, now, failed);
        if (failed[0] != null) {
            throw failed[0];
        }
    }

    private static boolean wasKnownBy(Row row, LocalDate day) {
        if (row instanceof Reading reading) {
            return !reading.takenAt().isAfter(day.atTime(LocalTime.MAX));
        }
        return !(row instanceof Timed timed) || timed.validFrom() == null || !timed.validFrom().isAfter(day);
    }

    /** A fresh register already holds the shipped market tables. */
    private static <R extends Row> Row target(Register target, Kind<R> kind, Row row, CoilbookException[] failed) {
        try {
            return kind.id().startsWith("market_") || kind.id().equals("fleet_setting") ? target.find(kind, row.key()) : null;
        } catch (CoilbookException e) {
            failed[0] = e;
            return null;
        }
    }

    private static void apply(Register target, List<RowChange> batch, LocalDate day, Instant now, CoilbookException[] failed) {
        if (batch.isEmpty() || failed[0] != null) {
            return;
        }
        try {
            target.apply(new Change("coilbook", now, "As of " + day, batch), Progress.NONE);
        } catch (CoilbookException e) {
            failed[0] = e;
        }
        batch.clear();
    }
}
