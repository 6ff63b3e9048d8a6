package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.DriverCircuit;

/** Makes the machine that fits a driver's kind. */
final class Machines {

    private Machines() {
    }

    static CycleMachine of(CircuitCase circuit) {
        return circuit.driver() instanceof DriverCircuit.LineCapacitor line ? new LineMachine(circuit, line)
                : new RegulatedMachine(circuit);
    }

    /** True if the mains phase plays a part in the current. */
    static boolean feelsMains(CircuitCase circuit) {
        return circuit.driver() instanceof DriverCircuit.LineCapacitor;
    }

    /** By how much the phase within the rectified half-wave moves from cycle to cycle, rad; zero means locked. */
    static double phaseStep(CircuitCase circuit) {
        double step = LineMachine.phaseStep(circuit.mains().frequency(), circuit.cyclesPerSecond());
        return Math.abs(step) < 1e-9 ? 0 : step;
    }
}
