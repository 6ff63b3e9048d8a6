package coilbook.workbench.internal.model;

/**
 * What undo and redo would do, in words; {@code null} where there is nothing.
 *
 * @param undoRows how many rows undo would change
 */
public record Steps(String undo, int undoRows, String redo) {

    /** Nothing to take back, nothing to do again. */
    public static final Steps NONE = new Steps(null, 0, null);
}
