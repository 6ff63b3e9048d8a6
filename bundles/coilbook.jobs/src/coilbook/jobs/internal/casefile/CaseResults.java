package coilbook.jobs.internal.casefile;

import java.util.Locale;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;

import coilbook.electrics.CycleResult;
import coilbook.electrics.Trace;
import coilbook.electrics.WaveformResult;

/** What a case came to, in the keys and units that files carry. */
public final class CaseResults {

    private CaseResults() {
    }

    /** One entry a cycle, and the repeating cycle; a threshold not given or not reached is null. */
    public static ObjectNode json(WaveformResult result) {
        ObjectNode whole = JsonNodeFactory.instance.objectNode();
        ArrayNode cycles = whole.putArray("cycles");
        for (CycleResult cycle : result.cycles()) {
            fill(cycles.addObject(), cycle);
        }
        fill(whole.putObject("steady"), result.steady().worst());
        return whole;
    }

    private static void fill(ObjectNode node, CycleResult cycle) {
        node.put("cycle", cycle.cycle());
        put(node, "sourceVoltageAtSwitchOnV", cycle.sourceVoltageAtSwitchOn());
        put(node, "peakCurrentA", cycle.peakCurrent());
        put(node, "timeOfPeakMs", cycle.timeOfPeak() * 1e3);
        put(node, "timeToPullInMs", cycle.timeToPullIn() * 1e3);
        put(node, "holdMeanCurrentA", cycle.holdMeanCurrent());
        put(node, "holdMinimumCurrentA", cycle.holdMinimumCurrent());
        put(node, "minimumAfterPeakCurrentA", cycle.minimumAfterPeakCurrent());
        put(node, "windingEnergyJ", cycle.windingEnergy());
        put(node, "releaseTimeMs", cycle.releaseTime() * 1e3);
    }

    private static void put(ObjectNode node, String key, double value) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            node.putNull(key);
        } else {
            node.put(key, value);
        }
    }

    /** The samples as RFC 4180 wants them: one heading line, lines ended by CR LF. */
    public static String csv(Trace trace) {
        StringBuilder text = new StringBuilder(trace.size() * 36).append("time_s,source_V,coil_A\r\n");
        for (int i = 0; i < trace.size(); i++) {
            text.append(
                    String.format(Locale.ROOT, "%.9g,%.9g,%.9g\r\n", trace.time()[i], trace.sourceVoltage()[i], trace.coilCurrent()[i]));
        }
        return text.toString();
    }
}
