package coilbook.fleet;

import java.util.List;

/**
 * Something that a person must be told in plain words: the message is complete and names no class. The reason decides the command line's exit code.
 */
public class CoilbookException extends Exception {

    private static final long serialVersionUID = 1L;

    /** Why the work could not be done. */
    public enum Reason {
        /** The command's words are off (exit 2). */
        USAGE,
        /** An input file or value cannot be taken (exit 3). */
        BAD_INPUT,
        /** The register cannot be opened: missing, in use, damaged, foreign, newer (exit 4). */
        REGISTER,
        /** The person cancelled. */
        CANCELLED
    }

    private final Reason reason;
    private final transient List<InputProblem> problems;

    public CoilbookException(Reason reason, String message) {
        this(reason, message, List.of(), null);
    }

    public CoilbookException(Reason reason, String message, Throwable cause) {
        this(reason, message, List.of(), cause);
    }

    public CoilbookException(Reason reason, String message, List<InputProblem> problems, Throwable cause) {
        super(message, cause);
        this.reason = reason;
        this.problems = List.copyOf(problems);
    }

    public Reason reason() {
        return reason;
    }

    /** The values that could not be taken; may be empty. */
    public List<InputProblem> problems() {
        return problems == null ? List.of() : problems;
    }
}
