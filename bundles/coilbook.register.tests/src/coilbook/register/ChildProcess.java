package coilbook.register;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

import coilbook.criteria.Finding;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Row;
import coilbook.register.internal.H2Registers;

/** Runs a main class of these tests in a Java process of its own, with the classes of this one, be they in jars, folders or bundles. */
final class ChildProcess {

    private final Process process;
    private final BufferedReader output;

    private ChildProcess(Process process) {
        this.process = process;
        this.output = new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8));
    }

    /** Starts a main class. */
    static ChildProcess start(Class<?> main, String... arguments) throws Exception {
        return start(List.of(), main, arguments);
    }

    /**
     * @param before what stands before the command, for example another user's
     */
    static ChildProcess start(List<String> before, Class<?> main, String... arguments) throws Exception {
        Set<String> places = new LinkedHashSet<>();
        for (Class<?> type : new Class<?>[] { main, H2Registers.class, Finding.class, StationElectrics.class, Row.class,
                org.h2.jdbcx.JdbcConnectionPool.class,
                org.jooq.DSLContext.class,
                Class.forName("org.reactivestreams.Publisher", false, org.jooq.DSLContext.class.getClassLoader()),
                Class.forName("io.r2dbc.spi.R2dbcException", false, org.jooq.DSLContext.class.getClassLoader()) }) {
            places.add(place(type));
        }
        List<String> command = new ArrayList<>(before);
        command.addAll(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-Xmx400m", "-XX:TieredStopAtLevel=1", "-cp",
                        String.join(java.io.File.pathSeparator, places), main.getName()));
        command.addAll(List.of(arguments));
        return new ChildProcess(new ProcessBuilder(command).redirectErrorStream(true).start());
    }

    /** Where a class was loaded from; a bundle that is a folder keeps its classes below it. */
    private static String place(Class<?> type) throws Exception {
        String location = type.getProtectionDomain().getCodeSource().getLocation().toString();
        Path path = Path.of(URI.create(location.startsWith("reference:") ? location.substring("reference:".length()) : location));
        String name = type.getName().replace('.', '/') + ".class";
        for (String below : List.of("", "target/classes", "bin")) {
            if (java.nio.file.Files.exists(path.resolve(below).resolve(name))) {
                return path.resolve(below).toString();
            }
        }
        return path.toString();
    }

    /** The next line it prints, or {@code null} once it has ended. */
    String line() throws IOException {
        return output.readLine();
    }

    /** Everything it prints until it ends. */
    String rest() throws IOException, InterruptedException {
        StringBuilder text = new StringBuilder();
        for (String line = line(); line != null; line = line()) {
            text.append(line).append('\n');
        }
        process.waitFor();
        return text.toString();
    }

    /** Ends it at once and without warning; what it printed before can still be read. */
    void kill() throws InterruptedException {
        process.toHandle().destroyForcibly();
        process.waitFor();
    }

    boolean isAlive() {
        return process.isAlive();
    }
}
