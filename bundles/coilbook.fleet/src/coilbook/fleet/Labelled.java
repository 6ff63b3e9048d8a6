package coilbook.fleet;

/** A term with a stable text: the same word is written to files, stored in the register and read back. */
public interface Labelled {

    /** The term as files and the register spell it, for example {@code two-level}; never empty, never translated. */
    String label();
}
