package coilbook.register;

import java.util.List;

/**
 * Which status rows, in which order.
 *
 * @param scope part of the fleet
 * @param filters all must hold; an expression is words that must occur, or {@code = < <= > >= !=} and a value in the column's unit, or {@code low to high}
 * @param sorts the first counts most; the station's code breaks ties
 */
public record StatusQuery(FleetScope scope, List<Filter> filters, List<Sort> sorts) {

    public StatusQuery {
        filters = List.copyOf(filters);
        sorts = List.copyOf(sorts);
    }

    /** One column's filter. */
    public record Filter(StatusColumn column, String expression) {
    }

    /** One column's order. */
    public record Sort(StatusColumn column, boolean descending) {
    }

    public static StatusQuery all() {
        return new StatusQuery(FleetScope.all(), List.of(), List.of());
    }
}
