package coilbook.workbench.internal.places;

import java.util.ArrayList;
import java.util.List;

import coilbook.register.FleetScope;
import coilbook.register.Status;

/**
 * One entry of the tree: the whole fleet, a customer, a site or a line.
 *
 * @param name as the tree shows it
 * @param key what it is by, the same after the tree is read again
 */
public record PlaceNode(String name, String key, FleetScope scope, Status.Counts counts, List<PlaceNode> children) {

    /**
     * The tree of places that come in the order of their codes, a customer before its sites and a site before its lines.
     *
     * @param all the name of the whole fleet
     * @param nobody the name under which sites without a customer stand
     */
    static PlaceNode tree(List<Status.Place> places, Status.Counts total, String all, String nobody) {
        List<PlaceNode> customers = new ArrayList<>();
        PlaceNode customer = null;
        PlaceNode site = null;
        for (Status.Place place : places) {
            String owner = place.customer() == null ? "" : place.customer();
            if (place.site() == null) {
                customer = customer(owner, place.counts(), nobody);
                customers.add(customer);
                continue;
            }
            if (customer == null) {
                customer = customer(owner, total, nobody);
                customers.add(customer);
            }
            if (place.line() == null) {
                FleetScope scope = FleetScope.sites(List.of(place.site()));
                site = new PlaceNode(place.site(), "s" + place.site(), scope, place.counts(), new ArrayList<>());
                customer.children.add(site);
            } else if (site != null) {
                String code = place.site() + "/" + place.line();
                FleetScope scope = new FleetScope(List.of(), List.of(), List.of(code), List.of());
                site.children.add(new PlaceNode(place.line(), "l" + code, scope, place.counts(), List.of()));
            }
        }
        return new PlaceNode(all, "", FleetScope.all(), total, customers);
    }

    /** Words in place of a tree that could not be read. */
    static PlaceNode note(String words) {
        return new PlaceNode(words, "note", FleetScope.all(), new Status.Counts(0, 0, 0, 0, 0, 0), List.of());
    }

    private static PlaceNode customer(String code, Status.Counts counts, String nobody) {
        FleetScope scope = new FleetScope(List.of(code), List.of(), List.of(), List.of());
        return new PlaceNode(code.isEmpty() ? nobody : code, "c" + code, scope, counts, new ArrayList<>());
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof PlaceNode node && node.key.equals(key);
    }

    @Override
    public int hashCode() {
        return key.hashCode();
    }
}
