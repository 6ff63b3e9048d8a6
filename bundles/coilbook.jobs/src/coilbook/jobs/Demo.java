package coilbook.jobs;

import java.time.Clock;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.jobs.internal.demo.DemoCatalogue;
import coilbook.jobs.internal.demo.FleetInventor;
import coilbook.register.Register;

/**
 * Fills a new register with an invented fleet: plants in eleven countries, an invented catalogue, mostly conforming stations, and faults of every
 * criterion dealt out evenly. The same seed gives the same data, and the first stations do not depend on how many follow.
 */
@Component(service = Demo.class)
public final class Demo {

    /** More would be of no use on one machine. */
    public static final int MOST_STATIONS = 2_000_000;
    private static final int ROWS_A_CHANGE = 20_000;
    private static final String WHO = "demo";

    private final Clock clock;

    @Activate
    public Demo() {
        this(Clock.systemUTC());
    }

    /** With a clock of one's own, for tests. */
    public Demo(Clock clock) {
        this.clock = clock;
    }

    /** Writes the catalogue and the stations, in steps of bounded size so that memory stays bounded too. */
    public void fill(Register register, int stations, long seed, Progress progress) throws CoilbookException {
        write(register, DemoCatalogue.rows(), "Invented catalogue", progress);
        FleetInventor inventor = new FleetInventor(seed);
        List<Row> batch = new ArrayList<>(ROWS_A_CHANGE + 100);
        int from = 1;
        for (int i = 0; i < stations; i++) {
            batch.addAll(inventor.station(i));
            if (batch.size() >= ROWS_A_CHANGE || i == stations - 1) {
                write(register, batch, "Invented stations " + from + " to " + (i + 1), progress);
                progress.report("Inventing stations", i + 1, stations);
                progress.check();
                batch.clear();
                from = i + 2;
            }
        }
    }

    private void write(Register register, List<Row> rows, String why, Progress progress) throws CoilbookException {
        List<RowChange> changes = new ArrayList<>(rows.size());
        rows.stream().sorted(Comparator.comparingInt(row -> Kind.ALL.indexOf(Kind.of(row))))
                .forEach(row -> changes.add(RowChange.insert(row)));
        register.apply(new Change(WHO, clock.instant(), why, changes), new Quiet(progress));
    }

    /** Lets a step be cancelled, but tells nothing of it: the person follows the stations, not each step's rows. */
    private record Quiet(Progress whole) implements Progress {

        @Override
        public void report(String step, long done, long total) {
            // the whole reports
        }

        @Override
        public boolean isCancelled() {
            return whole.isCancelled();
        }
    }
}
