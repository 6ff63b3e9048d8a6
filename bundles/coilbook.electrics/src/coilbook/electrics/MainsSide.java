package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import java.util.ArrayList;
import java.util.List;

/** What the mains, the series resistor and the capacitor have to bear, at the highest mains. */
final class MainsSide {

    /** Voltage below which a charge counts as harmless after disconnection, V (IEC 60204-1, 6.2.4). */
    private static final double HARMLESS = 60;

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private final HeatCorner hot;
    private double winding = Double.NaN;
    private double stuckWinding = Double.NaN;
    private SteadyResult duty;
    private SteadyResult held;
    private double regulatedPower = Double.NaN;

    MainsSide(CornerCircuits circuits, StationCircuit station, HeatCorner hot) {
        this.circuits = circuits;
        this.station = station;
        this.hot = hot;
    }

    void derive(Temperature.Steady atDuty, Temperature.Steady stuck) throws IllegalCaseException {
        if (!circuits.missing().isEmpty()) {
            return;
        }
        winding = Double.isFinite(atDuty.celsius()) ? atDuty.celsius() : CornerCircuits.or(station.highestAmbient(), 20);
        if (circuits.dutyKnown() && station.meanRate() > 0) {
            duty = hot.steady(winding, station.meanRate());
        }
        if (circuits.lineOperated()) {
            stuckWinding = Double.isFinite(stuck.celsius()) ? stuck.celsius() : winding;
            held = SteadySearch.fromRest(circuits.heldOn(Corner.HOT, stuckWinding), 1);
        } else if (duty != null) {
            double source = duty.worst().energies().source() * station.meanRate();
            regulatedPower = source / station.driver().efficiency() + CornerCircuits.or(station.driver().standbyPower(), 0);
        }
    }

    private Derived value(double value, double celsius, List<String> missing) {
        Condition at = circuits.condition(Corner.HOT, celsius);
        List<String> bounded = circuits.hasInductance() ? List.of() : List.of(Data.INDUCTANCE);
        return missing.isEmpty() ? new Derived(value, at, List.of(), bounded) : Derived.missing(at, missing);
    }

    private List<String> missingAtDuty() {
        return circuits.missingWith(station.meanRate(), Data.DUTY_RATE, station.onTime(), Data.DUTY_ON_TIME);
    }

    private List<String> missingForPower() {
        List<String> all = missingAtDuty();
        if (!circuits.lineOperated()) {
            all.addAll(circuits.missingWith(station.driver().efficiency(), Data.EFFICIENCY, station.driver().powerFactor(),
                    Data.POWER_FACTOR, station.supply().highestVoltage(), Data.MAINS_HIGHEST_VOLTAGE));
        }
        return all.stream().distinct().toList();
    }

    Derived rms() {
        double voltage = circuits.voltage(Corner.HOT);
        double rms = duty == null ? 0
                : circuits.lineOperated() ? duty.worst().mainsRmsCurrent() : regulatedPower / station.driver().powerFactor() / voltage;
        return value(rms, winding, missingForPower());
    }

    Derived apparentPower() {
        double rms = rms().value();
        return value(rms * circuits.voltage(Corner.HOT), winding, missingForPower());
    }

    /** Highest current from the mains in a cycle; a line-operated driver only, else there is no value and nothing missing. */
    Derived peak() {
        return lineOnly(duty == null ? 0 : duty.worst().mainsPeakCurrent(), winding, missingAtDuty());
    }

    Derived seriesAtDuty() {
        double power = duty == null ? 0
                : duty.byPhase().stream().mapToDouble(cycle -> cycle.energies().seriesResistor()).average().orElse(0) * station.meanRate();
        return lineOnly(power, winding, missingAtDuty());
    }

    Derived seriesStuckOn() {
        double power = held == null ? Double.NaN
                : held.worst().energies().seriesResistor() / held.worst().energies().source()
                        * heldSource();
        return lineOnly(power, stuckWinding, circuits.missing());
    }

    /** Mean power from the mains while held on, W. */
    private double heldSource() {
        return held.worst().energies().source() * circuits.heldOn(Corner.HOT, stuckWinding).cyclesPerSecond();
    }

    /** Rectified mains less the bridge drop straight across the series resistor, W: mean of (Vp sin θ − Vd)² while positive, over R. */
    Derived seriesShorted() {
        if (!circuits.lineOperated() || !circuits.missing().isEmpty()) {
            return lineOnly(Double.NaN, Double.NaN, circuits.missing());
        }
        DriverFigures driver = station.driver();
        double peak = Math.sqrt(2) * station.supply().highestVoltage();
        double drop = Math.min(CornerCircuits.or(driver.rectifierDrop(), 0), peak);
        double start = Math.asin(drop / peak);
        double angle = Math.PI - 2 * start;
        double square = peak * peak * (angle + Math.sin(2 * start)) / 2 - 4 * peak * drop * Math.cos(start) + drop * drop * angle;
        double series = driver.seriesResistance() * (1 - CornerCircuits.or(driver.seriesResistanceTolerance(), 0));
        return lineOnly(square / Math.PI / series, Double.NaN, circuits.missing());
    }

    Derived storedEnergy() {
        double full = fullCharge();
        double capacitance = station.driver().capacitance() * (1 + CornerCircuits.or(station.driver().capacitanceTolerance(), 0));
        return lineOnly(0.5 * capacitance * full * full, Double.NaN, circuits.missing());
    }

    /** R C ln(V/60 V) through the bleed resistor. */
    Derived decayTime() {
        double full = fullCharge();
        double capacitance = station.driver().capacitance() * (1 + CornerCircuits.or(station.driver().capacitanceTolerance(), 0));
        double bleed = station.driver().bleedResistance();
        double time = full <= HARMLESS ? 0
                : Double.isNaN(bleed) ? Double.POSITIVE_INFINITY : bleed * capacitance * Math.log(full / HARMLESS);
        return lineOnly(time, Double.NaN, circuits.missing());
    }

    private double fullCharge() {
        return Math.max(0, Math.sqrt(2) * station.supply().highestVoltage() - CornerCircuits.or(station.driver().rectifierDrop(), 0));
    }

    private Derived lineOnly(double value, double celsius, List<String> missing) {
        if (circuits.lineOperated()) {
            return value(value, celsius, missing);
        }
        return Derived.missing(circuits.condition(Corner.HOT, celsius), new ArrayList<>());
    }
}
