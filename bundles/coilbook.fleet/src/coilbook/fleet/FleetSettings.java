package coilbook.fleet;

import java.util.Collection;
import java.util.Map;
import java.util.TreeMap;

/**
 * The fleet's own margins, with defaults that are common practice (no source). Factors are fractions, temperatures K, intervals months.
 */
public final class FleetSettings {

    /** Margin below which a current, power or load that meets its limit is an observation: 10 %. */
    public static final String MARGIN = "margin";
    /** Margin in K below which a temperature that meets its limit is an observation: 10 K. */
    public static final String TEMPERATURE_MARGIN = "temperature margin";
    /** The hold current must exceed the drop-out current by this factor: 1.25. */
    public static final String HOLD_MARGIN = "hold margin";
    /** Allowance in K between mean winding temperature and hot spot: 10 K. */
    public static final String HOT_SPOT_ALLOWANCE = "hot-spot allowance";
    /** Months after which a mains reading is out of date: 24. */
    public static final String MAINS_READING_INTERVAL = "mains reading interval";
    /** Months after which a winding or insulation reading is out of date: 24. */
    public static final String WINDING_READING_INTERVAL = "winding reading interval";
    /** Months between inspections: 12. */
    public static final String INSPECTION_INTERVAL = "inspection interval";
    /** Drift of winding resistance allowed against the first reading of the same item: 5 %. */
    public static final String WINDING_DRIFT = "winding drift";
    /** Resistance tolerance taken where a coil type states none: 10 %. */
    public static final String RESISTANCE_TOLERANCE = "resistance tolerance";
    /** Tolerance of series resistors taken where a driver type states none: 5 %. */
    public static final String SERIES_RESISTANCE_TOLERANCE = "series resistance tolerance";
    /** Tolerance of capacitors taken where a driver type states none: 20 %. */
    public static final String CAPACITANCE_TOLERANCE = "capacitance tolerance";

    private static final Map<String, Double> DEFAULTS = Map.ofEntries(Map.entry(MARGIN, 0.10), Map.entry(TEMPERATURE_MARGIN, 10.0),
            Map.entry(HOLD_MARGIN, 1.25), Map.entry(HOT_SPOT_ALLOWANCE, 10.0), Map.entry(MAINS_READING_INTERVAL, 24.0),
            Map.entry(WINDING_READING_INTERVAL, 24.0), Map.entry(INSPECTION_INTERVAL, 12.0), Map.entry(WINDING_DRIFT, 0.05),
            Map.entry(RESISTANCE_TOLERANCE, 0.10), Map.entry(SERIES_RESISTANCE_TOLERANCE, 0.05),
            Map.entry(CAPACITANCE_TOLERANCE, 0.20));

    private final Map<String, Double> values;

    private FleetSettings(Map<String, Double> values) {
        this.values = Map.copyOf(values);
    }

    public static FleetSettings defaults() {
        return new FleetSettings(DEFAULTS);
    }

    /** The defaults overridden by the fleet's own rows. */
    public static FleetSettings of(Collection<FleetSetting> rows) {
        Map<String, Double> values = new TreeMap<>(DEFAULTS);
        for (FleetSetting row : rows) {
            values.put(row.name(), row.value());
        }
        return new FleetSettings(values);
    }

    /** The value of a setting.
     *
     * @throws IllegalArgumentException for a name that is no setting
     */
    public double get(String name) {
        Double value = values.get(name);
        if (value == null) {
            throw new IllegalArgumentException("no fleet setting is called " + name);
        }
        return value;
    }

    /** All values by name, in alphabetical order. */
    public Map<String, Double> all() {
        return new TreeMap<>(values);
    }
}
