package coilbook.electrics;

import coilbook.electrics.internal.CaseCheck;

/**
 * One circuit with its duty: all that a waveform needs.
 *
 * @param mains the supply; may be null where the driver regulates its own output
 * @param loopResistance resistance of the cable, both conductors, Ω; it stands in the loop during release too
 * @param cyclesPerSecond cycle rate, 1/s
 * @param onTime s; shorter than the period
 * @param cycles how many cycles to report
 * @param openingDelay time from pull-in until the valve is open, s: hold is judged after it
 */
public record CircuitCase(MainsSource mains, DriverCircuit driver, CoilCircuit coil, double loopResistance, double cyclesPerSecond,
        double onTime, int cycles, double openingDelay) {

    public CircuitCase(MainsSource mains, DriverCircuit driver, CoilCircuit coil, double loopResistance, double cyclesPerSecond,
            double onTime, int cycles) {
        this(mains, driver, coil, loopResistance, cyclesPerSecond, onTime, cycles, 0);
    }

    /** Time from one switch-on to the next, s. */
    public double period() {
        return 1 / cyclesPerSecond;
    }

    /** Winding and cable together, Ω. */
    public double totalResistance() {
        return coil.resistance() + loopResistance;
    }

    public CircuitCase atPhase(double radians) {
        return new CircuitCase(mains.atPhase(radians), driver, coil, loopResistance, cyclesPerSecond, onTime, cycles, openingDelay);
    }

    public CircuitCase atTemperature(double celsius) {
        return new CircuitCase(mains, driver, coil.atTemperature(celsius), loopResistance, cyclesPerSecond, onTime, cycles, openingDelay);
    }

    /** Refuses what cannot be computed, naming the field. */
    public void check() throws IllegalCaseException {
        CaseCheck.check(this);
    }
}
