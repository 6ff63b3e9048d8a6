package coilbook.criteria.internal.heat;

import static coilbook.criteria.StationFixture.fixedDcStation;
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
import coilbook.fleet.DriverKind;
import coilbook.fleet.InsulationClass;

class WindingTemperatureTest {

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("winding-temperature", fixture);
    }

    private static StationFixture without(String kind, String field) {
        StationFixture fixture = twoLevelStation();
        return switch (kind) {
            case "coil" -> fixture.coil(field, null);
            case "driver" -> fixture.driver(field, null);
            case "duty" -> fixture.duty(field, null);
            case "site" -> fixture.site(field, null);
            default -> throw new AssertionError(kind);
        };
    }

    /** Standing still the winding is as warm as its surroundings. */
    private static StationFixture still(double ambient) {
        return twoLevelStation().duty("cycle_rate", Datum.nameplate(0)).station("coil_ambient_highest", Datum.measured(ambient));
    }

    /** Limits of the thermal classes as IEC 60085 gives them (secondary publications), less 10 K. */
    @ParameterizedTest
    @CsvSource({ "Y,80", "A,95", "E,110", "B,120", "F,145", "H,170", "N,190", "R,210" })
    void classLimits(InsulationClass insulation, double limit) {
        judge(still(40).coil("insulation_class", insulation)).is(Verdict.CONFORMITY).compares(40, limit, 1e-9).at("hot")
                .says("class " + insulation + " allows " + (int) (limit + 10) + " °C (IEC 60085) less 10 K");
    }

    @Test
    void limitMetExactlyIsMetNarrowly() {
        judge(still(145)).is(Verdict.OBSERVATION);
        judge(still(135.1)).is(Verdict.OBSERVATION);
        judge(still(135)).is(Verdict.CONFORMITY);
        judge(still(145.1)).is(Verdict.NONCONFORMITY).isHazard(true).compares(145.1, 145, 1e-9).says("Winding 145.1 °C");
        judge(still(140).fleet("temperature margin", 5)).is(Verdict.CONFORMITY);
        judge(still(145.1).fleet("hot-spot allowance", 5)).is(Verdict.OBSERVATION);
    }

    /** 12 V on 10 Ω, 5 K/W, 25 °C: 82.757500 °C, closed form of a voltage-driven winding. */
    @Test
    void voltageDrivenFixedPoint() {
        StationFixture held = fixedDcStation().coil("resistance_tolerance", Datum.catalogue(0)).station("cable_length", Datum.nameplate(0))
                .site("ambient_highest", Datum.nameplate(25)).duty("cycle_rate", Datum.nameplate(0.01))
                .duty("on_time", Datum.nameplate(99.995));
        Finding finding = Judged.finding("winding-temperature", held);
        assertEquals(82.757500, finding.evidence().value(), 0.01);
        assertEquals(11.551500, finding.evidence().numbers().get("Winding power [W]"), 0.005);
    }

    /** Two-level, 20 cycles a second of 20 ms, freewheel of 0.7 V: 11.8357097 W in the winding at 20 °C (closed form and ngspice). */
    @Test
    void powerAtDutyIsTheCheckValue() {
        Finding finding = Judged.finding("winding-temperature",
                Judged.atTwentyDegrees(twoLevelStation()).duty("cycle_rate", Datum.nameplate(20))
                        .driver("clamp_voltage", Datum.catalogue(0.7)));
        assertEquals(11.8357097, finding.evidence().numbers().get("Winding power [W]"), 1e-4);
        assertEquals(20, finding.evidence().value(), 1e-3);
        FindingAssert.assertThat(finding).says("20 1/s of 20 ms, 11.84 W and 20 °C ambient");
    }

    /** The hot corner takes resistance at − tolerance, which on a voltage heats most. */
    @Test
    void toleranceCounts() {
        double tight = Judged.finding("winding-temperature", twoLevelStation().coil("resistance_tolerance", Datum.catalogue(0))).evidence()
                .value();
        double wide = Judged.finding("winding-temperature", twoLevelStation().coil("resistance_tolerance", Datum.catalogue(0.1))).evidence()
                .value();
        assertTrue(wide > tight + 1, tight + " " + wide);
    }

    @Test
    void tooHotCanHurt() {
        judge(twoLevelStation().coil("thermal_resistance", Datum.catalogue(8)).duty("cycle_rate", Datum.nameplate(45)))
                .is(Verdict.NONCONFORMITY).isHazard(true).says("45 1/s of 20 ms", "class F");
    }

    /** 2.3 A on 10 Ω with 5 K/W has no steady temperature (closed form: R_th · I² · R₂₀ / 254.5 ≥ 1) unless the bus saturates. */
    @Test
    void currentRegulatedRunsAway() {
        StationFixture runaway = twoLevelStation().driver("kind", DriverKind.CURRENT_REGULATED).driver("bus_voltage", Datum.catalogue(400))
                .driver("peak_current", Datum.catalogue(3)).driver("peak_time", Datum.catalogue(0.002))
                .driver("hold_current", Datum.catalogue(2.3))
                .coil("insulation_voltage", Datum.catalogue(600)).duty("cycle_rate", Datum.nameplate(0.01))
                .duty("on_time", Datum.nameplate(99.995));
        judge(runaway).is(Verdict.NONCONFORMITY).isHazard(true).says("no steady temperature below", "where the bus saturates");
    }

    /** Without a thermal resistance: (155 − 10 − 40) / 20 = 5.25 K/W at most. */
    @Test
    void highestDissipationBoundsTheThermalResistance() {
        judge(twoLevelStation().coil("thermal_resistance", null)).is(Verdict.CONFORMITY).says("Winding at most");
        judge(twoLevelStation().coil("thermal_resistance", null).coil("highest_dissipation", Datum.catalogue(12)).duty("cycle_rate",
                Datum.nameplate(45))).is(Verdict.UNDETERMINED)
                .misses("Thermal resistance of coil type C10");
        judge(twoLevelStation().coil("thermal_resistance", null).coil("highest_dissipation", null)).is(Verdict.UNDETERMINED)
                .misses("Thermal resistance of coil type C10");
    }

    @Test
    void withoutInductanceDirectCurrentIsTheBound() {
        judge(twoLevelStation().coil("inductance", null)).is(Verdict.CONFORMITY).says("Winding at most");
        judge(twoLevelStation().coil("inductance", null).coil("thermal_resistance", Datum.catalogue(8)).duty("cycle_rate",
                Datum.nameplate(30))).is(Verdict.UNDETERMINED)
                .misses("Inductance of coil type C10");
    }

    @Test
    void surroundingsBetweenAirAndBody() {
        StationFixture heated = twoLevelStation().coil("thermal_resistance", Datum.catalogue(8)).station("body_temperature",
                Datum.measured(100));
        judge(heated.duty("cycle_rate", Datum.nameplate(5))).is(Verdict.CONFORMITY);
        judge(heated.duty("cycle_rate", Datum.nameplate(18))).is(Verdict.UNDETERMINED).misses("Conductance to air of station WERK/L1/=A1",
                "Conductance to body of station WERK/L1/=A1");
        judge(heated.duty("cycle_rate", Datum.nameplate(45))).is(Verdict.NONCONFORMITY).isHazard(true);
    }

    @Test
    void withoutACableWhatIsMissedIsNotMissedForCertain() {
        judge(twoLevelStation().station("cable_length", null)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().station("cable_length", null).coil("thermal_resistance", Datum.catalogue(8)).duty("cycle_rate",
                Datum.nameplate(45))).is(Verdict.UNDETERMINED)
                .misses("Cable length of station WERK/L1/=A1");
    }

    @ParameterizedTest
    @CsvSource({ "coil,insulation_class,Insulation class of coil type C10", "coil,resistance20,Resistance at 20 °C of coil type C10",
            "site,ambient_highest,Ambient highest of site WERK", "duty,cycle_rate,Cycle rate of station WERK/L1/=A1",
            "duty,on_time,On-time of station WERK/L1/=A1", "driver,hold_voltage,Hold voltage of driver type D1",
            "driver,pull_in_voltage,Pull-in voltage of driver type D1" })
    void namesWhatIsMissing(String kind, String field, String name) {
        judge(without(kind, field)).is(Verdict.UNDETERMINED).misses(name);
    }

    @Test
    void namesWhatIsNotThere() {
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutDuty()).is(Verdict.UNDETERMINED).misses("Cycle rate of station WERK/L1/=A1",
                "On-time of station WERK/L1/=A1");
    }
}
