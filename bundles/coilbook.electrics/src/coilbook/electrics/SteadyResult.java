package coilbook.electrics;

import java.util.List;

/**
 * The repeating cycle.
 *
 * @param worst the least favourable of the phases, key by key: least currents and source voltage, longest times, most heat; a threshold that
 *            any phase misses is NaN
 * @param byPhase the repeating cycle at each phase of the mains looked at; one entry where phase plays no part or is locked to the cycle
 * @param cyclesToSettle cycles needed, at the slowest phase
 * @param settled false if the bound on cycles was met before two neighbours agreed within 0.1 %
 */
public record SteadyResult(CycleResult worst, List<CycleResult> byPhase, int cyclesToSettle, boolean settled) {

    public SteadyResult {
        byPhase = List.copyOf(byPhase);
    }

    /** Mean over the phases of the heat in the winding per cycle, J: what rules the winding's temperature. */
    public double meanWindingEnergy() {
        return byPhase.stream().mapToDouble(CycleResult::windingEnergy).average().orElse(0);
    }

    /** Highest peak current of any phase, A. */
    public double highestPeakCurrent() {
        return byPhase.stream().mapToDouble(CycleResult::peakCurrent).max().orElse(0);
    }
}
