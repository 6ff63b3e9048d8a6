package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.ArrayList;
import java.util.List;

/** The four limits of the cycle rate. */
final class RateLimits {

    private static final int PHASES = 4;
    private static final int STEPS = 12;
    private static final double PRECISION = 0.01;
    /** A rate at which the on-time would fill the whole period cannot be computed; limits are looked for up to this share of it. */
    private static final double FULLEST = 0.95;

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private final HeatCorner hot;
    private final double lowWinding;
    private final SteadySearch.Series series = new SteadySearch.Series(PHASES);

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
        return new Derived(recovers(), at, List.of(), List.of());
    }

    /** Looks for the period at which the least peak is just the pull-in current. */
    private double recovers() throws IllegalCaseException {
        double shortest = station.onTime() / FULLEST;
        double shortage = shortage(shortest);
        if (shortage <= 0) {
            return Double.POSITIVE_INFINITY;
        }
        double longest = Math.max(station.onTime() + 1, 10 * shortest);
        double reserve = -shortage(longest);
        if (reserve < 0) {
            return 0;
        }
        int side = 0;
        for (int step = 0; step < STEPS && longest - shortest > PRECISION * longest; step++) {
            // recharging is about exponential: the peak is nearer to its last value than a straight line says
            double period = step < 2 ? Math.sqrt(shortest * longest)
                    : shortest + (longest - shortest) * shortage / (shortage + reserve);
            double lacks = shortage(period);
            if (lacks > 0) {
                shortest = period;
                shortage = lacks;
                reserve *= side == 1 ? 0.5 : 1;
                side = 1;
            } else {
                longest = period;
                reserve = -lacks;
                shortage *= side == -1 ? 0.5 : 1;
                side = -1;
            }
        }
        return 1 / longest;
    }

    /** By how much the least peak falls short of the pull-in current, A. */
    private double shortage(double period) throws IllegalCaseException {
        CircuitCase circuit = circuits.build(Corner.LOW_HOT, lowWinding, 1 / period, station.onTime());
        return station.coil().pullInCurrent() - series.next(circuit).worst().peakCurrent();
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
