package coilbook.exchange.internal.out;

import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;

/** Tells how far writing is and stops it when it is no longer wanted. Readers of the register take plain consumers, so a stop travels through them unchecked. */
final class Watch {

    private static final int EVERY = 500;

    private final Progress progress;
    private final long total;

    /** A row's writer that may fail in plain words. */
    interface Writer<T> {
        void write(T row) throws CoilbookException;
    }

    /** Carries a stop through a reader. */
    static final class Stopped extends RuntimeException {

        private static final long serialVersionUID = 1L;

        Stopped(CoilbookException cause) {
            super(cause);
        }

        CoilbookException reason() {
            return (CoilbookException) getCause();
        }
    }

    /**
     * @param total stations in all, or 0 where not known
     */
    Watch(Progress progress, long total) {
        this.progress = progress;
        this.total = total;
    }

    void step(String step) throws CoilbookException {
        progress.check();
        progress.report(step, 0, 0);
    }

    <T> Consumer<T> each(String step, Writer<T> writer) {
        return each(step, 0, writer);
    }

    /** The same with the number of stations as the whole. */
    <T> Consumer<T> eachStation(String step, Writer<T> writer) {
        return each(step, total, writer);
    }

    private <T> Consumer<T> each(String step, long of, Writer<T> writer) {
        long[] done = { 0 };
        return row -> {
            try {
                writer.write(row);
                if (++done[0] % EVERY == 0) {
                    progress.check();
                    progress.report(step, done[0], of);
                }
            } catch (CoilbookException e) {
                throw new Stopped(e);
            }
        };
    }
}
