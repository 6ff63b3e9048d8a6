package coilbook.workbench.tests.support;

import java.util.Dictionary;
import java.util.Hashtable;
import java.util.Map;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import java.util.function.Supplier;

import org.eclipse.core.runtime.Platform;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.e4.core.contexts.IEclipseContext;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.MenuItem;
import org.eclipse.swt.widgets.Shell;
import org.osgi.framework.Bundle;
import org.osgi.framework.Constants;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceRegistration;

import coilbook.workbench.internal.model.Fleets;
import coilbook.workbench.internal.window.JobBackground;

/** Runs the whole application on the main thread while a second thread plays the user. */
public final class WindowRun {

    /** What the user does. */
    @FunctionalInterface
    public interface User {
        void play(WindowRun window) throws Exception;
    }

    private static final long PATIENCE_MS = 180_000;

    private final Display display;

    private WindowRun(Display display) {
        this.display = display;
    }

    /** @param fleets shown instead of the real registers; {@code null} for those */
    public static void run(Fleets fleets, User user) throws Exception {
        Display display = Display.getDefault(); // made here: the first thread to ask for it owns it
        ServiceRegistration<Fleets> service = null;
        if (fleets != null) {
            Dictionary<String, Object> first = new Hashtable<>(Map.of(Constants.SERVICE_RANKING, Integer.MAX_VALUE));
            service = FrameworkUtil.getBundle(WindowRun.class).getBundleContext().registerService(Fleets.class, fleets, first);
        }
        AtomicReference<Throwable> failed = new AtomicReference<>();
        WindowRun window = new WindowRun(display);
        Thread player = new Thread(() -> {
            try {
                user.play(window);
            } catch (Throwable t) {
                failed.set(t);
            } finally {
                window.quit();
            }
        }, "user");
        player.start();
        IApplication application = (IApplication) Platform.getBundle("org.eclipse.e4.ui.workbench.swt")
                .loadClass("org.eclipse.e4.ui.internal.workbench.swt.E4Application").getConstructor().newInstance();
        application.start(new Context());
        player.join(PATIENCE_MS);
        if (service != null) {
            service.unregister();
        }
        if (failed.get() != null) {
            throw new AssertionError(failed.get().getMessage(), failed.get());
        }
    }

    private void quit() {
        if (!display.isDisposed()) {
            display.asyncExec(() -> {
                for (Shell shell : display.getShells()) {
                    if (!shell.isDisposed()) {
                        shell.close();
                    }
                }
            });
        }
    }

    public Display display() {
        return display;
    }

    /** A value read on the window's thread. */
    public <T> T get(Supplier<T> what) {
        AtomicReference<T> out = new AtomicReference<>();
        AtomicReference<RuntimeException> failed = new AtomicReference<>();
        display.syncExec(() -> {
            try {
                out.set(what.get());
            } catch (RuntimeException e) {
                failed.set(e);
            }
        });
        if (failed.get() != null) {
            throw failed.get();
        }
        return out.get();
    }

    public void run(Runnable what) {
        get(() -> {
            what.run();
            return null;
        });
    }

    /** Waits until something holds, and says what was there instead if it never does. */
    public void await(String what, BooleanSupplier holds, Supplier<Object> instead) throws InterruptedException {
        long end = System.currentTimeMillis() + PATIENCE_MS;
        while (!get(holds::getAsBoolean)) {
            if (System.currentTimeMillis() > end) {
                throw new AssertionError("waited in vain until " + what + "; there was: " + get(instead));
            }
            Thread.sleep(20);
        }
    }

    /** Waits until no work is under way and what it told the window is done. */
    public void idle() throws InterruptedException {
        for (int i = 0; i < 3; i++) {
            await("the work is done", () -> Job.getJobManager().find(JobBackground.class).length == 0);
            run(() -> {
                // whatever the work told the window is done before this
            });
        }
    }

    public void await(String what, BooleanSupplier holds) throws InterruptedException {
        await(what, holds, () -> "nothing to say");
    }

    /** The window; waits until it is there. */
    public Shell shell() throws InterruptedException {
        await("the window is there", () -> main() != null);
        return get(this::main);
    }

    private Shell main() {
        for (Shell shell : display.getShells()) {
            if (shell.getData("modelElement") instanceof MWindow && shell.isVisible()) {
                return shell;
            }
        }
        return null;
    }

    /** The window's context, in which the parts' shared objects are. */
    public IEclipseContext context() throws InterruptedException {
        Shell shell = shell();
        return get(() -> ((MWindow) shell.getData("modelElement")).getContext());
    }

    public <T> T service(Class<T> type) throws InterruptedException {
        IEclipseContext context = context();
        return get(() -> context.get(type));
    }

    public NatTable grid() throws InterruptedException {
        Shell shell = shell();
        await("the grid is there", () -> find(shell, NatTable.class) != null);
        return get(() -> find(shell, NatTable.class));
    }

    /** The first control of a kind below another. */
    public static <C extends Control> C find(Composite parent, Class<C> kind) {
        for (Control child : parent.getChildren()) {
            if (kind.isInstance(child)) {
                return kind.cast(child);
            }
            C below = child instanceof Composite composite ? find(composite, kind) : null;
            if (below != null) {
                return below;
            }
        }
        return null;
    }

    /** Every control of a kind below another. */
    public static <C extends Control> void each(Composite parent, Class<C> kind, java.util.function.Consumer<C> what) {
        for (Control child : parent.getChildren()) {
            if (kind.isInstance(child)) {
                what.accept(kind.cast(child));
            }
            if (child instanceof Composite composite) {
                each(composite, kind, what);
            }
        }
    }

    /** Chooses an item of the menu bar by the words it begins with. */
    public void choose(String menu, String item) throws InterruptedException {
        Shell shell = shell();
        run(() -> {
            Menu opened = named(shell.getMenuBar(), menu).getMenu();
            opened.notifyListeners(SWT.Show, new Event());
            MenuItem chosen = named(opened, item);
            if (!chosen.isEnabled()) {
                throw new IllegalStateException(item + " cannot be chosen now");
            }
            chosen.notifyListeners(SWT.Selection, new Event());
            opened.notifyListeners(SWT.Hide, new Event());
        });
    }

    public static MenuItem named(Menu menu, String words) {
        StringBuilder there = new StringBuilder();
        for (MenuItem item : menu.getItems()) {
            String text = item.getText().replace("&", "");
            if (text.startsWith(words)) {
                return item;
            }
            there.append(text).append("; ");
        }
        throw new IllegalStateException("no menu item \"" + words + "\" among " + there);
    }

    private static final class Context implements IApplicationContext {
        private static final Map<String, String> PRODUCT = Map.of("appName", "Coilbook", "applicationXMI",
                "coilbook.workbench/Application.e4xmi", "lifeCycleURI",
                "bundleclass://coilbook.workbench/coilbook.workbench.internal.LifeCycle", "cssTheme", "coilbook.theme.light",
                "clearPersistedState", "true", "persistState", "false");

        @Override
        public Map<?, ?> getArguments() {
            return Map.of(APPLICATION_ARGS, new String[0]);
        }

        @Override
        public void applicationRunning() {
            // nobody waits for it
        }

        @Override
        public String getBrandingApplication() {
            return "org.eclipse.e4.ui.workbench.swt.E4Application";
        }

        @Override
        public String getBrandingName() {
            return "Coilbook";
        }

        @Override
        public String getBrandingDescription() {
            return "";
        }

        @Override
        public String getBrandingId() {
            return "coilbook.workbench.product";
        }

        @Override
        public String getBrandingProperty(String key) {
            return PRODUCT.get(key);
        }

        @Override
        public Bundle getBrandingBundle() {
            return Platform.getBundle("coilbook.workbench");
        }

        @Override
        public void setResult(Object result, IApplication application) {
            // the exit code is not looked at
        }
    }
}
