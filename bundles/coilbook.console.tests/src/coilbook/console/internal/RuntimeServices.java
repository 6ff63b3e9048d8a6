package coilbook.console.internal;

import java.util.function.Supplier;

import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;

import coilbook.jobs.Audit;
import coilbook.jobs.BringIn;
import coilbook.jobs.CaseFiles;
import coilbook.jobs.Check;
import coilbook.jobs.Demo;
import coilbook.register.Registers;

/** The services as the runtime wires them: what the tests prove is what people start. */
final class RuntimeServices {

    private RuntimeServices() {
    }

    static Services services() {
        return new Services(service(Registers.class), service(BringIn.class), service(Check.class), service(Audit.class),
                service(Demo.class),
                service(CaseFiles.class));
    }

    private static <S> Supplier<S> service(Class<S> type) {
        return () -> {
            BundleContext bundles = FrameworkUtil.getBundle(RuntimeServices.class).getBundleContext();
            ServiceReference<S> reference = bundles.getServiceReference(type);
            if (reference == null) {
                throw new IllegalStateException("the runtime wires no " + type.getName());
            }
            return bundles.getService(reference);
        };
    }
}
