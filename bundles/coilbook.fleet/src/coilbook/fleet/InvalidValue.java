package coilbook.fleet;

/** A value that a column cannot hold. The message says what was expected, in words for the person who typed it. */
public final class InvalidValue extends Exception {

    private static final long serialVersionUID = 1L;

    private final String column;
    private final transient Object value;

    /**
     * @param column the heading
     * @param value what was given
     * @param expected what was expected, for example "a resistance above 0 Ω"
     */
    public InvalidValue(String column, Object value, String expected) {
        super(expected);
        this.column = column;
        this.value = value;
    }

    public String column() {
        return column;
    }

    public String value() {
        return value == null ? "" : value.toString();
    }

    /** What was expected. */
    public String expected() {
        return getMessage();
    }
}
