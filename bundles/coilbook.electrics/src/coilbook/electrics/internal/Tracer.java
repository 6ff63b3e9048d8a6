package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.Trace;

/** Samples the waveform of a case at even intervals, from the exact solution of each piece. */
public final class Tracer implements SampleSink {

    private final double interval;
    private final double[] time;
    private final double[] source;
    private final double[] coil;
    private double cycleStart;

    private Tracer(double interval, int points) {
        this.interval = interval;
        time = new double[points];
        source = new double[points];
        coil = new double[points];
        for (int index = 0; index < points; index++) {
            time[index] = index * interval;
        }
    }

    /** Samples the whole of the case's cycles, end included. */
    public static Trace trace(CircuitCase circuit, double interval, int points) throws IllegalCaseException {
        CycleMachine machine = Machines.of(circuit);
        Tracer tracer = new Tracer(interval, points);
        machine.sink = tracer;
        machine.restart(Machines.feelsMains(circuit) ? circuit.mains().phase() : 0);
        for (int cycle = 0; cycle < circuit.cycles(); cycle++) {
            tracer.cycleStart = cycle * machine.period;
            machine.cycle();
        }
        return new Trace(tracer.time, tracer.source, tracer.coil);
    }

    @Override
    public void source(Piece piece, double start, double length) {
        sample(piece, start, length, true);
    }

    @Override
    public void coil(Piece piece, double start, double length) {
        sample(piece, start, length, false);
    }

    private void sample(Piece piece, double start, double length, boolean ofSource) {
        double from = cycleStart + start;
        int first = (int) Math.max(0, Math.ceil((from - 1e-9 * interval) / interval));
        for (int index = first; index < time.length && time[index] <= from + length + 1e-9 * interval; index++) {
            piece.at(Math.min(length, Math.max(0, time[index] - from)));
            if (ofSource) {
                source[index] = piece.bus;
            } else {
                coil[index] = piece.current;
            }
        }
    }
}
