package coilbook.criteria.internal.output;

import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.Judged;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.electrics.CircuitCase;
import coilbook.electrics.CoilCircuit;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.MainsSource;
import coilbook.electrics.Waveforms;
import coilbook.fleet.Datum;
import coilbook.fleet.LevelChange;
import coilbook.fleet.Provenance;

class ComparisonTest {

    private static StationFixture approved(StationFixture fixture) {
        return fixture.coil("approved_drivers", List.of("D1")).coil("inductance", null).coil("drop_out_current", null);
    }

    private static FindingAssert pullIn(StationFixture fixture) {
        return Judged.judge("pull-in-current", fixture);
    }

    @Test
    void approvedWithoutACableIsTheApprovedPair() {
        pullIn(approved(twoLevelStation()).station("cable_length", Datum.nameplate(0))).is(Verdict.CONFORMITY).compares(1, 1, 0)
                .says("approves driver type D1", "whatever the inductance, the peak current here is at least 1 of theirs");
        Judged.judge("hold-current", approved(twoLevelStation()).station("cable_length", Datum.nameplate(0))).is(Verdict.CONFORMITY)
                .says("hold current");
        assertEquals(Provenance.ESTIMATED, Judged.finding("pull-in-current", approved(twoLevelStation())).evidence().provenance());
    }

    /** R/(R + R_cable) for 9.5 Ω at 10 °C, 9.1267 Ω, and 0.39 Ω: 0.95902; with 27 m, 1.053 Ω: 0.8966. */
    @Test
    void theCableTakesItsShare() {
        pullIn(approved(twoLevelStation())).is(Verdict.OBSERVATION).compares(9.5 * 244.5 / 254.5 / (9.5 * 244.5 / 254.5 + 0.39), 1, 1e-9)
                .says("0.959");
        pullIn(approved(twoLevelStation()).station("cable_length", Datum.nameplate(27))).is(Verdict.NONCONFORMITY);
    }

    /** Mains low 108 V against a setting that goes down to 100 V or only to 115 V; without a cable. */
    @Test
    void theMainsOfALineCapacitorDriverCount() {
        StationFixture line = approved(lineCapacitorStation()).station("cable_length", Datum.nameplate(0));
        pullIn(line).is(Verdict.CONFORMITY).compares((Math.sqrt(2) * 108 - 1.4) / (Math.sqrt(2) * 100 - 1.4), 1, 1e-9);
        pullIn(line.setting("L120", "lowest_voltage", Datum.catalogue(115))).is(Verdict.OBSERVATION);
        pullIn(line.setting("L120", "lowest_voltage", Datum.catalogue(121))).is(Verdict.NONCONFORMITY);
        pullIn(line.setting("L120", "lowest_voltage", null)).is(Verdict.UNDETERMINED).misses("Inductance of coil type C10");
    }

    @Test
    void doesNotDecideWhereItCannotCompare() {
        pullIn(approved(twoLevelStation()).coil("approved_drivers", List.of("D2"))).is(Verdict.UNDETERMINED);
        pullIn(approved(twoLevelStation()).station("cable_length", null)).is(Verdict.UNDETERMINED);
        pullIn(approved(twoLevelStation()).duty("on_time", Datum.nameplate(0.002))).is(Verdict.UNDETERMINED);
        pullIn(approved(twoLevelStation()).coil("inductance", Datum.catalogue(0.008)).coil("pull_in_current", Datum.catalogue(5)))
                .is(Verdict.NONCONFORMITY).says("pull-in needs 5 A");
    }

    /** The bound holds for any inductance: swept with exact waveforms from 10 µs to 100 ms of L/R, with cables up to the coil's own resistance. */
    @Test
    void boundHoldsForAnyInductance() throws Exception {
        for (double decade = -5; decade <= -1; decade += 0.5) {
            double inductance = 250 * Math.pow(10, decade);
            for (double cable : new double[] { 5, 50, 250 }) {
                double share = 250 / (250 + cable);
                assertTrue(peak(line(), inductance, cable) >= share * peak(line(), inductance, 0) * (1 - 1e-9), inductance + " " + cable);
                DriverCircuit twoLevel = new DriverCircuit.TwoLevel(48, 0.003, 6, LevelChange.SOURCE, 0, 47);
                assertTrue(peak(twoLevel, inductance, cable) >= share * peak(twoLevel, inductance, 0) * (1 - 1e-9),
                        inductance + " " + cable);
            }
        }
    }

    private static DriverCircuit line() {
        return new DriverCircuit.LineCapacitor(430, 6.8e-6, 1.4, 0, 0.7);
    }

    private static double peak(DriverCircuit driver, double inductance, double cable) throws Exception {
        CoilCircuit coil = new CoilCircuit(250, inductance, Double.NaN, Double.NaN, Double.NaN, 20);
        CircuitCase circuit = new CircuitCase(new MainsSource(120, 60, 0.4), driver, coil, cable, 0.5, 0.3, 1);
        return Waveforms.solve(circuit).cycles().get(0).peakCurrent();
    }
}
