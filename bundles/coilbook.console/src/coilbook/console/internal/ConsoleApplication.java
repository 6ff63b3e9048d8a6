package coilbook.console.internal;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.osgi.framework.FrameworkUtil;

/** The command line as an application of the runtime: takes the arguments, returns the exit code. */
public final class ConsoleApplication implements IApplication {

    @Override
    public Object start(IApplicationContext context) {
        System.out.println("Coilbook " + FrameworkUtil.getBundle(ConsoleApplication.class).getVersion());
        return 0;
    }

    @Override
    public void stop() {
        // Nothing runs beyond start().
    }
}
