package coilbook.register;

import java.util.List;

/**
 * Part of a fleet: all of it, or the named customers, sites, lines ({@code SITE/LINE}) and stations together.
 */
public record FleetScope(List<String> customers, List<String> sites, List<String> lines, List<String> stations) {

    public FleetScope {
        customers = List.copyOf(customers);
        sites = List.copyOf(sites);
        lines = List.copyOf(lines);
        stations = List.copyOf(stations);
    }

    public static FleetScope all() {
        return new FleetScope(List.of(), List.of(), List.of(), List.of());
    }

    public static FleetScope sites(List<String> codes) {
        return new FleetScope(List.of(), codes, List.of(), List.of());
    }

    public boolean isAll() {
        return customers.isEmpty() && sites.isEmpty() && lines.isEmpty() && stations.isEmpty();
    }
}
