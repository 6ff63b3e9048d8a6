package coilbook.criteria.internal.mains;

import static coilbook.criteria.FindingAssert.assertThat;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

import coilbook.criteria.Criterion;
import coilbook.criteria.FindingAssert;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;
import coilbook.fleet.Provenance;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SubjectKind;

/** Windows of the fixture: S230 takes 200 to 260 V, P115 takes 100 to 130 V, both 47 to 63 Hz; the circuit is 230 V 50 Hz in Germany (207 to 253 V). */
class InputCriteriaTest {

    private static FindingAssert judge(Criterion criterion, StationFixture fixture) {
        return assertThat(criterion.judge(fixture.view(), null));
    }

    private static FindingAssert nominal(StationFixture fixture) {
        return judge(new InputNominal(), fixture);
    }

    private static FindingAssert tolerance(StationFixture fixture) {
        return judge(new InputTolerance(), fixture);
    }

    private static FindingAssert frequency(StationFixture fixture) {
        return judge(new InputFrequency(), fixture);
    }

    @Test
    void nominalInTheWindow() {
        nominal(twoLevelStation()).is(Verdict.CONFORMITY).says("230 V", "200 V to 260 V", "S230").compares(230, 260, 0).at("nominal");
    }

    @Test
    void nominalAboveTheWindowCanHurt() {
        nominal(twoLevelStation().choose("P115")).is(Verdict.NONCONFORMITY).isHazard(true).compares(230, 130, 0).says("230 V is above",
                "130 V", "P115");
    }

    @Test
    void nominalBelowTheWindowCannot() {
        nominal(twoLevelStation().circuit("nominal_voltage", Datum.nameplate(120))).is(Verdict.NONCONFORMITY).isHazard(false)
                .compares(120, 200, 0)
                .says("120 V is below", "200 V");
    }

    @Test
    void nominalExactlyAtTheLimitIsMet() {
        nominal(twoLevelStation().setting("S230", "highest_voltage", Datum.catalogue(230))).is(Verdict.CONFORMITY);
        nominal(twoLevelStation().setting("S230", "lowest_voltage", Datum.catalogue(230))).is(Verdict.CONFORMITY);
        nominal(twoLevelStation().setting("S230", "highest_voltage", Datum.catalogue(230 / (1 + 1e-10)))).is(Verdict.CONFORMITY);
        nominal(twoLevelStation().setting("S230", "highest_voltage", Datum.catalogue(230 / (1 + 1e-8)))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void nominalThroughATransformer() {
        nominal(twoLevelStation().choose("P115").transformer(230, 115, 0.06)).is(Verdict.CONFORMITY).says("115 V");
        nominal(twoLevelStation().choose("P115").transformer(230, 115, null)).is(Verdict.CONFORMITY).says("115 V");
    }

    @Test
    void nominalNamesWhatIsMissing() {
        nominal(twoLevelStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1")
                .says("Circuit of station");
        nominal(twoLevelStation().circuit("nominal_voltage", null)).is(Verdict.UNDETERMINED).misses("Nominal voltage of circuit WERK/M1");
        nominal(twoLevelStation().setting("S230", "lowest_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Lowest voltage of input setting D1/S230");
        nominal(twoLevelStation().setting("S230", "highest_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Highest voltage of input setting D1/S230");
        nominal(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        nominal(twoLevelStation().choose(null)).is(Verdict.UNDETERMINED).misses("Input setting of station WERK/L1/=A1");
        nominal(twoLevelStation().onlySetting("none")).is(Verdict.UNDETERMINED).misses("Input settings of driver type D1");
    }

    @Test
    void oneLimitAloneDecidesWhereItIsBroken() {
        nominal(twoLevelStation().choose("P115").setting("P115", "lowest_voltage", null)).is(Verdict.NONCONFORMITY).isHazard(true);
    }

    @Test
    void onlySettingNeedsNoRecord() {
        nominal(twoLevelStation().choose(null).onlySetting("S230")).is(Verdict.CONFORMITY);
    }

    @Test
    void unrecordedSettingDecidesWhereEverySettingAgrees() {
        nominal(twoLevelStation().choose(null).circuit("nominal_voltage", Datum.nameplate(400))).is(Verdict.NONCONFORMITY).isHazard(true)
                .says("Whichever setting");
        nominal(twoLevelStation().choose(null).circuit("nominal_voltage", Datum.nameplate(150))).is(Verdict.NONCONFORMITY).isHazard(false);
        frequency(twoLevelStation().choose(null)).is(Verdict.CONFORMITY).says("Whichever setting", "50 Hz");
    }

    @Test
    void settingUnknownToTheTypeIsContradictory() {
        nominal(twoLevelStation().choose("X9")).is(Verdict.UNDETERMINED)
                .misses("Input setting of station WERK/L1/=A1, for the recorded “X9” is none of driver type D1");
    }

    @Test
    void bandInTheWindow() {
        tolerance(twoLevelStation()).is(Verdict.CONFORMITY).says("207 V", "253 V", "200 V to 260 V", "90 % of nominal");
    }

    @Test
    void bandExactlyTheWindowIsMet() {
        tolerance(twoLevelStation().setting("S230", "lowest_voltage", Datum.catalogue(207)).setting("S230", "highest_voltage",
                Datum.catalogue(253)))
                .is(Verdict.CONFORMITY);
    }

    @Test
    void highEndCanHurtLowEndCannot() {
        tolerance(twoLevelStation().setting("S230", "highest_voltage", Datum.catalogue(250))).is(Verdict.NONCONFORMITY).isHazard(true)
                .at("high")
                .compares(253, 250, 1e-12).says("high end 253 V", "110 % of nominal", "above the highest voltage 250 V");
        tolerance(twoLevelStation().setting("S230", "lowest_voltage", Datum.catalogue(210))).is(Verdict.NONCONFORMITY).isHazard(false)
                .at("low")
                .compares(207, 210, 1e-12).says("low end 207 V", "below the lowest voltage 210 V");
    }

    @Test
    void bothEndsAreNamed() {
        tolerance(twoLevelStation().setting("S230", "lowest_voltage", Datum.catalogue(210)).setting("S230", "highest_voltage",
                Datum.catalogue(250)))
                .is(Verdict.NONCONFORMITY).isHazard(true).says("The high end 253 V", ", and the low end 207 V");
    }

    @Test
    void circuitsOwnToleranceCountsBeforeTheMarkets() {
        tolerance(twoLevelStation().circuit("tolerance_above", Datum.nameplate(0.2))).is(Verdict.NONCONFORMITY).compares(276, 260, 1e-12)
                .says("circuit’s tolerance +20 %");
        tolerance(twoLevelStation().circuit("tolerance_below", Datum.nameplate(0.2))).is(Verdict.NONCONFORMITY).compares(184, 200, 1e-12)
                .says("circuit’s tolerance −20 %");
    }

    @Test
    void everyReadingCounts() {
        tolerance(twoLevelStation().readMains(261.5)).is(Verdict.NONCONFORMITY).isHazard(true).compares(261.5, 260, 0)
                .says("reading of 2026-05-02");
        tolerance(twoLevelStation().readMains(198)).is(Verdict.NONCONFORMITY).compares(198, 200, 0);
        tolerance(twoLevelStation().readMains(240)).is(Verdict.CONFORMITY).says("207 V", "253 V");
        // A reading at the driver counts as it is, one on the circuit goes through the transformer.
        tolerance(twoLevelStation().choose("P115").transformer(230, 115, 0.0).read(SubjectKind.STATION, StationFixture.STATION,
                ReadingQuantity.MAINS_VOLTAGE, StationFixture.TODAY, 131, null, null)).is(Verdict.NONCONFORMITY).compares(131, 130, 0);
        tolerance(twoLevelStation().choose("P115").transformer(230, 115, 0.0).readMains(256)).is(Verdict.CONFORMITY).says("128 V");
    }

    @Test
    void transformerLowersTheLowEndByItsRegulation() {
        // 207 V · 115/230 · (1 − 0.06) = 97.29 V, below 100 V; 253 V · 115/230 = 126.5 V.
        tolerance(twoLevelStation().choose("P115").transformer(230, 115, 0.06)).is(Verdict.NONCONFORMITY).isHazard(false)
                .compares(97.29, 100, 1e-12)
                .says("97.29 V", "through transformer T1");
        tolerance(twoLevelStation().choose("P115").transformer(230, 115, null)).is(Verdict.UNDETERMINED)
                .misses("Regulation of transformer type T1");
        tolerance(twoLevelStation().choose("P115").transformer(230, 120, null)).is(Verdict.NONCONFORMITY).isHazard(true).compares(132, 130,
                1e-12);
    }

    @Test
    void bandNamesWhatIsMissing() {
        tolerance(twoLevelStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1");
        tolerance(twoLevelStation().circuit("nominal_voltage", null)).is(Verdict.UNDETERMINED).misses("Nominal voltage of circuit WERK/M1");
        tolerance(twoLevelStation().setting("S230", "lowest_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Lowest voltage of input setting D1/S230");
        tolerance(twoLevelStation().setting("S230", "highest_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Highest voltage of input setting D1/S230");
        tolerance(twoLevelStation().choose(null)).is(Verdict.UNDETERMINED).misses("Input setting of station WERK/L1/=A1");
    }

    @Test
    void bandThatIsAssumedWeakensTheVerdict() {
        assertEquals(Provenance.ASSUMED, new InputTolerance().judge(twoLevelStation().market("TH").view(), null).evidence().provenance());
        assertEquals(Provenance.CATALOGUE, new InputTolerance().judge(twoLevelStation().view(), null).evidence().provenance());
    }

    @Test
    void frequencyInTheRange() {
        frequency(twoLevelStation()).is(Verdict.CONFORMITY).says("50 Hz", "47 Hz to 63 Hz");
        frequency(twoLevelStation().setting("S230", "lowest_frequency", Datum.catalogue(50))).is(Verdict.CONFORMITY);
    }

    @Test
    void frequencyOutOfTheRange() {
        frequency(twoLevelStation().setting("S230", "lowest_frequency", Datum.catalogue(55))).is(Verdict.NONCONFORMITY).isHazard(false)
                .compares(50, 55, 0).says("50 Hz is below", "55 Hz");
        frequency(twoLevelStation().circuit("nominal_frequency", Datum.nameplate(400))).is(Verdict.NONCONFORMITY).compares(400, 63, 0)
                .says("400 Hz is above", "63 Hz");
        frequency(twoLevelStation().read(SubjectKind.CIRCUIT, "WERK/M1", ReadingQuantity.MAINS_FREQUENCY, StationFixture.TODAY, 46.5, null,
                null))
                .is(Verdict.NONCONFORMITY).compares(46.5, 47, 0).says("A reading of 46.5 Hz");
    }

    @Test
    void frequencyNamesWhatIsMissing() {
        frequency(twoLevelStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1");
        frequency(twoLevelStation().circuit("nominal_frequency", null)).is(Verdict.UNDETERMINED)
                .misses("Nominal frequency of circuit WERK/M1");
        frequency(twoLevelStation().setting("S230", "lowest_frequency", null)).is(Verdict.UNDETERMINED)
                .misses("Lowest frequency of input setting D1/S230");
        frequency(twoLevelStation().setting("S230", "highest_frequency", null)).is(Verdict.UNDETERMINED)
                .misses("Highest frequency of input setting D1/S230");
        frequency(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
    }

    private static FindingAssert recorded(StationFixture fixture) {
        return judge(new InputSettingRecorded(), fixture);
    }

    @Test
    void settingIsRecorded() {
        recorded(twoLevelStation()).is(Verdict.CONFORMITY).says("S230", "one of 2");
        recorded(twoLevelStation().choose(null).onlySetting("S230")).is(Verdict.NOT_APPLICABLE).says("only one input setting");
    }

    @Test
    void wrongStrapThatWouldOverstressCanHurt() {
        recorded(twoLevelStation().choose(null)).is(Verdict.NONCONFORMITY).isHazard(true).at("high").compares(253, 130, 1e-12)
                .says("None of the 2 settings", "253 V", "P115 takes only 130 V");
        recorded(twoLevelStation().choose(null).circuit("nominal_voltage", Datum.nameplate(115))).is(Verdict.NONCONFORMITY).isHazard(false)
                .says("126.5 V", "130 V");
        recorded(twoLevelStation().choose("X9")).is(Verdict.NONCONFORMITY).isHazard(true).says("“X9” is none of driver type D1");
        recorded(twoLevelStation().choose(null).withoutCircuit()).is(Verdict.NONCONFORMITY).isHazard(false).says("is not known");
    }

    @Test
    void settingNamesWhatIsMissing() {
        recorded(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        recorded(twoLevelStation().onlySetting("none")).is(Verdict.UNDETERMINED).misses("Input settings of driver type D1");
    }
}
