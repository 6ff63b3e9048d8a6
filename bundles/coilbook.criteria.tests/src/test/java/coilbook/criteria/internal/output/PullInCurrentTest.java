package coilbook.criteria.internal.output;

import static coilbook.criteria.Judged.atTwentyDegrees;
import static coilbook.criteria.StationFixture.fixedDcStation;
import static coilbook.criteria.StationFixture.lineCapacitorStation;
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
import coilbook.fleet.CoilConnection;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.Provenance;

/** Check values: 48 V on 10 Ω + 8 mH after 3 ms is 4.68711 A, the closed form of an RL circuit. */
class PullInCurrentTest {

    private static final double CHECK = 48 / 10.0 * (1 - Math.exp(-3.75));

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("pull-in-current", fixture);
    }

    @Test
    void peakIsTheCheckValue() {
        judge(atTwentyDegrees(twoLevelStation())).is(Verdict.CONFORMITY).isHazard(false).at("low").compares(4.68711, 1.2, 2e-6)
                .says("Peak current 4.687 A, winding 20 °C; pull-in needs 1.2 A (catalogue)", "the valve needs 2 ms to open (catalogue)");
    }

    /** R hot at + tolerance, with the cable; the closed form at the winding temperature that the evidence states. */
    @Test
    void lowCornerIsHotWithTheCable() {
        Finding finding = Judged.finding("pull-in-current", twoLevelStation());
        double celsius = finding.evidence().numbers().get("Winding temperature [°C]");
        assertTrue(celsius > 45 && celsius < 80, "warmed up at duty: " + celsius);
        double resistance = 10.5 * (234.5 + celsius) / 254.5 + 0.39;
        assertEquals(48 / resistance * (1 - Math.exp(-0.003 * resistance / 0.008)), finding.evidence().value(), 1e-6);
        assertEquals(0.39, finding.evidence().numbers().get("Cable [Ω]"), 1e-12);
        assertEquals(40, finding.evidence().numbers().get("Ambient [°C]"));
        assertEquals(Provenance.CATALOGUE, finding.evidence().provenance());
    }

    /** A drop or tolerance that nobody stated is taken by rule, and the verdict says that it rests on an assumption. */
    @Test
    void whatIsTakenByRuleCountsAsAssumed() {
        for (String unstated : new String[] { "switch_drop", "rectifier_drop", "series_resistance_tolerance", "capacitance_tolerance" }) {
            Finding finding = Judged.finding("pull-in-current", lineCapacitorStation().driver(unstated, null));
            assertEquals(Provenance.ASSUMED, finding.evidence().provenance(), unstated);
        }
        Finding finding = Judged.finding("pull-in-current", twoLevelStation().coil("resistance_tolerance", null));
        assertEquals(Provenance.ASSUMED, finding.evidence().provenance());
    }

    /** Line-capacitor at 120 V, 60 Hz: ngspice gives a peak of 0.4484966 A at mains phase 90° and 0.4397177 A at 0° (recorded cases b1, b2). */
    @Test
    void lineCapacitorTakesTheWorstPhase() {
        Finding finding = Judged.finding("pull-in-current", Judged.ngspiceParts());
        FindingAssert.assertThat(finding).is(Verdict.CONFORMITY).says("at 120 V, winding 20 °C");
        assertTrue(finding.evidence().value() <= 0.4397177 * 1.005 && finding.evidence().value() > 0.42, "" + finding.evidence().value());
    }

    @Test
    void metExactlyIsMetNarrowly() {
        judge(atTwentyDegrees(twoLevelStation()).valve("opening_delay", Datum.catalogue(0)).coil("pull_in_current", Datum.catalogue(CHECK)))
                .is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).valve("opening_delay", Datum.catalogue(0)).coil("pull_in_current",
                Datum.catalogue(CHECK / 1.05))).is(Verdict.OBSERVATION);
        judge(atTwentyDegrees(twoLevelStation()).valve("opening_delay", Datum.catalogue(0)).coil("pull_in_current",
                Datum.catalogue(CHECK / 1.1))).is(Verdict.CONFORMITY);
        judge(atTwentyDegrees(twoLevelStation()).valve("opening_delay", Datum.catalogue(0)).fleet("margin", 0.02).coil("pull_in_current",
                Datum.catalogue(CHECK / 1.05))).is(Verdict.CONFORMITY);
    }

    @Test
    void notReached() {
        judge(atTwentyDegrees(twoLevelStation()).coil("pull_in_current", Datum.catalogue(CHECK * (1 + 1e-6)))).is(Verdict.NONCONFORMITY)
                .isHazard(false);
        judge(twoLevelStation().coil("pull_in_current", Datum.measured(4.5))).is(Verdict.NONCONFORMITY)
                .says("pull-in needs 4.5 A (measured)");
        judge(fixedDcStation()).is(Verdict.NONCONFORMITY).says("pull-in needs 1.2 A");
    }

    @Test
    void reachedButNotLongEnough() {
        judge(twoLevelStation().valve("opening_delay", Datum.catalogue(0.006))).is(Verdict.NONCONFORMITY).says("stays there only",
                "needs 6 ms to open");
    }

    /** Break-even: L* = R · t / ln(1/(1 − I·R/V)) = 10 · 3 ms / ln(1/(1 − 1.2 · 10/48)) = 104.28 mH (closed form). */
    @Test
    void withoutInductanceItNamesTheBreakEven() {
        judge(atTwentyDegrees(twoLevelStation()).coil("inductance", null)).is(Verdict.UNDETERMINED).misses("Inductance of coil type C10")
                .says("pull-in is reached below 104.3 mH");
    }

    /** The most there can be is 48 V on 9.5 Ω at 10 °C, 9.1267 Ω: 5.259 A. */
    @Test
    void withoutInductanceItStillDecidesWhatCannotBe() {
        judge(twoLevelStation().coil("inductance", null).coil("pull_in_current", Datum.catalogue(5.3))).is(Verdict.NONCONFORMITY)
                .compares(48 / (9.5 * 244.5 / 254.5), 5.3, 1e-9).says("Even without inductance", "5.259 A", "5.3 A");
        judge(twoLevelStation().coil("inductance", null).coil("pull_in_current", Datum.catalogue(5.2))).is(Verdict.UNDETERMINED);
        judge(lineCapacitorStation().coil("inductance", null).coil("pull_in_current", Datum.catalogue(0.7))).is(Verdict.NONCONFORMITY);
    }

    @ParameterizedTest
    @CsvSource({ "coil,pull_in_current,Pull-in current of coil type C10", "coil,resistance20,Resistance at 20 °C of coil type C10",
            "coil,inductance,Inductance of coil type C10", "driver,pull_in_voltage,Pull-in voltage of driver type D1",
            "driver,pull_in_time,Pull-in time of driver type D1", "driver,hold_voltage,Hold voltage of driver type D1",
            "driver,kind,Kind of driver type D1", "duty,on_time,On-time of station WERK/L1/=A1",
            "valve,opening_delay,Opening delay of valve type V1", "station,cable_length,Cable length of station WERK/L1/=A1",
            "cable,conductor_resistance,Conductor resistance of cable type W1" })
    void namesWhatIsMissing(String kind, String field, String name) {
        judge(without(twoLevelStation(), kind, field)).is(Verdict.UNDETERMINED).misses(name).says(name);
    }

    @ParameterizedTest
    @CsvSource({ "driver,series_resistance,Series resistance of driver type D1", "driver,capacitance,Capacitance of driver type D1",
            "duty,cycle_rate,Cycle rate of station WERK/L1/=A1", "circuit,nominal_frequency,Nominal frequency of circuit WERK/M1" })
    void namesWhatIsMissingOfALineCapacitorDriver(String kind, String field, String name) {
        judge(without(lineCapacitorStation(), kind, field)).is(Verdict.UNDETERMINED).misses(name);
    }

    static StationFixture without(StationFixture fixture, String kind, String field) {
        return switch (kind) {
            case "coil" -> fixture.coil(field, null);
            case "driver" -> fixture.driver(field, null);
            case "duty" -> fixture.duty(field, null);
            case "valve" -> fixture.valve(field, null);
            case "station" -> fixture.station(field, null);
            case "cable" -> fixture.cable(field, null);
            case "circuit" -> fixture.circuit(field, null);
            case "site" -> fixture.site(field, null);
            default -> throw new AssertionError(kind);
        };
    }

    @Test
    void namesWhatIsNotFitted() {
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).says("Driver type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutValve()).is(Verdict.UNDETERMINED).misses("Valve type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutCable()).is(Verdict.UNDETERMINED).misses("Cable type of station WERK/L1/=A1");
    }

    @Test
    void withoutACableWhatIsMissedIsMissed() {
        judge(twoLevelStation().withoutCable().coil("pull_in_current", Datum.catalogue(4.5))).is(Verdict.NONCONFORMITY);
    }

    /** Without thermal data the winding is taken as hot as its class allows: met there is met, missed there is not missed for certain. */
    @Test
    void withoutThermalDataTheClassBoundsTheWinding() {
        StationFixture unknown = twoLevelStation().coil("thermal_resistance", null).coil("highest_dissipation", null);
        judge(unknown).is(Verdict.CONFORMITY).says("winding 145 °C");
        judge(unknown.coil("pull_in_current", Datum.catalogue(3.2))).is(Verdict.UNDETERMINED).misses("Thermal resistance of coil type C10");
    }

    @Test
    void surroundingsBetweenAirAndBodyLeaveItOpen() {
        StationFixture heated = twoLevelStation().valve("opening_delay", Datum.catalogue(0.001)).station("body_temperature",
                Datum.measured(160));
        String[] conductances = { "Conductance to air of station WERK/L1/=A1", "Conductance to body of station WERK/L1/=A1" };
        judge(heated).is(Verdict.CONFORMITY);
        judge(heated.coil("pull_in_current", Datum.catalogue(3.3))).is(Verdict.UNDETERMINED).misses(conductances);
        judge(heated.coil("pull_in_current", Datum.catalogue(4))).is(Verdict.NONCONFORMITY);
        judge(heated.coil("pull_in_current", Datum.catalogue(3.3)).station("conductance_to_air", Datum.estimated(1))
                .station("conductance_to_body", Datum.estimated(0.01))).is(Verdict.CONFORMITY);
    }

    @Test
    void coilsTogetherOnAChannel() {
        // Two in series on 48 V: 20 Ω and 16 mH, half the current, the same pull-in current.
        judge(atTwentyDegrees(twoLevelStation()).station("coils_on_channel", 2).station("coil_connection", CoilConnection.SERIES))
                .is(Verdict.CONFORMITY).compares(CHECK / 2, 1.2, 1e-6).says("2 coils in series");
        judge(atTwentyDegrees(twoLevelStation()).station("coils_on_channel", 2).station("coil_connection", CoilConnection.PARALLEL))
                .is(Verdict.CONFORMITY).compares(CHECK * 2, 2.4, 1e-6).says("2 coils in parallel");
        judge(twoLevelStation().station("coils_on_channel", 2)).is(Verdict.UNDETERMINED).misses("Coil connection of station WERK/L1/=A1");
    }

    @Test
    void kindsThatAreNotComputedSaySo() {
        judge(twoLevelStation().driver("kind", DriverKind.DIRECT_AC)).is(Verdict.UNDETERMINED).says("not computed yet");
    }

    @Test
    void contradictionsAreNamed() {
        judge(twoLevelStation().duty("on_time", Datum.nameplate(0.2))).is(Verdict.UNDETERMINED)
                .misses("On-time of station WERK/L1/=A1, for 200 ms does not fit into 10 1/s");
    }
}
