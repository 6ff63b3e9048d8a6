package coilbook.exchange.internal.in;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

import coilbook.fleet.Field;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;

/** The columns of a flat list, one row a station, by the many names branches give them; the names are data beside this class. */
final class FlatLayout implements Layout {

    static final String STATION = "station";
    static final String TAG = "station.tag";
    static final String SITE = "site.code";
    static final String LINE = "line.code";
    static final String MAINS = "mains";
    static final String WIRING = "wiring";
    static final String READING = "reading.";
    static final String READING_DATE = "reading.date";

    /** Kinds of which a flat list may name any column. */
    private static final Set<String> KINDS = Set.of("customer", "site", "line", "circuit", "station", "supply", "setting_choice", "duty",
            "valve_type",
            "coil_type", "driver_type", "cable_type");

    private final Map<String, Named> byName = new LinkedHashMap<>();
    private final Map<String, Target> byId = new LinkedHashMap<>();

    FlatLayout() {
        addFields();
        addOwn();
        try (BufferedReader reader = new BufferedReader(
                new InputStreamReader(FlatLayout.class.getResourceAsStream("flat-headings.txt"), StandardCharsets.UTF_8))) {
            reader.lines().filter(line -> !line.isBlank() && !line.startsWith("#")).forEach(this::addLine);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void addFields() {
        for (Kind<?> kind : Kind.ALL) {
            if (KINDS.contains(kind.id())) {
                for (Field field : kind.fields()) {
                    boolean key = field.isKey() && field.refersTo() != null || field.id().equals("valid_to");
                    if (!key) {
                        put(kind.id() + "." + field.id(), field.headingWithUnit(), kind, field, null);
                    }
                }
            }
        }
    }

    private void addOwn() {
        Kind<Fitting> fitting = Kind.of(Fitting.class);
        for (FittedKind part : FittedKind.values()) {
            String word = part.label().substring(0, 1).toUpperCase(Locale.ROOT) + part.label().substring(1);
            put(part.label() + ".type", word + " type", fitting, fitting.field("type"), null);
            put(part.label() + ".serial", word + " serial", fitting, fitting.field("serial"), null);
            put(part.label() + ".since", word + " fitted since", fitting, fitting.field("valid_from"), null);
            Kind<?> type = typeKind(part);
            put(part.label() + ".maker", word + " maker", type, type.field("maker"), null);
        }
        Kind<Reading> reading = Kind.of(Reading.class);
        for (ReadingQuantity quantity : ReadingQuantity.values()) {
            String unit = quantity.unit().symbol();
            String word = quantity.label().substring(0, 1).toUpperCase(Locale.ROOT) + quantity.label().substring(1);
            put(READING + quantity.name().toLowerCase(Locale.ROOT), unit.isEmpty() ? word : word + " [" + unit + "]", reading,
                    reading.field("value"),
                    quantity);
        }
        put(READING_DATE, "Measured on", reading, reading.field("taken_at"), null);
        put(READING + "temperature", "Reading temperature [°C]", reading, reading.field("temperature"), null);
        put(READING + "by", "Measured by", reading, reading.field("by"), null);
        put(READING + "instrument", "Instrument", reading, reading.field("instrument"), null);
        byId.put(STATION, new Target(STATION, "Station", null, null, null));
        byId.put(MAINS, new Target(MAINS, "Mains", null, null, null));
        byId.put(WIRING, new Target(WIRING, "Wiring", null, null, null));
        alias(SITE, "station.site", "line.site", "circuit.site");
        alias(LINE, "station.line");
        alias("circuit.code", "supply.circuit");
        alias("customer.code", "site.customer");
        for (FittedKind part : FittedKind.values()) {
            alias(part.label() + ".type", part.label() + "_type.code");
            alias(part.label() + ".maker", part.label() + "_type.maker");
        }
    }

    private void alias(String id, String... others) {
        for (String other : others) {
            byId.put(other, byId.get(id));
        }
    }

    private void put(String id, String heading, Kind<?> kind, Field field, ReadingQuantity quantity) {
        byId.put(id, new Target(id, heading, kind, field, quantity));
    }

    /** The catalogue of a part. */
    static Kind<?> typeKind(FittedKind part) {
        for (Kind<?> kind : Kind.ALL) {
            if (kind.id().equals(part.label() + "_type")) {
                return kind;
            }
        }
        throw new IllegalArgumentException(part.label());
    }

    private void addLine(String line) {
        int equals = line.indexOf('=');
        String id = line.substring(0, equals).strip();
        Target target = byId.get(id);
        if (target == null) {
            throw new IllegalStateException("no such column: " + id);
        }
        for (String name : line.substring(equals + 1).split("\\|")) {
            int at = name.indexOf('@');
            String words = Texts.fold(at < 0 ? name : name.substring(0, at));
            Named before = byName.put(words, new Named(target, at < 0 ? "" : name.substring(at + 1).strip()));
            if (before != null) {
                throw new IllegalStateException("the heading " + words + " stands twice");
            }
        }
    }

    @Override
    public String name() {
        return "flat list";
    }

    @Override
    public Named find(String foldedHeading) {
        return byName.get(foldedHeading);
    }

    @Override
    public Target byId(String id) {
        return byId.get(id);
    }

    @Override
    public List<String> missing(Set<String> ids) {
        List<String> missing = new ArrayList<>();
        if (!ids.contains(STATION)) {
            if (!ids.contains(TAG)) {
                missing.add("Station");
            }
            if (!ids.contains(SITE)) {
                missing.add("Site");
            }
            if (!ids.contains(LINE)) {
                missing.add("Line");
            }
        }
        return missing;
    }

    @Override
    public Collection<String> names() {
        return byName.keySet();
    }
}
