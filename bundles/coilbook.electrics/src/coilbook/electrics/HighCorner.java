package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Output current, bus and insulation stress, and release, at the highest mains with a cold winding, from rest: the source is full then. */
final class HighCorner {

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private List<String> missing;
    private SteadyResult rested;

    HighCorner(CornerCircuits circuits, StationCircuit station) {
        this.circuits = circuits;
        this.station = station;
    }

    void derive() throws IllegalCaseException {
        missing = circuits.missingWith(station.lowestAmbient(), Data.AMBIENT);
        if (missing.isEmpty()) {
            CircuitCase circuit = circuits.rested(Corner.HIGH_COLD, station.lowestAmbient());
            circuit.check();
            rested = SteadySearch.fromRest(circuit, SteadySearch.PHASES);
        }
    }

    void cases(Map<Corner, CircuitCase> cases) {
        if (rested != null && circuits.hasInductance() && !Double.isNaN(station.onTime())) {
            cases.put(Corner.HIGH_COLD, circuits.quick(Corner.HIGH_COLD, station.lowestAmbient()));
        }
    }

    private Derived value(double value, List<String> missingIds, List<String> bounded) {
        Condition at = circuits.condition(Corner.HIGH_COLD, station.lowestAmbient());
        return missingIds.isEmpty() ? new Derived(value, at, List.of(), bounded) : Derived.missing(at, missingIds);
    }

    Derived peak() {
        List<String> bounded = new ArrayList<>();
        if (!circuits.hasInductance()) {
            bounded.add(Data.INDUCTANCE);
        }
        return value(rested == null ? Double.NaN : rested.highestPeakCurrent(), missing, bounded);
    }

    Derived busPeak() {
        return value(rested == null ? Double.NaN : rested.worst().sourceVoltagePeak(), missing, List.of());
    }

    /** The clamp, referred to the pole the coil hangs on, adds to the source. */
    Derived workingPeak() {
        double clamp = CornerCircuits.or(station.driver().clampVoltage(), 0);
        return value(rested == null ? Double.NaN : Math.max(rested.worst().sourceVoltagePeak(), clamp), missing, List.of());
    }

    Derived releaseTime() {
        List<String> all = new ArrayList<>(missing);
        all.addAll(circuits.missingWith(station.coil().inductance(), Data.INDUCTANCE, station.coil().dropOutCurrent(),
                Data.DROP_OUT_CURRENT, station.onTime(), Data.DUTY_ON_TIME));
        double time = rested == null ? Double.NaN : rested.worst().releaseTime();
        return value(Double.isNaN(time) ? Double.POSITIVE_INFINITY : time, all.stream().distinct().toList(), List.of());
    }
}
