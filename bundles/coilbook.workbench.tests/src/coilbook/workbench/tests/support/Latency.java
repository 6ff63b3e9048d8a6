package coilbook.workbench.tests.support;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

import org.eclipse.swt.widgets.Display;

/**
 * Watches how long the window's thread keeps an event waiting. What that thread spent ready to run while the machine ran others is taken off, as the
 * kernel counts it: a busy machine must not look like a slow window, nor the other way round.
 */
public final class Latency implements AutoCloseable {

    private static final long PAUSE_MS = 5;

    private final Display display;
    private final Thread window;
    private final Thread watcher;
    private final Path statistics;
    private volatile boolean ended;
    private volatile long worst;
    private volatile long probes;
    private volatile String worstStack = "";

    public Latency(Display display) {
        this.display = display;
        this.window = display.getThread();
        Path[] own = new Path[1];
        display.syncExec(() -> own[0] = ofThisThread());
        statistics = own[0];
        watcher = new Thread(this::watch, "latency watcher");
        watcher.setDaemon(true);
        watcher.setPriority(Thread.MAX_PRIORITY);
        watcher.start();
    }

    private static Path ofThisThread() {
        try {
            return Path.of("/proc").resolve(Files.readSymbolicLink(Path.of("/proc/thread-self"))).resolve("schedstat");
        } catch (IOException | UnsupportedOperationException e) {
            return null;
        }
    }

    private void watch() {
        while (!ended && !display.isDisposed()) {
            try {
                probe();
                Thread.sleep(PAUSE_MS);
            } catch (InterruptedException e) {
                return;
            } catch (org.eclipse.swt.SWTException e) {
                return; // the display went between the question and the call
            }
        }
    }

    /** Nanoseconds for which the window's thread was ready and not let run, so far; 0 where the kernel does not tell. */
    private long starved() {
        try {
            return statistics == null ? 0 : Long.parseLong(Files.readString(statistics).split(" ")[1]);
        } catch (IOException e) {
            return 0;
        }
    }

    private void probe() throws InterruptedException {
        CountDownLatch served = new CountDownLatch(1);
        long before = starved();
        long start = System.nanoTime();
        String stack = "";
        display.asyncExec(served::countDown);
        while (!ended) {
            if (served.await(PAUSE_MS, TimeUnit.MILLISECONDS)) {
                break;
            }
            if (stack.isEmpty() && System.nanoTime() - start > 120_000_000L) {
                StringBuilder text = new StringBuilder();
                for (StackTraceElement element : window.getStackTrace()) {
                    text.append("\n    ").append(element);
                }
                stack = text.toString();
            }
        }
        long waited = (System.nanoTime() - start - (starved() - before)) / 1_000_000;
        probes++;
        if (waited > worst) {
            worst = waited;
            worstStack = stack;
        }
    }

    /** The longest wait so far, in ms. */
    public long worst() {
        return worst;
    }

    public long probes() {
        return probes;
    }

    /** What the window's thread was doing in the longest wait, if that was long. */
    public String stack() {
        return worstStack;
    }

    @Override
    public void close() {
        ended = true;
        watcher.interrupt();
    }
}
