package coilbook.electrics;

import coilbook.electrics.internal.CycleRun;
import coilbook.electrics.internal.SteadySearch;
import coilbook.electrics.internal.Tracer;

/**
 * Waveforms of coil current and source voltage, exact piece by piece: between switching events a circuit is linear and has a closed solution; events
 * are found by bracketing and refining. Pure functions; the winding's temperature is as given, without self-heating.
 */
public final class Waveforms {

    /** Most samples that a trace will hold. */
    public static final int MOST_SAMPLES = 5_000_000;

    private Waveforms() {
    }

    /**
     * Solves the cycles asked for, and finds the repeating one.
     *
     * @throws IllegalCaseException naming the field that cannot be
     */
    public static WaveformResult solve(CircuitCase circuit) throws IllegalCaseException {
        circuit.check();
        return new WaveformResult(CycleRun.cycles(circuit), SteadySearch.find(circuit));
    }

    /**
     * Samples the cycles asked for, from the first switch-on to the end of the last cycle.
     *
     * @param interval between samples, s
     */
    public static Trace trace(CircuitCase circuit, double interval) throws IllegalCaseException {
        circuit.check();
        double span = circuit.cycles() * circuit.period();
        double points = Math.floor(span / interval * (1 + 1e-12)) + 1;
        if (!(interval > 0 && points <= MOST_SAMPLES)) {
            throw new IllegalCaseException("interval", interval, "at least " + span / MOST_SAMPLES + " s");
        }
        return Tracer.trace(circuit, interval, (int) points);
    }

    /** Samples the cycles asked for with a given number of points, at least two. */
    public static Trace traceWith(CircuitCase circuit, int points) throws IllegalCaseException {
        if (points < 2 || points > MOST_SAMPLES) {
            throw new IllegalCaseException("points", Integer.toString(points), "2 to " + MOST_SAMPLES);
        }
        circuit.check();
        return Tracer.trace(circuit, circuit.cycles() * circuit.period() / (points - 1), points);
    }
}
