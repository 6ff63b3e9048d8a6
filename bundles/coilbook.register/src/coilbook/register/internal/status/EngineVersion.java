package coilbook.register.internal.status;

import java.io.IOException;
import java.io.InputStream;
import java.util.jar.Attributes;
import java.util.jar.Manifest;

/** The version of the bundle a class comes from, as its manifest says. */
final class EngineVersion {

    private EngineVersion() {
    }

    /** {@code bundle version}, or {@code bundle without a version} where classes are run outside their bundle. */
    static String of(Class<?> type, String bundle) {
        try (InputStream in = type.getResourceAsStream("/META-INF/MANIFEST.MF")) {
            Attributes main = in == null ? new Attributes() : new Manifest(in).getMainAttributes();
            String name = main.getValue("Bundle-SymbolicName");
            return name != null && name.startsWith(bundle) ? bundle + " " + main.getValue("Bundle-Version") : bundle + " without a version";
        } catch (IOException e) {
            return bundle + " without a version";
        }
    }
}
