package coilbook.register.internal;

import java.io.IOException;
import java.sql.SQLException;
import java.util.List;

import org.h2.mvstore.MVStoreException;
import org.jooq.exception.DataAccessException;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/** Turns what the database library throws into words for a person. */
final class Failures {

    /** What systems say when a disk, a quota or a file's size limit is used up. */
    private static final List<String> FULL = List.of("No space left", "not enough space", "Disk quota", "File too large");
    private static final int IN_USE = 90020;
    private static final int WRONG_USER = 28000;
    private static final int MISSING = 90146;
    private static final int DAMAGED = 90030;

    private Failures() {
    }

    /** Work on the database. */
    interface Work<T> {
        T run() throws SQLException, CoilbookException;
    }

    /** Runs work and translates its failure.
     *
     * @param register its name, for the message
     */
    static <T> T translating(String register, Work<T> work) throws CoilbookException {
        try {
            return work.run();
        } catch (SQLException | DataAccessException | MVStoreException e) {
            throw translate(register, e);
        }
    }

    static CoilbookException translate(String register, Exception failure) {
        String words = words(register, failure);
        return new CoilbookException(Reason.REGISTER, words, failure);
    }

    private static String words(String register, Exception failure) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            String message = String.valueOf(cause.getMessage());
            if (cause instanceof IOException && FULL.stream().anyMatch(message::contains)) {
                return "The disk is full. The register " + register + " holds what was recorded before; nothing of this step was kept.";
            } else if (cause instanceof SQLException sql && sql.getErrorCode() == IN_USE) {
                return register + " is in use.";
            } else if (cause instanceof SQLException sql && sql.getErrorCode() == WRONG_USER) {
                return register + " is a database of another program.";
            } else if (cause instanceof SQLException sql && sql.getErrorCode() == MISSING) {
                return "There is no register " + register + ".";
            } else if (cause instanceof SQLException sql && sql.getErrorCode() == DAMAGED) {
                return register + " is damaged. Restore it from a backup copy.";
            } else if (cause instanceof MVStoreException) {
                return register + " can no longer be read or written: the file is damaged, the disk is full or was removed.";
            }
        }
        return register + " can no longer be read or written.";
    }
}
