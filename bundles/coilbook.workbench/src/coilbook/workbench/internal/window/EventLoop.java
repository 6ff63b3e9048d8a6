package coilbook.workbench.internal.window;

import java.util.function.Consumer;

import org.eclipse.e4.ui.internal.workbench.swt.IEventLoopAdvisor;
import org.eclipse.swt.widgets.Display;

/**
 * Takes what the window's event loop catches. The platform's own advisor shows class names under "Internal Error"; it can only be replaced through this
 * interface, which is not part of its API (see releng/decisions).
 */
@SuppressWarnings("restriction")
public final class EventLoop implements IEventLoopAdvisor {

    private final Consumer<Throwable> uncaught;

    public EventLoop(Consumer<Throwable> uncaught) {
        this.uncaught = uncaught;
    }

    @Override
    public void eventLoopIdle(Display display) {
        display.sleep();
    }

    @Override
    public void eventLoopException(Throwable exception) {
        uncaught.accept(exception);
    }
}
