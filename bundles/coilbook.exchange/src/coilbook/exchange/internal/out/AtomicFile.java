package coilbook.exchange.internal.out;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/** Makes a file appear whole or not at all: it is written beside its place under another name and moved there when it is complete. */
final class AtomicFile {

    private static final int TRIES = 1000;

    /** What fills the file. */
    interface Filler {
        void fill(Path temporary) throws IOException, CoilbookException;
    }

    private AtomicFile() {
    }

    /**
     * Fills and moves.
     *
     * @throws CoilbookException with reason BAD_INPUT if the place cannot be written
     */
    static void write(Path out, Filler filler) throws CoilbookException {
        Path target = out.toAbsolutePath().normalize();
        if (Files.isDirectory(target)) {
            throw new CoilbookException(Reason.BAD_INPUT, out + " is a folder; name a file to write.");
        }
        Path temporary = null;
        try {
            Path folder = target.getParent();
            Files.createDirectories(folder);
            temporary = beside(folder, target.getFileName().toString());
            filler.fill(temporary);
            move(temporary, target);
            temporary = null;
        } catch (IOException e) {
            throw new CoilbookException(Reason.BAD_INPUT, out + " cannot be written: " + words(e), e);
        } finally {
            remove(temporary);
        }
    }

    /** Not {@link Files#createTempFile}, which would leave the finished file readable by its owner alone. */
    private static Path beside(Path folder, String name) throws IOException {
        for (int i = 0; i < TRIES; i++) {
            try {
                return Files.createFile(folder.resolve("." + name + "." + i + ".part"));
            } catch (FileAlreadyExistsException e) {
                // somebody else is writing, or left one behind: the next number
            }
        }
        throw new IOException("too many unfinished files beside it");
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void remove(Path temporary) {
        if (temporary != null) {
            try {
                Files.deleteIfExists(temporary);
            } catch (IOException e) {
                temporary.toFile().deleteOnExit();
            }
        }
    }

    private static String words(IOException e) {
        if (e instanceof java.nio.file.AccessDeniedException) {
            return "the folder or the file may not be written.";
        } else if (e instanceof java.nio.file.NoSuchFileException || e instanceof FileAlreadyExistsException
                || e instanceof java.nio.file.NotDirectoryException) {
            return "its folder does not exist and cannot be made.";
        } else if (e instanceof java.nio.file.FileSystemException system && system.getReason() != null) {
            return system.getReason() + ".";
        }
        return e.getMessage() == null ? "the disk refused it." : e.getMessage() + ".";
    }
}
