package coilbook.register;

import java.nio.file.Path;

import coilbook.fleet.CoilbookException;

/** Opens registers; a declarative service. */
public interface Registers {

    /**
     * Opens the register at a base path ({@code R} for {@code R.mv.db}). Before a file is connected to, its schema is read without executing it.
     *
     * @throws CoilbookException with reason REGISTER: missing, in use (saying by whom), damaged, foreign, newer than this version, a folder that may not
     *         be written; with reason BAD_INPUT for {@link OpenMode#CREATE_NEW} on an existing one
     */
    Register open(Path base, OpenMode mode) throws CoilbookException;

    /** A register that lives in memory and is gone when closed. */
    Register temporary() throws CoilbookException;
}
