package coilbook.register.internal.file;

/** Something in a data file that a register of ours never holds; thrown through the database library while it reads. */
final class ForeignContent extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /** @param what it is, in words */
    ForeignContent(String what) {
        super(what);
    }
}
