package coilbook.fleet;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * The units that files and screens show. Inside the code every quantity is in SI, temperatures in °C; {@link #toSi} and {@link #fromSi}
 * are the only places where the two meet.
 */
public enum Unit {
    NONE("", 1), VOLT("V", 1), AMPERE("A", 1), MILLIAMPERE("mA", 1e-3), OHM("Ω", 1), MEGAOHM("MΩ", 1e6), KILOOHM("kΩ", 1e3),
    MILLIHENRY("mH", 1e-3), MICROFARAD("µF", 1e-6), MILLISECOND("ms", 1e-3), SECOND("s", 1), MINUTE("min", 60), HOUR("h", 3600),
    HERTZ("Hz", 1), PER_SECOND("1/s", 1), HOURS_PER_YEAR("h/a", 1), WATT("W", 1), VOLT_AMPERE("VA", 1), JOULE("J", 1),
    CELSIUS("°C", 1), KELVIN("K", 1), KELVIN_PER_WATT("K/W", 1), WATT_PER_KELVIN("W/K", 1), PERCENT("%", 0.01), METRE("m", 1),
    MILLIMETRE("mm", 1e-3), METRE_PER_SECOND("m/s", 1), SQUARE_MILLIMETRE("mm²", 1e-6), OHM_PER_KILOMETRE("Ω/km", 1e-3), BAR("bar", 1e5),
    YEAR("a", 1);

    private final String symbol;
    private final double factor;

    Unit(String symbol, double factor) {
        this.symbol = symbol;
        this.factor = factor;
    }

    /** The symbol as headings show it, empty for a plain number. */
    public String symbol() {
        return symbol;
    }

    /** A number in this unit, in SI, rounded to 15 significant digits so that 33 µF is 3.3e-5 F and not 3.2999999999999996e-5 F. */
    public double toSi(double shown) {
        return rounded(shown * factor, 15);
    }

    /** An SI value in this unit, rounded to 14 significant digits so that 0.003 s shows as 3 ms and not as 3.0000000000000004. */
    public double fromSi(double si) {
        return rounded(si / factor, 14);
    }

    private double rounded(double value, int digits) {
        return factor == 1 || value == 0 || Double.isNaN(value) || Double.isInfinite(value) ? value
                : new BigDecimal(value).round(new MathContext(digits)).doubleValue();
    }
}
