package coilbook.exchange.internal.in;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.fleet.CoilbookException;

/** What a person says headings mean, where recognition cannot tell: heading to field, or to nothing where the column is to be passed over. */
final class ColumnMap {

    private final Map<String, String> byHeading = new HashMap<>();
    private final Map<String, String> names = new LinkedHashMap<>();
    private final Set<String> met = new HashSet<>();

    ColumnMap(Map<String, String> columns, List<Layout> layouts) throws CoilbookException {
        for (Map.Entry<String, String> entry : columns.entrySet()) {
            String id = entry.getValue() == null ? "" : entry.getValue().strip();
            if (!id.isEmpty() && layouts.stream().allMatch(layout -> layout.byId(id) == null)) {
                throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, "Column map: \"" + entry.getKey() + "\" is to be \"" + id
                        + "\", which is no field; expected for example station.tag, coil.serial, duty.cycle_rate, reading.winding_resistance, or an empty text");
            }
            byHeading.put(Texts.fold(entry.getKey()), id);
            names.put(Texts.fold(entry.getKey()), entry.getKey());
        }
    }

    /** The field's id, an empty text for a column to pass over, {@code null} where nothing is said. */
    String get(String heading) {
        if (byHeading.isEmpty()) {
            return null;
        }
        String folded = Texts.fold(heading);
        met.add(folded);
        return byHeading.get(folded);
    }

    /** Headings that a person spoke of and no file has. */
    List<String> neverMet() {
        return names.entrySet().stream().filter(entry -> !met.contains(entry.getKey())).map(Map.Entry::getValue).toList();
    }
}
