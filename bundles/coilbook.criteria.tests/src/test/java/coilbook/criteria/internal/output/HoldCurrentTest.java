package coilbook.criteria.internal.output;

import static coilbook.criteria.Judged.atTwentyDegrees;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.criteria.Finding;
import coilbook.criteria.FindingAssert;
import coilbook.criteria.Judged;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;

/** Check values: 6 V hold on 10 Ω is 0.6 A (arithmetic); line-capacitor hold figures of the recorded ngspice case b1. */
class HoldCurrentTest {

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("hold-current", fixture);
    }

    @Test
    void regulatedHoldIsTheCheckValue() {
        judge(atTwentyDegrees(twoLevelStation())).is(Verdict.CONFORMITY).isHazard(false).at("low").compares(0.6, 0.25, 1e-3)
                .says("Hold current 0.6001 A mean, winding 20 °C, 0.6 A least; 0.25 A needed, 1.25 × drop-out 0.2 A (catalogue)");
    }

    @Test
    void marginCountsInTheFleetsFactor() {
        judge(atTwentyDegrees(twoLevelStation()).coil("drop_out_current", Datum.catalogue(0.43))).is(Verdict.CONFORMITY);
        judge(atTwentyDegrees(twoLevelStation()).coil("drop_out_current", Datum.catalogue(0.45))).is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).coil("drop_out_current", Datum.catalogue(0.48))).is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).coil("drop_out_current", Datum.catalogue(0.49))).is(Verdict.NONCONFORMITY).isHazard(false)
                .compares(0.6, 0.6125, 1e-3).says("0.6125 A needed, 1.25 × drop-out 0.49 A");
        judge(atTwentyDegrees(twoLevelStation()).fleet("hold margin", 1.1).coil("drop_out_current", Datum.catalogue(0.49)))
                .is(Verdict.CONFORMITY)
                .says("1.1 × drop-out");
    }

    @Test
    void tooShortAnOnTimeHasNoHold() {
        judge(twoLevelStation().duty("on_time", Datum.nameplate(0.003))).is(Verdict.NOT_APPLICABLE);
    }

    /** ngspice, 120 V 60 Hz: mean 0.1577 A, rippling from 0.058 to 0.241 A (recorded case b1). */
    @Test
    void lineCapacitorHoldRipples() {
        Finding finding = Judged.finding("hold-current", Judged.ngspiceParts().coil("drop_out_current", Datum.catalogue(0.045)));
        FindingAssert.assertThat(finding).is(Verdict.OBSERVATION).says("at 120 V");
        assertEquals(0.1577234, finding.evidence().numbers().get("Hold current, mean [A]"), 0.005 * 0.1577234);
        // The first trough after the peak is deeper than those of the settled hold.
        assertTrue(finding.evidence().value() < 0.058 && finding.evidence().value() > 0.045, "" + finding.evidence().value());
    }

    @Test
    void dipsAreRiddenThroughOrNot() {
        StationFixture dipping = Judged.ngspiceParts().coil("drop_out_current", Datum.catalogue(0.1));
        judge(dipping.coil("ride_through", Datum.catalogue(0.005))).is(Verdict.OBSERVATION).says("it dips to", "below drop-out 0.1 A for",
                "rides through 5 ms (catalogue)");
        judge(dipping.coil("ride_through", Datum.catalogue(0.0005))).is(Verdict.NONCONFORMITY).says("rides through 0.5 ms");
        judge(dipping.coil("ride_through", null)).is(Verdict.UNDETERMINED).misses("Ride-through time of coil type C10");
    }

    /** Judged by the mean, 0.1577 A at 120 V: 1.25 · 0.13 = 0.1625 A is not met whatever the ride-through. */
    @Test
    void meanBelowTheNeededHold() {
        judge(Judged.ngspiceParts().coil("drop_out_current", Datum.catalogue(0.13)).coil("ride_through", Datum.catalogue(1)))
                .is(Verdict.NONCONFORMITY)
                .compares(0.1577234, 0.1625, 0.005);
    }

    @Test
    void withoutInductanceARegulatedHoldIsStillKnown() {
        judge(twoLevelStation().coil("inductance", null)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().coil("inductance", null).coil("drop_out_current", Datum.catalogue(0.55))).is(Verdict.UNDETERMINED)
                .misses("Inductance of coil type C10");
    }

    @ParameterizedTest
    @CsvSource({ "coil,drop_out_current,Drop-out current of coil type C10", "coil,resistance20,Resistance at 20 °C of coil type C10",
            "driver,hold_voltage,Hold voltage of driver type D1", "driver,pull_in_time,Pull-in time of driver type D1",
            "duty,on_time,On-time of station WERK/L1/=A1", "station,cable_length,Cable length of station WERK/L1/=A1" })
    void namesWhatIsMissing(String kind, String field, String name) {
        judge(PullInCurrentTest.without(twoLevelStation(), kind, field)).is(Verdict.UNDETERMINED).misses(name);
    }

    @Test
    void namesWhatIsMissingOfALineCapacitorDriver() {
        judge(StationFixture.lineCapacitorStation().coil("inductance", null)).is(Verdict.UNDETERMINED)
                .misses("Inductance of coil type C10");
        judge(StationFixture.lineCapacitorStation().driver("capacitance", null)).is(Verdict.UNDETERMINED)
                .misses("Capacitance of driver type D1");
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
    }
}
