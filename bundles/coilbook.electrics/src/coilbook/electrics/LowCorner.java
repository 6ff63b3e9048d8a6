package coilbook.electrics;

import coilbook.electrics.internal.SteadySearch;
import coilbook.fleet.DriverKind;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Pull-in and hold at the lowest mains, winding hot and cold. */
final class LowCorner {

    private final CornerCircuits circuits;
    private final StationCircuit station;
    private final CoilFigures coil;
    private double winding = Double.NaN;
    private List<String> boundedWinding = List.of();
    private List<String> missing;
    private SteadyResult hot;
    private SteadyResult cold;

    LowCorner(CornerCircuits circuits, StationCircuit station) {
        this.circuits = circuits;
        this.station = station;
        coil = station.coil();
    }

    void derive() throws IllegalCaseException {
        findWinding();
        missing = circuits.missingWith(station.onTime(), Data.DUTY_ON_TIME);
        if (Double.isNaN(winding)) {
            missing.add(Data.THERMAL_RESISTANCE);
        }
        if (circuits.lineOperated() && Double.isNaN(circuits.quickRate())) {
            missing.add(Data.DUTY_RATE);
        }
        if (!missing.isEmpty() || !circuits.hasInductance()) {
            return;
        }
        CircuitCase circuit = circuits.quick(Corner.LOW_HOT, winding);
        circuit.check();
        hot = SteadySearch.overPhases(circuit, SteadySearch.PHASES);
        if (circuits.lineOperated() && !Double.isNaN(station.lowestAmbient())) {
            cold = SteadySearch.overPhases(circuits.quick(Corner.LOW_COLD, station.lowestAmbient()), SteadySearch.PHASES);
        }
    }

    /** The hot winding: steady at duty, else the hottest its class allows, which is the bound. */
    private void findWinding() throws IllegalCaseException {
        HeatCorner heat = new HeatCorner(circuits, station, Corner.LOW_HOT);
        Temperature.Steady steady = heat.atDuty();
        winding = steady.celsius();
        if (Double.isNaN(winding) || steady.runsAway()) {
            boundedWinding = Double.isNaN(winding) ? heat.missingAtDuty() : List.of();
            winding = coil.highestWindingTemperature();
        } else {
            boundedWinding = heat.bounded();
        }
    }

    /** Temperature of the hot winding, °C; NaN if not even a bound is known. */
    double winding() {
        return winding;
    }

    void cases(Map<Corner, CircuitCase> cases) {
        if (hot != null) {
            cases.put(Corner.LOW_HOT, circuits.quick(Corner.LOW_HOT, winding));
        }
        if (cold != null) {
            cases.put(Corner.LOW_COLD, circuits.quick(Corner.LOW_COLD, station.lowestAmbient()));
        }
    }

    private Condition hotCondition() {
        return circuits.condition(Corner.LOW_HOT, winding);
    }

    private List<String> missingAnd(double value, String id) {
        List<String> all = new ArrayList<>(missing);
        if (!circuits.hasInductance()) {
            all.add(Data.INDUCTANCE);
        }
        if (Double.isNaN(value)) {
            all.add(id);
        }
        return all;
    }

    private Derived value(double value, List<String> missingIds) {
        return missingIds.isEmpty() ? new Derived(value, hotCondition(), List.of(), boundedWinding)
                : Derived.missing(hotCondition(), missingIds);
    }

    Derived peak() {
        return value(hot == null ? Double.NaN : hot.worst().peakCurrent(), missingAnd(0, ""));
    }

    Derived timeToPullIn() {
        double time = hot == null ? Double.NaN : hot.worst().timeToPullIn();
        return value(Double.isNaN(time) ? Double.POSITIVE_INFINITY : time, missingAnd(coil.pullInCurrent(), Data.PULL_IN_CURRENT));
    }

    Derived heldAtPullIn() {
        double time = hot == null ? Double.NaN : hot.worst().heldAtPullIn();
        return value(Double.isNaN(time) ? 0 : time, missingAnd(coil.pullInCurrent(), Data.PULL_IN_CURRENT));
    }

    /** L* = R t / ln(1/(1 − I R/V)): inductance up to which the current of a regulated voltage reaches pull-in within the time. */
    Derived breakEvenInductance() {
        DriverFigures driver = station.driver();
        double source = driver.kind() == DriverKind.TWO_LEVEL ? driver.pullInVoltage()
                : driver.kind() == DriverKind.FIXED_DC ? driver.outputVoltage() : driver.busVoltage();
        double time = driver.kind() == DriverKind.TWO_LEVEL ? driver.pullInTime()
                : driver.kind() == DriverKind.CURRENT_REGULATED ? driver.peakTime() : station.onTime();
        if (circuits.lineOperated()) {
            return Derived.missing(hotCondition(), List.of());
        }
        List<String> all = circuits.missingWith(coil.pullInCurrent(), Data.PULL_IN_CURRENT, time, Data.DUTY_ON_TIME, winding,
                Data.THERMAL_RESISTANCE);
        if (!all.isEmpty()) {
            return Derived.missing(hotCondition(), all);
        }
        double resistance = Copper.resistanceAt(coil.highestResistance20(), winding) + CornerCircuits.or(station.cableResistance(), 0);
        double drive = source - CornerCircuits.or(driver.switchDrop(), 0);
        double share = coil.pullInCurrent() * resistance / drive;
        double shortest = Double.isNaN(station.onTime()) ? time : Math.min(time, station.onTime());
        boolean within = driver.kind() != DriverKind.CURRENT_REGULATED || driver.peakCurrent() >= coil.pullInCurrent();
        double inductance = drive > 0 && share < 1 && within ? -resistance * shortest / Math.log1p(-share) : 0;
        return new Derived(inductance, hotCondition(), List.of(), boundedWinding);
    }

    Derived holdMinimum() {
        if (hot == null) {
            return holdWithoutInductance();
        }
        double least = applies(hot.worst().minimumAfterOpeningCurrent());
        if (cold != null && applies(cold.worst().minimumAfterOpeningCurrent()) < least) {
            return new Derived(cold.worst().minimumAfterOpeningCurrent(), circuits.condition(Corner.LOW_COLD, station.lowestAmbient()),
                    List.of(), List.of());
        }
        return new Derived(least, hotCondition(), List.of(), boundedWinding);
    }

    /** A regulated source holds with its hold level over the resistance, whatever the inductance, once the plunger is in. */
    private Derived holdWithoutInductance() {
        List<String> all = missingAnd(0, "");
        boolean onlyInductance = all.equals(List.of(Data.INDUCTANCE)) && !circuits.lineOperated();
        if (!onlyInductance) {
            return Derived.missing(hotCondition(), all);
        }
        return new Derived(regulatedHold(), hotCondition(), List.of(), withInductance());
    }

    private double regulatedHold() {
        DriverFigures driver = station.driver();
        double resistance = Copper.resistanceAt(coil.highestResistance20(), winding) + CornerCircuits.or(station.cableResistance(), 0);
        double drop = CornerCircuits.or(driver.switchDrop(), 0);
        return switch (driver.kind()) {
            case TWO_LEVEL -> station.onTime() > driver.pullInTime() ? Math.max(0, driver.holdVoltage() - drop) / resistance
                    : Double.POSITIVE_INFINITY;
            case FIXED_DC -> Math.max(0, driver.outputVoltage() - drop) / resistance;
            case CURRENT_REGULATED -> Math.min(driver.holdCurrent(), Math.max(0, driver.busVoltage() - drop) / resistance);
            case LINE_CAPACITOR, RECTIFIED_AC, DIRECT_AC -> Double.NaN;
        };
    }

    private List<String> withInductance() {
        List<String> all = new ArrayList<>(boundedWinding);
        if (!all.contains(Data.INDUCTANCE)) {
            all.add(Data.INDUCTANCE);
        }
        return all;
    }

    /** Hold does not apply where the on-time is over before the valve is open, or before the driver goes to hold. */
    private double applies(double minimum) {
        DriverFigures driver = station.driver();
        boolean never = Double.isNaN(minimum) || driver.kind() == DriverKind.TWO_LEVEL && station.onTime() <= driver.pullInTime();
        return never ? Double.POSITIVE_INFINITY : minimum;
    }

    Derived holdMean() {
        if (hot == null) {
            return holdWithoutInductance();
        }
        return value(hot.worst().holdMeanCurrent(), missingAnd(0, ""));
    }

    Derived belowDropOut() {
        if (hot == null) {
            return value(Double.NaN, missingAnd(coil.dropOutCurrent(), Data.DROP_OUT_CURRENT));
        }
        double longest = CornerCircuits.or(hot.worst().belowDropOut(), 0);
        if (cold != null && CornerCircuits.or(cold.worst().belowDropOut(), 0) > longest) {
            return new Derived(cold.worst().belowDropOut(), circuits.condition(Corner.LOW_COLD, station.lowestAmbient()), List.of(),
                    List.of());
        }
        return value(longest, missingAnd(coil.dropOutCurrent(), Data.DROP_OUT_CURRENT));
    }
}
