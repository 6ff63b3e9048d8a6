package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.ArrayList;
import java.util.List;

/** Steady winding temperature and power of a corner, at duty and held on. */
final class HeatCorner {

    /** Few phases are enough for energy, which as a smooth periodic function of phase averages out fast. */
    private static final int PHASES = 4;
    /** K; the sheets of an audit rely on it. */
    private static final double TOLERANCE = 1e-3;

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private final Corner corner;
    private final double thermalResistance;
    private final SteadySearch.Series series = new SteadySearch.Series(PHASES);
    private final List<String> missing;
    private final List<String> bounded = new ArrayList<>();

    HeatCorner(CornerCircuits circuits, StationCircuit station, Corner corner) {
        this.circuits = circuits;
        this.station = station;
        this.corner = corner;
        CoilFigures coil = station.coil();
        thermalResistance = coil.thermalResistanceOrBound();
        missing = circuits.missingWith(thermalResistance, Data.THERMAL_RESISTANCE, circuits.ambient(corner), Data.AMBIENT);
        if (Double.isNaN(coil.thermalResistance())) {
            bounded.add(Data.THERMAL_RESISTANCE);
        }
        if (!circuits.hasInductance()) {
            bounded.add(Data.INDUCTANCE);
        }
    }

    /** Mean heat per cycle at a winding temperature and rate, J. */
    double energy(double celsius, double rate) throws IllegalCaseException {
        return steady(celsius, rate).meanWindingEnergy();
    }

    /** The repeating cycle at a winding temperature and rate. */
    SteadyResult steady(double celsius, double rate) throws IllegalCaseException {
        return series.next(circuits.build(corner, celsius, rate, station.onTime()));
    }

    /** The steady state at duty; its temperature is NaN if data are missing. */
    Temperature.Steady atDuty() throws IllegalCaseException {
        if (!missing.isEmpty() || !circuits.dutyKnown()) {
            return new Temperature.Steady(Double.NaN, Double.NaN);
        }
        double rate = station.meanRate();
        if (rate <= 0) {
            return new Temperature.Steady(circuits.ambient(corner), 0);
        }
        return Temperature.steady(circuits.ambient(corner), thermalResistance, celsius -> rate * energy(celsius, rate), TOLERANCE);
    }

    /** The steady state held on without end; NaN if data are missing. */
    Temperature.Steady heldOn() throws IllegalCaseException {
        if (!missing.isEmpty()) {
            return new Temperature.Steady(Double.NaN, Double.NaN);
        }
        return Temperature.steady(circuits.ambient(corner), thermalResistance, this::heldPower, TOLERANCE);
    }

    /** Heat in the winding when held on, W. */
    double heldPower(double celsius) throws IllegalCaseException {
        CircuitCase held = circuits.heldOn(corner, celsius);
        double rms = SteadySearch.fromRest(held, 1).worst().holdRmsCurrent();
        return rms * rms * held.coil().resistance();
    }

    Derived derived(double value, double celsius) {
        Condition at = circuits.condition(corner, celsius);
        return Double.isNaN(value) ? Derived.missing(at, missingAtDuty()) : new Derived(value, at, List.of(), bounded);
    }

    Derived derivedHeldOn(double value, double celsius) {
        Condition at = circuits.condition(corner, celsius);
        return Double.isNaN(value) ? Derived.missing(at, missing) : new Derived(value, at, List.of(), bounded);
    }

    List<String> missingAtDuty() {
        List<String> all = new ArrayList<>(missing);
        if (Double.isNaN(station.meanRate())) {
            all.add(Data.DUTY_RATE);
        }
        if (Double.isNaN(station.onTime())) {
            all.add(Data.DUTY_ON_TIME);
        }
        return all;
    }

    double thermalResistance() {
        return thermalResistance;
    }

    List<String> bounded() {
        return bounded;
    }

    /**
     * Temperature at which a current-regulated bus can no longer drive the hold current, °C: above it power falls as the winding heats. NaN for
     * other kinds.
     */
    double saturation() {
        if (!circuits.currentDriven() || !circuits.missing().isEmpty()) {
            return Double.NaN;
        }
        DriverFigures driver = station.driver();
        double loop = (driver.busVoltage() - CornerCircuits.or(driver.switchDrop(), 0)) / driver.holdCurrent();
        double winding = loop - CornerCircuits.or(station.cableResistance(), 0);
        return Copper.temperatureOf(winding, circuits.resistance20(corner));
    }
}
