package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.ArrayList;
import java.util.List;

/** The four limits of the cycle rate. */
final class RateLimits {

    private static final int PHASES = 4;
    private static final int HALVINGS = 7;
    /** A rate at which the on-time would fill the whole period cannot be computed; limits are looked for up to this share of it. */
    private static final double FULLEST = 0.95;

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private final HeatCorner hot;
    private final double lowWinding;

    RateLimits(CornerCircuits circuits, StationCircuit station, HeatCorner hot, double lowWinding) {
        this.circuits = circuits;
        this.station = station;
        this.hot = hot;
        this.lowWinding = lowWinding;
    }

    CycleRateLimit derive(Derived releaseTime) throws IllegalCaseException {
        return new CycleRateLimit(byHeat(), byRecovery(), byRelease(releaseTime), byValve());
    }

    /** Rate at which heat per cycle, at the winding's highest temperature, just balances what the winding gives off. */
    private Derived byHeat() throws IllegalCaseException {
        double limit = station.coil().highestWindingTemperature();
        Condition at = circuits.condition(Corner.HOT, limit);
        List<String> missing = circuits.missingWith(hot.thermalResistance(), Data.THERMAL_RESISTANCE, station.highestAmbient(),
                Data.AMBIENT, station.onTime(), Data.DUTY_ON_TIME, limit, Data.INSULATION_CLASS);
        if (!missing.isEmpty()) {
            return Derived.missing(at, missing);
        }
        double allowed = (limit - station.highestAmbient()) / hot.thermalResistance();
        if (allowed <= 0) {
            return new Derived(0, at, List.of(), hot.bounded());
        }
        double most = FULLEST / station.onTime();
        double rate = allowed / hot.energy(limit, Math.min(most, CornerCircuits.or(station.meanRate(), most) > 0
                ? CornerCircuits.or(station.meanRate(), most)
                : most));
        if (rate < most) {
            rate = allowed / hot.energy(limit, rate);
        }
        return new Derived(rate < most ? rate : Double.POSITIVE_INFINITY, at, List.of(), hot.bounded());
    }

    /** Rate up to which the source recovers so far that every cycle reaches the pull-in current; a regulated source always does. */
    private Derived byRecovery() throws IllegalCaseException {
        Condition at = circuits.condition(Corner.LOW_HOT, lowWinding);
        if (!circuits.lineOperated() && circuits.missing().isEmpty()) {
            return new Derived(Double.POSITIVE_INFINITY, at, List.of(), List.of());
        }
        List<String> missing = circuits.missingWith(station.coil().inductance(), Data.INDUCTANCE, station.coil().pullInCurrent(),
                Data.PULL_IN_CURRENT, station.onTime(), Data.DUTY_ON_TIME, lowWinding, Data.THERMAL_RESISTANCE);
        if (!missing.isEmpty()) {
            return Derived.missing(at, missing);
        }
        double high = FULLEST / station.onTime();
        if (pullsIn(high)) {
            return new Derived(Double.POSITIVE_INFINITY, at, List.of(), List.of());
        }
        double low = Math.min(1 / (station.onTime() + 1), 0.1 * high);
        if (!pullsIn(low)) {
            return new Derived(0, at, List.of(), List.of());
        }
        for (int halving = 0; halving < HALVINGS; halving++) {
            double middle = 2 / (1 / low + 1 / high);
            if (pullsIn(middle)) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return new Derived(low, at, List.of(), List.of());
    }

    private boolean pullsIn(double rate) throws IllegalCaseException {
        CircuitCase circuit = circuits.build(Corner.LOW_HOT, lowWinding, rate, station.onTime());
        return !Double.isNaN(SteadySearch.overPhases(circuit, PHASES).worst().timeToPullIn());
    }

    private Derived byRelease(Derived releaseTime) {
        List<String> missing = new ArrayList<>(releaseTime.missing());
        if (Double.isNaN(station.closingDelay())) {
            missing.add(Data.VALVE_CLOSING_DELAY);
        }
        if (!missing.isEmpty()) {
            return Derived.missing(releaseTime.at(), missing);
        }
        return new Derived(1 / (station.onTime() + releaseTime.value() + station.closingDelay()), releaseTime.at(), List.of(), List.of());
    }

    private Derived byValve() {
        Condition at = circuits.condition(Corner.NOMINAL, Double.NaN);
        return Double.isNaN(station.valveHighestRate()) ? Derived.missing(at, List.of(Data.VALVE_HIGHEST_RATE))
                : new Derived(station.valveHighestRate(), at, List.of(), List.of());
    }
}
