package coilbook.fleet;

import java.util.Objects;

/**
 * One value of a quantity with its provenance. The value is in SI (temperatures in °C, percentages as fractions) and finite; the range a
 * field allows is stated by its {@link Column} and checked by its {@link Kind}. A missing value is {@code null}, never zero.
 *
 * @throws IllegalArgumentException if the value is not finite
 */
public record Datum(double value, Provenance provenance) {

    public Datum {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("a quantity must be a finite number");
        }
        Objects.requireNonNull(provenance, "provenance");
    }

    public static Datum measured(double value) {
        return new Datum(value, Provenance.MEASURED);
    }

    public static Datum nameplate(double value) {
        return new Datum(value, Provenance.NAMEPLATE);
    }

    public static Datum catalogue(double value) {
        return new Datum(value, Provenance.CATALOGUE);
    }

    public static Datum estimated(double value) {
        return new Datum(value, Provenance.ESTIMATED);
    }

    public static Datum assumed(double value) {
        return new Datum(value, Provenance.ASSUMED);
    }

    /** The value, or NaN if there is none: for arithmetic that carries "missing" along. */
    public static double orNaN(Datum datum) {
        return datum == null ? Double.NaN : datum.value();
    }

    /** The value, or the given one if there is none. */
    public static double or(Datum datum, double otherwise) {
        return datum == null ? otherwise : datum.value();
    }
}
