package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

import coilbook.fleet.Change;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.ValveType;

/**
 * What was true on a day, as it was known at an instant, on a history made by hand. On 10 January it is recorded that coil A sits at the station since
 * the 5th. On 20 January it is learnt that in truth coil B replaced it on the 15th. On 1 February the resistance of B is corrected from 40 to 90 ohm.
 */
class PastTest {

    private static final Instant TENTH = Instant.parse("2026-01-10T12:00:00Z");
    private static final Instant TWENTIETH = Instant.parse("2026-01-20T12:00:00Z");
    private static final Instant FEBRUARY = Instant.parse("2026-02-01T12:00:00Z");
    private static final String STATION = "S000/L/1";

    private static LocalDate january(int day) {
        return LocalDate.of(2026, 1, day);
    }

    private static Fitting fitting(String type, LocalDate from, LocalDate to) throws Exception {
        return SampleRows.bare(Fitting.class, "station", STATION, "kind", FittedKind.COIL, "valid_from", from, "valid_to", to, "type",
                type);
    }

    private static Register history() throws Exception {
        Register register = FleetFixture.registers().temporary();
        List<Row> rows = FleetFixture.shared(1);
        rows.add(SampleRows.bare(Line.class, "site", "S000", "code", "L"));
        rows.add(SampleRows.bare(Station.class, "site", "S000", "line", "L", "tag", "1"));
        CoilType wrong = SampleRows.bare(CoilType.class, "code", "B", "resistance20", Datum.catalogue(40));
        rows.add(SampleRows.bare(CoilType.class, "code", "A", "resistance20", Datum.catalogue(90)));
        rows.add(wrong);
        Fitting open = fitting("A", january(5), null);
        rows.add(open);
        record(register, TENTH, rows.stream().map(RowChange::insert).toList());
        record(register, TWENTIETH, List.of(RowChange.replace(open, fitting("A", january(5), january(15))),
                RowChange.insert(fitting("B", january(15), null))));
        record(register, FEBRUARY,
                List.of(RowChange.replace(wrong, SampleRows.bare(CoilType.class, "code", "B", "resistance20", Datum.measured(90)))));
        return register;
    }

    private static void record(Register register, Instant when, List<RowChange> rows) throws Exception {
        register.apply(new Change("tester", when, "History", rows), Progress.NONE);
    }

    @Test
    void theStationLooksAsItWasKnownThen() throws Exception {
        try (Register register = history()) {
            assertCoil(register, january(18), TENTH, "A", 90);
            assertCoil(register, january(18), TWENTIETH, "B", 40);
            assertCoil(register, january(18), FEBRUARY, "B", 90);
            assertCoil(register, january(18), null, "B", 90);
            assertCoil(register, january(14), null, "A", 90);
            assertCoil(register, january(15), null, "B", 90);
            assertCoil(register, january(14), TENTH.plusSeconds(60), "A", 90);
            assertNull(register.station(STATION, AsOf.on(january(4))).coil(), "nothing sat there yet");
            assertNull(register.station(STATION, new AsOf(january(18), TENTH.minusSeconds(1))), "nothing was known yet");
        }
    }

    private static void assertCoil(Register register, LocalDate trueOn, Instant knownAt, String type, double ohms) throws Exception {
        StationView view = register.station(STATION, new AsOf(trueOn, knownAt));
        assertEquals(type, view.coil().code(), trueOn + " as known at " + knownAt);
        assertEquals(ohms, view.coil().resistance20().value());
        assertEquals(type, view.fitting(FittedKind.COIL).type());
        assertEquals(trueOn, view.asOf());
    }

    @Test
    void pastFittingsAreThoseThatLeft() throws Exception {
        try (Register register = history()) {
            assertEquals(List.of("A"), register.station(STATION, AsOf.on(january(20))).pastFittings().stream().map(Fitting::type).toList());
            assertEquals(List.of(), register.station(STATION, AsOf.on(january(14))).pastFittings());
        }
    }

    @Test
    void rowsOfAPastAreThoseKnownAndTrueThen() throws Exception {
        try (Register register = history()) {
            List<String> fittings = new ArrayList<>();
            register.read(Kind.of(Fitting.class), new AsOf(january(18), TWENTIETH), row -> fittings.add(row.type()));
            assertEquals(List.of("B"), fittings);
            List<Double> ohms = new ArrayList<>();
            register.read(Kind.of(CoilType.class), new AsOf(january(18), TWENTIETH), row -> ohms.add(row.resistance20().value()));
            assertEquals(List.of(90.0, 40.0, 40.0, 90.0), ohms, "A, B, C40, C90");
            List<Row> circuits = new ArrayList<>();
            register.read(Kind.of(Circuit.class), new AsOf(january(18), TENTH.minusSeconds(1)), circuits::add);
            assertEquals(List.of(), circuits);
            List<Row> valves = new ArrayList<>();
            register.read(Kind.of(ValveType.class), AsOf.on(january(1)), valves::add);
            assertEquals(1, valves.size(), "catalogue entries have no interval");
        }
    }

    @Test
    void statusRowsOfAPast() throws Exception {
        try (Register register = history()) {
            assertPast(register, january(18), TENTH, "conformity", "A");
            assertPast(register, january(18), TWENTIETH, "nonconformity", "B");
            assertPast(register, january(18), null, "conformity", "B");
            assertPast(register, january(4), null, "undetermined", null);
            try (PastStatus none = register.statusAsOf(AsOf.on(january(18)), FleetScope.sites(List.of("S999")), Progress.NONE)) {
                assertEquals(0, none.ids(StatusQuery.all()).length);
            }
        }
    }

    private static void assertPast(Register register, LocalDate trueOn, Instant knownAt, String verdict, String coil) throws Exception {
        try (PastStatus past = register.statusAsOf(new AsOf(trueOn, knownAt), FleetScope.all(), Progress.NONE)) {
            StatusRow row = past.rows(past.ids(StatusQuery.all())).get(0);
            assertEquals(verdict, row.get(StatusColumn.VERDICT));
            assertEquals(coil, row.get(StatusColumn.COIL_TYPE));
            assertEquals(1, past.counts(FleetScope.all()).stations());
        }
    }
}
