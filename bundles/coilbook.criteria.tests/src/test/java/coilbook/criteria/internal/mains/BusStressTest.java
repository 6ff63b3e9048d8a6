package coilbook.criteria.internal.mains;

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
 * 120 V rms is 169.706 V peak (arithmetic). The United States' band goes to 126 V: √2 · 126 − 1.4 = 176.7909 V on the bus; the switch sees the clamp's
 * 0.7 V besides.
 */
class BusStressTest {

    private static final double BUS = 176.79090887;

    private static FindingAssert judge(StationFixture fixture) {
        return assertThat(new BusStress().judge(fixture.view(), null));
    }

    @Test
    void withinTheRatings() {
        judge(lineCapacitorStation()).is(Verdict.CONFORMITY).at("high").compares(BUS, 250, 1e-9).says("126 V", "capacitor sees 176.8 V",
                "250 V");
        judge(lineCapacitorStation().driver("switch_rating", Datum.catalogue(180))).is(Verdict.CONFORMITY).compares(BUS + 0.7, 180, 1e-9)
                .says("switch sees 177.5 V", "180 V");
    }

    @Test
    void peakOfTheSineIsTheCheckValue() {
        judge(lineCapacitorStation().circuit("tolerance_above", Datum.nameplate(0)).driver("rectifier_drop", Datum.catalogue(0)))
                .is(Verdict.CONFORMITY).compares(169.706, 250, 3e-6).says("169.7 V");
    }

    @Test
    void ratingMetExactlyIsMet() {
        double bus = Math.sqrt(2) * 126 - 1.4;
        judge(lineCapacitorStation().driver("capacitor_rating", Datum.catalogue(bus))).is(Verdict.CONFORMITY);
        judge(lineCapacitorStation().driver("capacitor_rating", Datum.catalogue(bus * (1 - 1e-8)))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void aboveTheRatingsCanHurt() {
        judge(lineCapacitorStation().driver("capacitor_rating", Datum.catalogue(160))).is(Verdict.NONCONFORMITY).isHazard(true)
                .compares(BUS, 160, 1e-9)
                .says("capacitor sees 176.8 V", "rated 160 V");
        judge(lineCapacitorStation().driver("switch_rating", Datum.catalogue(177))).is(Verdict.NONCONFORMITY).isHazard(true)
                .compares(BUS + 0.7, 177, 1e-9).says("switch sees 177.5 V", "rated 177 V");
        judge(lineCapacitorStation().readMains(180)).is(Verdict.NONCONFORMITY).isHazard(true).compares(Math.sqrt(2) * 180 - 1.4, 250, 1e-9);
    }

    @Test
    void boundsDecideWhereTheyCan() {
        judge(lineCapacitorStation().driver("rectifier_drop", null)).is(Verdict.CONFORMITY);
        judge(lineCapacitorStation().driver("rectifier_drop", null).driver("capacitor_rating", Datum.catalogue(177)))
                .is(Verdict.UNDETERMINED)
                .misses("Rectifier drop of driver type D1");
        judge(lineCapacitorStation().driver("clamp_voltage", null).driver("switch_rating", Datum.catalogue(150))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void namesWhatIsMissing() {
        judge(lineCapacitorStation().withoutCircuit()).is(Verdict.UNDETERMINED).misses("Circuit of station WERK/L1/=A1");
        judge(lineCapacitorStation().circuit("nominal_voltage", null)).is(Verdict.UNDETERMINED)
                .misses("Nominal voltage of circuit WERK/M1");
        judge(lineCapacitorStation().driver("capacitor_rating", null)).is(Verdict.UNDETERMINED)
                .misses("Capacitor voltage rating of driver type D1");
        judge(lineCapacitorStation().driver("switch_rating", null)).is(Verdict.UNDETERMINED)
                .misses("Switch voltage rating of driver type D1");
        judge(lineCapacitorStation().driver("clamp_voltage", null)).is(Verdict.UNDETERMINED).misses("Clamp voltage of driver type D1");
        judge(lineCapacitorStation().driver("kind", null)).is(Verdict.UNDETERMINED).misses("Kind of driver type D1");
        judge(lineCapacitorStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
    }

    @Test
    void regulatedOutputsDoNotFollowTheMains() {
        judge(twoLevelStation()).is(Verdict.NOT_APPLICABLE).says("two-level");
        judge(fixedDcStation()).is(Verdict.NOT_APPLICABLE).says("fixed-dc");
    }
}
