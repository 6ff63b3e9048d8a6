package coilbook.electrics.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CoilCircuit;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.MainsSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Pieces against the textbook closed forms of a charged capacitor on a coil and of a coil on a voltage, within 1e-9. */
class ClosedFormTest {

    private static final double NONE = Double.NaN;
    private static final double R = 250;
    private static final double L = 0.2;
    private static final double V0 = 165;

    private static LineParameters line(double capacitance) {
        DriverCircuit.LineCapacitor driver = new DriverCircuit.LineCapacitor(430, capacitance, 1.4, 0, 0.7);
        return new LineParameters(
                new CircuitCase(new MainsSource(1, 50, 0), driver, new CoilCircuit(R, L, NONE, NONE, NONE, 20), 0, 1, 0.1, 1), driver);
    }

    private static void near(double expected, double actual, double scale) {
        assertEquals(expected, actual, 1e-9 * scale);
    }

    /** Capacitances on both sides of 4L/R² = 12.8 µF, at it, and as near to it as makes formulas cancel. */
    @ParameterizedTest
    @ValueSource(doubles = { 1e-9, 6.8e-6, 12.7e-6, 12.7999999e-6, 12.8e-6, 12.800000001e-6, 12.9e-6, 22e-6, 1 })
    void discharge(double capacitance) {
        CoilBusPiece piece = new CoilBusPiece(line(capacitance), L, false);
        piece.start(V0, 0, 0, Double.POSITIVE_INFINITY);
        double a = R / 2 / L;
        double square = 1 / (L * capacitance) - a * a;
        double w = Math.sqrt(Math.abs(square));
        for (double t = 0; t < 0.01; t += 1.37e-4) {
            double even;
            double odd;
            if (w < 1e-2 * a) {
                // series in (wt)², which near w = 0 has no cancellation
                double x = square * t * t;
                even = Math.exp(-a * t) * (1 - x / 2 * (1 - x / 12 * (1 - x / 30)));
                odd = Math.exp(-a * t) * t * (1 - x / 6 * (1 - x / 20 * (1 - x / 42)));
            } else if (square > 0) {
                even = Math.exp(-a * t) * Math.cos(w * t);
                odd = Math.exp(-a * t) * Math.sin(w * t) / w;
            } else {
                even = 0.5 * (Math.exp((w - a) * t) + Math.exp((-w - a) * t));
                odd = 0.5 * (Math.exp((w - a) * t) - Math.exp((-w - a) * t)) / w;
            }
            piece.at(t);
            near(V0 * (even + a * odd), piece.bus, V0);
            near(V0 / L * odd, piece.current, V0 / R);
        }
    }

    @Test
    void coilOnAVoltage() {
        SteadyCurrentPiece piece = new SteadyCurrentPiece();
        double tau = 8e-3 / 10;
        piece.start(0, 48, 10, 8e-3, 48);
        double[] moment = { 1e-9, 1e-6, 0.5e-3, 3e-3, 0.1 };
        for (double t : moment) {
            double current = 4.8 * (1 - Math.exp(-t / tau));
            double charge = 4.8 * (t - tau * (1 - Math.exp(-t / tau)));
            double square = 4.8 * 4.8 * (t - 2 * tau * (1 - Math.exp(-t / tau)) + tau / 2 * (1 - Math.exp(-2 * t / tau)));
            piece.at(t);
            near(current, piece.current, 4.8);
            // for short times the textbook forms lose their digits by cancellation, for long ones the current hardly moves
            near(charge, piece.charge(t), Math.max(charge, 1e-6));
            near(square, piece.square(t), Math.max(square, 1e-6));
            if (t < 0.01) {
                near(t, piece.timeTo(current), Math.max(t, 1e-4));
            }
        }
        piece.at(3e-3);
        near(4.68711482, piece.current, 10 * 4.8);
        near(0.511214791, 48 * piece.charge(3e-3), 1);
    }

    @Test
    void weightsAddUpAndIntegrateTheFifteenthPower() {
        double weights = 0;
        double power = 0;
        for (int point = 0; point < Gauss.POINTS; point++) {
            weights += Gauss.weight(point);
            power += Gauss.weight(point) * Math.pow(Gauss.node(point), 15);
        }
        assertEquals(1, weights, 1e-14);
        assertEquals(1 / 16.0, power, 1e-14);
    }
}
