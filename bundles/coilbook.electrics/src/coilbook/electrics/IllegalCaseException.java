package coilbook.electrics;

/**
 * A circuit that cannot be computed as it was given: names the field, the value and what was expected, in words fit for a person.
 * Field names are those of the case records in dotted form, for example {@code duty.onTime}.
 */
public final class IllegalCaseException extends Exception {

    private static final long serialVersionUID = 1L;

    private final String field;
    private final String value;
    private final String expected;

    public IllegalCaseException(String field, String value, String expected) {
        super(field + " is " + value + "; expected: " + expected);
        this.field = field;
        this.value = value;
        this.expected = expected;
    }

    public IllegalCaseException(String field, double value, String expected) {
        this(field, Double.isNaN(value) ? "missing" : Double.toString(value), expected);
    }

    /** The field at fault, in dotted form. */
    public String field() {
        return field;
    }

    /** The value at fault, as text. */
    public String value() {
        return value;
    }

    /** What would have been accepted. */
    public String expected() {
        return expected;
    }
}
