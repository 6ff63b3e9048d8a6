package coilbook.criteria;

import java.util.Map;

import coilbook.fleet.Provenance;
import coilbook.fleet.Unit;

/**
 * The computed value beside its limit, at the corner where the margin is least.
 *
 * @param value in SI; NaN where the criterion compares no numbers
 * @param limit in SI; NaN likewise
 * @param unit the unit in which both are shown
 * @param corner {@code low}, {@code high}, {@code hot}, {@code nominal}, or empty
 * @param sentence one sentence with numbers
 * @param provenance the weakest of the values it rests on; {@code null} where it rests on none
 * @param numbers the numbers it was computed from, by name with unit, in order
 */
public record Evidence(double value, double limit, Unit unit, String corner, String sentence, Provenance provenance,
        Map<String, Double> numbers) {

    public Evidence {
        numbers = java.util.Collections.unmodifiableMap(new java.util.LinkedHashMap<>(numbers));
    }

    /** Evidence that is words alone. */
    public static Evidence words(String sentence) {
        return new Evidence(Double.NaN, Double.NaN, Unit.NONE, "", sentence, null, Map.of());
    }
}
