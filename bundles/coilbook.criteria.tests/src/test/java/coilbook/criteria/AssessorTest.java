package coilbook.criteria;

import static coilbook.criteria.StationFixture.TODAY;
import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;

import coilbook.fleet.Datum;

class AssessorTest {

    private static final List<String> IDS = List.of("input-nominal", "input-tolerance", "input-frequency", "input-setting-recorded",
            "bus-stress",
            "coil-class", "pull-in-current", "hold-current", "output-current", "winding-temperature", "cycle-rate", "coil-insulation",
            "winding-resistance", "serial-unique");

    private final Assessor assessor = new Assessor();

    private Finding finding(String criterion, StationFixture fixture) {
        return assessor.assess(fixture.view()).findings().stream().filter(f -> f.criterion().equals(criterion)).findFirst().orElseThrow();
    }

    @Test
    void oneFindingForEachCriterionInOrder() {
        assertEquals(IDS, Criteria.all().stream().map(Criterion::id).toList());
        assertEquals(IDS, assessor.assess(twoLevelStation().view()).findings().stream().map(Finding::criterion).toList());
    }

    @Test
    void aConformingStationHasNothingToReport() {
        Assessment assessment = assessor.assess(twoLevelStation().view());
        assertEquals(Verdict.CONFORMITY, assessment.worst());
        assertEquals(0, assessment.hazards());
        assertEquals(0,
                assessment.count(Verdict.NONCONFORMITY) + assessment.count(Verdict.OBSERVATION) + assessment.count(Verdict.UNDETERMINED));
        assertTrue(assessment.findings().stream().noneMatch(f -> f.verdict().isReported()));
    }

    @Test
    void hazardsAreCountedApart() {
        Assessment assessment = assessor.assess(twoLevelStation().choose("P115").coil("pull_in_current", Datum.catalogue(5)).view());
        assertEquals(2, assessment.hazards(), "input-nominal and input-tolerance");
        assertEquals(1, assessment.count(Verdict.NONCONFORMITY), "pull-in-current");
        assertEquals(Verdict.NONCONFORMITY, assessment.worst());
    }

    @Test
    void anEmptyRegisterIsUndeterminedNotWrong() {
        Assessment assessment = assessor
                .assess(twoLevelStation().withoutCircuit().withoutCoil().withoutDriver().withoutDuty().withoutValve().view());
        assertEquals(0, assessment.hazards() + assessment.count(Verdict.NONCONFORMITY));
        assertEquals(Verdict.UNDETERMINED, assessment.worst());
        assessment.findings().stream().filter(f -> f.verdict() == Verdict.UNDETERMINED)
                .forEach(f -> assertFalse(f.missing().isEmpty(), f.criterion()));
    }

    @Test
    void everyUndeterminedSentenceNamesWhatIsMissing() {
        for (Finding finding : assessor.assess(lineCapacitorStation().coil("inductance", null).coil("insulation_class", null)
                .circuit("nominal_voltage", null).view()).findings()) {
            finding.missing()
                    .forEach(name -> assertTrue(
                            finding.evidence().sentence().contains(name) || finding.verdict() == Verdict.NOT_YET_RECORDED,
                            finding.criterion() + ": " + finding.evidence().sentence()));
        }
    }

    @Test
    void aConcessionAcceptsUntilItEnds() {
        StationFixture broken = twoLevelStation().coil("pull_in_current", Datum.catalogue(5));
        broken.concede("pull-in-current", TODAY.minusDays(10), TODAY.plusDays(10), null, null);
        Assessment during = assessor.assess(broken.view());
        assertEquals(1, during.conceded());
        assertEquals(0, during.count(Verdict.NONCONFORMITY));
        assertEquals(Verdict.CONFORMITY, during.worst());
        assertEquals(TODAY.plusDays(10), during.recheckOn());
        assertTrue(finding("pull-in-current", broken).conceded());
        assertEquals(Verdict.NONCONFORMITY, finding("pull-in-current", broken).verdict());
        assertFalse(finding("pull-in-current", broken.on(TODAY.plusDays(10))).conceded(), "ended");
        assertFalse(finding("pull-in-current", broken.on(TODAY.minusDays(11))).conceded(), "not yet granted");
        assertEquals(TODAY.minusDays(10), assessor.assess(broken.on(TODAY.minusDays(11)).view()).recheckOn());
        assertNull(assessor.assess(broken.on(TODAY.plusDays(11)).view()).recheckOn());
    }

    @Test
    void aHazardNeedsASecondPerson() {
        StationFixture strap = twoLevelStation().choose("P115");
        assertFalse(finding("input-nominal", strap.concede("input-nominal", null, TODAY.plusDays(1), null, null)).conceded());
        assertFalse(finding("input-nominal", strap.concede("input-nominal", null, TODAY.plusDays(1), "First person ", null)).conceded(),
                "the same");
        Finding conceded = finding("input-nominal", strap.concede("input-nominal", null, TODAY.plusDays(1), "second person", null));
        assertTrue(conceded.conceded());
        assertTrue(conceded.hazard(), "it stays a hazard");
        assertFalse(finding("input-tolerance", strap).conceded(), "another criterion");
    }

    @Test
    void aConcessionFallsWhenTheEvidenceGetsWorse() {
        StationFixture broken = twoLevelStation().circuit("nominal_voltage", Datum.nameplate(190));
        assertTrue(finding("input-nominal", broken.concede("input-nominal", null, TODAY.plusDays(1), null, 190.0)).conceded());
        assertFalse(finding("input-nominal", broken.circuit("nominal_voltage", Datum.nameplate(189))).conceded());
        assertTrue(finding("input-nominal", broken.circuit("nominal_voltage", Datum.nameplate(195))).conceded());
    }

    @Test
    void nothingButNonconformitiesIsConceded() {
        assertEquals(0,
                assessor.assess(
                        twoLevelStation().coil("pull_in_current", null).concede("pull-in-current", null, TODAY.plusDays(1), null, null)
                                .view())
                        .conceded());
    }

    @Test
    void aReadingsExpiryIsADayToLookAgain() {
        // Taken 40 days before 2026-06-01, good for 24 months.
        Assessment assessment = assessor.assess(twoLevelStation().readWinding(10, 20.0).view());
        assertEquals(TODAY.minusDays(40).plusMonths(24).plusDays(1), assessment.recheckOn());
        StationFixture later = twoLevelStation().readWinding(10, 20.0).on(assessment.recheckOn().minusDays(1));
        assertEquals(Verdict.CONFORMITY, finding("winding-resistance", later).verdict());
        assertEquals(Verdict.UNDETERMINED, finding("winding-resistance", later.on(assessment.recheckOn())).verdict());
    }

    @Test
    void equalViewsGiveEqualFindingsFromManyThreads() {
        List<Finding> expected = assessor.assess(lineCapacitorStation().view()).findings();
        List<List<Finding>> all = IntStream.range(0, 16).parallel().mapToObj(i -> assessor.assess(lineCapacitorStation().view()).findings())
                .toList();
        all.forEach(findings -> assertEquals(expected, findings));
        assertEquals(expected, new Assessor(1).assess(lineCapacitorStation().view()).findings());
    }

    @Test
    void everyCriterionSaysWhatItIs() {
        for (Criterion criterion : Criteria.all()) {
            String id = criterion.id();
            assertTrue(criterion.title().endsWith("?"), id);
            assertFalse(criterion.group().isBlank(), id);
            assertFalse(criterion.needs().isEmpty(), id);
            assertFalse(criterion.limitSource().isBlank(), id);
            assertFalse(criterion.remedies().isEmpty(), id);
            assertTrue(criterion.hazardRule().isEmpty() || criterion.hazardRule().startsWith("Yes"), id);
            String source = criterion.limitSource();
            assertTrue(source.contains("catalogue entr") || source.contains("input settings") || source.contains("IEC")
                    || source.contains("no source"), id + ": " + source);
        }
        assertEquals("pull-in-current", Criteria.byId("pull-in-current").id());
        assertThrows(IllegalArgumentException.class, () -> Criteria.byId("no-such"));
    }
}
