package coilbook.exchange.internal.in;

import java.util.LinkedHashMap;
import java.util.Map;

import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.Kind;

/** The values of one line of a flat list by the ids of their columns; only what is there. */
final class FlatValues {

    private final Map<String, Object> values = new LinkedHashMap<>();

    void put(String id, Object value) {
        if (value != null) {
            values.put(id, value);
        }
    }

    Object get(String id) {
        return values.get(id);
    }

    String text(String id) {
        return (String) values.get(id);
    }

    Datum datum(String id) {
        return (Datum) values.get(id);
    }

    /** Whether any column of that kind is there. */
    boolean has(Kind<?> kind) {
        return values.keySet().stream().anyMatch(id -> id.startsWith(kind.id() + "."));
    }

    /** Copies every value of a kind into a row, save what the row has already. */
    void fill(Kind<?> kind, Map<Field, Object> row) {
        String prefix = kind.id() + ".";
        for (Map.Entry<String, Object> entry : values.entrySet()) {
            if (entry.getKey().startsWith(prefix)) {
                String id = entry.getKey().substring(prefix.length());
                for (Field field : kind.fields()) {
                    if (field.id().equals(id)) {
                        row.putIfAbsent(field, entry.getValue());
                    }
                }
            }
        }
    }
}
