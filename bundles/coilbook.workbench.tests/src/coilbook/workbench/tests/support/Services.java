package coilbook.workbench.tests.support;

import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.util.tracker.ServiceTracker;

/** The runtime's services, for tests that prepare a register before the window opens. */
public final class Services {

    private static final long PATIENCE_MS = 30_000;

    private Services() {
    }

    /** A service; waits until it is there. */
    public static <T> T get(Class<T> type) throws InterruptedException {
        BundleContext context = FrameworkUtil.getBundle(Services.class).getBundleContext();
        ServiceTracker<T, T> tracker = new ServiceTracker<>(context, type, null);
        tracker.open();
        T service = tracker.waitForService(PATIENCE_MS);
        if (service == null) {
            throw new AssertionError("no service " + type.getName());
        }
        return service;
    }
}
