package coilbook.electrics;

/**
 * Mean winding temperature, lumped: θ = θ_ambient + R_th · P(θ), and its course in time with one time constant τ_th = R_th · C_th. Sources: fixed
 * point of the copper law; duty types S2 and S3 of IEC 60034-1. Temperatures °C, powers W, thermal resistance K/W, times s.
 */
public final class Temperature {

    /** Above this no winding is left: copper melts at 1085 °C; a fixed point beyond counts as none. */
    public static final double HIGHEST = 1000;

    private Temperature() {
    }

    /** Power in the winding at a mean winding temperature. */
    @FunctionalInterface
    public interface PowerAt {

        double watts(double celsius) throws IllegalCaseException;
    }

    /**
     * A steady state.
     *
     * @param celsius mean winding temperature; infinite if there is none below {@link #HIGHEST}
     * @param power at that temperature, W; NaN if there is none
     */
    public record Steady(double celsius, double power) {

        static final Steady NONE = new Steady(Double.POSITIVE_INFINITY, Double.NaN);

        /** True if the temperature runs away. */
        public boolean runsAway() {
            return Double.isInfinite(celsius);
        }
    }

    /** The lowest steady temperature above the ambient, to the given tolerance in K. */
    public static Steady steady(double ambient, double thermalResistance, PowerAt power, double tolerance) throws IllegalCaseException {
        double low = ambient;
        double lowExcess = thermalResistance * power.watts(low);
        if (lowExcess <= 0) {
            return new Steady(ambient, 0);
        }
        double high = low;
        double highExcess = lowExcess;
        double step = lowExcess;
        while (highExcess > 0) {
            if (high >= HIGHEST) {
                return Steady.NONE;
            }
            low = high;
            lowExcess = highExcess;
            high = Math.min(HIGHEST, high + step);
            highExcess = ambient + thermalResistance * power.watts(high) - high;
            step = lowExcess > highExcess ? 1.05 * Math.max(0, highExcess) * (high - low) / (lowExcess - highExcess) + tolerance : 2 * step;
        }
        return between(ambient, thermalResistance, power, tolerance, low, lowExcess, high, highExcess);
    }

    /** Regula falsi with the Illinois change: excess is positive at low and not at high. */
    private static Steady between(double ambient, double thermalResistance, PowerAt power, double tolerance, double lowest,
            double lowestExcess, double highest, double highestExcess) throws IllegalCaseException {
        double low = lowest;
        double high = highest;
        double lowExcess = lowestExcess;
        double highExcess = highestExcess;
        double guess = high;
        double excess = highExcess;
        int side = 0;
        for (int step = 0; step < 100 && Math.abs(excess) > tolerance && high - low > tolerance; step++) {
            guess = low + (high - low) * lowExcess / (lowExcess - highExcess);
            excess = ambient + thermalResistance * power.watts(guess) - guess;
            if (excess > 0) {
                low = guess;
                lowExcess = excess;
                highExcess *= side == 1 ? 0.5 : 1;
                side = 1;
            } else {
                high = guess;
                highExcess = excess;
                lowExcess *= side == -1 ? 0.5 : 1;
                side = -1;
            }
        }
        return new Steady(guess, (guess + excess - ambient) / thermalResistance);
    }

    /** A winding on a constant voltage, V rms; resistance at 20 °C, Ω. Closed form: (θ − θa)(k + θ) = R_th V² (k + 20) / R20. */
    public static Steady voltageDriven(double voltage, double resistance20, double thermalResistance, double ambient) {
        double k = Copper.ZERO_RESISTANCE;
        double right = thermalResistance * voltage * voltage * (k + 20) / resistance20;
        double half = 0.5 * (k - ambient);
        double celsius = -half + Math.sqrt(half * half + k * ambient + right);
        return new Steady(celsius, voltage * voltage / Copper.resistanceAt(resistance20, celsius));
    }

    /** A winding at a constant current, A rms. Closed form: θ = (θa + g k)/(1 − g), g = R_th I² R20/(k + 20); none if g ≥ 1. */
    public static Steady currentDriven(double current, double resistance20, double thermalResistance, double ambient) {
        double k = Copper.ZERO_RESISTANCE;
        double gain = thermalResistance * current * current * resistance20 / (k + 20);
        if (gain >= 1) {
            return Steady.NONE;
        }
        double celsius = (ambient + gain * k) / (1 - gain);
        return new Steady(celsius, current * current * Copper.resistanceAt(resistance20, celsius));
    }

    /** Rise, K, after a time at constant power, from the final rise: ΔT∞ (1 − e^(−t/τ)). */
    public static double riseAfter(double time, double finalRise, double timeConstant) {
        return -finalRise * Math.expm1(-time / timeConstant);
    }

    /** Time from cold until the rise is at a limit: −τ ln(1 − ΔT/ΔT∞), duty S2; infinite if it never is. */
    public static double timeToRise(double rise, double finalRise, double timeConstant) {
        return rise >= finalRise ? Double.POSITIVE_INFINITY : -timeConstant * Math.log1p(-rise / finalRise);
    }

    /** Highest rise of an intermittent periodic duty, S3: ΔT∞ (1 − e^(−t_on/τ)) / (1 − e^(−t_cycle/τ)). */
    public static double highestRise(double onTime, double cycleTime, double finalRise, double timeConstant) {
        return finalRise * Math.expm1(-onTime / timeConstant) / Math.expm1(-cycleTime / timeConstant);
    }

    /** Lowest rise of an intermittent periodic duty, S3: the highest, decayed over the rest. */
    public static double lowestRise(double onTime, double cycleTime, double finalRise, double timeConstant) {
        return highestRise(onTime, cycleTime, finalRise, timeConstant) * Math.exp(-(cycleTime - onTime) / timeConstant);
    }
}
