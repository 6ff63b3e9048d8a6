package coilbook.criteria.internal.station;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Supplier;

import coilbook.fleet.Datum;
import coilbook.fleet.Provenance;

/**
 * A value in SI that is known with its provenance, or else names what is missing to know it.
 *
 * @param value NaN where missing
 * @param provenance the weakest it rests on; {@code null} where missing
 * @param missing in the words of the columns; empty where known
 */
public record Fact(double value, Provenance provenance, List<String> missing) {

    public Fact {
        missing = List.copyOf(missing);
    }

    /** A recorded value, or its name as missing; names are put together only where they are needed, since most values are there. */
    public static Fact of(Datum datum, Supplier<String> name) {
        return datum == null ? missing(name.get()) : new Fact(datum.value(), datum.provenance(), List.of());
    }

    public static Fact known(double value, Provenance provenance) {
        return new Fact(value, provenance, List.of());
    }

    public static Fact missing(String... names) {
        return missing(List.of(names));
    }

    public static Fact missing(List<String> names) {
        return new Fact(Double.NaN, null, names);
    }

    public boolean isKnown() {
        return missing.isEmpty();
    }

    public Fact map(DoubleUnaryOperator rule) {
        return isKnown() ? new Fact(rule.applyAsDouble(value), provenance, missing) : this;
    }

    /** A value computed from two: known if both are. */
    public Fact with(Fact other, DoubleBinaryOperator rule) {
        return isKnown() && other.isKnown()
                ? new Fact(rule.applyAsDouble(value, other.value), Provenance.weaker(provenance, other.provenance), List.of())
                : missing(allMissing(this, other));
    }

    /** This, or the other where this is missing. */
    public Fact orElse(Fact other) {
        return isKnown() ? this : other.isKnown() ? other : this;
    }

    /** At best as strong as the given provenance. */
    public Fact noStrongerThan(Provenance weakest) {
        return isKnown() ? new Fact(value, Provenance.weaker(provenance, weakest), missing) : this;
    }

    /** Everything that is missing to know all of the facts. */
    public static List<String> allMissing(Fact... facts) {
        Set<String> names = new LinkedHashSet<>();
        for (Fact fact : facts) {
            names.addAll(fact.missing);
        }
        return new ArrayList<>(names);
    }

    /** The weakest provenance of those that are known. */
    public static Provenance weakest(Fact... facts) {
        Provenance weakest = null;
        for (Fact fact : facts) {
            weakest = Provenance.weaker(weakest, fact.provenance);
        }
        return weakest;
    }
}
