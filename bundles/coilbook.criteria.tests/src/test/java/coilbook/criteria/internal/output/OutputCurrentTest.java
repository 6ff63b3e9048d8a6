package coilbook.criteria.internal.output;

import static coilbook.criteria.Judged.atTwentyDegrees;
import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.Judged;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;

/** Check values: 48 V on 10 Ω + 8 mH after 3 ms is 4.68711 A; 48 V on 10 Ω is 4.8 A. */
class OutputCurrentTest {

    private static final double CHECK = 48 / 10.0 * (1 - Math.exp(-3.75));

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("output-current", fixture);
    }

    @Test
    void peakIsTheCheckValue() {
        judge(atTwentyDegrees(twoLevelStation())).is(Verdict.CONFORMITY).at("high").compares(4.68711, 6, 2e-6)
                .says("Peak current 4.687 A, winding 20 °C; the driver’s channel gives 6 A (catalogue)");
    }

    /** High corner: 10 Ω − 5 % at 10 °C and the cable's 0.39 Ω. */
    @Test
    void highCornerIsCold() {
        double resistance = 9.5 * 244.5 / 254.5 + 0.39;
        judge(twoLevelStation()).compares(48 / resistance * (1 - Math.exp(-0.003 * resistance / 0.008)), 6, 1e-6).says("winding 10 °C");
    }

    @Test
    void limitMetExactlyIsMetNarrowly() {
        judge(atTwentyDegrees(twoLevelStation()).driver("output_current_limit", Datum.catalogue(CHECK))).is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).driver("output_current_limit", Datum.catalogue(5))).is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).driver("output_current_limit", Datum.catalogue(CHECK / 0.9))).is(Verdict.CONFORMITY);
        judge(atTwentyDegrees(twoLevelStation()).driver("output_current_limit", Datum.catalogue(CHECK * (1 - 1e-6))))
                .is(Verdict.NONCONFORMITY)
                .isHazard(false).says("the driver’s channel gives");
    }

    @Test
    void moduleLimitCountsWhereItIsStated() {
        judge(atTwentyDegrees(twoLevelStation()).driver("module_current_limit", Datum.catalogue(4))).is(Verdict.NONCONFORMITY)
                .compares(4.68711, 4, 2e-6)
                .says("the driver’s module gives 4 A");
    }

    @Test
    void lowestLoad() {
        judge(twoLevelStation().driver("lowest_load", Datum.catalogue(9))).is(Verdict.OBSERVATION).compares(9.5, 9, 1e-12)
                .says("The coil can be as low as 9.5 Ω at 20 °C (catalogue 10 Ω less 5 %)", "lowest load is 9 Ω");
        judge(twoLevelStation().driver("lowest_load", Datum.catalogue(9.5))).is(Verdict.OBSERVATION);
        judge(twoLevelStation().driver("lowest_load", Datum.catalogue(9.6))).is(Verdict.NONCONFORMITY).isHazard(false).compares(9.5, 9.6,
                1e-12);
        judge(twoLevelStation().driver("lowest_load", null)).is(Verdict.CONFORMITY);
    }

    /** Without inductance the bound is V/R, 48 V on 10 Ω: 4.8 A. */
    @Test
    void withoutInductanceDirectCurrentIsTheBound() {
        judge(atTwentyDegrees(twoLevelStation()).coil("inductance", null)).is(Verdict.CONFORMITY).compares(4.8, 6, 1e-4)
                .says("Peak current at most 4.8 A");
        judge(atTwentyDegrees(twoLevelStation()).coil("inductance", null).driver("output_current_limit", Datum.catalogue(4.7)))
                .is(Verdict.UNDETERMINED)
                .misses("Inductance of coil type C10").says("4.7 A");
    }

    @Test
    void withoutACableWhatIsMissedIsNotMissedForCertain() {
        judge(twoLevelStation().station("cable_length", null)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().station("cable_length", null).driver("output_current_limit", Datum.catalogue(4.95)))
                .is(Verdict.UNDETERMINED)
                .misses("Cable length of station WERK/L1/=A1");
        judge(twoLevelStation().driver("output_current_limit", Datum.catalogue(4.95))).is(Verdict.OBSERVATION);
    }

    @ParameterizedTest
    @CsvSource({ "driver,output_current_limit,Output current limit of driver type D1",
            "coil,resistance20,Resistance at 20 °C of coil type C10",
            "site,ambient_lowest,Ambient lowest of site WERK", "driver,pull_in_voltage,Pull-in voltage of driver type D1",
            "driver,kind,Kind of driver type D1" })
    void namesWhatIsMissing(String kind, String field, String name) {
        judge(PullInCurrentTest.without(twoLevelStation(), kind, field)).is(Verdict.UNDETERMINED).misses(name);
    }

    @Test
    void namesWhatIsNotThere() {
        judge(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(lineCapacitorStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1");
    }
}
