package coilbook.exchange.internal.in;

import java.util.HashMap;
import java.util.Map;

/** Keeps one copy of values that lists repeat thousands of times; bounded, so that serial numbers do not fill it. */
final class Pool {

    private static final int LIMIT = 50_000;

    private final Map<Object, Object> values = new HashMap<>();

    @SuppressWarnings("unchecked")
    <T> T one(T value) {
        if (value == null) {
            return null;
        }
        Object before = values.get(value);
        if (before != null) {
            return (T) before;
        }
        if (values.size() < LIMIT) {
            values.put(value, value);
        }
        return value;
    }
}
