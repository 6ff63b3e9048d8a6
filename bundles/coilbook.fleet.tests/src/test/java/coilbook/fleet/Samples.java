package coilbook.fleet;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;

/** A row of any kind with every column filled, for tests that walk all kinds. */
final class Samples {

    private Samples() {
    }

    static Object[] values(Kind<?> kind) {
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = value(kind.fields().get(i), i);
        }
        return values;
    }

    private static Object value(Field field, int index) {
        return switch (field.type()) {
            case TEXT -> field.heading() + " " + index;
            case QUANTITY -> Datum.nameplate(inside(field));
            case NUMBER -> 12.5;
            case INTEGER -> 3;
            case YES_NO -> index % 2 == 0;
            case DATE -> LocalDate.of(2026, 3, 1).plusDays(index);
            case DATE_TIME -> LocalDateTime.of(2026, 3, 1, 14, 5);
            case TERM -> field.terms().get(0);
            case TEXTS -> List.of("one", "two");
            case MONEY -> new BigDecimal("12.5");
        };
    }

    private static double inside(Field field) {
        double low = Math.max(field.min(), -1e6);
        double high = Math.min(field.max(), 1e6);
        return field.unit().toSi(field.unit().fromSi(low + (high - low) * 0.25));
    }
}
