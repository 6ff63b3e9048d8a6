package coilbook.jobs;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where a person's own register and other data stand. */
public final class RegisterPlace {

    private final Map<String, String> environment;
    private final Path home;
    private final String system;

    /**
     * @param environment the process's variables
     * @param home the person's home folder
     * @param system the operating system's name as Java tells it
     */
    public RegisterPlace(Map<String, String> environment, Path home, String system) {
        this.environment = Map.copyOf(environment);
        this.home = home;
        this.system = system.toLowerCase(Locale.ROOT);
    }

    /** That of this process. */
    public static RegisterPlace ofThisProcess() {
        return new RegisterPlace(System.getenv(), Path.of(System.getProperty("user.home")), System.getProperty("os.name"));
    }

    /** The base path of the person's own register: {@code COILBOOK_REGISTER}, else {@code coilbook/fleet} in the data folder. */
    public Path ownRegister() {
        String said = environment.get("COILBOOK_REGISTER");
        return said == null || said.isBlank() ? dataFolder().resolve("fleet") : Path.of(said);
    }

    /** The program's folder among the person's data. */
    public Path dataFolder() {
        if (system.startsWith("windows")) {
            String roaming = environment.get("APPDATA");
            return (roaming == null || roaming.isBlank() ? home.resolve("AppData").resolve("Roaming") : Path.of(roaming))
                    .resolve("coilbook");
        } else if (system.startsWith("mac")) {
            return home.resolve("Library").resolve("Application Support").resolve("coilbook");
        }
        String data = environment.get("XDG_DATA_HOME");
        return (data == null || !data.startsWith("/") ? home.resolve(".local").resolve("share") : Path.of(data)).resolve("coilbook");
    }

    /** Whether a register stands at a base path. */
    public static boolean exists(Path base) {
        return Files.exists(base.resolveSibling(base.getFileName() + ".mv.db"));
    }
}
