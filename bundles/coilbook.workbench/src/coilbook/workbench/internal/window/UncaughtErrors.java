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
    private final Texts texts = Texts.of(UncaughtErrors.class);
    private final AtomicBoolean showing = new AtomicBoolean();

    private UncaughtErrors(Display display) {
        this.display = display;
    }

    /** Catches what the window's own thread lets through. */
    public static UncaughtErrors install(Display display) {
        UncaughtErrors errors = new UncaughtErrors(display);
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
                    MessageDialog.openError(display.getActiveShell(), texts.get("error.title"), texts.get("error.text", id));
                } finally {
                    showing.set(false);
                }
            });
        }
    }
}
