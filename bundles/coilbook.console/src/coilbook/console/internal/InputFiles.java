package coilbook.console.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.CoilbookException;
import coilbook.jobs.BringIn;

/** The files a command was given; standard input is kept in a temporary file for as long as this is open. */
public final class InputFiles implements AutoCloseable {

    private static final String DASH = "-";

    private final List<Path> paths = new ArrayList<>();
    private Path folder;

    public InputFiles(Terminal terminal, List<Path> given) throws CoilbookException {
        for (Path path : given) {
            paths.add(path.toString().equals(DASH) ? standardInput(terminal) : terminal.resolve(path));
        }
    }

    private Path standardInput(Terminal terminal) throws CoilbookException {
        if (folder != null) {
            throw new CoilbookException(CoilbookException.Reason.USAGE, "Standard input (-) can be read once only.");
        }
        try {
            byte[] bytes = terminal.in().readAllBytes();
            boolean zip = bytes.length > 1 && bytes[0] == 'P' && bytes[1] == 'K';
            folder = Files.createTempDirectory("coilbook-input");
            return Files.write(folder.resolve(zip ? "standard input.xlsx" : "standard input.csv"), bytes);
        } catch (IOException e) {
            close();
            throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, "Standard input cannot be read.", e);
        }
    }

    public List<Path> paths() {
        return paths;
    }

    /** The names without folders. */
    public String names() {
        return BringIn.names(paths);
    }

    @Override
    public void close() {
        if (folder != null) {
            for (Path path : paths) {
                if (path.startsWith(folder)) {
                    delete(path);
                }
            }
            delete(folder);
        }
    }

    private static void delete(Path path) {
        try {
            Files.deleteIfExists(path);
        } catch (IOException e) {
            path.toFile().deleteOnExit();
        }
    }
}
