package coilbook.criteria.internal.insulation;

import static coilbook.criteria.FindingAssert.assertThat;
import static coilbook.criteria.StationFixture.fixedDcStation;
import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;

import org.junit.jupiter.api.Test;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;

/**
 * Not isolated: 126 V rms high, √2 · 126 + 0.7 = 178.8909 V peak. Isolated two-level: 48 V, and 48 + 47 = 95 V while it releases (the check value of a lead
 * with a 47 V clamp).
 */
class CoilInsulationTest {

    private static FindingAssert judge(StationFixture fixture) {
        return assertThat(new CoilInsulation().judge(fixture.view(), null));
    }

    @Test
    void isolatedOutputAgainstItsClamp() {
        judge(twoLevelStation()).is(Verdict.CONFORMITY).says("48 V rms", "95 V peak", "150 V rms", "400 V peak (catalogue)").compares(48,
                150, 0);
        judge(twoLevelStation().coil("insulation_peak_voltage", Datum.catalogue(90))).is(Verdict.NONCONFORMITY).isHazard(true)
                .compares(95, 90, 0)
                .says("95 V peak", "rated 90 V peak");
        judge(twoLevelStation().coil("insulation_peak_voltage", Datum.catalogue(95))).is(Verdict.CONFORMITY).compares(95, 95, 0);
        judge(twoLevelStation().coil("insulation_voltage", Datum.catalogue(40))).is(Verdict.NONCONFORMITY).isHazard(true)
                .compares(48, 40, 0)
                .says("48 V rms", "rated 40 V rms");
        judge(fixedDcStation()).is(Verdict.CONFORMITY).says("12 V rms", "59 V peak");
    }

    @Test
    void peakRatingFromTheRmsRating() {
        judge(twoLevelStation().coil("insulation_peak_voltage", null)).is(Verdict.CONFORMITY).says("212.1 V peak (√2 · the rms rating)");
        judge(twoLevelStation().coil("insulation_peak_voltage", null).coil("insulation_voltage", Datum.catalogue(60)))
                .is(Verdict.NONCONFORMITY)
                .compares(95, 84.852813742, 1e-9);
    }

    @Test
    void mainsReferencedCoilSeesTheMains() {
        judge(lineCapacitorStation()).is(Verdict.CONFORMITY).says("The driver is not isolated", "126 V rms", "178.9 V peak").compares(126,
                300, 0);
        judge(lineCapacitorStation().coil("insulation_voltage", Datum.catalogue(120)).coil("insulation_peak_voltage", Datum.catalogue(600)))
                .is(Verdict.NONCONFORMITY).isHazard(true).compares(126, 120, 1e-12).says("126 V rms", "rated 120 V rms");
        judge(lineCapacitorStation().coil("insulation_peak_voltage", Datum.catalogue(170))).is(Verdict.NONCONFORMITY).isHazard(true)
                .compares(178.89090887, 170, 1e-9);
    }

    @Test
    void customarySumIsAnObservationAtNominalMains() {
        // 120 + √2 · 120 − 1.4 = 288.3056 V (common practice, no source).
        judge(lineCapacitorStation().coil("insulation_voltage", Datum.catalogue(250))).is(Verdict.OBSERVATION).at("nominal")
                .compares(288.30562748, 250, 1e-9).says("288.3 V", "common practice, no source");
        judge(lineCapacitorStation().coil("insulation_voltage", Datum.catalogue(288.30562748477142))).is(Verdict.CONFORMITY);
    }

    @Test
    void boundsDecideWhereTheyCan() {
        judge(twoLevelStation().driver("isolated_from_mains", null)).is(Verdict.UNDETERMINED)
                .misses("Isolated from mains of driver type D1");
        judge(twoLevelStation().driver("isolated_from_mains", null).coil("insulation_voltage", Datum.catalogue(620))
                .coil("insulation_peak_voltage", null)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().driver("isolated_from_mains", null).coil("insulation_voltage", Datum.catalogue(40)))
                .is(Verdict.NONCONFORMITY);
        judge(twoLevelStation().driver("clamp_voltage", null).coil("insulation_voltage", Datum.catalogue(40))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void namesWhatIsMissing() {
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        judge(twoLevelStation().driver("kind", null)).is(Verdict.UNDETERMINED).misses("Kind of driver type D1");
        judge(twoLevelStation().coil("insulation_voltage", null)).is(Verdict.UNDETERMINED).misses("Insulation voltage of coil type C10");
        judge(twoLevelStation().driver("clamp_voltage", null)).is(Verdict.UNDETERMINED).misses("Clamp voltage of driver type D1");
        judge(twoLevelStation().driver("pull_in_voltage", null)).is(Verdict.UNDETERMINED).misses("Pull-in voltage of driver type D1");
        judge(fixedDcStation().driver("output_voltage", null)).is(Verdict.UNDETERMINED).misses("Output voltage of driver type D1");
        judge(lineCapacitorStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1");
        judge(lineCapacitorStation().circuit("nominal_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Nominal voltage of circuit WERK/M1");
    }
}
