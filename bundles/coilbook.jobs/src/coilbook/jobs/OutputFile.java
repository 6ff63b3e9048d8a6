package coilbook.jobs;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

import coilbook.fleet.CoilbookException;

/** An output file that appears whole or not at all: written beside its place under another name, then moved there. */
public final class OutputFile {

    private OutputFile() {
    }

    /**
     * Refuses a place where no file can be written, before long work is done for it.
     *
     * @throws CoilbookException with reason BAD_INPUT: a folder, or a folder that is missing or may not be written
     */
    public static void check(Path file) throws CoilbookException {
        Path folder = file.toAbsolutePath().getParent();
        if (Files.isDirectory(file)) {
            throw bad(file + ": this is a folder; expected the name of a file to write.", null);
        } else if (folder == null || !Files.isDirectory(folder)) {
            throw bad(file + ": the folder " + folder + " does not exist.", null);
        } else if (!Files.isWritable(folder)) {
            throw bad(file + ": the folder " + folder + " may not be written by you.", null);
        }
    }

    /** Writes the file whole.
     *
     * @throws CoilbookException with reason BAD_INPUT if it cannot be written; then nothing is left behind
     */
    public static void write(Path file, byte[] bytes) throws CoilbookException {
        check(file);
        Path whole = file.toAbsolutePath();
        Path part = whole.resolveSibling("." + whole.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.write(part, bytes);
            try {
                Files.move(part, whole, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } catch (AtomicMoveNotSupportedException e) {
                Files.move(part, whole, StandardCopyOption.REPLACE_EXISTING);
            }
        } catch (IOException e) {
            discard(part);
            throw bad(file + ": the file cannot be written; is the disk full, or is it open elsewhere?", e);
        }
    }

    private static void discard(Path part) {
        try {
            Files.deleteIfExists(part);
        } catch (IOException e) {
            // the part that cannot be taken away harms nobody; what matters is the message that follows
        }
    }

    private static CoilbookException bad(String message, Throwable cause) {
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, message, cause);
    }
}
