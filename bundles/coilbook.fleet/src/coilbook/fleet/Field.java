package coilbook.fleet;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.reflect.RecordComponent;
import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Locale;

/** One column of a {@link Kind}: name, type, unit, range, and how to read it from a row. Made once from a record component. */
public final class Field {

    private final String id;
    private final Column column;
    private final FieldType type;
    private final Class<?> javaType;
    private final MethodHandle accessor;

    Field(RecordComponent component) {
        this.column = component.getAnnotation(Column.class);
        if (column == null) {
            throw new IllegalStateException(component + " carries no column");
        }
        this.id = snake(component.getName());
        this.javaType = component.getType();
        this.type = typeOf(javaType);
        try {
            this.accessor = MethodHandles.lookup().unreflect(component.getAccessor())
                    .asType(java.lang.invoke.MethodType.methodType(Object.class, Row.class));
        } catch (IllegalAccessException e) {
            throw new IllegalStateException(e);
        }
    }

    private static String snake(String name) {
        return name.replaceAll("([a-z0-9])([A-Z])", "$1_$2").toLowerCase(Locale.ROOT);
    }

    private static FieldType typeOf(Class<?> java) {
        if (java == String.class) {
            return FieldType.TEXT;
        } else if (java == Datum.class) {
            return FieldType.QUANTITY;
        } else if (java == Double.class) {
            return FieldType.NUMBER;
        } else if (java == Integer.class) {
            return FieldType.INTEGER;
        } else if (java == Boolean.class) {
            return FieldType.YES_NO;
        } else if (java == LocalDate.class) {
            return FieldType.DATE;
        } else if (java == LocalDateTime.class) {
            return FieldType.DATE_TIME;
        } else if (java == BigDecimal.class) {
            return FieldType.MONEY;
        } else if (java == List.class) {
            return FieldType.TEXTS;
        } else if (Labelled.class.isAssignableFrom(java) && java.isEnum()) {
            return FieldType.TERM;
        }
        throw new IllegalStateException("no column can hold " + java);
    }

    /** The stable name used in storage, for example {@code pull_in_current}. */
    public String id() {
        return id;
    }

    /** The heading without unit. */
    public String heading() {
        return column.value();
    }

    /** The heading as sheets show it, the unit in square brackets. */
    public String headingWithUnit() {
        return unit() == Unit.NONE ? heading() : heading() + " [" + unit().symbol() + "]";
    }

    public Unit unit() {
        return column.unit();
    }

    public FieldType type() {
        return type;
    }

    public boolean isKey() {
        return column.key();
    }

    /** Whether a row without the value is refused; a date in a key may be missing ("always"). */
    public boolean isRequired() {
        return column.required() || column.key() && type != FieldType.DATE;
    }

    public boolean isPersonal() {
        return column.personal();
    }

    /** The kind whose key the text names, or {@code null}. */
    public Class<? extends Row> refersTo() {
        return column.refersTo() == Row.class ? null : column.refersTo();
    }

    /** The words a {@link FieldType#TERM} may be, in order; empty for other types. */
    public List<Labelled> terms() {
        return type == FieldType.TERM ? List.of((Labelled[]) javaType.getEnumConstants()) : List.of();
    }

    /** The value in a row; {@code null} where missing. */
    public Object get(Row row) {
        try {
            return accessor.invokeExact(row);
        } catch (RuntimeException | Error e) {
            throw e;
        } catch (Throwable e) {
            throw new IllegalStateException(e);
        }
    }

    /**
     * Refuses a value of the wrong type or out of range.
     *
     * @throws InvalidValue naming the heading, the value in its unit and what was expected
     */
    public void check(Object value) throws InvalidValue {
        if (value == null) {
            if (isRequired()) {
                throw new InvalidValue(heading(), null, "a value");
            }
            return;
        }
        if (!javaType.isInstance(value)) {
            throw new InvalidValue(heading(), value, FieldText.expected(this));
        }
        if (value instanceof String text && (text.isBlank() || text.length() > 4000)) {
            throw new InvalidValue(heading(), value, "a text of 1 to 4000 characters");
        }
        if (isKey() && value instanceof String text && (text.indexOf('\n') >= 0 || text.indexOf('\t') >= 0)) {
            throw new InvalidValue(heading(), value, "a code on one line");
        }
        double number = value instanceof Datum datum ? datum.value() : value instanceof Number plain ? plain.doubleValue() : 0;
        boolean numeric = value instanceof Datum || value instanceof Number;
        if (numeric
                && (number < column.min() || column.above() && number <= column.min() || number > column.max() || Double.isNaN(number))) {
            throw new InvalidValue(heading(), FieldText.format(this, value), FieldText.expected(this));
        }
    }

    double min() {
        return column.min();
    }

    double max() {
        return column.max();
    }

    boolean above() {
        return column.above();
    }

    @Override
    public String toString() {
        return id;
    }
}
