package coilbook.jobs.internal.merge;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.Test;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.Timed;
import coilbook.fleet.TypeStatus;

/** How files are laid over a register; every expectation is worked out by hand from the rules of the merge. */
class PatchMergeTest {

    private static final String STATION = "DE1/L1/G1";
    private static final LocalDate MAY = LocalDate.of(2026, 5, 1);

    private final List<RowPatch> patches = new ArrayList<>();

    private static Row row(Class<? extends Row> type, Object... idsAndValues) {
        Kind<?> kind = Kind.of(type);
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < idsAndValues.length; i += 2) {
            values[kind.fields().indexOf(kind.field((String) idsAndValues[i]))] = idsAndValues[i + 1];
        }
        return kind.construct(values);
    }

    private void says(String sheet, int line, boolean onlyIfMissing, Class<? extends Row> type, Object... idsAndValues) {
        Kind<?> kind = Kind.of(type);
        Map<Field, Object> values = new LinkedHashMap<>();
        for (int i = 0; i < idsAndValues.length; i += 2) {
            values.put(kind.field((String) idsAndValues[i]), idsAndValues[i + 1]);
        }
        patches.add(new RowPatch(kind, values, new RowPatch.Source("fleet.xlsx", sheet, line), onlyIfMissing));
    }

    private void says(int line, Class<? extends Row> type, Object... idsAndValues) {
        says(Kind.of(type).sheet(), line, false, type, idsAndValues);
    }

    private void list(int line, Class<? extends Row> type, Object... idsAndValues) {
        says("List", line, false, type, idsAndValues);
    }

    private PatchMerge.Outcome merge(PresentRows present, InputProblem... rejected) throws CoilbookException {
        int lines = (int) patches.stream().map(RowPatch::source).distinct().count();
        return PatchMerge.merge(new Incoming(lines + rejected.length, patches, List.of(rejected), false, false), present, Progress.NONE);
    }

    private static HeldRows plant() {
        return new HeldRows(row(Customer.class, "code", "QUILL"), row(Site.class, "code", "DE1", "customer", "QUILL", "country", "DE"),
                row(Circuit.class, "site", "DE1", "code", "C1"), row(Circuit.class, "site", "DE1", "code", "C2"),
                row(Line.class, "site", "DE1", "code", "L1"), row(CoilType.class, "code", "KM-24"), row(CoilType.class, "code", "KM-36"),
                row(Station.class, "site", "DE1", "line", "L1", "tag", "G1", "description", "left gun"),
                row(Supply.class, "station", STATION, "circuit", "DE1/C1"),
                row(Duty.class, "station", STATION, "cycle_rate", Datum.measured(5), "on_time", Datum.measured(0.02)),
                row(Fitting.class, "station", STATION, "kind", FittedKind.COIL, "type", "KM-24", "serial", "S1"));
    }

    @Test
    void aFieldThatAFileDoesNotMentionStays() throws CoilbookException {
        says(2, Station.class, "site", "DE1", "line", "L1", "tag", "G1", "cable_length", Datum.measured(7));
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(1, outcome.rows().size());
        Station after = (Station) outcome.rows().get(0).after();
        assertEquals("left gun", after.description());
        assertEquals(7, after.cableLength().value());
        assertEquals(List.of(1, 0, 1, 0), List.of(outcome.read(), outcome.created(), outcome.changed(), outcome.unchanged()));
    }

    @Test
    void aBlankCellOfARowsOwnSheetClearsAndOneOfAListDoesNot() throws CoilbookException {
        says(2, Station.class, "site", "DE1", "line", "L1", "tag", "G1", "description", null);
        assertNull(((Station) merge(plant()).rows().get(0).after()).description());
        patches.clear();
        list(2, Station.class, "site", "DE1", "line", "L1", "tag", "G1", "description", null);
        assertEquals(1, merge(plant()).unchanged());
    }

    @Test
    void theSameContentIsNoChange() throws CoilbookException {
        list(2, Station.class, "site", "DE1", "line", "L1", "tag", "G1");
        list(2, Supply.class, "station", STATION, "circuit", "C1");
        list(2, Fitting.class, "station", STATION, "kind", FittedKind.COIL, "type", "KM-24");
        PatchMerge.Outcome outcome = merge(plant());
        assertTrue(outcome.rows().isEmpty(), outcome.rows()::toString);
        assertEquals(1, outcome.unchanged());
        assertNull(outcome.change("x", java.time.Instant.EPOCH, "y"));
    }

    @Test
    void otherContentWithoutADateCorrectsThePresentInterval() throws CoilbookException {
        list(2, Fitting.class, "station", STATION, "kind", FittedKind.COIL, "type", "KM-36");
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(1, outcome.rows().size());
        RowChange change = outcome.rows().get(0);
        assertEquals("KM-24", ((Fitting) change.before()).type());
        assertEquals("KM-36", ((Fitting) change.after()).type());
        assertNull(((Fitting) change.after()).validFrom());
    }

    @Test
    void otherContentWithALaterDateEndsThePresentIntervalAndBeginsAnother() throws CoilbookException {
        list(2, Fitting.class, "station", STATION, "kind", FittedKind.COIL, "valid_from", MAY, "type", "KM-36");
        HeldRows held = plant();
        PatchMerge.Outcome outcome = merge(held);
        held.apply(outcome.rows());
        List<Timed> intervals = held.intervals(Kind.of(Fitting.class), Intervals.subject(Kind.of(Fitting.class),
                row(Fitting.class, "station", STATION, "kind", FittedKind.COIL)));
        assertEquals(2, intervals.size());
        assertEquals(MAY, intervals.get(0).validTo());
        assertEquals("KM-36", ((Fitting) intervals.get(1)).type());
        assertNull(((Fitting) intervals.get(1)).serial(), "the piece that left must not come along");
        assertNull(intervals.get(1).validTo());
    }

    @Test
    void aNewDutyCarriesOnWhatIsNotSaid() throws CoilbookException {
        list(2, Duty.class, "station", STATION, "valid_from", MAY, "cycle_rate", Datum.measured(8));
        PatchMerge.Outcome outcome = merge(plant());
        Duty opened = outcome.rows().stream().map(c -> (Duty) c.after()).filter(d -> MAY.equals(d.validFrom())).findFirst().orElseThrow();
        assertEquals(8, opened.cycleRate().value());
        assertEquals(0.02, opened.onTime().value());
    }

    @Test
    void anEarlierDateThanThePresentOneIsRefusedWithItsReason() throws CoilbookException {
        HeldRows held = plant();
        held.apply(List.of(RowChange.remove(held.intervals(Kind.of(Supply.class), STATION).get(0)),
                RowChange.insert(row(Supply.class, "station", STATION, "valid_from", MAY, "circuit", "DE1/C1"))));
        list(2, Supply.class, "station", STATION, "valid_from", MAY.minusYears(1), "circuit", "C2");
        PatchMerge.Outcome outcome = merge(held);
        assertEquals(1, outcome.rejected().size());
        assertTrue(outcome.rejected().get(0).problem().contains("2026-05-01"), outcome.rejected()::toString);
    }

    @Test
    void pastIntervalsOfAPartComeInBesideThePresentOne() throws CoilbookException {
        says(2, Fitting.class, "station", STATION, "kind", FittedKind.COIL, "valid_from", MAY.minusYears(3), "valid_to", MAY.minusYears(1),
                "type", "KM-36");
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(1, outcome.created());
        assertTrue(outcome.rows().get(0).before() == null);
    }

    @Test
    void overlappingSuppliesAreRefused() throws CoilbookException {
        says(2, Supply.class, "station", STATION, "valid_from", MAY.minusYears(3), "valid_to", MAY, "circuit", "C2");
        assertEquals(1, merge(plant()).rejected().size());
    }

    @Test
    void aRowThatNamesNothingIsRefusedWithTheRowsThatRestOnIt() throws CoilbookException {
        says(2, Site.class, "code", "US1", "country", "US");
        says(5, Line.class, "site", "US1", "code", "L1");
        says(6, Line.class, "site", "US2", "code", "L1");
        says(8, Station.class, "site", "US2", "line", "L1", "tag", "G1");
        says(9, Station.class, "site", "US1", "line", "L1", "tag", "G1");
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(List.of(6, 8), outcome.rejected().stream().map(InputProblem::row).sorted().toList());
        assertEquals(3, outcome.created());
        assertEquals(5, outcome.read());
        assertTrue(outcome.rejected().stream().anyMatch(p -> p.problem().contains("US2")), outcome.rejected()::toString);
    }

    @Test
    void oneSubjectTwiceInASheetIsReportedWithTheFirstPlace() throws CoilbookException {
        says(2, Station.class, "site", "DE1", "line", "L1", "tag", "G2");
        says(3, Station.class, "site", "DE1", "line", "L1", "tag", "G3");
        says(7, Station.class, "site", "DE1", "line", "L1", "tag", "G2");
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(2, outcome.created());
        assertEquals(7, outcome.rejected().get(0).row());
        assertTrue(outcome.rejected().get(0).problem().contains("row 2"), outcome.rejected()::toString);
    }

    @Test
    void linesThatContradictEachOtherAboutASharedRowAreReported() throws CoilbookException {
        list(5, Circuit.class, "site", "DE1", "code", "C9", "nominal_voltage", Datum.nameplate(230));
        list(5, Station.class, "site", "DE1", "line", "L1", "tag", "G5");
        list(6, Circuit.class, "site", "DE1", "code", "C9", "nominal_voltage", Datum.nameplate(230));
        list(6, Station.class, "site", "DE1", "line", "L1", "tag", "G6");
        list(7, Circuit.class, "site", "DE1", "code", "C9", "nominal_voltage", Datum.nameplate(120));
        list(7, Station.class, "site", "DE1", "line", "L1", "tag", "G7");
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(List.of(7), outcome.rejected().stream().map(InputProblem::row).toList());
        assertEquals(2, outcome.created());
        assertEquals(3, outcome.rows().size());
        assertTrue(outcome.rejected().get(0).problem().contains("230"), outcome.rejected()::toString);
    }

    @Test
    void aTypeNamedInPassingIsCreatedIncompleteOnlyWhereTheCatalogueLacksIt() throws CoilbookException {
        says("List", 5, true, CoilType.class, "code", "KM-24", "status", TypeStatus.INCOMPLETE, "rated_voltage", Datum.nameplate(120));
        says("List", 6, true, CoilType.class, "code", "ZZ-9", "status", TypeStatus.INCOMPLETE, "rated_voltage", Datum.nameplate(48));
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(1, outcome.rows().size());
        CoilType made = (CoilType) outcome.rows().get(0).after();
        assertEquals("ZZ-9", made.code());
        assertEquals(TypeStatus.INCOMPLETE, made.status());
        assertNull(made.resistance20());
        assertEquals(List.of("coil type ZZ-9"), outcome.incompleteTypes());
    }

    @Test
    void aCatalogueSheetInTheSameFilesGoesBeforeWhatAListSaysInPassing() throws CoilbookException {
        says("List", 5, true, CoilType.class, "code", "ZZ-9", "status", TypeStatus.INCOMPLETE);
        says(2, CoilType.class, "code", "ZZ-9", "status", TypeStatus.CURRENT);
        PatchMerge.Outcome outcome = merge(plant());
        assertEquals(TypeStatus.CURRENT, ((CoilType) outcome.rows().get(0).after()).status());
        assertTrue(outcome.incompleteTypes().isEmpty());
    }

    @Test
    void aLineThatTheReaderRejectedCountsAsRead() throws CoilbookException {
        says(2, Customer.class, "code", "NEW");
        PatchMerge.Outcome outcome = merge(new HeldRows(), new InputProblem("fleet.xlsx", "Customers", 3, "Customer", "", "a value"));
        assertEquals(List.of(2, 1, 1), List.of(outcome.read(), outcome.created(), outcome.rejected().size()));
    }

    @Test
    void bringingTheSameInTwiceChangesNothing() throws CoilbookException {
        HeldRows held = plant();
        says(2, Station.class, "site", "DE1", "line", "L1", "tag", "G2", "description", "right gun");
        says("Stations", 2, false, Supply.class, "station", "DE1/L1/G2", "valid_from", MAY, "valid_to", null, "circuit", "C2");
        says("Stations", 2, false, Duty.class, "station", "DE1/L1/G2", "valid_from", null, "valid_to", null, "cycle_rate", null);
        says(2, Fitting.class, "station", "DE1/L1/G2", "kind", FittedKind.COIL, "valid_from", MAY, "valid_to", null, "type", "KM-36");
        says(3, Fitting.class, "station", "DE1/L1/G2", "kind", FittedKind.COIL, "valid_from", null, "valid_to", MAY, "type", "KM-24");
        PatchMerge.Outcome first = merge(held);
        assertEquals(List.of(), first.rejected());
        assertEquals(4, first.rows().size(), first.rows()::toString);
        held.apply(first.rows());
        PatchMerge.Outcome second = merge(held);
        assertEquals(List.of(), second.rows());
        assertEquals(second.read(), second.unchanged());
    }
}
