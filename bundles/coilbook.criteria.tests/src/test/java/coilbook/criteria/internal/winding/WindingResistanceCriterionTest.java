package coilbook.criteria.internal.winding;

import static coilbook.criteria.FindingAssert.assertThat;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Provenance;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SubjectKind;

/** The coil has 10 Ω ± 5 % at 20 °C. */
class WindingResistanceCriterionTest {

    private static FindingAssert judge(StationFixture fixture) {
        return assertThat(new WindingResistanceCriterion().judge(fixture.view(), null));
    }

    /** Check values of the correction to 20 °C: arithmetic with the copper constant 234.5 of resistance-method temperature tests. */
    @ParameterizedTest
    @CsvSource({ "11.2,45,10.198211", "10.4,28,10.083048", "13.7,95,10.581639" })
    void correctsToTwentyDegrees(double ohm, double celsius, double at20) {
        judge(twoLevelStation().coil("resistance_tolerance", Datum.catalogue(0.1)).readWinding(ohm, celsius)).is(Verdict.CONFORMITY)
                .compares(at20, 11, 1e-6).says(celsius == 95 ? "10.58 Ω at 20 °C" : "at 20 °C", "9 Ω to 11 Ω", "2026-04-22");
    }

    @Test
    void lowAndHighAreTold() {
        judge(twoLevelStation().readWinding(9.0, 20.0)).is(Verdict.NONCONFORMITY).isHazard(false).compares(9, 9.5, 1e-12).says("Read 9 Ω",
                "9.5 Ω to 10.5 Ω", "shorted turns");
        judge(twoLevelStation().readWinding(13.7, 95.0)).is(Verdict.NONCONFORMITY).compares(10.581639, 10.5, 1e-6).says("13.7 Ω", "95 °C",
                "10.58 Ω",
                "bad joint");
    }

    @Test
    void toleranceMetExactlyIsMet() {
        judge(twoLevelStation().readWinding(9.5, 20.0)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().readWinding(10.5, 20.0)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().readWinding(10.5 * (1 + 1e-8), 20.0)).is(Verdict.NONCONFORMITY);
    }

    @Test
    void withoutATemperatureOnlyOneSideIsJudged() {
        // Air 10 to 40 °C: the winding is taken as 10 to 50 °C, 40 K, which are about 16 % of resistance (16.36 % here).
        judge(twoLevelStation().readWinding(10.2, null)).is(Verdict.UNDETERMINED)
                .misses("Temperature of the reading of winding resistance of station WERK/L1/=A1").says("10 °C to 50 °C");
        judge(twoLevelStation().readWinding(13, null)).is(Verdict.NONCONFORMITY).says("high", "11.63 Ω to 13.53 Ω")
                .compares(13 * 254.5 / 284.5, 10.5, 1e-9);
        judge(twoLevelStation().readWinding(9, null)).is(Verdict.NONCONFORMITY).says("low").compares(9 * 254.5 / 244.5, 9.5, 1e-9);
        judge(twoLevelStation().coil("resistance_tolerance", Datum.catalogue(0.2)).readWinding(10.3, null)).is(Verdict.CONFORMITY);
    }

    @Test
    void toleranceNotStatedIsAssumed() {
        var finding = new WindingResistanceCriterion()
                .judge(twoLevelStation().coil("resistance_tolerance", null).readWinding(10.9, 20.0).view(), null);
        assertThat(finding).is(Verdict.CONFORMITY).says("9 Ω to 11 Ω");
        assertEquals(Provenance.ASSUMED, finding.evidence().provenance());
    }

    @Test
    void firstReadingIsNotYetRecorded() {
        judge(twoLevelStation()).is(Verdict.NOT_YET_RECORDED).misses("Reading of winding resistance of station WERK/L1/=A1");
    }

    @Test
    void onlyReadingsOfThisVeryCoilCount() {
        judge(twoLevelStation().read(SubjectKind.ITEM, "coil/other", ReadingQuantity.WINDING_RESISTANCE, StationFixture.TODAY, 5, null,
                null))
                .is(Verdict.NOT_YET_RECORDED);
        judge(twoLevelStation().read(SubjectKind.STATION, StationFixture.STATION, ReadingQuantity.WINDING_RESISTANCE,
                StationFixture.TODAY.minusYears(4), 5, Datum.measured(20), null)).is(Verdict.NOT_YET_RECORDED);
        judge(twoLevelStation().fit(FittedKind.COIL, "C10", null).read(SubjectKind.STATION, StationFixture.STATION,
                ReadingQuantity.WINDING_RESISTANCE,
                StationFixture.TODAY.minusDays(1), 10.1, Datum.measured(20), null)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE, StationFixture.TODAY.plusDays(1), 5,
                Datum.measured(20), null)).is(Verdict.NOT_YET_RECORDED);
    }

    @Test
    void newestReadingCounts() {
        judge(twoLevelStation().readWinding(9, 20.0).read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE,
                StationFixture.TODAY, 10,
                Datum.measured(20), null)).is(Verdict.CONFORMITY).says("Read 10 Ω");
    }

    @Test
    void readingOutOfDate() {
        var old = StationFixture.TODAY.minusMonths(24).minusDays(1);
        judge(twoLevelStation().read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE, old, 10, Datum.measured(20), null))
                .is(Verdict.UNDETERMINED).says("out of date");
        judge(twoLevelStation().read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE, old.plusDays(1), 10,
                Datum.measured(20), null))
                .is(Verdict.CONFORMITY);
    }

    @Test
    void namesWhatIsMissing() {
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(twoLevelStation().coil("resistance20", null).readWinding(10, 20.0)).is(Verdict.UNDETERMINED)
                .misses("Resistance at 20 °C of coil type C10");
    }
}
