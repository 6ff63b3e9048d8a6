package coilbook.console.internal;

import coilbook.fleet.Progress;

/** The time during which a command works: its progress is wiped from the terminal when it ends, well or badly. */
public final class Work implements AutoCloseable {

    private final Progress progress;

    public Work(Terminal terminal) {
        this.progress = terminal.progress();
    }

    public Progress progress() {
        return progress;
    }

    @Override
    public void close() {
        if (progress instanceof ProgressLine line) {
            line.close();
        }
    }
}
