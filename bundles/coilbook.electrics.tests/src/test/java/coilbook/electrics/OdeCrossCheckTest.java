package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.ClassicalRungeKuttaIntegrator;
import org.junit.jupiter.api.Test;

/**
 * The exact pieces against a general integrator of a kept library (Hipparchus, classical Runge–Kutta of small fixed steps) on random circuits:
 * within 0.1 %. The integrator knows nothing of pieces and events: limits stand in its right-hand side.
 */
class OdeCrossCheckTest {

    private static final int CIRCUITS = 120;
    private static final double STEP = 2e-6;

    /** State: capacitor voltage, coil current, integrals of current, of its square and of the mains power. */
    private record Equation(CircuitCase circuit, DriverCircuit.LineCapacitor driver, boolean on) implements OrdinaryDifferentialEquation {

        @Override
        public int getDimension() {
            return 5;
        }

        @Override
        public double[] computeDerivatives(double t, double[] y) {
            double bus = y[0];
            double current = Math.max(0, y[1]);
            double mains = Math.abs(circuit.mains().peak() * Math.sin(circuit.mains().angularFrequency() * t + circuit.mains().phase()));
            double drawn = Math.max(0, mains - driver.rectifierDrop() - bus) / driver.seriesResistance();
            double busRate = (drawn - (on ? current : 0)) / driver.capacitance();
            if (bus <= -driver.rectifierDrop() && busRate < 0) {
                busRate = 0;
            }
            double drive = on ? bus - driver.switchDrop() : -driver.clampVoltage();
            double currentRate = (drive - circuit.totalResistance() * current) / circuit.coil().inductanceOpen();
            if (y[1] <= 0 && currentRate < 0) {
                currentRate = 0;
            }
            return new double[] { busRate, currentRate, current, current * current, drawn * mains };
        }
    }

    private static double[] integrate(CircuitCase circuit, boolean on, double from, double to, double[] start) {
        int steps = (int) Math.ceil((to - from) / STEP);
        ClassicalRungeKuttaIntegrator integrator = new ClassicalRungeKuttaIntegrator((to - from) / steps);
        Equation equation = new Equation(circuit, (DriverCircuit.LineCapacitor) circuit.driver(), on);
        return integrator.integrate(equation, new ODEState(from, start), to).getPrimaryState();
    }

    @Test
    void lineCapacitorCircuits() throws IllegalCaseException {
        RandomCircuits random = new RandomCircuits(42);
        for (int index = 0; index < CIRCUITS; index++) {
            CircuitCase circuit = random.lineCapacitor(1);
            CycleResult cycle = Waveforms.solve(circuit).cycles().get(0);
            double full = circuit.mains().peak() - ((DriverCircuit.LineCapacitor) circuit.driver()).rectifierDrop();
            double[] half = integrate(circuit, true, 0, circuit.onTime() / 2, new double[] { full, 0, 0, 0, 0 });
            double[] off = integrate(circuit, true, circuit.onTime() / 2, circuit.onTime(), half);
            double[] end = integrate(circuit, false, circuit.onTime(), circuit.period(), off);
            String what = circuit.toString();
            double scale = cycle.peakCurrent();
            assertEquals(off[1], cycle.currentAtSwitchOff(), 1e-3 * scale, what);
            assertEquals(2 * (off[2] - half[2]) / circuit.onTime(), cycle.holdMeanCurrent(), 1e-3 * cycle.holdMeanCurrent(), what);
            assertEquals(circuit.coil().resistance() * end[3], cycle.windingEnergy(), 1e-3 * cycle.windingEnergy(), what);
            assertEquals(end[4], cycle.energies().source(), 1e-3 * cycle.energies().source(), what);
            double capacitance = ((DriverCircuit.LineCapacitor) circuit.driver()).capacitance();
            double stored = 0.5 * capacitance * (end[0] * end[0] - full * full);
            assertEquals(stored, cycle.energies().stored(), 1e-3 * 0.5 * capacitance * full * full, what);
        }
    }
}
