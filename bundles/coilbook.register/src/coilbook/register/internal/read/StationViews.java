package coilbook.register.internal.read;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Concession;
import coilbook.fleet.Controller;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.Timed;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.References;
import coilbook.register.internal.store.Versions;

/** Puts station views together from the rows of a batch of stations and the rows they share. */
public final class StationViews {

    /** How many stations are read together. */
    public static final int BATCH = 1000;

    private static final Comparator<Reading> NEWEST_FIRST = Comparator.comparing(Reading::takenAt).reversed().thenComparing(Reading::key);

    private final Codecs codecs;

    public StationViews(Codecs codecs) {
        this.codecs = codecs;
    }

    /** The views of stations, in the order given. */
    public List<LoadedStation> of(Connection connection, List<Versions.Version<Station>> stations, GroupRows groups, Snapshot snapshot)
            throws SQLException {
        StationRows rows = new StationRows(connection, codecs, snapshot, stations.stream().map(Versions.Version::key).toList());
        List<LoadedStation> loaded = new ArrayList<>(stations.size());
        for (Versions.Version<Station> station : stations) {
            loaded.add(view(station, rows, groups, snapshot));
        }
        return loaded;
    }

    private static LoadedStation view(Versions.Version<Station> version, StationRows rows, GroupRows groups, Snapshot snapshot) {
        Station station = version.row();
        String code = version.key();
        Site site = groups.find(Site.class, station.site());
        Supply supply = rows.now(Supply.class, code);
        Circuit circuit = supply == null ? null : groups.find(Circuit.class, References.circuitKey(supply));
        List<Fitting> fittings = rows.all(Fitting.class, code).stream().filter(fitting -> fitting.trueOn(snapshot.trueOn()))
                .sorted(Comparator.comparing(Fitting::kind).thenComparing(StationRows.NEWEST_LAST.reversed())).toList();
        List<Fitting> past = rows.all(Fitting.class, code).stream()
                .filter(fitting -> fitting.validTo() != null && !fitting.validTo().isAfter(snapshot.trueOn()))
                .sorted(StationRows.NEWEST_LAST.reversed().thenComparing(Timed::key)).toList();
        DriverType driver = groups.find(DriverType.class, type(fittings, FittedKind.DRIVER));
        SettingChoice choice = rows.now(SettingChoice.class, code);
        InputSetting setting = driver == null || choice == null ? null
                : groups.find(InputSetting.class, driver.code() + "/" + choice.setting());
        List<Reading> all = readings(code, circuit, fittings, rows);
        List<Reading> taken = all.stream().filter(reading -> !reading.takenAt().toLocalDate().isAfter(snapshot.trueOn()))
                .sorted(NEWEST_FIRST).toList();
        List<Concession> concessions = rows.all(Concession.class, code).stream().filter(concession -> concession.trueOn(snapshot.trueOn()))
                .sorted(Comparator.comparing(Concession::key)).toList();
        StationView view = new StationView(snapshot.trueOn(), station, groups.find(Line.class, station.lineKey()), site,
                site == null ? null : groups.find(Customer.class, site.customer()), supply, circuit,
                circuit == null ? null : groups.find(TransformerType.class, circuit.transformerType()), choice, setting,
                driver == null ? List.of() : groups.settings(driver.code()), rows.now(Duty.class, code),
                groups.find(Controller.class, References.controllerKey(station)),
                groups.find(ValveType.class, type(fittings, FittedKind.VALVE)),
                groups.find(CoilType.class, type(fittings, FittedKind.COIL)), driver,
                groups.find(CableType.class, type(fittings, FittedKind.CABLE)),
                fittings, past, taken, concessions, places(fittings, rows), site == null ? null : groups.market(site),
                groups.fleetSettings());
        return new LoadedStation(version.rowId(), view, rows.turnsOn(station, all));
    }

    private static String type(List<Fitting> fittings, FittedKind kind) {
        for (Fitting fitting : fittings) {
            if (fitting.kind() == kind) {
                return fitting.type();
            }
        }
        return null;
    }

    private static List<Reading> readings(String code, Circuit circuit, List<Fitting> fittings, StationRows rows) {
        List<Reading> all = new ArrayList<>();
        take(rows, SubjectKind.STATION, code, all);
        if (circuit != null) {
            take(rows, SubjectKind.CIRCUIT, circuit.key(), all);
        }
        fittings.stream().map(Fitting::itemKey).filter(Objects::nonNull).distinct().forEach(key -> take(rows, SubjectKind.ITEM, key, all));
        return all;
    }

    private static void take(StationRows rows, SubjectKind kind, String subject, List<Reading> into) {
        rows.readings(subject).stream().filter(reading -> reading.subjectKind() == kind).forEach(into::add);
    }

    private static Map<String, List<String>> places(List<Fitting> fittings, StationRows rows) {
        Map<String, List<String>> places = new LinkedHashMap<>();
        for (Fitting fitting : fittings) {
            if (fitting.itemKey() != null) {
                places.put(fitting.itemKey(), rows.places(fitting.itemKey()));
            }
        }
        return places;
    }
}
