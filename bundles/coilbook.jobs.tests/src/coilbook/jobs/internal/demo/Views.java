package coilbook.jobs.internal.demo;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

import coilbook.criteria.MarketTables;
import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.fleet.ValveType;

/** Puts rows together into views without a register, so that what the demo invents can be judged by itself. */
final class Views {

    private final LocalDate day;
    private final Map<String, Row> rows = new HashMap<>();
    private final List<Row> market = MarketTables.rows();
    private final Map<String, List<Fitting>> fittings = new TreeMap<>();
    private final List<Reading> readings = new ArrayList<>();
    private final Map<String, List<InputSetting>> settings = new HashMap<>();
    private final Map<String, List<String>> places = new HashMap<>();

    Views(LocalDate day) {
        this.day = day;
    }

    void add(Row row) {
        if (row instanceof Fitting fitting) {
            fittings.computeIfAbsent(fitting.station(), s -> new ArrayList<>()).add(fitting);
            if (fitting.itemKey() != null) {
                places.computeIfAbsent(fitting.itemKey(), s -> new ArrayList<>()).add(fitting.station());
            }
        } else if (row instanceof Reading reading) {
            readings.add(reading);
        } else if (row instanceof InputSetting setting) {
            settings.computeIfAbsent(setting.driverType(), s -> new ArrayList<>()).add(setting);
        } else if (row instanceof Supply || row instanceof Duty || row instanceof SettingChoice) {
            rows.put(row.getClass().getSimpleName() + Kind.of(row).fields().get(0).get(row), row);
            return;
        }
        Row before = rows.put(row.getClass().getSimpleName() + row.key(), row);
        if (before != null) {
            throw new AssertionError("a row stands twice: " + row);
        }
    }

    private <R extends Row> R find(Class<R> type, Object key) {
        return type.cast(rows.get(type.getSimpleName() + key));
    }

    StationView of(Station station) {
        String code = station.key();
        List<Fitting> fitted = fittings.getOrDefault(code, List.of());
        Map<FittedKind, String> types = new HashMap<>();
        Map<String, List<String>> itemPlaces = new HashMap<>();
        List<Reading> own = new ArrayList<>();
        for (Fitting fitting : fitted) {
            types.put(fitting.kind(), fitting.type());
            if (fitting.itemKey() != null) {
                itemPlaces.put(fitting.itemKey(), places.get(fitting.itemKey()));
                readings.stream().filter(r -> r.subject().equals(fitting.itemKey())).forEach(own::add);
            }
        }
        own.sort(Comparator.comparing(Reading::takenAt).reversed());
        Site site = find(Site.class, station.site());
        Supply supply = find(Supply.class, code);
        SettingChoice choice = find(SettingChoice.class, code);
        String driver = types.get(FittedKind.DRIVER);
        return new StationView(day, station, find(Line.class, station.lineKey()), site, find(Customer.class, site.customer()), supply,
                find(Circuit.class, supply.circuit()), null, choice,
                choice == null ? null : find(InputSetting.class, driver + "/" + choice.setting()),
                settings.getOrDefault(driver, List.of()), find(Duty.class, code), null, find(ValveType.class, types.get(FittedKind.VALVE)),
                find(CoilType.class, types.get(FittedKind.COIL)), find(DriverType.class, driver),
                find(CableType.class, types.get(FittedKind.CABLE)),
                fitted, List.of(), own, List.of(), itemPlaces, MarketTables.view(site.country(), market), FleetSettings.defaults());
    }
}
