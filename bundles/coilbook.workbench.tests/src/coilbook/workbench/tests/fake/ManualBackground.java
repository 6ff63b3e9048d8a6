package coilbook.workbench.tests.fake;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.workbench.internal.model.Background;

/** Background work that happens when the test says so, on the test's own thread. */
public final class ManualBackground implements Background {

    private final Deque<Runnable> waiting = new ArrayDeque<>();

    @Override
    public <T> Handle start(String name, Lane lane, Task<T> task, Consumer<T> done, Consumer<CoilbookException> failed) {
        boolean[] unwanted = new boolean[1];
        waiting.add(() -> {
            try {
                T result = task.run(Progress.NONE);
                if (!unwanted[0]) {
                    done.accept(result);
                }
            } catch (CoilbookException e) {
                if (!unwanted[0]) {
                    failed.accept(e);
                }
            }
        });
        return () -> unwanted[0] = true;
    }

    /** Does what waits, and what that starts in turn. */
    public void runAll() {
        for (int i = 0; i < 10_000 && !waiting.isEmpty(); i++) {
            waiting.poll().run();
        }
        if (!waiting.isEmpty()) {
            throw new AssertionError("work begets work without end");
        }
    }

    /** Does one piece of what waits. */
    public void runOne() {
        waiting.poll().run();
    }

    public int waiting() {
        return waiting.size();
    }
}
