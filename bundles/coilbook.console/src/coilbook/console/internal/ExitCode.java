package coilbook.console.internal;

import coilbook.fleet.CoilbookException;

/** The command line's exit codes, as its help states them. */
public final class ExitCode {

    public static final int DONE = 0;
    /** {@code --fail-on} is met. */
    public static final int FAIL_ON_MET = 1;
    public static final int USAGE = 2;
    public static final int BAD_INPUT = 3;
    public static final int REGISTER = 4;
    public static final int UNEXPECTED = 5;

    private ExitCode() {
    }

    public static int of(CoilbookException.Reason reason) {
        return switch (reason) {
            case USAGE -> USAGE;
            case BAD_INPUT -> BAD_INPUT;
            case REGISTER -> REGISTER;
            case CANCELLED -> UNEXPECTED;
        };
    }
}
