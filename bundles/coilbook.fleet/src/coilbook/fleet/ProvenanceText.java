package coilbook.fleet;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * The provenance of all quantities of one row in one cell: the commonest first, exceptions after it, for example
 * {@code catalogue; Inductance = estimated by rule}.
 */
public final class ProvenanceText {

    private final Provenance common;
    private final Map<String, Provenance> exceptions;

    private ProvenanceText(Provenance common, Map<String, Provenance> exceptions) {
        this.common = common;
        this.exceptions = exceptions;
    }

    static String of(Kind<?> kind, Row row) {
        Map<Provenance, Integer> counts = new EnumMap<>(Provenance.class);
        for (Field field : kind.fields()) {
            if (field.get(row) instanceof Datum datum) {
                counts.merge(datum.provenance(), 1, Integer::sum);
            }
        }
        if (counts.isEmpty()) {
            return "";
        }
        Provenance common = null;
        for (Map.Entry<Provenance, Integer> entry : counts.entrySet()) {
            if (common == null || entry.getValue() > counts.get(common)) {
                common = entry.getKey();
            }
        }
        StringBuilder text = new StringBuilder(common.label());
        for (Field field : kind.fields()) {
            if (field.get(row) instanceof Datum datum && datum.provenance() != common) {
                text.append("; ").append(field.heading()).append(" = ").append(datum.provenance().label());
            }
        }
        return text.toString();
    }

    /**
     * Reads such a cell.
     *
     * @param text the cell, or {@code null} or blank for "catalogue" where the kind is a type, "nameplate" elsewhere
     * @throws InvalidValue for a word that is no provenance
     */
    public static ProvenanceText parse(String text, Provenance otherwise) throws InvalidValue {
        if (text == null || text.isBlank()) {
            return new ProvenanceText(otherwise, Map.of());
        }
        Provenance common = otherwise;
        Map<String, Provenance> exceptions = new HashMap<>();
        for (String part : text.split(";")) {
            int equals = part.indexOf('=');
            if (equals < 0) {
                common = word(part);
            } else {
                exceptions.put(part.substring(0, equals).strip().toLowerCase(Locale.ROOT), word(part.substring(equals + 1)));
            }
        }
        return new ProvenanceText(common, exceptions);
    }

    private static Provenance word(String text) throws InvalidValue {
        List<String> words = new ArrayList<>();
        for (Provenance provenance : Provenance.values()) {
            if (provenance.label().equalsIgnoreCase(text.strip()) || provenance.name().equalsIgnoreCase(text.strip())) {
                return provenance;
            }
            words.add(provenance.label());
        }
        throw new InvalidValue("Provenance", text, "one of " + String.join(", ", words));
    }

    /** The provenance of a field. */
    public Provenance of(Field field) {
        return exceptions.getOrDefault(field.heading().toLowerCase(Locale.ROOT), common);
    }
}
