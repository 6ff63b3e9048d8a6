package coilbook.criteria.internal;

import java.math.BigDecimal;
import java.math.MathContext;

import coilbook.fleet.Unit;

/** Numbers as sentences show them: four significant digits, more where two numbers that differ would look alike. */
public final class Shown {

    private static final int DIGITS = 4;
    private static final int MOST_DIGITS = 12;

    private Shown() {
    }

    /** A value in SI with its unit, for example {@code 0.82 A}. */
    public static String of(double si, Unit unit) {
        return text(si, unit, DIGITS);
    }

    /** A value beside another that it is compared with: with as many digits as tell them apart. */
    public static String beside(double si, double other, Unit unit) {
        int digits = DIGITS;
        if (!Compare.atMost(si, other) || !Compare.atLeast(si, other)) {
            while (digits < MOST_DIGITS && text(si, unit, digits).equals(text(other, unit, digits))) {
                digits++;
            }
        }
        return text(si, unit, digits);
    }

    private static String text(double si, Unit unit, int digits) {
        double shown = unit.fromSi(si);
        String number = shown == 0 ? "0" : Double.isInfinite(shown) || Double.isNaN(shown) ? "–" : plain(shown, digits);
        return unit == Unit.NONE ? number : number + " " + unit.symbol();
    }

    private static String plain(double shown, int digits) {
        BigDecimal rounded = BigDecimal.valueOf(shown).round(new MathContext(digits));
        return (rounded.signum() == 0 ? BigDecimal.ZERO : rounded.stripTrailingZeros()).toPlainString().replace('-', '−');
    }
}
