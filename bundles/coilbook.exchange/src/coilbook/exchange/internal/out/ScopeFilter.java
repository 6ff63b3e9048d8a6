package coilbook.exchange.internal.out;

import java.util.HashSet;
import java.util.Set;

import coilbook.fleet.Circuit;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Concession;
import coilbook.fleet.Controller;
import coilbook.fleet.Customer;
import coilbook.fleet.Fitting;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.register.FleetScope;
import coilbook.register.Register;

/**
 * Which rows belong to a part of the fleet: its stations, what they stand in, and what sits at them. Catalogue, market tables and settings always belong.
 * Keys are looked up whole and never taken apart, because a tag may itself hold a slash.
 */
final class ScopeFilter {

    private final boolean all;
    private final Set<String> customers = new HashSet<>();
    private final Set<String> sites = new HashSet<>();
    private final Set<String> lines = new HashSet<>();
    private final Set<String> stations = new HashSet<>();
    private final Set<String> items = new HashSet<>();

    private ScopeFilter(boolean all) {
        this.all = all;
    }

    static ScopeFilter of(Register register, FleetScope scope) throws CoilbookException {
        ScopeFilter filter = new ScopeFilter(scope.isAll());
        if (filter.all) {
            return filter;
        }
        Set<String> wholeSites = new HashSet<>(scope.sites());
        register.read(Kind.of(Site.class), site -> {
            if (site.customer() != null && scope.customers().contains(site.customer())) {
                wholeSites.add(site.code());
            }
        });
        filter.sites.addAll(wholeSites);
        Set<String> wholeLines = new HashSet<>(scope.lines());
        register.read(Kind.of(Line.class), line -> {
            if (wholeSites.contains(line.site()) || wholeLines.contains(line.key())) {
                filter.lines.add(line.key());
                filter.sites.add(line.site());
            }
        });
        Set<String> named = new HashSet<>(scope.stations());
        register.read(Kind.of(Station.class), station -> {
            if (wholeSites.contains(station.site()) || wholeLines.contains(station.lineKey()) || named.contains(station.key())) {
                filter.stations.add(station.key());
                filter.lines.add(station.lineKey());
                filter.sites.add(station.site());
            }
        });
        filter.customers.addAll(scope.customers());
        register.read(Kind.of(Site.class), site -> {
            if (site.customer() != null && filter.sites.contains(site.code())) {
                filter.customers.add(site.customer());
            }
        });
        register.read(Kind.of(Fitting.class), fitting -> {
            if (fitting.itemKey() != null && filter.stations.contains(fitting.station())) {
                filter.items.add(fitting.itemKey());
            }
        });
        return filter;
    }

    boolean isAll() {
        return all;
    }

    boolean has(Row row) {
        if (all) {
            return true;
        } else if (row instanceof Customer customer) {
            return customers.contains(customer.code());
        } else if (row instanceof Site site) {
            return sites.contains(site.code());
        } else if (row instanceof Circuit circuit) {
            return sites.contains(circuit.site());
        } else if (row instanceof Controller controller) {
            return sites.contains(controller.site());
        } else if (row instanceof Line line) {
            return lines.contains(line.key());
        } else if (row instanceof Station station) {
            return stations.contains(station.key());
        } else if (row instanceof Fitting fitting) {
            return stations.contains(fitting.station());
        } else if (row instanceof Concession concession) {
            return stations.contains(concession.station());
        } else if (row instanceof Item item) {
            return items.contains(item.key());
        }
        return !(row instanceof Reading reading) || has(reading);
    }

    private boolean has(Reading reading) {
        return switch (reading.subjectKind()) {
            case STATION -> stations.contains(reading.subject());
            case ITEM -> items.contains(reading.subject());
            case CIRCUIT -> sites.stream().anyMatch(site -> reading.subject().startsWith(site + "/"));
        };
    }
}
