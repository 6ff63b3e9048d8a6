package coilbook.fleet;

/** What a column holds. */
public enum FieldType {
    /** Text without line breaks at its ends; never empty. */
    TEXT,
    /** A {@link Datum}: SI value with provenance. */
    QUANTITY,
    /** A plain number without unit. */
    NUMBER,
    /** A whole number. */
    INTEGER,
    /** Yes or no. */
    YES_NO,
    /** A day at the site. */
    DATE,
    /** A day and time at the site. */
    DATE_TIME,
    /** One word of a fixed list ({@link Labelled}). */
    TERM,
    /** Several texts; written with commas. */
    TEXTS,
    /** An amount in the fleet's currency. */
    MONEY
}
