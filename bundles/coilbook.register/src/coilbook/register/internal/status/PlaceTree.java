package coilbook.register.internal.status;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

import coilbook.fleet.Customer;
import coilbook.fleet.Line;
import coilbook.fleet.Site;
import coilbook.register.Status.Counts;
import coilbook.register.Status.Place;
import coilbook.register.internal.read.GroupRows;

/** The tree customer, site, line with the counts of what lies below; places without a station are there too. */
final class PlaceTree {

    private static final Counts NONE = new Counts(0, 0, 0, 0, 0, 0);

    private PlaceTree() {
    }

    static List<Place> of(GroupRows groups, Map<List<String>, Counts> byLine) {
        Map<String, TreeSet<String>> lines = new TreeMap<>();
        groups.all(Site.class).forEach(site -> lines.put(site.code(), new TreeSet<>()));
        groups.all(Line.class).forEach(line -> lines.computeIfAbsent(line.site(), site -> new TreeSet<>()).add(line.code()));
        byLine.keySet().forEach(place -> lines.computeIfAbsent(place.get(0), site -> new TreeSet<>()).add(place.get(1)));
        Map<String, TreeSet<String>> sites = new TreeMap<>();
        groups.all(Customer.class).forEach(customer -> sites.put(customer.code(), new TreeSet<>()));
        for (String code : lines.keySet()) {
            Site site = groups.find(Site.class, code);
            sites.computeIfAbsent(site == null || site.customer() == null ? "" : site.customer(), customer -> new TreeSet<>()).add(code);
        }
        List<Place> tree = new ArrayList<>();
        sites.forEach((customer, codes) -> {
            int at = tree.size();
            Counts ofCustomer = NONE;
            for (String site : codes) {
                ofCustomer = sum(ofCustomer, addSite(customer, site, lines.get(site), byLine, tree));
            }
            tree.add(at, new Place(customer, null, null, ofCustomer));
        });
        return List.copyOf(tree);
    }

    private static Counts addSite(String customer, String site, TreeSet<String> lines, Map<List<String>, Counts> byLine, List<Place> tree) {
        int at = tree.size();
        Counts ofSite = NONE;
        for (String line : lines) {
            Counts counts = byLine.getOrDefault(List.of(site, line), NONE);
            tree.add(new Place(customer, site, line, counts));
            ofSite = sum(ofSite, counts);
        }
        tree.add(at, new Place(customer, site, null, ofSite));
        return ofSite;
    }

    private static Counts sum(Counts one, Counts other) {
        return new Counts(one.stations() + other.stations(), one.hazards() + other.hazards(),
                one.nonconformities() + other.nonconformities(),
                one.observations() + other.observations(), one.undetermined() + other.undetermined(), one.conceded() + other.conceded());
    }
}
