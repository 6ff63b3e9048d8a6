package coilbook.electrics;

import coilbook.fleet.LevelChange;
import java.util.Random;

/** Circuits drawn with a fixed seed, every figure of four digits so that a netlist says exactly the same. */
final class RandomCircuits {

    private final Random random;

    RandomCircuits(long seed) {
        random = new Random(seed);
    }

    /** A figure between two, evenly spread on a logarithmic scale. */
    double between(double least, double most) {
        double value = least * Math.pow(most / least, random.nextDouble());
        double scale = Math.pow(10, 3 - Math.floor(Math.log10(value)));
        return Math.round(value * scale) / scale;
    }

    boolean chance() {
        return random.nextBoolean();
    }

    /** A plausible line-capacitor circuit. */
    CircuitCase lineCapacitor(int cycles) {
        double voltage = chance() ? between(95, 132) : between(200, 260);
        double frequency = chance() ? 50 : 60;
        double resistance = between(60, 600);
        double series = resistance * between(0.8, 3);
        double inductance = resistance * between(0.4e-3, 2e-3);
        double capacitance = between(1.5e-3, 8e-3) / resistance;
        double hold = 0.9 * voltage / (resistance + series);
        double rate = between(2.2, 9.7);
        CoilCircuit coil = new CoilCircuit(digits(resistance), digits(inductance), Double.NaN, Double.NaN, digits(0.3 * hold), 20);
        DriverCircuit driver = new DriverCircuit.LineCapacitor(digits(series), digits(capacitance), between(1.2, 2), between(0.2, 2),
                between(0.6, 60));
        return new CircuitCase(new MainsSource(voltage, frequency, Math.toRadians(digits(random.nextDouble() * 360))), driver, coil,
                digits(between(0.1, 5)), rate, digits(between(0.25, 0.6) / rate), cycles);
    }

    /** A plausible two-level circuit. */
    CircuitCase twoLevel(int cycles) {
        double resistance = between(4, 30);
        double pullIn = between(24, 60);
        double hold = between(4, 10);
        double rate = between(5, 25);
        CoilCircuit coil = new CoilCircuit(resistance, digits(resistance * between(0.4e-3, 2e-3)), Double.NaN, Double.NaN,
                digits(0.3 * hold / resistance), 20);
        DriverCircuit driver = new DriverCircuit.TwoLevel(pullIn, between(1.5e-3, 5e-3), hold,
                chance() ? LevelChange.SOURCE : LevelChange.FREEWHEEL, between(0.1, 1), between(0.6, 50));
        return new CircuitCase(null, driver, coil, digits(between(0.05, 1)), rate, digits(between(0.3, 0.7) / rate), cycles);
    }

    /** A plausible fixed direct voltage. */
    CircuitCase fixedDc(int cycles) {
        double resistance = between(10, 200);
        double voltage = between(12, 48);
        double rate = between(5, 25);
        CoilCircuit coil = new CoilCircuit(resistance, digits(resistance * between(0.4e-3, 4e-3)), Double.NaN, Double.NaN,
                digits(0.3 * voltage / resistance), 20);
        DriverCircuit driver = new DriverCircuit.FixedDc(voltage, between(0.1, 1), between(0.6, 50));
        return new CircuitCase(null, driver, coil, digits(between(0.05, 1)), rate, digits(between(0.2, 0.7) / rate), cycles);
    }

    private static double digits(double value) {
        double scale = Math.pow(10, 3 - Math.floor(Math.log10(value)));
        return Math.round(value * scale) / scale;
    }
}
