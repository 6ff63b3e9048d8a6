package coilbook.workbench.internal.window;

import java.util.Locale;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Consumer;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Display;

import coilbook.workbench.internal.text.Texts;

/** Whatever nobody caught: written to the log under a number, and shown once with that number in plain words. */
public final class UncaughtErrors implements Consumer<Throwable> {

    private static final Logger LOG = Logger.getLogger(UncaughtErrors.class.getName());
    private static final int HEX = 36;

    private final Display display;
    private final String log;
    private final Texts texts = Texts.of(UncaughtErrors.class);
    private final AtomicBoolean showing = new AtomicBoolean();

    private UncaughtErrors(Display display, String log) {
        this.display = display;
        this.log = log;
    }

    /**
     * Catches what the window's own thread lets through.
     *
     * @param log where the log is, in words; may be empty
     */
    public static UncaughtErrors install(Display display, String log) {
        UncaughtErrors errors = new UncaughtErrors(display, log);
        display.setRuntimeExceptionHandler(errors::accept);
        display.setErrorHandler(error -> {
            errors.accept(error);
            if (error instanceof ThreadDeath || error instanceof VirtualMachineError) {
                throw error;
            }
        });
        return errors;
    }

    @Override
    public void accept(Throwable error) {
        String id = Long.toString(System.currentTimeMillis(), HEX).toUpperCase(Locale.ROOT);
        LOG.log(Level.SEVERE, "Uncaught, number " + id, error);
        // A second error while the first is on the screen would stack windows faster than a person can close them.
        if (!display.isDisposed() && showing.compareAndSet(false, true)) {
            display.asyncExec(() -> {
                try {
                    MessageDialog.openError(display.getActiveShell(), texts.get("error.title"), texts.get("error.text", id, log));
                } finally {
                    showing.set(false);
                }
            });
        }
    }
}
