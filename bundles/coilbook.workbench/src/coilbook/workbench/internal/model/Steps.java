package coilbook.workbench.internal.model;

/**
 * What undo and redo would do, in words; {@code null} where there is nothing.
 */
public record Steps(String undo, String redo) {

    /** Nothing to take back, nothing to do again. */
    public static final Steps NONE = new Steps(null, null);
}
