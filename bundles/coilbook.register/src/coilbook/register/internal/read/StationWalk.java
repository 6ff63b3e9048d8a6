package coilbook.register.internal.read;

import java.sql.Connection;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Station;
import coilbook.register.FleetScope;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.Versions;

/** Walks through the stations of a scope in the order of their codes, a batch at a time. */
public final class StationWalk {

    private final Versions<Station> versions;

    public StationWalk(Codecs codecs) {
        this.versions = new Versions<>(codecs.of(Kind.of(Station.class)));
    }

    /** Takes one batch; may end the walk by an exception. */
    public interface Taker {
        void take(List<Versions.Version<Station>> batch) throws SQLException, CoilbookException;
    }

    /** Every station of a scope, in batches of {@link StationViews#BATCH}. */
    public void each(Connection connection, FleetScope scope, GroupRows groups, long known, Taker taker)
            throws SQLException, CoilbookException {
        List<Versions.Version<Station>> waiting = new ArrayList<>();
        for (Span span : Span.of(scope, groups)) {
            String last = span.after();
            boolean more = true;
            while (more) {
                int wanted = StationViews.BATCH - waiting.size();
                int before = waiting.size();
                versions.each(connection, span.condition(last).and(KindTable.knownAt(known)), List.of(KindTable.KEY), wanted, waiting::add);
                more = waiting.size() - before == wanted && !span.isSingle();
                if (waiting.size() >= StationViews.BATCH) {
                    last = waiting.get(waiting.size() - 1).key();
                    taker.take(List.copyOf(waiting));
                    waiting.clear();
                }
            }
        }
        if (!waiting.isEmpty()) {
            taker.take(List.copyOf(waiting));
        }
    }

    /** The same for stations by their codes; those that are not there are passed over. */
    public void each(Connection connection, Collection<String> codes, long known, Taker taker) throws SQLException, CoilbookException {
        List<String> sorted = List.copyOf(new TreeSet<>(codes));
        for (int i = 0; i < sorted.size(); i += StationViews.BATCH) {
            List<Versions.Version<Station>> batch = new ArrayList<>();
            versions.lookedUp(connection, sorted.subList(i, Math.min(sorted.size(), i + StationViews.BATCH)), KindTable.knownAt(known),
                    batch::add);
            batch.sort(Comparator.comparing(Versions.Version::key));
            if (!batch.isEmpty()) {
                taker.take(batch);
            }
        }
    }
}
