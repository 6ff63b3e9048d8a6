package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Fitting;
import coilbook.fleet.FleetSetting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.register.Status.Counts;
import coilbook.register.Status.Place;
import coilbook.register.internal.H2Registers;
import coilbook.register.internal.status.Judged;
import coilbook.register.internal.status.Judging;

/** Status rows: in step with the journal, never judged without need, found by filters and in the order asked for. */
class StatusTest {

    private static final int STATIONS = 2500;
    private static final LocalDate TODAY = FleetFixture.TODAY;

    @TempDir
    Path folder;
    private final Set<String> judged = java.util.Collections.synchronizedSet(new TreeSet<>());
    private final Judging judging = new Judging() {
        private final Judging standIn = new FleetFixture.StandInJudging();

        @Override
        public Judged judge(StationView station) {
            judged.add(station.code());
            return standIn.judge(station);
        }

        @Override
        public String version() {
            return standIn.version();
        }
    };
    private Register register;

    @BeforeEach
    void open() throws Exception {
        register = new H2Registers(judging, List::of).open(folder.resolve("r"), OpenMode.CREATE_NEW);
        List<Row> rows = FleetFixture.shared(3);
        rows.addAll(FleetFixture.stations(0, STATIONS));
        register.apply(FleetFixture.inserting(rows), Progress.NONE);
        assertFalse(register.status().isUpToDate(TODAY));
        assertEquals(STATIONS, register.status().bringUpToDate(TODAY, Progress.NONE));
        assertTrue(register.status().isUpToDate(TODAY));
        judged.clear();
    }

    @AfterEach
    void close() throws Exception {
        register.close();
    }

    private void apply(RowChange... rows) throws Exception {
        register.apply(FleetFixture.change("Change", List.of(rows)), Progress.NONE);
        assertFalse(register.status().isUpToDate(TODAY));
    }

    private long update() throws Exception {
        judged.clear();
        long count = register.status().bringUpToDate(TODAY, Progress.NONE);
        assertTrue(register.status().isUpToDate(TODAY));
        return count;
    }

    @Test
    void countsAndPlaces() throws Exception {
        Counts all = register.status().counts(FleetScope.all());
        assertEquals(new Counts(STATIONS, 0, STATIONS / 10, 0, 0, 0), all);
        assertEquals(new Counts(500, 0, 50, 0, 0, 0), register.status().counts(FleetScope.sites(List.of("S002"))));
        List<Place> places = register.status().places();
        assertEquals(new Place("ACME", null, null, all), places.get(0));
        assertEquals(new Place("ACME", "S000", null, new Counts(1000, 0, 100, 0, 0, 0)), places.get(1));
        assertEquals(new Place("ACME", "S000", "L00", new Counts(50, 0, 5, 0, 0, 0)), places.get(2));
        assertEquals(1 + 3 + 50, places.size());
    }

    @Test
    void findingsOfAScopeInOrder() throws Exception {
        List<String> stations = new ArrayList<>();
        register.status().findings(new FleetScope(List.of(), List.of(), List.of("S001/L01"), List.of()), finding -> {
            assertEquals("coil-resistance", finding.finding().criterion());
            assertEquals(40, finding.finding().evidence().value());
            assertEquals(java.util.Map.of("R", 40.0), finding.finding().evidence().numbers());
            stations.add(finding.station());
        });
        assertEquals(List.of("S001/L01/=K001050", "S001/L01/=K001060", "S001/L01/=K001070", "S001/L01/=K001080", "S001/L01/=K001090"),
                stations);
    }

    @Test
    void aRowOfItsOwnTouchesOneStation() throws Exception {
        Station station = register.find(Kind.of(Station.class), "S001/L00/=K001007");
        apply(RowChange.replace(station, Kind.of(Station.class).with(station, Kind.of(Station.class).field("description"), "new words")));
        assertEquals(1, update());
        assertEquals(Set.of("S001/L00/=K001007"), judged);
        long[] found = register.status().ids(filtered(StatusColumn.DESCRIPTION, "WORDS new"));
        assertEquals("S001/L00/=K001007", register.status().rows(found).get(0).station());
    }

    @Test
    void aCircuitTouchesItsStationsAndACatalogueEntryThoseThatUseIt() throws Exception {
        Circuit circuit = register.find(Kind.of(Circuit.class), "S002/C1");
        apply(RowChange.replace(circuit,
                Kind.of(Circuit.class).with(circuit, Kind.of(Circuit.class).field("nominal_voltage"), Datum.measured(240))));
        assertEquals(500, update());
        assertTrue(judged.stream().allMatch(code -> code.startsWith("S002/")));
        CoilType coil = register.find(Kind.of(CoilType.class), "C40");
        apply(RowChange.replace(coil,
                Kind.of(CoilType.class).with(coil, Kind.of(CoilType.class).field("resistance20"), Datum.measured(60))));
        assertEquals(STATIONS / 10, update());
        assertEquals(0, register.status().counts(FleetScope.all()).nonconformities());
        assertEquals(500, register.status().ids(filtered(StatusColumn.MAINS_VOLTAGE, "239 to 241")).length);
    }

    @Test
    void anItemTouchesEveryPlaceOfIt() throws Exception {
        Fitting there = register.find(Kind.of(Fitting.class), "S000/L00/=K000003/coil/2025-01-01");
        apply(RowChange.replace(there, Kind.of(Fitting.class).with(there, Kind.of(Fitting.class).field("serial"), "SN77")));
        assertEquals(2, update());
        assertEquals(Set.of("S000/L00/=K000003", "S000/L01/=K000077"), judged);
        StationView view = register.station("S000/L01/=K000077", AsOf.on(TODAY));
        assertEquals(List.of("S000/L00/=K000003", "S000/L01/=K000077"), view.itemPlaces().get("coil/SN77"));
    }

    @Test
    void whatChangesNothingReadIsNotJudgedAgain() throws Exception {
        apply(RowChange.insert(SampleRows.bare(Customer.class, "code", "OTHER")));
        assertEquals(0, update());
        apply(RowChange.insert(SampleRows.bare(FleetSetting.class, "name", "margin", "value", 0.1)));
        assertEquals(0, update(), "the default again");
        FleetSetting margin = register.find(Kind.of(FleetSetting.class), "margin");
        apply(RowChange.replace(margin, SampleRows.bare(FleetSetting.class, "name", "margin", "value", 0.2)));
        assertEquals(STATIONS, update());
    }

    @Test
    void theNextDayOnlyWhatTurnsIsJudged() throws Exception {
        Fitting coil = register.find(Kind.of(Fitting.class), "S000/L00/=K000000/coil/2025-01-01");
        LocalDate leaves = TODAY.plusDays(5);
        apply(RowChange.replace(coil, Kind.of(Fitting.class).with(coil, Kind.of(Fitting.class).field("valid_to"), leaves)));
        assertEquals(1, update());
        judged.clear();
        assertTrue(register.status().isUpToDate(TODAY.plusDays(4)), "nothing turned yet");
        assertFalse(register.status().isUpToDate(leaves));
        assertEquals(1, register.status().bringUpToDate(leaves, Progress.NONE));
        assertEquals(Set.of("S000/L00/=K000000"), judged);
        StatusRow row = register.status().rows(register.status().ids(filtered(StatusColumn.STATION, "=S000/L00/=K000000"))).get(0);
        assertEquals("undetermined", row.get(StatusColumn.VERDICT));
        assertNull(row.get(StatusColumn.COIL_TYPE));
        assertFalse(register.status().isUpToDate(TODAY), "judged on a later day");
        assertEquals(1, register.status().bringUpToDate(TODAY, Progress.NONE));
        assertEquals("C40", register.status().rows(new long[] { row.id() }).get(0).get(StatusColumn.COIL_TYPE));
    }

    @Test
    void aRemovedStationGoes() throws Exception {
        long[] before = register.status().ids(StatusQuery.all());
        List<RowChange> removals = FleetFixture.stations(0, 1).stream().filter(row -> !(row instanceof Line)).map(RowChange::remove)
                .toList();
        apply(removals.toArray(RowChange[]::new));
        update();
        assertEquals(STATIONS - 1, register.status().counts(FleetScope.all()).stations());
        assertNull(register.status().rows(before).get(0));
        List<String> left = new ArrayList<>();
        register.status().findings(FleetScope.sites(List.of("S000")), finding -> left.add(finding.station()));
        assertEquals(99, left.size());
    }

    @Test
    void aCancelledRunIsResumedAndItsRowsAreKept() throws Exception {
        FleetSetting margin = SampleRows.bare(FleetSetting.class, "name", "margin", "value", 0.3);
        apply(RowChange.insert(margin));
        Progress cancelling = new Progress() {
            private volatile boolean cancelled;

            @Override
            public void report(String step, long done, long total) {
                cancelled |= done > 0;
            }

            @Override
            public boolean isCancelled() {
                return cancelled;
            }
        };
        CoilbookException cancelled = assertThrows(CoilbookException.class, () -> register.status().bringUpToDate(TODAY, cancelling));
        assertEquals(Reason.CANCELLED, cancelled.reason());
        assertFalse(register.status().isUpToDate(TODAY));
        int first = judged.size();
        long rest = update();
        assertTrue(rest < STATIONS && first > 0 && first + rest >= STATIONS, first + " and " + rest);
    }

    @Test
    void theViewIsKeptOverReopeningAndMadeAnewWhenItIsOfNoUse() throws Exception {
        register.close();
        register = new H2Registers(judging, List::of).open(folder.resolve("r"), OpenMode.EXISTING);
        assertTrue(register.status().isUpToDate(TODAY));
        assertEquals(STATIONS, register.status().ids(StatusQuery.all()).length);
        register.close();
        Files.writeString(folder.resolve("r.view.mv.db"), "rubbish");
        register = new H2Registers(judging, List::of).open(folder.resolve("r"), OpenMode.EXISTING);
        assertFalse(register.status().isUpToDate(TODAY));
        assertEquals(STATIONS, update());
        register.close();
        Files.delete(folder.resolve("r.view.mv.db"));
        register = new H2Registers(judging, List::of).open(folder.resolve("r"), OpenMode.EXISTING);
        assertEquals(STATIONS, update());
    }

    private static StatusQuery filtered(StatusColumn column, String expression) {
        return new StatusQuery(FleetScope.all(), List.of(new StatusQuery.Filter(column, expression)), List.of());
    }

    @Test
    void filters() throws Exception {
        Status status = register.status();
        assertEquals(STATIONS / 10, status.ids(filtered(StatusColumn.COIL_TYPE, "c40")).length);
        assertEquals(STATIONS / 10 * 9, status.ids(filtered(StatusColumn.COIL_TYPE, "!= C40")).length);
        assertEquals(STATIONS, status.ids(filtered(StatusColumn.CABLE_TYPE, "=")).length);
        assertEquals(0, status.ids(filtered(StatusColumn.CABLE_TYPE, "!=")).length);
        assertEquals(84 * 5, status.ids(filtered(StatusColumn.CABLE_LENGTH, "1 m to 500 cm")).length, "lengths 1 to 5 m of thirty");
        assertEquals(84, status.ids(filtered(StatusColumn.CABLE_LENGTH, "3")).length);
        assertEquals(84 * 2, status.ids(filtered(StatusColumn.CABLE_LENGTH, "< 3")).length);
        assertEquals(STATIONS, status.ids(filtered(StatusColumn.CABLE_LENGTH, " ")).length);
        assertEquals(1, status.ids(filtered(StatusColumn.TAG, "K002499")).length);
        assertEquals(0, status.ids(filtered(StatusColumn.TAG, "%")).length, "a percent sign is only itself");
        CoilbookException refused = assertThrows(CoilbookException.class, () -> status.ids(filtered(StatusColumn.CABLE_LENGTH, "> long")));
        assertEquals(Reason.BAD_INPUT, refused.reason());
    }

    @Test
    void sortsAndWindows() throws Exception {
        Status status = register.status();
        long[] ids = status.ids(new StatusQuery(new FleetScope(List.of(), List.of("S000"), List.of(), List.of()), List.of(),
                List.of(new StatusQuery.Sort(StatusColumn.VERDICT, false), new StatusQuery.Sort(StatusColumn.CABLE_LENGTH, true))));
        List<StatusRow> rows = status.rows(Arrays.copyOf(ids, 101));
        assertEquals("nonconformity", rows.get(99).get(StatusColumn.VERDICT));
        assertEquals("conformity", rows.get(100).get(StatusColumn.VERDICT));
        for (int i = 1; i < 100; i++) {
            assertTrue((Double) rows.get(i - 1).get(StatusColumn.CABLE_LENGTH) >= (Double) rows.get(i).get(StatusColumn.CABLE_LENGTH));
        }
        List<Long> streamed = new ArrayList<>();
        status.each(StatusQuery.all(), row -> streamed.add(row.id()));
        assertArrayEquals(status.ids(StatusQuery.all()), streamed.stream().mapToLong(Long::longValue).toArray());
        assertEquals(3, (Double) status.rows(status.ids(filtered(StatusColumn.COIL_TYPE, "C40"))).get(0).get(StatusColumn.PEAK_CURRENT),
                1e-12);
    }

    @Test
    void stationsOfAScopeComeOnceAndInOrder() throws Exception {
        FleetScope scope = new FleetScope(List.of(), List.of("S001"), List.of("S000/L03", "S001/L00"),
                List.of("S002/L00/=K002001", "S000/L03/=K000151", "S009/L00/none"));
        List<String> codes = new ArrayList<>();
        register.stations(scope, AsOf.on(TODAY), view -> codes.add(view.code()));
        assertEquals(50 + 1000 + 1, codes.size());
        assertEquals(codes.stream().sorted().distinct().toList(), codes);
        List<String> all = new ArrayList<>();
        register.stations(FleetScope.all(), AsOf.on(TODAY), view -> {
            all.add(view.code());
            assertEquals(3, view.fittings().size());
            assertEquals("230", view.setting().code());
            assertEquals("DE", view.market().country());
        });
        assertEquals(STATIONS, all.size());
        List<String> customers = new ArrayList<>();
        register.stations(new FleetScope(List.of("ACME"), List.of(), List.of(), List.of()), AsOf.on(TODAY),
                view -> customers.add(view.code()));
        assertEquals(all, customers);
    }
}
