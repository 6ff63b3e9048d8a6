package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CycleResult;
import coilbook.electrics.EnergyAccount;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.SteadyResult;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds the cycle that repeats the one before within 0.1 %. Where the mains phase drifts from cycle to cycle, the cycle that settles at each of a
 * number of phases is found by starting further and further back along the drift, until the start no longer matters.
 */
public final class SteadySearch {

    /** Phases looked at over the rectified half-wave. */
    public static final int PHASES = 16;

    private static final double SAME = 1e-3;
    private static final int MOST_CYCLES = 4096;

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
        return search.overPhases(PHASES);
    }

    /** The repeating cycle over a number of evenly spaced phases of the mains, whether locked or not: what holds whenever the timer may fire. */
    public static SteadyResult overPhases(CircuitCase circuit, int phases) throws IllegalCaseException {
        SteadySearch search = new SteadySearch(circuit);
        return Machines.feelsMains(circuit) ? search.overPhases(phases) : search.result(List.of(search.forward(0)));
    }

    /** The first cycle after rest, over a number of evenly spaced phases of the mains. */
    public static SteadyResult fromRest(CircuitCase circuit, int phases) throws IllegalCaseException {
        SteadySearch search = new SteadySearch(circuit);
        int count = Machines.feelsMains(circuit) ? phases : 1;
        List<CycleResult> byPhase = new ArrayList<>(count);
        for (int index = 0; index < count; index++) {
            byPhase.add(search.after(0, Math.PI * index / count, 0));
        }
        search.slowest = 1;
        return search.result(byPhase);
    }

    private SteadyResult result(List<CycleResult> byPhase) {
        return new SteadyResult(worst(byPhase, slowest), byPhase, slowest, settled);
    }

    private SteadyResult overPhases(int phases) throws IllegalCaseException {
        List<CycleResult> byPhase = new ArrayList<>(phases);
        double step = Machines.phaseStep(circuit);
        int lead = 1;
        for (int index = 0; index < phases; index++) {
            double phase = Math.PI * index / phases;
            CycleResult last = after(lead, phase, step);
            CycleResult next = after(lead + 1, phase, step);
            while (!agree(last, next) && lead < MOST_CYCLES) {
                last = next;
                lead = 2 * lead;
                next = after(lead + 1, phase, step);
            }
            settled = agree(last, next) && settled;
            slowest = Math.max(slowest, lead + 1);
            byPhase.add(next);
        }
        return result(byPhase);
    }

    /** The cycle that follows the given number of others and is switched on at the given phase. */
    private CycleResult after(int others, double phase, double step) throws IllegalCaseException {
        machine.restart(phase - others * step);
        for (int index = 0; index <= others; index++) {
            machine.cycle();
        }
        return machine.result(others + 1);
    }

    private CycleResult forward(double phase) throws IllegalCaseException {
        machine.restart(phase);
        machine.cycle();
        CycleResult last = machine.result(1);
        for (int cycle = 2; cycle <= MOST_CYCLES; cycle++) {
            machine.cycle();
            CycleResult next = machine.result(cycle);
            slowest = cycle;
            if (agree(last, next)) {
                return next;
            }
            last = next;
        }
        settled = false;
        return last;
    }

    private static boolean agree(CycleResult one, CycleResult other) {
        double scale = 1e-6 * Math.max(one.peakCurrent(), other.peakCurrent());
        double shortTime = 1e-6 * Math.max(one.timeOfPeak(), other.timeOfPeak());
        return same(one.sourceVoltageAtSwitchOn(), other.sourceVoltageAtSwitchOn(), 0) && same(one.peakCurrent(), other.peakCurrent(), 0)
                && same(one.timeOfPeak(), other.timeOfPeak(), shortTime) && same(one.timeToPullIn(), other.timeToPullIn(), shortTime)
                && same(one.holdMeanCurrent(), other.holdMeanCurrent(), scale)
                && same(one.holdMinimumCurrent(), other.holdMinimumCurrent(), scale)
                && same(one.minimumAfterPeakCurrent(), other.minimumAfterPeakCurrent(), scale)
                && same(one.windingEnergy(), other.windingEnergy(), 0) && same(one.releaseTime(), other.releaseTime(), shortTime)
                && same(one.residualCurrent(), other.residualCurrent(), SAME * Math.max(one.peakCurrent(), other.peakCurrent()));
    }

    private static boolean same(double one, double other, double slack) {
        return one == other || Double.isNaN(one) && Double.isNaN(other)
                || Math.abs(one - other) <= SAME * Math.max(Math.abs(one), Math.abs(other)) + slack;
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
