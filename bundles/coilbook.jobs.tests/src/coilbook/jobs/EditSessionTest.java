package coilbook.jobs;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import coilbook.criteria.Assessment;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.electrics.Corner;
import coilbook.electrics.Trace;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.StationView;
import coilbook.register.AsOf;
import coilbook.register.Register;
import coilbook.register.StatusColumn;

/** Editing a small invented fleet cell by cell. */
class EditSessionTest {

    private static final Clock CLOCK = Clock.fixed(Instant.parse("2026-11-30T10:00:00Z"), ZoneOffset.UTC);
    private static final LocalDate TODAY = LocalDate.of(2026, 11, 30);

    private Register register;
    private EditSession session;
    private String station;

    @BeforeEach
    void aStationWithATwoLevelDriver() throws CoilbookException {
        register = RuntimeRegisters.get().temporary();
        new Demo(CLOCK).fill(register, 16, 1, Progress.NONE);
        session = new Editing(CLOCK).open(register, "tester");
        TreeSet<String> found = new TreeSet<>();
        register.read(Kind.of(Fitting.class), fitting -> {
            if (fitting.kind() == FittedKind.DRIVER && fitting.type().equals("DUO-44")) {
                found.add(fitting.station());
            }
        });
        for (String code : found) {
            if (broken(session.assess(code)).isEmpty() && register.station(code, AsOf.on(TODAY)).settingChoice() != null) {
                station = code;
                break;
            }
        }
        assertNotNull(station, "no sound station to edit");
    }

    @AfterEach
    void letGo() throws CoilbookException {
        register.close();
    }

    private static Set<String> broken(Assessment assessment) {
        return assessment.findings().stream().filter(f -> f.verdict() == Verdict.NONCONFORMITY).map(Finding::criterion)
                .collect(Collectors.toSet());
    }

    private StationView view() throws CoilbookException {
        return register.station(station, AsOf.on(TODAY));
    }

    private Edited edit(StatusColumn column, String text) throws CoilbookException {
        return session.edit(station, column, text, Progress.NONE);
    }

    @Test
    void anotherCoilChangesVerdictAndRowAtOnceAndUndoPutsThemBack() throws CoilbookException {
        String serial = view().fitting(FittedKind.COIL).serial();
        Edited edited = edit(StatusColumn.COIL_TYPE, "KM-48");
        assertEquals("KM-48", edited.rows().get(0).get(StatusColumn.COIL_TYPE));
        assertEquals(Verdict.NONCONFORMITY.label(), String.valueOf(edited.rows().get(0).get(StatusColumn.VERDICT)));
        assertTrue(broken(session.assess(station)).contains("coil-class"));
        assertEquals("KM-48", register.find(Kind.of(Item.class), "coil/" + serial).type(), "the piece is of the type that was typed");
        assertEquals(edited.seq(), session.undoable().seq());

        session.undo(Progress.NONE);
        assertEquals("KM-24", view().fitting(FittedKind.COIL).type());
        assertTrue(broken(session.assess(station)).isEmpty());
        assertEquals("Coil type at " + station + ": KM-48", session.redoable());

        session.redo(Progress.NONE);
        assertEquals("KM-48", view().fitting(FittedKind.COIL).type());
        assertNull(session.redoable());
    }

    @Test
    void whatDiffersInNothingIsNoStep() throws CoilbookException {
        assertEquals(0, edit(StatusColumn.COIL_TYPE, "KM-24").seq());
    }

    @Test
    void aDateEndsThePresentPartAndBeginsTheNext() throws CoilbookException {
        session.edit(List.of(new CellEdit(station, StatusColumn.COIL_TYPE, "KM-24A", TODAY.minusDays(3))), Progress.NONE);
        assertEquals("KM-24A", view().fitting(FittedKind.COIL).type());
        assertEquals("KM-24", register.station(station, AsOf.on(TODAY.minusDays(4))).fitting(FittedKind.COIL).type());
        assertNull(view().fitting(FittedKind.COIL).serial());
    }

    @Test
    void aDateForDutyCarriesOnTheRest() throws CoilbookException {
        double onTime = view().duty().onTime().value();
        session.edit(List.of(new CellEdit(station, StatusColumn.CYCLE_RATE, "2", TODAY.minusDays(3))), Progress.NONE);
        assertEquals(2, view().duty().cycleRate().value());
        assertEquals(onTime, view().duty().onTime().value());
    }

    @Test
    void anotherDriverDropsTheStrapOfTheOneBefore() throws CoilbookException {
        edit(StatusColumn.DRIVER_TYPE, "DUO-44W");
        assertNull(view().settingChoice());
        assertEquals(List.of("W"), session.choices(station, StatusColumn.INPUT_SETTING));
        edit(StatusColumn.INPUT_SETTING, "W");
        assertEquals("W", view().setting().code());
    }

    @Test
    void cellsOfOnePasteAreOneStep() throws CoilbookException {
        long before = register.head();
        session.edit(
                List.of(CellEdit.correct(station, StatusColumn.CYCLE_RATE, "2.5"), CellEdit.correct(station, StatusColumn.ON_TIME, "22 ms"),
                        CellEdit.correct(station, StatusColumn.CABLE_LENGTH, "7,5"),
                        CellEdit.correct(station, StatusColumn.DESCRIPTION, "left gun")),
                Progress.NONE);
        assertEquals(before + 1, register.head());
        assertEquals(2.5, view().duty().cycleRate().value());
        assertEquals(0.022, view().duty().onTime().value(), 1e-12);
        assertEquals(7.5, view().station().cableLength().value());
        assertEquals("left gun", view().station().description());
    }

    @Test
    void aCellThatCannotHoldItsTextChangesNothingAndSaysWhy() throws CoilbookException {
        long before = register.head();
        List<CellEdit> cells = List.of(CellEdit.correct(station, StatusColumn.DESCRIPTION, "x"),
                CellEdit.correct(station, StatusColumn.CABLE_LENGTH, "-3"));
        CoilbookException refused = assertThrows(CoilbookException.class, () -> session.edit(cells, Progress.NONE));
        assertTrue(refused.getMessage().contains("Cable length") && refused.getMessage().contains("-3"), refused::getMessage);
        CoilbookException unknown = assertThrows(CoilbookException.class, () -> edit(StatusColumn.COIL_TYPE, "KM-42"));
        assertTrue(unknown.getMessage().contains("the nearest is KM-"), unknown::getMessage);
        CoilbookException strap = assertThrows(CoilbookException.class, () -> edit(StatusColumn.INPUT_SETTING, "S320"));
        assertTrue(strap.getMessage().contains("S230"), strap::getMessage);
        assertThrows(CoilbookException.class, () -> edit(StatusColumn.PEAK_CURRENT, "3"));
        assertEquals(before, register.head());
    }

    @Test
    void everyColumnThatIsNotComputedNorAPlaceCanBeTyped() {
        Set<StatusColumn> places = Set.of(StatusColumn.STATION, StatusColumn.CUSTOMER, StatusColumn.SITE, StatusColumn.LINE,
                StatusColumn.TAG,
                StatusColumn.COUNTRY);
        for (StatusColumn column : StatusColumn.values()) {
            assertEquals(!column.isComputed() && !places.contains(column), EditSession.isEditable(column), column::name);
        }
    }

    @Test
    void choicesAreCodesOfTheCatalogueAndTheSite() throws CoilbookException {
        assertTrue(session.choices(station, StatusColumn.COIL_TYPE).containsAll(List.of("KM-24", "KM-48", "KS-24")));
        assertTrue(session.choices(station, StatusColumn.CIRCUIT).contains("C1"));
        assertTrue(session.choices(station, StatusColumn.CABLE_LENGTH).isEmpty());
        assertFalse(EditSession.hasChoices(StatusColumn.CABLE_LENGTH));
    }

    @Test
    void aWaveformShowsThePeakOfItsCorner() throws CoilbookException {
        Assessment assessment = session.assess(station);
        Trace trace = session.trace(assessment, Corner.NOMINAL);
        double highest = 0;
        for (double current : trace.coilCurrent()) {
            highest = Math.max(highest, current);
        }
        assertEquals(assessment.electrics().nominalPeak().value(), highest, 0.01 * highest);
    }
}
