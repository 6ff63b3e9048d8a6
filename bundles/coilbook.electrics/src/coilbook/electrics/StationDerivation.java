package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * Derives the electrics of a station at its corners. A pure function: equal circuits give equal results. A circuit whose data contradict one
 * another, so that it cannot be computed, is refused with the field named.
 */
public final class StationDerivation {

    private final StationCircuit station;
    private final CornerCircuits circuits;
    private final HeatCorner hot;
    private final HeatCorner nominal;
    private final Map<Corner, CircuitCase> cases = new EnumMap<>(Corner.class);
    private double nominalWinding = Double.NaN;

    private StationDerivation(StationCircuit station) {
        this.station = station;
        circuits = new CornerCircuits(station);
        hot = new HeatCorner(circuits, station, Corner.HOT);
        nominal = new HeatCorner(circuits, station, Corner.NOMINAL);
    }

    /**
     * Derives all values; those for which data are missing say which.
     *
     * @throws IllegalCaseException naming the figure that cannot be
     */
    public static StationElectrics derive(StationCircuit station) throws IllegalCaseException {
        return new StationDerivation(station).derive();
    }

    private StationElectrics derive() throws IllegalCaseException {
        Temperature.Steady hotState = hot.atDuty();
        Temperature.Steady stuck = hot.heldOn();
        Temperature.Steady nominalState = nominal.atDuty();
        Derived windingTemperature = hot.derived(hotState.celsius(), hotState.celsius());
        LowCorner low = new LowCorner(circuits, station);
        low.derive();
        HighCorner high = new HighCorner(circuits, station);
        high.derive();
        MainsSide mains = new MainsSide(circuits, station, hot);
        mains.derive(hotState, stuck);
        RateLimits limits = new RateLimits(circuits, station, hot, low.winding());
        SteadyResult middle = steadyNominal(nominalState.celsius());
        double heldNominal = middle == null ? Double.NaN : heat(middle.worst().holdRmsCurrent(), nominalState.celsius());
        low.cases(cases);
        if (Double.isFinite(hotState.celsius()) && circuits.hasInductance()) {
            cases.put(Corner.HOT, circuits.atDuty(Corner.HOT, hotState.celsius()));
        }
        high.cases(cases);
        double saturation = hot.saturation();
        return new StationElectrics(low.peak(), low.timeToPullIn(), low.heldAtPullIn(), low.breakEvenInductance(), low.holdMinimum(),
                low.holdMean(), low.belowDropOut(), high.releaseTime(), high.peak(), high.busPeak(), high.workingPeak(), windingTemperature,
                new Derived(saturation, circuits.condition(Corner.HOT, saturation), List.of(), List.of()),
                hot.derivedHeldOn(stuck.celsius(), stuck.celsius()), hot.derived(hotState.power(), hotState.celsius()),
                holdPower(heldNominal, nominalState.celsius()), atNominal(middle == null ? Double.NaN : middle.worst().peakCurrent()),
                atNominal(middle == null ? Double.NaN : middle.worst().holdMeanCurrent()),
                nominal.derived(nominalState.celsius(), nominalState.celsius()), limits.derive(high.releaseTime()), mains.rms(),
                mains.apparentPower(), mains.peak(), mains.seriesAtDuty(), mains.seriesStuckOn(), mains.seriesShorted(),
                mains.storedEnergy(), mains.decayTime(), cases);
    }

    private SteadyResult steadyNominal(double steadyWinding) throws IllegalCaseException {
        if (!circuits.missing().isEmpty() || !circuits.hasInductance() || Double.isNaN(station.onTime())) {
            return null;
        }
        nominalWinding = Double.isFinite(steadyWinding) ? steadyWinding : 20;
        CircuitCase circuit = circuits.quick(Corner.NOMINAL, nominalWinding);
        circuit.check();
        cases.put(Corner.NOMINAL, circuit);
        return SteadySearch.overPhases(circuit, SteadySearch.PHASES / 4);
    }

    private double heat(double rms, double celsius) {
        return rms * rms * Copper.resistanceAt(station.coil().resistance20(), celsius);
    }

    private Derived holdPower(double power, double celsius) {
        List<String> missing = circuits.hasInductance() ? nominal.missingAtDuty() : List.of(Data.INDUCTANCE);
        return Double.isNaN(power) ? Derived.missing(circuits.condition(Corner.NOMINAL, celsius), missing)
                : nominal.derived(power, celsius);
    }

    private Derived atNominal(double value) {
        Condition at = circuits.condition(Corner.NOMINAL, nominalWinding);
        List<String> missing = circuits.missingWith(station.coil().inductance(), Data.INDUCTANCE, station.onTime(), Data.DUTY_ON_TIME);
        return Double.isNaN(value) ? Derived.missing(at, missing) : new Derived(value, at, List.of(), List.of());
    }
}
