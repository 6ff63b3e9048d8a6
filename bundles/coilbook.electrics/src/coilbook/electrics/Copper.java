package coilbook.electrics;

/**
 * Resistance of copper against temperature: R(θ) = R20 · (234.5 + θ) / (234.5 + 20). Source: resistance method of temperature tests, with the
 * constant 234.5 (IEC 60034-1 uses 235; the choice is stated in the help).
 */
public final class Copper {

    /** Minus the temperature at which the resistance of copper extrapolates to zero, °C. */
    public static final double ZERO_RESISTANCE = 234.5;

    private Copper() {
    }

    /** Ratio of resistance at a temperature to that at 20 °C. */
    public static double factorAt(double celsius) {
        return (ZERO_RESISTANCE + celsius) / (ZERO_RESISTANCE + 20);
    }

    /** Resistance at a temperature, Ω, from that at 20 °C. */
    public static double resistanceAt(double resistance20, double celsius) {
        return resistance20 * factorAt(celsius);
    }

    /** Resistance at 20 °C, Ω, from one measured at a winding temperature. */
    public static double resistance20(double measured, double celsius) {
        return measured / factorAt(celsius);
    }

    /** Winding temperature, °C, at which a winding of the given resistance at 20 °C has the given resistance. */
    public static double temperatureOf(double resistance, double resistance20) {
        return resistance / resistance20 * (ZERO_RESISTANCE + 20) - ZERO_RESISTANCE;
    }
}
