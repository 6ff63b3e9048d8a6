package coilbook.workbench.internal.model;

import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;

/**
 * Work away from the thread that draws the window. What comes of it is told on that thread again, so that presenters need no locks.
 */
public interface Background {

    /** What is to be done, on another thread. */
    @FunctionalInterface
    interface Task<T> {
        T run(Progress progress) throws CoilbookException;
    }

    /** Work that was started. */
    @FunctionalInterface
    interface Handle {
        /** Says that its result is no longer wanted: neither done nor failed will be called. */
        void cancel();
    }

    /** How work waits for other work. */
    enum Lane {
        /** Beside everything else, quick and unseen. */
        READ,
        /** One after the other, in the order in which they were started. */
        WRITE,
        /** As WRITE, long enough to be shown in the status line with a way to cancel it. */
        LONG
    }

    /**
     * Starts work.
     *
     * @param name in words, for the status line
     * @param done takes the result; on the window's thread
     * @param failed takes what went wrong in the words for the person; on the window's thread; also when the person cancels
     */
    <T> Handle start(String name, Lane lane, Task<T> task, Consumer<T> done, Consumer<CoilbookException> failed);
}
