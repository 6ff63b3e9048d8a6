package coilbook.console.internal;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.function.Supplier;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.Version;

import coilbook.jobs.Audit;
import coilbook.jobs.BringIn;
import coilbook.jobs.CaseFiles;
import coilbook.jobs.Check;
import coilbook.jobs.Demo;
import coilbook.jobs.RegisterPlace;
import coilbook.register.Registers;

/** The command line as an application of the runtime: takes the arguments, returns the exit code. */
public final class ConsoleApplication implements IApplication {

    @Override
    public Object start(IApplicationContext context) {
        System.setProperty("java.awt.headless", "true");
        BundleContext bundles = FrameworkUtil.getBundle(ConsoleApplication.class).getBundleContext();
        PrintStream out = new PrintStream(new BufferedOutputStream(new FileOutputStream(FileDescriptor.out), 1 << 16), false,
                StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        boolean watched = System.console() != null || "1".equals(System.getenv("COILBOOK_STDERR_TTY"));
        Terminal terminal = new Terminal(System.in, out, err, watched, user(), RegisterPlace.ofThisProcess(),
                Path.of(System.getProperty("user.dir")));
        Console console = new Console(services(bundles), terminal, version(bundles.getBundle().getVersion()));
        String[] arguments = (String[]) context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
        try {
            return console.run(arguments);
        } catch (RuntimeException | Error e) {
            return console.unexpected(e);
        }
    }

    private static Services services(BundleContext bundles) {
        return new Services(service(bundles, Registers.class), service(bundles, BringIn.class), service(bundles, Check.class),
                service(bundles, Audit.class), service(bundles, Demo.class), service(bundles, CaseFiles.class));
    }

    private static <S> Supplier<S> service(BundleContext bundles, Class<S> type) {
        return () -> {
            ServiceReference<S> reference = bundles.getServiceReference(type);
            S service = reference == null ? null : bundles.getService(reference);
            if (service == null) {
                throw new IllegalStateException("the runtime has no " + type.getName());
            }
            return service;
        };
    }

    private static String user() {
        String name = System.getProperty("user.name");
        return name == null || name.isBlank() || "?".equals(name) ? "unknown" : name;
    }

    private static String version(Version version) {
        return version.getMajor() + "." + version.getMinor() + "." + version.getMicro();
    }

    @Override
    public void stop() {
        // Nothing runs beyond start().
    }
}
