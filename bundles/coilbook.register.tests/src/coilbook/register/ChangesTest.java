package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import coilbook.fleet.Change;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;

/** A Change happens wholly or not at all, and says why not. */
class ChangesTest {

    private static final String STATION = "S000/L00/=K000000";

    private Register register;

    @BeforeEach
    void open() throws Exception {
        register = FleetFixture.registers().temporary();
        List<Row> rows = FleetFixture.shared(1);
        rows.addAll(FleetFixture.stations(0, 3));
        register.apply(FleetFixture.inserting(rows), Progress.NONE);
    }

    @AfterEach
    void close() throws Exception {
        register.close();
    }

    private CoilbookException refused(RowChange... rows) throws Exception {
        long head = register.head();
        Customer sound = SampleRows.bare(Customer.class, "code", "SOUND");
        List<RowChange> all = new ArrayList<>(List.of(RowChange.insert(sound)));
        all.addAll(List.of(rows));
        CoilbookException refused = assertThrows(CoilbookException.class,
                () -> register.apply(FleetFixture.change("Try", all), Progress.NONE));
        assertEquals(Reason.BAD_INPUT, refused.reason());
        assertEquals(head, register.head(), "nothing is recorded");
        assertEquals(head, register.journal(0, 100).size());
        assertNull(register.find(Kind.of(Customer.class), "SOUND"), "the sound row of a refused change is not recorded either");
        return refused;
    }

    private static void says(CoilbookException refused, String... words) {
        for (String word : words) {
            assertTrue(refused.getMessage().contains(word), refused.getMessage() + " should say " + word);
        }
    }

    @Test
    void aRowThatIsThereAlreadyIsRefused() throws Exception {
        says(refused(RowChange.insert(SampleRows.bare(Line.class, "site", "S000", "code", "L00"))), "Lines", "S000/L00", "there already");
    }

    @Test
    void aRowThatChangedMeanwhileIsRefused() throws Exception {
        CoilType now = register.find(Kind.of(CoilType.class), "C90");
        CoilType stale = SampleRows.bare(CoilType.class, "code", "C90", "resistance20", Datum.measured(90));
        CoilType wanted = SampleRows.bare(CoilType.class, "code", "C90", "resistance20", Datum.measured(91));
        says(refused(RowChange.replace(stale, wanted)), "Coil types", "C90", "meanwhile");
        says(refused(RowChange.remove(SampleRows.bare(CoilType.class, "code", "GONE"))), "GONE", "no longer there");
        register.apply(FleetFixture.change("Fresh", List.of(RowChange.replace(now, wanted))), Progress.NONE);
        assertEquals(wanted, register.find(Kind.of(CoilType.class), "C90"));
    }

    @Test
    void aValueOutOfRangeIsRefusedByName() throws Exception {
        CoilType now = register.find(Kind.of(CoilType.class), "C90");
        Object[] values = Kind.of(CoilType.class).values(now);
        values[Kind.of(CoilType.class).fields().indexOf(Kind.of(CoilType.class).field("resistance20"))] = Datum.measured(-1);
        says(refused(RowChange.replace(now, Kind.of(CoilType.class).construct(values))), "C90", "Resistance at 20 °C", "above 0");
    }

    @Test
    void aReferenceThatLeadsNowhereIsRefused() throws Exception {
        says(refused(RowChange.insert(SampleRows.bare(Circuit.class, "site", "NOWHERE", "code", "C1"))), "Circuits", "NOWHERE", "Sites");
        says(refused(RowChange.insert(SampleRows.bare(Station.class, "site", "S000", "line", "L77", "tag", "x"))), "S000/L77", "Lines");
        says(refused(
                RowChange.insert(SampleRows.bare(Supply.class, "station", STATION, "valid_from", FleetFixture.TODAY, "circuit", "C9"))),
                "S000/C9");
        says(refused(RowChange.insert(
                SampleRows.bare(Fitting.class, "station", STATION, "kind", FittedKind.CABLE, "valid_from", FleetFixture.TODAY, "type",
                        "C90"))),
                "Cable types", "C90");
        says(refused(RowChange.insert(SampleRows.bare(Reading.class, "subject_kind", SubjectKind.ITEM, "subject", "coil/none", "quantity",
                ReadingQuantity.WINDING_RESISTANCE, "taken_at", FleetFixture.TODAY.atStartOfDay(), "value", 90.0))), "coil/none", "Items");
    }

    @Test
    void circuitsAreFoundWithAndWithoutTheirSite() throws Exception {
        Supply with = SampleRows.bare(Supply.class, "station", STATION, "valid_from", FleetFixture.TODAY, "circuit", "S000/C1");
        register.apply(FleetFixture.inserting(List.of(with)), Progress.NONE);
        assertEquals("C1", register.station(STATION, AsOf.on(FleetFixture.TODAY)).circuit().code());
    }

    @Test
    void whatOthersReferToIsNotRemoved() throws Exception {
        for (Row used : List.of(register.find(Kind.of(CoilType.class), "C90"), register.find(Kind.of(Site.class), "S000"),
                register.find(Kind.of(Line.class), "S000/L00"), register.find(Kind.of(Station.class), STATION),
                register.find(Kind.of(Circuit.class), "S000/C1"))) {
            says(refused(RowChange.remove(used)), used.key(), "refers to it");
        }
    }

    @Test
    void aStationGoesWithAllThatBelongsToIt() throws Exception {
        List<RowChange> rows = new ArrayList<>();
        for (Row row : FleetFixture.stations(1, 2)) {
            if (!(row instanceof Line)) {
                rows.add(RowChange.remove(row));
            }
        }
        register.apply(FleetFixture.change("Remove", rows), Progress.NONE);
        assertNull(register.find(Kind.of(Station.class), "S000/L00/=K000001"));
        assertNotNull(register.find(Kind.of(Station.class), STATION));
    }

    @Test
    void twiceTheSameRowIsRefused() throws Exception {
        Line line = SampleRows.bare(Line.class, "site", "S000", "code", "L99");
        says(refused(RowChange.insert(line), RowChange.insert(line)), "once");
    }

    @Test
    void aCancelledChangeLeavesNothing() throws Exception {
        List<Row> rows = FleetFixture.stations(50, 1000);
        Progress cancelling = new Progress() {
            private boolean reported;

            @Override
            public void report(String step, long done, long total) {
                reported = true;
            }

            @Override
            public boolean isCancelled() {
                return reported;
            }
        };
        CoilbookException cancelled = assertThrows(CoilbookException.class, () -> register.apply(FleetFixture.inserting(rows), cancelling));
        assertEquals(Reason.CANCELLED, cancelled.reason());
        assertEquals(1, register.head());
        assertNull(register.find(Kind.of(Station.class), "S000/L01/=K000050"));
        register.apply(FleetFixture.inserting(rows), Progress.NONE);
        assertNotNull(register.find(Kind.of(Station.class), "S000/L01/=K000050"));
    }

    @Test
    void rowsComeInTheOrderOfTheirKeysAndJournalInItsOwn() throws Exception {
        register.apply(FleetFixture.inserting(FleetFixture.stations(50, 120)), Progress.NONE);
        for (Kind<?> kind : List.of(Kind.of(Station.class), Kind.of(Fitting.class), Kind.of(Duty.class))) {
            List<String> keys = new ArrayList<>();
            register.read(kind, row -> keys.add(row.key()));
            assertEquals(kind.type() == Fitting.class ? 219 : 73, keys.size());
            assertEquals(keys.stream().sorted().toList(), keys, kind.toString());
        }
        List<JournalEntry> journal = register.journal(0, 10);
        assertEquals(List.of(1L, 2L), journal.stream().map(JournalEntry::seq).toList());
        assertEquals("tester", journal.get(0).who());
        assertEquals(1, register.journal(1, 10).size());
    }

    @Test
    void whatAChangeDidCanBeReadBack() throws Exception {
        Line line = register.find(Kind.of(Line.class), "S000/L00");
        Line faster = Kind.of(Line.class).with(line, Kind.of(Line.class).field("speed"), Datum.measured(2));
        Line other = SampleRows.bare(Line.class, "site", "S000", "code", "L50");
        register.apply(FleetFixture.inserting(List.of(other)), Progress.NONE);
        Change change = FleetFixture.change("Faster", List.of(RowChange.replace(line, faster), RowChange.remove(other)));
        long seq = register.apply(change, Progress.NONE);
        Change back = register.change(seq);
        assertEquals(change.why(), back.why());
        assertEquals(change.rows(), back.rows());
    }
}
