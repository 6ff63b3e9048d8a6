package coilbook.exchange.internal.out;

import coilbook.fleet.FieldText;
import coilbook.fleet.Unit;

/**
 * An arithmetic expression that is at once a number and the spreadsheet formula that gives it, so that the two cannot drift apart. A value that is missing makes
 * every expression over it missing (NaN); such a cell gets no formula.
 */
public final class Expr {

    /** How strongly the outermost operator binds; what binds less than its surroundings is bracketed. */
    private enum Binding {
        SUM, PRODUCT, ATOM
    }

    private final double value;
    private final String text;
    private final Binding binding;
    /** The cell itself and the unit it shows, where the expression is no more than that. */
    private final String cell;
    private final Unit cellUnit;

    private Expr(double value, String text, Binding binding, String cell, Unit cellUnit) {
        this.value = value;
        this.text = text;
        this.binding = binding;
        this.cell = cell;
        this.cellUnit = cellUnit;
    }

    private Expr(double value, String text, Binding binding) {
        this(value, text, binding, null, null);
    }

    /** Nothing: every expression over it is nothing too. */
    public static Expr none() {
        return new Expr(Double.NaN, "", Binding.ATOM);
    }

    /** A plain number, not negative. */
    public static Expr number(double value) {
        return new Expr(value, FieldText.number(value), Binding.ATOM);
    }

    /**
     * A cell that shows a quantity in a unit, taken back to SI.
     *
     * @param reference the cell, or a function that looks it up
     * @param si the value in SI; NaN for an empty cell
     */
    public static Expr cell(String reference, double si, Unit unit) {
        int scale = scale(unit);
        String text = scale == 1 ? reference : scale > 0 ? reference + "/" + scale : reference + "*" + -scale;
        return new Expr(si, text, scale == 1 ? Binding.ATOM : Binding.PRODUCT, reference, unit);
    }

    /** How many of the shown unit make one SI unit; negative where the SI unit is the smaller. */
    private static int scale(Unit unit) {
        return switch (unit) {
            case PERCENT -> 100;
            case MILLISECOND, MILLIHENRY, MILLIAMPERE, MILLIMETRE, OHM_PER_KILOMETRE -> 1000;
            case MICROFARAD -> 1_000_000;
            case KILOOHM -> -1000;
            case NONE, VOLT, AMPERE, OHM, SECOND, HERTZ, PER_SECOND, WATT, VOLT_AMPERE, JOULE, CELSIUS, KELVIN, KELVIN_PER_WATT, METRE,
                    METRE_PER_SECOND ->
                1;
            default -> throw new IllegalArgumentException("no formula takes " + unit);
        };
    }

    /** In SI. */
    public double value() {
        return value;
    }

    /** The formula in SI, without its equals sign. */
    public String text() {
        return text;
    }

    /** The formula for a cell that shows this in a unit. */
    public String shownIn(Unit unit) {
        if (cell != null && cellUnit == unit) {
            return cell;
        }
        int scale = scale(unit);
        return scale == 1 ? text : scale > 0 ? scale + "*" + within(Binding.PRODUCT) : within(Binding.PRODUCT) + "/" + -scale;
    }

    public boolean isPresent() {
        return !Double.isNaN(value) && !Double.isInfinite(value);
    }

    private String within(Binding surroundings) {
        return binding.compareTo(surroundings) < 0 ? "(" + text + ")" : text;
    }

    public Expr plus(Expr other) {
        return new Expr(value + other.value, text + "+" + other.text, Binding.SUM);
    }

    public Expr minus(Expr other) {
        return new Expr(value - other.value, text + "-" + other.within(Binding.PRODUCT), Binding.SUM);
    }

    public Expr times(Expr other) {
        return new Expr(value * other.value, within(Binding.PRODUCT) + "*" + other.within(Binding.PRODUCT), Binding.PRODUCT);
    }

    public Expr over(Expr other) {
        return new Expr(other.value == 0 ? Double.NaN : value / other.value, within(Binding.PRODUCT) + "/" + other.within(Binding.ATOM),
                Binding.PRODUCT);
    }

    public Expr plus(double number) {
        return plus(number(number));
    }

    public Expr minus(double number) {
        return minus(number(number));
    }

    public Expr negated() {
        return new Expr(-value, "-" + within(Binding.PRODUCT), Binding.PRODUCT);
    }

    /** e to the power of this. */
    public Expr exp() {
        return new Expr(Math.exp(value), "EXP(" + text + ")", Binding.ATOM);
    }

    /** The natural logarithm. */
    public Expr ln() {
        return new Expr(Math.log(value), "LN(" + text + ")", Binding.ATOM);
    }

    /** The smaller of the two. */
    public Expr least(Expr other) {
        return new Expr(Math.min(value, other.value), "MIN(" + text + "," + other.text + ")", Binding.ATOM);
    }

    /** The greater of the two. */
    public Expr most(Expr other) {
        return new Expr(Math.max(value, other.value), "MAX(" + text + "," + other.text + ")", Binding.ATOM);
    }

    /** The mean of a full-wave rectified sine of this rms value: 2√2/π, about 0.9003 times (elementary integration). */
    public Expr rectifiedMean() {
        return new Expr(value * 2 * Math.sqrt(2) / Math.PI, within(Binding.PRODUCT) + "*2*SQRT(2)/PI()", Binding.PRODUCT);
    }

    /** The peak of a sine of this rms value. */
    public Expr peak() {
        return new Expr(value * Math.sqrt(2), within(Binding.PRODUCT) + "*SQRT(2)", Binding.PRODUCT);
    }
}
