package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.fleet.CableType;
import coilbook.fleet.Change;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Controller;
import coilbook.fleet.DriverType;
import coilbook.fleet.Field;
import coilbook.fleet.Fitting;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.ValveType;

/** What rows refer to, and that no Change leaves a reference that leads nowhere. */
public final class References {

    /** Up to so many stations it is quicker to look each up than to read everything that may refer to one. */
    private static final int FEW = 5000;

    private final Codecs codecs;

    References(Codecs codecs) {
        this.codecs = codecs;
    }

    /** One reference of a row. */
    public record Reference(Field field, Kind<?> target, String key) {
    }

    /** The references of a row, the missing left out. */
    public static List<Reference> of(Row row) {
        List<Reference> found = new ArrayList<>(4);
        for (Field field : Kind.of(row).fields()) {
            Object value = field.get(row);
            if (value != null && field.refersTo() != null) {
                found.add(new Reference(field, Kind.of(field.refersTo()), key(row, field.refersTo(), (String) value)));
            }
        }
        if (row instanceof Fitting fitting) {
            found.add(new Reference(field(row, "type"), Kind.of(catalogue(fitting.kind())), fitting.type()));
        } else if (row instanceof Item item) {
            found.add(new Reference(field(row, "type"), Kind.of(catalogue(item.kind())), item.type()));
        } else if (row instanceof Reading reading) {
            Class<? extends Row> subject = switch (reading.subjectKind()) {
                case STATION -> Station.class;
                case ITEM -> Item.class;
                case CIRCUIT -> Circuit.class;
            };
            found.add(new Reference(field(row, "subject"), Kind.of(subject), reading.subject()));
        }
        return found;
    }

    private static Field field(Row row, String id) {
        return Kind.of(row).field(id);
    }

    /** The catalogue in which types of a kind of part stand. */
    public static Class<? extends Row> catalogue(FittedKind kind) {
        return switch (kind) {
            case VALVE -> ValveType.class;
            case COIL -> CoilType.class;
            case DRIVER -> DriverType.class;
            case CABLE -> CableType.class;
        };
    }

    private static String key(Row row, Class<? extends Row> target, String value) {
        if (row instanceof Station station) {
            return target == Line.class ? station.lineKey() : target == Controller.class ? inSite(station.site(), value) : value;
        } else if (row instanceof Supply supply && target == Circuit.class) {
            return circuitKey(supply);
        }
        return value;
    }

    /** The key of the circuit of a supply, which may be named with or without its site. */
    public static String circuitKey(Supply supply) {
        return inSite(siteOf(supply.station()), supply.circuit());
    }

    /** The key of the controller of a station, or {@code null}. */
    public static String controllerKey(Station station) {
        return station.controller() == null ? null : inSite(station.site(), station.controller());
    }

    /** The site in a station's code. */
    public static String siteOf(String station) {
        int slash = station.indexOf('/');
        return slash < 0 ? station : station.substring(0, slash);
    }

    private static String inSite(String site, String code) {
        return code.startsWith(site + "/") ? code : site + "/" + code;
    }

    /**
     * Checks, before anything is written, that whatever the new rows refer to exists or comes with them.
     *
     * @param head the latest sequence
     */
    void checkNew(Connection connection, Change change, long head) throws SQLException, CoilbookException {
        Map<Kind<?>, Set<String>> come = new HashMap<>();
        for (RowChange row : change.rows()) {
            if (row.after() != null) {
                come.computeIfAbsent(row.kind(), kind -> new HashSet<>()).add(row.key());
            }
        }
        Map<Kind<?>, Map<String, RowChange>> wanted = new LinkedHashMap<>();
        for (RowChange row : change.rows()) {
            if (row.after() != null) {
                for (Reference reference : of(row.after())) {
                    if (!come.getOrDefault(reference.target(), Set.of()).contains(reference.key())) {
                        wanted.computeIfAbsent(reference.target(), kind -> new LinkedHashMap<>()).putIfAbsent(reference.key(), row);
                    }
                }
            }
        }
        Map<Kind<?>, Set<String>> gone = gone(change);
        for (Map.Entry<Kind<?>, Map<String, RowChange>> entry : wanted.entrySet()) {
            Map<String, RowChange> missing = entry.getValue();
            Set<String> leaving = gone.getOrDefault(entry.getKey(), Set.of());
            Set<String> found = present(connection, entry.getKey(), missing.keySet(), head);
            for (Map.Entry<String, RowChange> reference : missing.entrySet()) {
                if (!found.contains(reference.getKey()) || leaving.contains(reference.getKey())) {
                    throw leadsNowhere(reference.getValue().after(), entry.getKey(), reference.getKey());
                }
            }
        }
    }

    private static CoilbookException leadsNowhere(Row row, Kind<?> target, String key) {
        for (Reference reference : of(row)) {
            if (reference.target() == target && reference.key().equals(key)) {
                return Refusal.of(Kind.of(row), row.key(), reference.field().heading(), key,
                        "an entry of " + target.sheet() + " was expected");
            }
        }
        throw new IllegalStateException();
    }

    private static Map<Kind<?>, Set<String>> gone(Change change) {
        Map<Kind<?>, Set<String>> gone = new HashMap<>();
        for (RowChange row : change.rows()) {
            if (row.after() == null) {
                gone.computeIfAbsent(row.kind(), kind -> new HashSet<>()).add(row.key());
            }
        }
        return gone;
    }

    private <R extends Row> Set<String> present(Connection connection, Kind<R> kind, Set<String> keys, long head) throws SQLException {
        KindTable<R> table = KindTable.of(kind);
        Set<String> lookups = new HashSet<>();
        keys.forEach(key -> lookups.add(table.lookupOf(key)));
        Set<String> found = new HashSet<>();
        found.addAll(Database.dsl(connection).select(KindTable.KEY).from(Sought.texts(lookups)).join(table.table())
                .on(table.lookup().eq(Sought.TEXT))
                .where(KindTable.knownAt(head)).fetch(KindTable.KEY));
        return found;
    }

    /** Checks, after the Change was written and before it is committed, that no row that stays refers to one that went. */
    void checkGone(Connection connection, Change change, long seq) throws SQLException, CoilbookException {
        Map<Kind<?>, Set<String>> gone = gone(change);
        if (!gone.isEmpty()) {
            for (KindTable<?> table : KindTable.ALL) {
                if (mayReferTo(table.kind(), gone.keySet())) {
                    checkGone(connection, table.kind(), gone, seq);
                }
            }
        }
    }

    private static boolean mayReferTo(Kind<?> kind, Set<Kind<?>> targets) {
        boolean typed = kind.type() == Fitting.class || kind.type() == Item.class;
        boolean taken = kind.type() == Reading.class;
        for (Kind<?> target : targets) {
            Class<?> type = target.type();
            if (kind.fields().stream().anyMatch(field -> field.refersTo() == type)
                    || typed && List.of(FittedKind.values()).stream().anyMatch(part -> catalogue(part) == type)
                    || taken && (type == Station.class || type == Item.class || type == Circuit.class)) {
                return true;
            }
        }
        return false;
    }

    private <R extends Row> void checkGone(Connection connection, Kind<R> kind, Map<Kind<?>, Set<String>> gone, long seq)
            throws SQLException, CoilbookException {
        KindTable<R> table = KindTable.of(kind);
        Versions<R> versions = new Versions<>(codecs.of(kind));
        List<Row> dangling = new ArrayList<>();
        Set<String> stations = gone.getOrDefault(Kind.of(Station.class), Set.of());
        boolean byStation = gone.size() == 1 && !stations.isEmpty() && stations.size() <= FEW && table.lookup() != KindTable.KEY;
        java.util.function.Consumer<Versions.Version<R>> look = version -> {
            if (dangling.isEmpty()) {
                for (Reference reference : of(version.row())) {
                    if (gone.getOrDefault(reference.target(), Set.of()).contains(reference.key())) {
                        dangling.add(version.row());
                        break;
                    }
                }
            }
        };
        if (byStation) {
            versions.lookedUp(connection, stations, KindTable.knownAt(seq), look);
        } else {
            versions.each(connection, KindTable.knownAt(seq), List.of(), look);
        }
        if (!dangling.isEmpty()) {
            Row row = dangling.get(0);
            Reference reference = of(row).stream().filter(r -> gone.getOrDefault(r.target(), Set.of()).contains(r.key())).findFirst()
                    .orElseThrow();
            throw Refusal.stale(reference.target(), reference.key(),
                    "it cannot be removed while " + kind.sheet() + " " + row.key() + " refers to it");
        }
    }
}
