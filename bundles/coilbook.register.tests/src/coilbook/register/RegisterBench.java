package coilbook.register;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;

import coilbook.fleet.Duty;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;

/** Not a test: how long a large fleet takes. Arguments: stations, folder. */
final class RegisterBench {

    private RegisterBench() {
    }

    public static void main(String[] arguments) throws Exception {
        int stations = Integer.parseInt(arguments[0]);
        Path base = Files.createDirectories(Path.of(arguments[1])).resolve("bench" + System.nanoTime());
        List<Row> shared = FleetFixture.shared((stations + 999) / 1000);
        try (Register register = timed("create", () -> FleetFixture.registers().open(base, OpenMode.CREATE_NEW))) {
            register.apply(FleetFixture.inserting(shared), Progress.NONE);
            for (int from = 0; from < stations; from += 50_000) {
                List<Row> rows = FleetFixture.stations(from, Math.min(stations, from + 50_000));
                timed("record " + rows.size() + " rows", () -> register.apply(FleetFixture.inserting(rows), Progress.NONE));
            }
            fill(register);
            List<RowChange> edits = new ArrayList<>();
            register.read(Kind.of(Duty.class), duty -> {
                if (edits.size() < 10_000) {
                    edits.add(RowChange.replace(duty,
                            new Duty(duty.station(), duty.validFrom(), null, duty.cycleRate(), duty.cycleRate(), null, null,
                                    null, null, null, null)));
                }
            });
            long seq = timed("change 10,000 rows", () -> register.apply(FleetFixture.change("Duties", edits), Progress.NONE));
            timed("judge again", () -> register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE));
            timed("undo 10,000 rows", () -> register.undo(seq, "bench", Progress.NONE));
            timed("judge again", () -> register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE));
            Station station = register.find(Kind.of(Station.class), "S000/L00/=K000007");
            Station renamed = Kind.of(Station.class).with(station, Kind.of(Station.class).field("description"), "renamed");
            timed("change one row",
                    () -> register.apply(FleetFixture.change("One", List.of(RowChange.replace(station, renamed))), Progress.NONE));
            timed("judge one", () -> register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE));
            timed("one station's view", () -> register.station("S000/L00/=K000007", AsOf.on(FleetFixture.TODAY)));
        }
        timed("open again", () -> {
            FleetFixture.registers().open(base, OpenMode.EXISTING).close();
            return null;
        });
        System.out.println("files: " + Files.size(Path.of(base + ".mv.db")) / 1_000_000 + " MB, view "
                + Files.size(Path.of(base + ".view.mv.db")) / 1_000_000
                + " MB");
    }

    private static void fill(Register register) throws Exception {
        int[] count = new int[1];
        timed("read all fittings", () -> {
            register.read(Kind.of(Fitting.class), row -> count[0]++);
            return count[0];
        });
        timed("all station views", () -> {
            register.stations(FleetScope.all(), AsOf.on(FleetFixture.TODAY), view -> count[0]++);
            return count[0];
        });
        timed("judge all", () -> register.status().bringUpToDate(FleetFixture.TODAY, Progress.NONE));
        long[] ids = timed("ids by code", () -> register.status().ids(StatusQuery.all()));
        for (StatusColumn column : List.of(StatusColumn.PEAK_CURRENT, StatusColumn.VERDICT, StatusColumn.COIL_SERIAL)) {
            timed("ids by " + column.id(),
                    () -> register.status().ids(new StatusQuery(FleetScope.all(), List.of(), List.of(new StatusQuery.Sort(column, true)))));
        }
        timed("ids filtered", () -> register.status().ids(new StatusQuery(FleetScope.all(),
                List.of(new StatusQuery.Filter(StatusColumn.COIL_TYPE, "c40"), new StatusQuery.Filter(StatusColumn.CABLE_LENGTH, "< 10")),
                List.of())));
        timed("window of 200", () -> register.status().rows(java.util.Arrays.copyOfRange(ids, ids.length / 2, ids.length / 2 + 200)));
        timed("every row", () -> {
            register.status().each(StatusQuery.all(), row -> count[0]++);
            return null;
        });
        timed("every finding", () -> {
            register.status().findings(FleetScope.all(), row -> count[0]++);
            return null;
        });
        timed("places", () -> register.status().places().size());
        timed("places again", () -> register.status().places().size());
        timed("counts of a site", () -> register.status().counts(FleetScope.sites(List.of("S001"))));
    }

    private static <T> T timed(String what, Callable<T> work) throws Exception {
        long start = System.nanoTime();
        long busy = cpu();
        T result = work.call();
        System.out.printf("%-28s %8.0f ms %8.0f ms CPU%n", what, (System.nanoTime() - start) / 1e6, (cpu() - busy) / 1e6);
        return result;
    }

    /** Nanoseconds of all threads. */
    private static long cpu() {
        return ProcessHandle.current().info().totalCpuDuration().orElse(Duration.ZERO).toNanos();
    }
}
