package coilbook.console.internal;

import java.io.PrintStream;
import java.util.Locale;

import coilbook.fleet.Progress;

/** One line of progress that overwrites itself, a few times a second, and is wiped before anything else is said. */
final class ProgressLine implements Progress, AutoCloseable {

    private static final long INTERVAL_NANOS = 150_000_000L;

    private final PrintStream err;
    private long last = System.nanoTime();
    private int width;

    ProgressLine(PrintStream err) {
        this.err = err;
    }

    @Override
    public synchronized void report(String step, long done, long total) {
        long now = System.nanoTime();
        if (now - last < INTERVAL_NANOS) {
            return;
        }
        last = now;
        String text = step + (total > 0 ? String.format(Locale.ROOT, " %,d of %,d", done, total)
                : done > 0 ? String.format(Locale.ROOT, " %,d", done) : "");
        err.print("\r" + text + " ".repeat(Math.max(0, width - text.length())));
        err.flush();
        width = text.length();
    }

    @Override
    public boolean isCancelled() {
        return false;
    }

    @Override
    public synchronized void close() {
        if (width > 0) {
            err.print("\r" + " ".repeat(width) + "\r");
            err.flush();
            width = 0;
        }
    }
}
