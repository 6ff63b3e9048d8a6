package coilbook.fleet;

/** How long work tells how far it is and learns that it is no longer wanted. Implementations are safe to call from any thread. */
public interface Progress {

    /** Nobody watches, nobody cancels. */
    Progress NONE = new Progress() {
        @Override
        public void report(String step, long done, long total) {
            // nobody watches
        }

        @Override
        public boolean isCancelled() {
            return false;
        }
    };

    /**
     * @param step what is being done, in words
     * @param done so far
     * @param total in all, or 0 where not known
     */
    void report(String step, long done, long total);

    boolean isCancelled();

    /** Ends the work if it is no longer wanted.
     *
     * @throws CoilbookException with reason CANCELLED
     */
    default void check() throws CoilbookException {
        if (isCancelled()) {
            throw new CoilbookException(CoilbookException.Reason.CANCELLED, "Cancelled; nothing was changed.");
        }
    }
}
