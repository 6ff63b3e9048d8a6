package coilbook.criteria.internal.heat;

import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.Judged;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;

class CycleRateTest {

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("cycle-rate", fixture);
    }

    @Test
    void valveRules() {
        judge(twoLevelStation().valve("highest_rate", Datum.catalogue(12))).is(Verdict.CONFORMITY).compares(10, 12, 0)
                .says("Duty 10 1/s highest; 12 1/s allowed, ruled by valve mechanics");
        judge(twoLevelStation().valve("highest_rate", Datum.catalogue(10))).is(Verdict.CONFORMITY);
        judge(twoLevelStation().valve("highest_rate", Datum.catalogue(9.9))).is(Verdict.NONCONFORMITY).isHazard(false).compares(10, 9.9, 0);
        judge(twoLevelStation().duty("burst_rate", Datum.nameplate(30)).valve("highest_rate", Datum.catalogue(25)))
                .is(Verdict.NONCONFORMITY)
                .compares(30, 25, 0);
    }

    /**
     * Release from 0.6 A to 0.2 A against 47 V: τ · ln[(0.6 + 4.7)/(0.2 + 4.7)] = 0.0627742 ms (closed form); 1 / (20 ms + 0.0627742 ms + 2 ms) = 45.3247
     * cycles a second.
     */
    @Test
    void releaseRules() {
        double release = 0.0008 * Math.log(5.3 / 4.9);
        judge(Judged.atTwentyDegrees(twoLevelStation())).is(Verdict.CONFORMITY).compares(10, 1 / (0.022 + release), 1e-5)
                .says("ruled by release time");
        judge(Judged.atTwentyDegrees(twoLevelStation()).duty("burst_rate", Datum.nameplate(46))).is(Verdict.NONCONFORMITY)
                .compares(46, 1 / (0.022 + release), 1e-5);
    }

    /** The rate at which the winding meets its limit is the rate at which winding-temperature meets it. */
    @Test
    void heatRules() {
        StationFixture warm = twoLevelStation().coil("thermal_resistance", Datum.catalogue(15));
        double highest = Judged.finding("cycle-rate", warm).evidence().numbers().get("Highest by winding temperature [1/s]");
        judge(warm.duty("cycle_rate", Datum.nameplate(highest * 0.99))).is(Verdict.CONFORMITY).says("mean", "ruled by winding temperature");
        assertEquals(145, Judged.finding("winding-temperature", warm.duty("cycle_rate", Datum.nameplate(highest))).evidence().value(), 0.2);
        judge(warm.duty("cycle_rate", Datum.nameplate(highest * 1.01))).is(Verdict.NONCONFORMITY).at("hot");
    }

    /** Trade rule (common practice, no source): 20 W ÷ 0.6912 J is about 29 cycles a second, inductance neglected; here 20 W are 100 K at 5 K/W. */
    @Test
    void heatRuleOfThumb() {
        StationFixture rule = Judged.atTwentyDegrees(twoLevelStation()).coil("inductance", null)
                .coil("thermal_resistance", Datum.catalogue(5))
                .driver("hold_voltage", Datum.catalogue(0.001)).duty("on_time", Datum.nameplate(0.003001))
                .site("ambient_highest", Datum.nameplate(45));
        double highest = Judged.finding("cycle-rate", rule).evidence().numbers().get("Highest by winding temperature [1/s]");
        // At 145 °C the winding has 379.5/254.5 times its resistance and takes as much less energy.
        assertEquals(28.9 * 379.5 / 254.5, highest, 0.1);
    }

    @Test
    void recoveryRulesALineCapacitorDriver() {
        judge(lineCapacitorStation().duty("burst_rate", Datum.nameplate(30))).says("ruled by source recovery");
        judge(lineCapacitorStation().duty("burst_rate", Datum.nameplate(40))).is(Verdict.NONCONFORMITY).at("low");
    }

    @ParameterizedTest
    @CsvSource({ "coil,drop_out_current,Drop-out current of coil type C10", "coil,insulation_class,Insulation class of coil type C10",
            "valve,highest_rate,Highest cycle rate of valve type V1", "valve,closing_delay,Closing delay of valve type V1",
            "site,ambient_highest,Ambient highest of site WERK", "driver,hold_voltage,Hold voltage of driver type D1",
            "coil,inductance,Inductance of coil type C10" })
    void namesWhatIsMissing(String kind, String field, String name) {
        StationFixture fixture = twoLevelStation();
        switch (kind) {
            case "coil" -> fixture.coil(field, null);
            case "valve" -> fixture.valve(field, null);
            case "site" -> fixture.site(field, null);
            default -> fixture.driver(field, null);
        }
        judge(fixture).is(Verdict.UNDETERMINED).misses(name);
    }

    @Test
    void namesWhatIsNotThere() {
        judge(twoLevelStation().duty("cycle_rate", null)).is(Verdict.UNDETERMINED).misses("Cycle rate of station WERK/L1/=A1");
        judge(twoLevelStation().duty("on_time", null)).is(Verdict.UNDETERMINED).misses("On-time of station WERK/L1/=A1");
        judge(twoLevelStation().withoutValve()).is(Verdict.UNDETERMINED).misses("Valve type of station WERK/L1/=A1");
        judge(twoLevelStation().coil("thermal_resistance", null).coil("highest_dissipation", null)).is(Verdict.UNDETERMINED)
                .misses("Thermal resistance of coil type C10");
    }

    @Test
    void oneBrokenLimitDecidesWhateverElseIsMissing() {
        judge(twoLevelStation().coil("drop_out_current", null).valve("highest_rate", Datum.catalogue(9))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void boundsLeaveItOpen() {
        judge(twoLevelStation().coil("thermal_resistance", null).coil("highest_dissipation", Datum.catalogue(10)).duty("cycle_rate",
                Datum.nameplate(40))).is(Verdict.UNDETERMINED)
                .misses("Thermal resistance of coil type C10");
        judge(twoLevelStation().coil("thermal_resistance", Datum.catalogue(8)).station("body_temperature", Datum.measured(100))
                .duty("cycle_rate", Datum.nameplate(18))).is(Verdict.UNDETERMINED)
                .misses("Conductance to air of station WERK/L1/=A1", "Conductance to body of station WERK/L1/=A1");
        judge(twoLevelStation().coil("thermal_resistance", Datum.catalogue(8)).station("body_temperature", Datum.measured(100))
                .duty("cycle_rate", Datum.nameplate(44))).is(Verdict.NONCONFORMITY);
    }
}
