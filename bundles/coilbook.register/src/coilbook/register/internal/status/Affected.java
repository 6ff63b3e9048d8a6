package coilbook.register.internal.status;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

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
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;
import coilbook.register.internal.read.GroupRows;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.store.Journal;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.References;
import coilbook.register.internal.store.Versions;

/**
 * Which stations the Changes since a sequence can have touched: those whose own rows changed, and those that use a place, circuit, type or item that
 * did. Market tables and settings can touch every station.
 */
final class Affected {

    /** Beyond so many changed rows it is quicker to look at every station's fingerprint. */
    private static final int MOST_ROWS = 100_000;

    private final Truth truth;
    private final Set<String> stations = new HashSet<>();
    private final Set<String> sites = new HashSet<>();
    private final Set<String> customers = new HashSet<>();
    private final Set<String> lines = new HashSet<>();
    private final Set<String> circuits = new HashSet<>();
    private final Set<String> transformers = new HashSet<>();
    private final Set<String> controllers = new HashSet<>();
    private final Set<String> items = new HashSet<>();
    /** Types by the kind of part, as {@code kind/type}. */
    private final Set<String> types = new HashSet<>();
    private boolean everything;

    private Affected(Truth truth) {
        this.truth = truth;
    }

    /** The codes of the stations touched by the Changes after one sequence up to another, or {@code null} for all of them. */
    static Set<String> between(Truth truth, long after, long upTo) throws SQLException {
        Affected affected = new Affected(truth);
        try (Connection connection = truth.connection()) {
            List<Journal.Part> parts = truth.journal().parts(connection, after, upTo);
            long rows = parts.stream().mapToLong(part -> (long) part.opened() + part.closed()).sum();
            if (rows > MOST_ROWS) {
                return null;
            }
            for (Journal.Part part : parts) {
                affected.collect(connection, part.kind(), part);
            }
            return affected.everything ? null : affected.resolve(connection, upTo);
        }
    }

    private <R extends Row> void collect(Connection connection, Kind<R> kind, Journal.Part part) throws SQLException {
        Versions<R> versions = new Versions<>(truth.codecs().of(kind));
        versions.opened(connection, part).forEach(version -> take(version.row()));
        versions.closed(connection, part).forEach(version -> take(version.row()));
    }

    private void take(Row row) {
        if (row instanceof Station station) {
            stations.add(station.key());
        } else if (row instanceof Supply supply) {
            stations.add(supply.station());
        } else if (row instanceof SettingChoice choice) {
            stations.add(choice.station());
        } else if (row instanceof Duty duty) {
            stations.add(duty.station());
        } else if (row instanceof Concession concession) {
            stations.add(concession.station());
        } else if (row instanceof Fitting fitting) {
            stations.add(fitting.station());
            if (fitting.serial() != null) {
                items.add(fitting.itemKey());
            }
        } else if (row instanceof Reading reading) {
            (switch (reading.subjectKind()) {
                case STATION -> stations;
                case ITEM -> items;
                case CIRCUIT -> circuits;
            }).add(reading.subject());
        } else {
            takeShared(row);
        }
    }

    private void takeShared(Row row) {
        if (row instanceof Item item) {
            items.add(item.key());
        } else if (row instanceof Site site) {
            sites.add(site.code());
        } else if (row instanceof Customer customer) {
            customers.add(customer.code());
        } else if (row instanceof Line line) {
            lines.add(line.key());
        } else if (row instanceof Circuit circuit) {
            circuits.add(circuit.key());
        } else if (row instanceof TransformerType transformer) {
            transformers.add(transformer.code());
        } else if (row instanceof Controller controller) {
            controllers.add(controller.key());
        } else if (row instanceof ValveType valve) {
            type(FittedKind.VALVE, valve.code());
        } else if (row instanceof CoilType coil) {
            type(FittedKind.COIL, coil.code());
        } else if (row instanceof DriverType driver) {
            type(FittedKind.DRIVER, driver.code());
        } else if (row instanceof InputSetting setting) {
            type(FittedKind.DRIVER, setting.driverType());
        } else if (row instanceof CableType cable) {
            type(FittedKind.CABLE, cable.code());
        } else {
            everything = true;
        }
    }

    private void type(FittedKind kind, String code) {
        types.add(kind.label() + "/" + code);
    }

    private Set<String> resolve(Connection connection, long known) throws SQLException {
        GroupRows groups = truth.groups(connection, known);
        groups.all(Site.class).stream().filter(site -> customers.contains(site.customer())).forEach(site -> sites.add(site.code()));
        groups.all(Circuit.class).stream().filter(circuit -> transformers.contains(circuit.transformerType()))
                .forEach(c -> circuits.add(c.key()));
        Set<String> found = new TreeSet<>(stations);
        if (!sites.isEmpty() || !lines.isEmpty() || !controllers.isEmpty()) {
            new Versions<>(truth.codecs().of(Kind.of(Station.class))).each(connection, KindTable.knownAt(known), List.of(), version -> {
                Station station = version.row();
                if (sites.contains(station.site()) || lines.contains(station.lineKey())
                        || controllers.contains(References.controllerKey(station))) {
                    found.add(version.key());
                }
            });
        }
        if (!circuits.isEmpty()) {
            new Versions<>(truth.codecs().of(Kind.of(Supply.class))).each(connection, KindTable.knownAt(known), List.of(), version -> {
                if (circuits.contains(References.circuitKey(version.row()))) {
                    found.add(version.row().station());
                }
            });
        }
        resolveFittings(connection, known, found);
        return found;
    }

    private void resolveFittings(Connection connection, long known, Set<String> found) throws SQLException {
        Versions<Fitting> fittings = new Versions<>(truth.codecs().of(Kind.of(Fitting.class)));
        if (!types.isEmpty()) {
            fittings.each(connection, KindTable.knownAt(known), List.of(), version -> {
                Fitting fitting = version.row();
                if (types.contains(fitting.kind().label() + "/" + fitting.type())) {
                    found.add(fitting.station());
                }
            });
        }
        if (!items.isEmpty()) {
            List<String> serials = items.stream().map(item -> item.substring(item.indexOf('/') + 1)).distinct().toList();
            fittings.anyOf(connection, KindTable.of(Fitting.class).text("serial"), serials, KindTable.knownAt(known),
                    version -> found.add(version.row().station()));
        }
    }
}
