package coilbook.electrics.internal;

/**
 * The coil on a constant voltage, or at a constant current: one exponential, so that everything about it has a closed form.
 * i(t) = I∞ + (i0 − I∞) e^(−t/τ), τ = L/R (REFERENCES 2.3).
 */
final class SteadyCurrentPiece extends Piece {

    private double startCurrent;
    private double target;
    private double rate;

    /** Begins a piece on a constant voltage, V, with the shown source voltage. */
    void start(double current0, double voltage, double resistance, double inductance, double shownVoltage) {
        startCurrent = current0;
        target = voltage / resistance;
        rate = resistance / inductance;
        bus = shownVoltage;
    }

    /** Begins a piece at constant current. */
    void startConstant(double current0, double shownVoltage) {
        startCurrent = current0;
        target = current0;
        rate = 0;
        bus = shownVoltage;
    }

    @Override
    void at(double elapsed) {
        double change = -Math.expm1(-rate * elapsed);
        current = startCurrent + (target - startCurrent) * change;
        slope = rate * (target - current);
    }

    /** Time until the current is at the given value, s; infinity if it never is, zero if it is there. */
    double timeTo(double value) {
        if (value == startCurrent) {
            return 0;
        }
        double ratio = (startCurrent - value) / (value - target);
        return rate > 0 && ratio > 0 ? Math.log1p(ratio) / rate : Double.POSITIVE_INFINITY;
    }

    /** Integral of the current, A·s. */
    double charge(double length) {
        double x = rate * length;
        if (x < 1e-3) {
            return length * (startCurrent + (target - startCurrent) * x * (0.5 - x * (1 / 6.0 - x * (1 / 24.0 - x / 120))));
        }
        return target * length + (startCurrent - target) * -Math.expm1(-x) / rate;
    }

    /** Integral of the square of the current, A²·s. */
    double square(double length) {
        double x = rate * length;
        if (x < 2) {
            double sum = 0;
            for (int point = 0; point < Gauss.POINTS; point++) {
                at(Gauss.node(point) * length);
                sum += Gauss.weight(point) * current * current;
            }
            return sum * length;
        }
        double free = startCurrent - target;
        double gone = -Math.expm1(-x);
        double goneTwice = -Math.expm1(-2 * x);
        return target * target * length + (2 * target * gone + 0.5 * free * goneTwice) * free / rate;
    }

    @Override
    double margin() {
        return 1;
    }

    @Override
    double panel(double elapsed) {
        return UNLIMITED;
    }
}
