package coilbook.workbench.internal;

import org.osgi.framework.Bundle;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;

/**
 * The grid library uses Eclipse Collections, which finds its factories with ServiceLoader: SPI Fly and the collections must run before the first class of
 * the grid does. They are started here and not by a start level, because then the command line would pay for them too (2 s and 250 MB). Hands out nothing.
 */
public final class Activator implements BundleActivator {

    private static final String[] BEFORE_THE_GRID = { "org.apache.aries.spifly.dynamic.bundle", "org.eclipse.collections.impl" };

    @Override
    public void start(BundleContext context) throws BundleException {
        for (String name : BEFORE_THE_GRID) {
            for (Bundle bundle : context.getBundles()) {
                if (name.equals(bundle.getSymbolicName())) {
                    bundle.start(Bundle.START_TRANSIENT);
                }
            }
        }
    }

    @Override
    public void stop(BundleContext context) {
        // what was started transiently ends with the framework
    }
}
