package coilbook.workbench.internal.window;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Properties;
import java.util.logging.Level;
import java.util.logging.Logger;

/**
 * What the window remembers from one start to the next: where it stood, how it was divided, its look. In a file of its own, because the platform's saved
 * model brings back parts and commands of an older version. Losing it costs a person a resize: no error here stops anything.
 */
public final class WindowState {

    private static final Logger LOG = Logger.getLogger(WindowState.class.getName());

    private final Path file;
    private final Properties values = new Properties();

    /** @param file {@code null} to remember nothing */
    public WindowState(Path file) {
        this.file = file;
        if (file != null && Files.isRegularFile(file)) {
            try (Reader in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
                values.load(in);
            } catch (IOException | IllegalArgumentException e) {
                LOG.log(Level.INFO, "The window starts afresh: " + file + " cannot be read", e);
                values.clear();
            }
        }
    }

    /** A remembered number, or the given one. */
    public int number(String key, int otherwise) {
        try {
            return Integer.parseInt(values.getProperty(key, Integer.toString(otherwise)).strip());
        } catch (NumberFormatException e) {
            return otherwise;
        }
    }

    /** A remembered word, or the given one. */
    public String word(String key, String otherwise) {
        return values.getProperty(key, otherwise);
    }

    /** Remembers. */
    public void put(String key, Object value) {
        values.setProperty(key, String.valueOf(value));
    }

    /** Writes the file. */
    public void save() {
        if (file == null) {
            return;
        }
        Path fresh = Path.of(file + ".new");
        try {
            Path folder = file.toAbsolutePath().getParent();
            if (folder != null) {
                Files.createDirectories(folder);
            }
            try (Writer out = Files.newBufferedWriter(fresh, StandardCharsets.UTF_8)) {
                values.store(out, null);
            }
            Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            LOG.log(Level.INFO, "The window's place is not remembered: " + file + " cannot be written", e);
        }
    }
}
