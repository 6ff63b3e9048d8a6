package coilbook.register.internal.read;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

import coilbook.fleet.Concession;
import coilbook.fleet.Duty;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Reading;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.Timed;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.References;
import coilbook.register.internal.store.Versions;

/** The rows that belong to each of a batch of stations: a few statements for the batch instead of a few for each station. */
final class StationRows {

    static final Comparator<Timed> NEWEST_LAST = Comparator.comparing(Timed::validFrom, Comparator.nullsFirst(Comparator.naturalOrder()));

    private final Connection connection;
    private final Codecs codecs;
    private final Snapshot snapshot;
    private final Map<String, Map<Class<?>, List<Timed>>> timed = new HashMap<>();
    private final Map<String, List<Reading>> readings = new HashMap<>();
    private final Map<String, List<Fitting>> places = new HashMap<>();

    StationRows(Connection connection, Codecs codecs, Snapshot snapshot, Collection<String> stations) throws SQLException {
        this.connection = connection;
        this.codecs = codecs;
        this.snapshot = snapshot;
        stations.forEach(station -> timed.put(station, new HashMap<>()));
        load(Supply.class, stations);
        load(SettingChoice.class, stations);
        load(Duty.class, stations);
        load(Fitting.class, stations);
        load(Concession.class, stations);
        loadReadings(stations);
        loadPlaces();
    }

    private <R extends Timed> void load(Class<R> type, Collection<String> stations) throws SQLException {
        new Versions<>(codecs.of(Kind.of(type))).lookedUp(connection, stations, KindTable.knownAt(snapshot.known()),
                version -> timed.get(station(version.row())).computeIfAbsent(type, t -> new ArrayList<>(4)).add(version.row()));
    }

    private static String station(Timed row) {
        if (row instanceof Fitting fitting) {
            return fitting.station();
        } else if (row instanceof Supply supply) {
            return supply.station();
        } else if (row instanceof Duty duty) {
            return duty.station();
        } else if (row instanceof SettingChoice choice) {
            return choice.station();
        }
        return ((Concession) row).station();
    }

    private void loadReadings(Collection<String> stations) throws SQLException {
        Set<String> subjects = new TreeSet<>(stations);
        for (String station : stations) {
            Supply supply = now(Supply.class, station);
            if (supply != null) {
                subjects.add(References.circuitKey(supply));
            }
            for (Fitting fitting : all(Fitting.class, station)) {
                if (fitting.trueOn(snapshot.trueOn()) && fitting.itemKey() != null) {
                    subjects.add(fitting.itemKey());
                }
            }
        }
        new Versions<>(codecs.of(Kind.of(Reading.class))).lookedUp(connection, subjects, KindTable.knownAt(snapshot.known()),
                version -> readings.computeIfAbsent(version.row().subject(), s -> new ArrayList<>(4)).add(version.row()));
    }

    private void loadPlaces() throws SQLException {
        Set<String> serials = new HashSet<>();
        timed.keySet().forEach(station -> all(Fitting.class, station).stream().filter(fitting -> fitting.serial() != null)
                .forEach(fitting -> serials.add(fitting.serial())));
        KindTable<Fitting> table = KindTable.of(Fitting.class);
        new Versions<>(codecs.of(table.kind())).anyOf(connection, table.text("serial"), serials, KindTable.knownAt(snapshot.known()),
                version -> places.computeIfAbsent(version.row().itemKey(), key -> new ArrayList<>(2)).add(version.row()));
    }

    /** Every interval of a kind at a station. */
    @SuppressWarnings("unchecked")
    <R extends Timed> List<R> all(Class<R> type, String station) {
        return (List<R>) timed.get(station).getOrDefault(type, List.of());
    }

    /** The row that was true on the day, the latest begun where several were; or {@code null}. */
    <R extends Timed> R now(Class<R> type, String station) {
        return all(type, station).stream().filter(row -> row.trueOn(snapshot.trueOn())).max(NEWEST_LAST).orElse(null);
    }

    /** Readings of a subject, in no order. */
    List<Reading> readings(String subject) {
        return readings.getOrDefault(subject, List.of());
    }

    /** The stations where an item sat on the day, in order. */
    List<String> places(String itemKey) {
        return places.getOrDefault(itemKey, List.of()).stream().filter(fitting -> fitting.trueOn(snapshot.trueOn())).map(Fitting::station)
                .distinct()
                .sorted().toList();
    }

    /** The next day on which a row of the station, or of an item at it, begins or ceases to be true; or {@code null}. */
    LocalDate turnsOn(Station station, Collection<Reading> all) {
        LocalDate next = null;
        for (List<Timed> rows : timed.get(station.key()).values()) {
            for (Timed row : rows) {
                next = earlier(next, row);
                if (row instanceof Fitting fitting && fitting.serial() != null) {
                    for (Fitting place : places.getOrDefault(fitting.itemKey(), List.of())) {
                        next = earlier(next, place);
                    }
                }
            }
        }
        for (Reading reading : all) {
            next = earlier(next, reading.takenAt().toLocalDate());
        }
        return next;
    }

    private LocalDate earlier(LocalDate next, Timed row) {
        return earlier(earlier(next, row.validFrom()), row.validTo());
    }

    private LocalDate earlier(LocalDate next, LocalDate date) {
        return date != null && date.isAfter(snapshot.trueOn()) && (next == null || date.isBefore(next)) ? date : next;
    }
}
