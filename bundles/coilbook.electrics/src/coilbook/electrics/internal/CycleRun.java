package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CycleResult;
import coilbook.electrics.IllegalCaseException;
import java.util.ArrayList;
import java.util.List;

/** Runs the cycles of a case from its start state, one after the other. */
public final class CycleRun {

    private CycleRun() {
    }

    public static List<CycleResult> cycles(CircuitCase circuit) throws IllegalCaseException {
        CycleMachine machine = Machines.of(circuit);
        machine.restart(Machines.feelsMains(circuit) ? circuit.mains().phase() : 0);
        List<CycleResult> cycles = new ArrayList<>(circuit.cycles());
        for (int cycle = 1; cycle <= circuit.cycles(); cycle++) {
            machine.cycle();
            cycles.add(machine.result(cycle));
        }
        return cycles;
    }
}
