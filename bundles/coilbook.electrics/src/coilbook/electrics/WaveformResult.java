package coilbook.electrics;

import java.util.List;

/**
 * Answer to one case: the cycles asked for, from the first on, and the repeating one.
 */
public record WaveformResult(List<CycleResult> cycles, SteadyResult steady) {

    public WaveformResult {
        cycles = List.copyOf(cycles);
    }
}
