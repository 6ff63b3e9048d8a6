package coilbook.register.internal.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/** The missing folders above a new register; they are removed again unless the register comes to be. */
public final class Folders implements AutoCloseable {

    private final Deque<Path> made = new ArrayDeque<>();
    private boolean kept;

    private Folders() {
    }

    /** Makes a folder and those above it. */
    public static Folders make(Path folder) throws CoilbookException {
        Folders folders = new Folders();
        Deque<Path> missing = new ArrayDeque<>();
        for (Path each = folder; each != null && !Files.exists(each); each = each.getParent()) {
            missing.push(each);
        }
        try {
            for (Path each : missing) {
                Files.createDirectory(each);
                folders.made.push(each);
            }
            if (!Files.isDirectory(folder) || !Files.isWritable(folder)) {
                throw new IOException("not writable");
            }
            return folders;
        } catch (IOException e) {
            folders.close();
            throw new CoilbookException(Reason.REGISTER, "The register cannot be made: the folder " + folder + " may not be written.", e);
        }
    }

    /** The register came to be: the folders stay. */
    public void keep() {
        kept = true;
    }

    /** Whether a register's file and its folder may be written.
     *
     * @throws CoilbookException if not
     */
    public static void checkWritable(Path file) throws CoilbookException {
        if (Files.isDirectory(file)) {
            throw new CoilbookException(Reason.REGISTER, file + " is a folder and no register.");
        } else if (!Files.isReadable(file)) {
            throw new CoilbookException(Reason.REGISTER, file + " may not be read.");
        } else if (!Files.isWritable(file)) {
            throw new CoilbookException(Reason.REGISTER, file + " may not be written.");
        } else if (!Files.isWritable(file.getParent())) {
            throw new CoilbookException(Reason.REGISTER,
                    "The folder " + file.getParent() + " may not be written; a register needs it for its view.");
        }
    }

    @Override
    public void close() {
        while (!kept && !made.isEmpty()) {
            made.pop().toFile().delete();
        }
    }
}
