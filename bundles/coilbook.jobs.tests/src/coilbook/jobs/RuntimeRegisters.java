package coilbook.jobs;

import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;

import coilbook.register.Registers;

/** The registers as the runtime wires them. */
final class RuntimeRegisters {

    private RuntimeRegisters() {
    }

    static Registers get() {
        BundleContext bundles = FrameworkUtil.getBundle(RuntimeRegisters.class).getBundleContext();
        ServiceReference<Registers> reference = bundles.getServiceReference(Registers.class);
        if (reference == null) {
            throw new IllegalStateException("the runtime wires no registers");
        }
        return bundles.getService(reference);
    }
}
