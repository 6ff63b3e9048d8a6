package coilbook.fleet;

/** One row of the register: an immutable record whose components carry {@link Column}. */
public interface Row {

    /** What identifies the row among its kind, from the components marked as key. */
    default String key() {
        return Kind.of(this).key(this);
    }
}
