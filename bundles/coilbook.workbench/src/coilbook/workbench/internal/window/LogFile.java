package coilbook.workbench.internal.window;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.logging.FileHandler;
import java.util.logging.Handler;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.logging.SimpleFormatter;

/** Where the window writes what went wrong: a file beside the person's own data, of a megabyte at most and one older. */
public final class LogFile {

    private static final int MOST_BYTES = 1_000_000;
    private static final int FILES = 2;

    private final Logger logger = Logger.getLogger("coilbook");
    private final Path file;
    private final Handler handler;

    /** Begins to write; where that cannot be, the window goes on without. */
    public LogFile(Path folder) {
        Path wanted = folder.resolve("workbench.log");
        Handler opened = null;
        try {
            Files.createDirectories(folder);
            opened = new FileHandler(wanted.toString().replace("%", "%%") + ".%g", MOST_BYTES, FILES, true);
            opened.setFormatter(new SimpleFormatter());
            opened.setLevel(Level.WARNING);
            logger.addHandler(opened);
            logger.setLevel(Level.WARNING);
        } catch (IOException e) {
            logger.log(Level.INFO, "No log is kept in " + folder, e);
        }
        handler = opened;
        file = Path.of(wanted + ".0");
    }

    /** Where it is written, in words for the person. */
    public String place() {
        return handler == null ? "" : file.toString();
    }

    /** Ends writing. */
    public void close() {
        if (handler != null) {
            logger.removeHandler(handler);
            handler.close();
        }
    }
}
