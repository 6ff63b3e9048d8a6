package coilbook.exchange.internal.out;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CoilbookException;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;

/** The status rows of a scope beside its stations, both in the order of codes, a page at a time. Rows that the two sort differently wait until they are asked for. */
final class StatusFeed {

    private static final int PAGE = 500;

    private final Status status;
    private final long[] ids;
    private final Map<String, StatusRow> waiting = new HashMap<>();
    private int next;

    StatusFeed(Status status, FleetScope scope) throws CoilbookException {
        this.status = status;
        this.ids = status.ids(new StatusQuery(scope, List.of(), List.of(new StatusQuery.Sort(StatusColumn.STATION, false))));
    }

    int size() {
        return ids.length;
    }

    /** The row of a station, or {@code null} if it has none. */
    StatusRow of(String station) throws CoilbookException {
        StatusRow row = waiting.remove(station);
        while (row == null && next < ids.length) {
            long[] page = Arrays.copyOfRange(ids, next, Math.min(ids.length, next + PAGE));
            next += page.length;
            for (StatusRow one : status.rows(page)) {
                if (one != null) {
                    waiting.put(one.station(), one);
                }
            }
            row = waiting.remove(station);
        }
        return row;
    }
}
