package coilbook.register;

/** What may happen where there is no register yet. */
public enum OpenMode {
    /** A missing register is refused and nothing is created. */
    EXISTING,
    /** A missing register is created; an existing one is opened. */
    CREATE_IF_MISSING,
    /** An existing register is refused. */
    CREATE_NEW
}
