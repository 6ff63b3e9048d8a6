package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CycleResult;
import coilbook.electrics.EnergyAccount;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.SteadyResult;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds the cycle that repeats the one before within 0.1 %. Where the mains phase drifts from cycle to cycle, the settled cycle is a function of
 * the phase at its switch-on: it is found at evenly spaced phases together, each pass starting every phase from the state in which the cycle
 * before it ended, interpolated between the phases, until nothing changes any more.
 */
public final class SteadySearch {

    /** Phases looked at over the rectified half-wave. */
    public static final int PHASES = 16;

    private static final double SAME = 1e-3;
    private static final int MOST_CYCLES = 4096;
    /** Panels after which the search gives up: about half a second. */
    private static final long MOST_EFFORT = 400_000;
    private static final int WARM_UP = 2;
    /** States so near to those of a neighbouring circuit, as a share of full scale, need no second pass. */
    private static final double NEAR = 3e-4;

    private final CircuitCase circuit;
    private final CycleMachine machine;
    private int slowest;
    private boolean settled = true;

    private SteadySearch(CircuitCase circuit) {
        this.circuit = circuit;
        machine = Machines.of(circuit);
    }

    /** The repeating cycle as the case file means it: at the given phase where cycle and mains are locked, else the worst over the phases. */
    public static SteadyResult find(CircuitCase circuit) throws IllegalCaseException {
        SteadySearch search = new SteadySearch(circuit);
        if (!Machines.feelsMains(circuit)) {
            return search.result(List.of(search.forward(0)));
        }
        if (Machines.phaseStep(circuit) == 0) {
            return search.result(List.of(search.forward(circuit.mains().phase())));
        }
        return search.overPhases(search.warmUp(PHASES), false);
    }

    /** The repeating cycle over a number of evenly spaced phases of the mains, whether locked or not: what holds whenever the timer may fire. */
    public static SteadyResult overPhases(CircuitCase circuit, int phases) throws IllegalCaseException {
        SteadySearch search = new SteadySearch(circuit);
        return Machines.feelsMains(circuit) ? search.overPhases(search.warmUp(phases), false) : search.result(List.of(search.forward(0)));
    }

    /**
     * A search over the same circuit with small changes, as of temperature: each begins with the states that the one before ended with. Not for use by
     * several threads.
     */
    public static final class Series {

        private final int phases;
        private PhaseStates states;

        public Series(int phases) {
            this.phases = phases;
        }

        /** The repeating cycle over the phases. */
        public SteadyResult next(CircuitCase circuit) throws IllegalCaseException {
            SteadySearch search = new SteadySearch(circuit);
            if (!Machines.feelsMains(circuit)) {
                return search.result(List.of(search.forward(0)));
            }
            boolean near = states != null;
            states = near ? states : search.warmUp(phases);
            return search.overPhases(states, near);
        }
    }

    /** The first cycle after rest, over a number of evenly spaced phases of the mains. */
    public static SteadyResult fromRest(CircuitCase circuit, int phases) throws IllegalCaseException {
        SteadySearch search = new SteadySearch(circuit);
        int count = Machines.feelsMains(circuit) ? phases : 1;
        List<CycleResult> byPhase = new ArrayList<>(count);
        for (int index = 0; index < count; index++) {
            search.machine.restart(Math.PI * index / count);
            search.machine.cycle();
            byPhase.add(search.machine.result(1));
        }
        search.slowest = 1;
        return search.result(byPhase);
    }

    private SteadyResult result(List<CycleResult> byPhase) {
        return new SteadyResult(worst(byPhase, slowest), byPhase, slowest, settled);
    }

    private SteadyResult overPhases(PhaseStates states, boolean near) throws IllegalCaseException {
        int phases = states.count();
        double step = Machines.phaseStep(circuit);
        List<CycleResult> last = pass(states);
        long effort = machine.work();
        for (int pass = 1; pass <= MOST_CYCLES; pass++) {
            double moved = states.shift(step);
            if (near && moved < NEAR) {
                return result(last);
            }
            List<CycleResult> next = pass(states);
            effort += phases * machine.work();
            slowest = WARM_UP + pass + 1;
            double moves = states.movesNext(step);
            // what further passes could still change is what this one will hand on, as a share of what it was handed itself
            double share = moved > 0 ? moves / moved : 0;
            if (share < 1 && agree(last, next, share) || states.settled(moves)) {
                states.shift(step);
                return result(next);
            }
            if (effort > MOST_EFFORT) {
                break;
            }
            last = next;
        }
        settled = false;
        return result(last);
    }

    private PhaseStates warmUp(int phases) throws IllegalCaseException {
        machine.restart(0);
        for (int cycle = 0; cycle < WARM_UP; cycle++) {
            machine.cycle();
        }
        return new PhaseStates(phases, machine.source(), machine.current, machine.plunger.isClosed());
    }

    /** Runs one cycle at every phase and keeps the states in which they end. */
    private List<CycleResult> pass(PhaseStates states) throws IllegalCaseException {
        int phases = states.count();
        List<CycleResult> byPhase = new ArrayList<>(phases);
        for (int index = 0; index < phases; index++) {
            machine.resume(states.source(index), states.current(index), states.closed(index), Math.PI * index / phases);
            machine.cycle();
            states.end(index, machine.source(), machine.current, machine.plunger.isClosed());
            byPhase.add(machine.result(slowest + 1));
        }
        return byPhase;
    }

    private CycleResult forward(double phase) throws IllegalCaseException {
        machine.restart(phase);
        machine.cycle();
        CycleResult last = machine.result(1);
        long effort = 0;
        for (int cycle = 2; cycle <= MOST_CYCLES; cycle++) {
            machine.cycle();
            CycleResult next = machine.result(cycle);
            slowest = cycle;
            if (agree(last, next, 1)) {
                return next;
            }
            last = next;
            effort += machine.work();
            if (effort > MOST_EFFORT) {
                break;
            }
        }
        settled = false;
        return last;
    }

    private static boolean agree(List<CycleResult> ones, List<CycleResult> others, double share) {
        for (int index = 0; index < ones.size(); index++) {
            if (!agree(ones.get(index), others.get(index), share)) {
                return false;
            }
        }
        return true;
    }

    /** True if the two are within 0.1 % of each other, or if the given share of their difference is. */
    private static boolean agree(CycleResult one, CycleResult other, double share) {
        double peak = Math.max(one.peakCurrent(), other.peakCurrent());
        double scale = 1e-6 * peak;
        double shortTime = 1e-6 * Math.max(one.timeOfPeak(), other.timeOfPeak());
        return same(one.sourceVoltageAtSwitchOn(), other.sourceVoltageAtSwitchOn(), 0, share)
                && same(one.peakCurrent(), other.peakCurrent(), 0, share) && same(one.timeOfPeak(), other.timeOfPeak(), shortTime, share)
                && same(one.timeToPullIn(), other.timeToPullIn(), shortTime, share)
                && same(one.holdMeanCurrent(), other.holdMeanCurrent(), scale, share)
                && same(one.holdMinimumCurrent(), other.holdMinimumCurrent(), scale, share)
                && same(one.minimumAfterPeakCurrent(), other.minimumAfterPeakCurrent(), scale, share)
                && same(one.windingEnergy(), other.windingEnergy(), 0, share)
                && same(one.releaseTime(), other.releaseTime(), shortTime, share)
                && same(one.residualCurrent(), other.residualCurrent(), SAME * peak, share);
    }

    private static boolean same(double one, double other, double slack, double share) {
        return one == other || Double.isNaN(one) && Double.isNaN(other)
                || share * Math.abs(one - other) <= SAME * Math.max(Math.abs(one), Math.abs(other)) + slack;
    }

    private static CycleResult worst(List<CycleResult> all, int cycle) {
        CycleResult worst = all.get(0);
        for (CycleResult next : all.subList(1, all.size())) {
            boolean hotter = next.windingEnergy() > worst.windingEnergy();
            EnergyAccount energies = hotter ? next.energies() : worst.energies();
            worst = new CycleResult(cycle, Math.min(worst.sourceVoltageAtSwitchOn(), next.sourceVoltageAtSwitchOn()),
                    Math.max(worst.sourceVoltagePeak(), next.sourceVoltagePeak()), Math.min(worst.peakCurrent(), next.peakCurrent()),
                    Math.max(worst.timeOfPeak(), next.timeOfPeak()), Math.max(worst.timeToPullIn(), next.timeToPullIn()),
                    Math.min(worst.heldAtPullIn(), next.heldAtPullIn()), Math.min(worst.holdMeanCurrent(), next.holdMeanCurrent()),
                    Math.min(worst.holdMinimumCurrent(), next.holdMinimumCurrent()),
                    Math.min(worst.holdRmsCurrent(), next.holdRmsCurrent()),
                    Math.min(worst.minimumAfterPeakCurrent(), next.minimumAfterPeakCurrent()),
                    leastKnown(worst.minimumAfterOpeningCurrent(), next.minimumAfterOpeningCurrent()),
                    -leastKnown(-worst.belowDropOut(), -next.belowDropOut()),
                    Math.min(worst.currentAtSwitchOff(), next.currentAtSwitchOff()),
                    Math.max(worst.releaseTime(), next.releaseTime()), Math.max(worst.residualCurrent(), next.residualCurrent()),
                    Math.max(worst.windingEnergy(), next.windingEnergy()), Math.max(worst.coilRmsCurrent(), next.coilRmsCurrent()),
                    Math.max(worst.mainsRmsCurrent(), next.mainsRmsCurrent()), Math.max(worst.mainsPeakCurrent(), next.mainsPeakCurrent()),
                    energies);
        }
        return worst;
    }

    /** The hold of a phase whose on-time ends before the valve is open does not count. */
    private static double leastKnown(double one, double other) {
        return Double.isNaN(one) ? other : Double.isNaN(other) ? one : Math.min(one, other);
    }
}
