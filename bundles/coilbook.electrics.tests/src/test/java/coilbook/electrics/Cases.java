package coilbook.electrics;

import coilbook.fleet.LevelChange;

/** Circuits that several tests share. */
final class Cases {

    static final double NONE = Double.NaN;

    private Cases() {
    }

    /** The 250 Ω coil of the line-capacitor netlists, with a drop-out current of a tenth of its hold current. */
    static CoilCircuit coilA() {
        return new CoilCircuit(250, 0.2, NONE, NONE, 0.016, 20);
    }

    /** The 10 Ω coil of the two-level netlists. */
    static CoilCircuit coilB() {
        return new CoilCircuit(10, 8e-3, NONE, NONE, NONE, 20);
    }

    static CircuitCase lineA(double voltage, double frequency, double phaseDegrees, double onTime, double rate, int cycles) {
        return new CircuitCase(new MainsSource(voltage, frequency, Math.toRadians(phaseDegrees)),
                new DriverCircuit.LineCapacitor(430, 6.8e-6, 1.4, 0, 0.7), coilA(), 0, rate, onTime, cycles);
    }

    static CircuitCase twoLevelB(LevelChange change, double onTime, double rate, int cycles) {
        return new CircuitCase(null, new DriverCircuit.TwoLevel(48, 3e-3, 6, change, 0, 0.7), coilB(), 0, rate, onTime, cycles);
    }

    static CycleResult first(CircuitCase circuit) throws IllegalCaseException {
        return Waveforms.solve(circuit).cycles().get(0);
    }

    /** Linear interpolation in a trace. */
    static double at(double[] time, double[] value, double moment) {
        int index = (int) Math.floor(moment / (time[1] - time[0]));
        index = Math.max(0, Math.min(time.length - 2, index));
        double share = (moment - time[index]) / (time[index + 1] - time[index]);
        return value[index] + share * (value[index + 1] - value[index]);
    }
}
