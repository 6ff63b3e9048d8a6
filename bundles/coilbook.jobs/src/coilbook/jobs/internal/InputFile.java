package coilbook.jobs.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

import coilbook.fleet.CoilbookException;

/** Small input files, read whole, with words for what can be wrong with them. */
public final class InputFile {

    private InputFile() {
    }

    /**
     * The bytes of a file.
     *
     * @throws CoilbookException with reason BAD_INPUT if it is missing, a folder, empty, too large or may not be read
     */
    public static byte[] bytes(Path file, long most) throws CoilbookException {
        if (!Files.exists(file)) {
            throw bad(file + ": there is no such file.");
        } else if (Files.isDirectory(file)) {
            throw bad(file + ": this is a folder; expected a file.");
        }
        try {
            long size = Files.size(file);
            if (size == 0) {
                throw bad(file + ": the file is empty.");
            } else if (size > most) {
                throw bad(file + ": the file has " + size + " bytes; expected at most " + most + ".");
            }
            return Files.readAllBytes(file);
        } catch (IOException e) {
            throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, file + ": the file cannot be read.", e);
        }
    }

    private static CoilbookException bad(String message) {
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, message);
    }
}
