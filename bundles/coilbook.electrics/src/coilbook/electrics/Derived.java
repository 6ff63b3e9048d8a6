package coilbook.electrics;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One derived value with what it rests on. Data are named by stable ids: {@code coil.inductance}, {@code duty.rate} and so on, see
 * {@link Data}.
 *
 * @param value SI unit as the field says; NaN if it could not be derived, or with nothing missing if it means nothing for this kind; infinite if there is none, as with a current that is never reached
 * @param at the condition it was computed for
 * @param missing data without which there is no value; empty if there is one
 * @param bounded data that were missing and were replaced by their least favourable bound: a limit met is met for certain, a limit missed is not
 *            missed for certain
 */
public record Derived(double value, Condition at, List<String> missing, List<String> bounded) {

    public Derived {
        missing = List.copyOf(missing);
        bounded = List.copyOf(bounded);
    }

    static Derived missing(Condition at, List<String> missing) {
        return new Derived(Double.NaN, at, missing, List.of());
    }

    /** True if there is a value, be it infinite. */
    public boolean known() {
        return !Double.isNaN(value);
    }

    /** True if the value is a bound on the unfavourable side, for want of data. */
    public boolean isBound() {
        return !bounded.isEmpty();
    }

    public OptionalDouble asOptional() {
        return known() ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
