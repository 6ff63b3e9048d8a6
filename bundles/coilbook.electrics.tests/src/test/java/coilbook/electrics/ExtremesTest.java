package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import coilbook.fleet.LevelChange;
import java.time.Duration;
import org.junit.jupiter.api.Test;

/** Circuits that no driver is, which yet must end, without a value that is no number, and with their energy accounted for. */
class ExtremesTest {

    private static final double NONE = Double.NaN;

    private static void sound(CircuitCase circuit) throws IllegalCaseException {
        WaveformResult result = Waveforms.solve(circuit);
        for (CycleResult cycle : result.cycles()) {
            sound(circuit, cycle);
        }
        for (CycleResult cycle : result.steady().byPhase()) {
            sound(circuit, cycle);
        }
        assertTrue(result.steady().cyclesToSettle() > 0);
    }

    private static void sound(CircuitCase circuit, CycleResult cycle) {
        double[] values = { cycle.peakCurrent(), cycle.timeOfPeak(),
                cycle.holdMeanCurrent(), cycle.holdMinimumCurrent(), cycle.holdRmsCurrent(), cycle.minimumAfterPeakCurrent(),
                cycle.currentAtSwitchOff(), cycle.residualCurrent(), cycle.windingEnergy(), cycle.coilRmsCurrent(), cycle.mainsRmsCurrent(),
                cycle.mainsPeakCurrent() };
        for (double value : values) {
            assertTrue(Double.isFinite(value) && value >= 0, () -> circuit + " gives " + cycle);
        }
        // a freewheeling bridge leaves the capacitor at minus its drop
        double drop = circuit.driver() instanceof DriverCircuit.LineCapacitor line ? line.rectifierDrop() : 0;
        assertTrue(cycle.sourceVoltageAtSwitchOn() >= -drop && cycle.sourceVoltagePeak() >= -drop, () -> circuit + " gives " + cycle);
        EnergyAccount energies = cycle.energies();
        double scale = energies.source() + energies.winding() + Math.abs(energies.stored()) + energies.clamp() + energies.seriesResistor();
        assertEquals(0, energies.imbalance(), 1e-3 * scale + 1e-15, () -> circuit + " gives " + cycle);
        assertTrue(cycle.timeOfPeak() <= circuit.onTime());
        assertTrue(cycle.minimumAfterPeakCurrent() <= cycle.peakCurrent());
        assertTrue(!(cycle.timeToPullIn() > circuit.onTime()));
    }

    @Test
    void anyPositiveLineCapacitorCircuitEnds() {
        RandomCircuits random = new RandomCircuits(20261201);
        assertTimeoutPreemptively(Duration.ofMinutes(5), () -> {
            for (int index = 0; index < 120; index++) {
                double rate = random.between(0.05, 1000);
                double pullIn = random.between(1e-3, 100);
                double inductance = random.between(1e-4, 1);
                CoilCircuit coil = new CoilCircuit(random.between(1e-3, 1e4), inductance,
                        random.chance() ? inductance * random.between(1, 3) : NONE, pullIn, pullIn * random.between(0.1, 1), 20);
                DriverCircuit driver = new DriverCircuit.LineCapacitor(random.between(1e-3, 1e5), random.between(1e-6, 1),
                        random.chance() ? 0 : random.between(0.1, 5), random.chance() ? 0 : random.between(0.1, 5),
                        random.chance() ? 0 : random.between(0.1, 500), random.chance() ? NONE : random.between(1e3, 1e7));
                sound(new CircuitCase(new MainsSource(random.between(1, 500), random.chance() ? 50 : 60, random.between(0.01, 6)), driver,
                        coil, random.chance() ? 0 : random.between(1e-3, 100), rate, random.between(0.01, 0.99) / rate, 2));
            }
        });
    }

    @Test
    void anyPositiveRegulatedCircuitEnds() {
        RandomCircuits random = new RandomCircuits(20261202);
        assertTimeoutPreemptively(Duration.ofMinutes(2), () -> {
            for (int index = 0; index < 2000; index++) {
                double rate = random.between(0.01, 1000);
                double pullIn = random.between(1e-3, 100);
                double inductance = random.between(1e-6, 1);
                double onTime = random.between(0.01, 0.99) / rate;
                CoilCircuit coil = new CoilCircuit(random.between(1e-3, 1e4), inductance,
                        random.chance() ? inductance * random.between(1, 3) : NONE, pullIn, pullIn * random.between(0.1, 1), 20);
                double drop = random.chance() ? 0 : random.between(0.1, 5);
                double clamp = random.chance() ? 0 : random.between(0.1, 500);
                DriverCircuit driver = switch (index % 4) {
                    case 0 -> new DriverCircuit.FixedDc(random.between(0.1, 400), drop, clamp);
                    case 1 -> new DriverCircuit.CurrentRegulated(random.between(0.1, 400), random.between(0.01, 50),
                            onTime * random.between(0.01, 2), random.between(0.01, 50), drop, clamp);
                    default -> new DriverCircuit.TwoLevel(random.between(0.1, 400), onTime * random.between(0.01, 2),
                            random.between(0.1, 400), index % 4 == 2 ? LevelChange.SOURCE : LevelChange.FREEWHEEL, drop, clamp);
                };
                sound(new CircuitCase(null, driver, coil, random.chance() ? 0 : random.between(1e-3, 100), rate, onTime, 2));
            }
        });
    }

    @Test
    void plausibleCircuitsBalanceTheirEnergy() throws IllegalCaseException {
        RandomCircuits random = new RandomCircuits(7);
        for (int index = 0; index < 200; index++) {
            CircuitCase circuit = index % 3 == 0 ? random.lineCapacitor(3) : index % 3 == 1 ? random.twoLevel(3) : random.fixedDc(3);
            for (CycleResult cycle : Waveforms.solve(circuit).cycles()) {
                assertEquals(0, cycle.energies().imbalance(), 1e-9 * cycle.energies().source(), circuit::toString);
            }
        }
    }

    @Test
    void refusalsNameTheField() {
        CircuitCase sound = Cases.lineA(120, 60, 0, 0.3, 2.5, 1);
        refused("duty.onTime", new CircuitCase(sound.mains(), sound.driver(), sound.coil(), 0, 2.5, 0.4, 1));
        refused("duty.onTime", new CircuitCase(sound.mains(), sound.driver(), sound.coil(), 0, 2.5, NONE, 1));
        refused("mains", new CircuitCase(null, sound.driver(), sound.coil(), 0, 2.5, 0.3, 1));
        refused("mains.frequency", new CircuitCase(new MainsSource(120, 0, 0), sound.driver(), sound.coil(), 0, 2.5, 0.3, 1));
        refused("cable.loopResistance", new CircuitCase(sound.mains(), sound.driver(), sound.coil(), -1, 2.5, 0.3, 1));
        refused("coil.resistance20", withCoil(new CoilCircuit(0, 0.2, NONE, NONE, NONE, 20)));
        refused("coil.inductance", withCoil(new CoilCircuit(250, NONE, NONE, NONE, NONE, 20)));
        refused("coil.inductanceClosed", withCoil(new CoilCircuit(250, 0.2, 0.1, 0.3, NONE, 20)));
        refused("coil.pullInCurrent", withCoil(new CoilCircuit(250, 0.2, 0.3, NONE, NONE, 20)));
        refused("driver.seriesResistance", new CircuitCase(sound.mains(), new DriverCircuit.LineCapacitor(Double.POSITIVE_INFINITY, 1e-6,
                1, 0, 1), sound.coil(), 0, 2.5, 0.3, 1));
        refused("cycles", new CircuitCase(sound.mains(), sound.driver(), sound.coil(), 0, 2.5, 0.3, 0));
    }

    private static CircuitCase withCoil(CoilCircuit coil) {
        CircuitCase sound = Cases.lineA(120, 60, 0, 0.3, 2.5, 1);
        return new CircuitCase(sound.mains(), sound.driver(), coil, 0, 2.5, 0.3, 1);
    }

    private static void refused(String field, CircuitCase circuit) {
        try {
            Waveforms.solve(circuit);
        } catch (IllegalCaseException e) {
            assertEquals(field, e.field());
            assertFalse(e.expected().isEmpty());
            return;
        }
        throw new AssertionError("not refused: " + field);
    }
}
