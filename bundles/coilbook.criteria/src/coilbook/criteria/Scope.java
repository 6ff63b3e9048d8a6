package coilbook.criteria;

/** What a criterion looks at, and so which stations a change can touch. */
public enum Scope {
    /** One station. */
    STATION,
    /** All stations on a circuit. */
    CIRCUIT,
    /** All places of an item. */
    ITEM,
    /** A catalogue entry alone. */
    CATALOGUE
}
