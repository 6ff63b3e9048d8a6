package coilbook.register;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;

/** Rows with every field filled, by the type of the field; references and keys are set by the caller. */
final class SampleRows {

    private SampleRows() {
    }

    /** A row of a kind with a value in every field; those named are as given. */
    static <R extends Row> R full(Class<R> type, Object... given) throws InvalidValue {
        Kind<R> kind = Kind.of(type);
        List<Object> values = new ArrayList<>();
        int number = 0;
        for (Field field : kind.fields()) {
            values.add(value(field, number++));
        }
        for (int i = 0; i < given.length; i += 2) {
            values.set(kind.fields().indexOf(kind.field((String) given[i])), given[i + 1]);
        }
        return kind.create(values.toArray());
    }

    /** A row of a kind with nothing but the values named. */
    static <R extends Row> R bare(Class<R> type, Object... given) throws InvalidValue {
        Kind<R> kind = Kind.of(type);
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < given.length; i += 2) {
            values[kind.fields().indexOf(kind.field((String) given[i]))] = given[i + 1];
        }
        return kind.create(values);
    }

    private static Object value(Field field, int number) {
        return switch (field.type()) {
            case TEXT -> field.isKey() ? "key " + number : "text " + number + " ä=+-@\"';--\nline 2";
            case QUANTITY -> new Datum(inRange(field, 0.1 + number / 7.0), Provenance.values()[number % 5]);
            case NUMBER -> inRange(field, -1e-9 * number + 1.0 / 3);
            case INTEGER -> 1 + number;
            case YES_NO -> number % 2 == 0;
            case DATE -> LocalDate.of(2026, 1, 1).plusDays(number);
            case DATE_TIME -> LocalDateTime.of(2026, 3, 31, 14, 5, 6).plusNanos(123_000);
            case TERM -> field.terms().get(number % field.terms().size());
            case TEXTS -> List.of("one", "two, three", "fünf");
            case MONEY -> new BigDecimal("12.5");
        };
    }

    /** The wanted value, or the first of some others that the field takes. */
    private static double inRange(Field field, double wanted) {
        for (double value : new double[] { wanted, wanted / 100, wanted / 10000, 10 + wanted, 1 + wanted / 100, 1.1 }) {
            try {
                field.check(field.type() == FieldType.QUANTITY ? Datum.measured(value) : (Object) value);
                return value;
            } catch (InvalidValue e) {
                continue;
            }
        }
        throw new IllegalArgumentException(field + " takes none of the samples");
    }
}
