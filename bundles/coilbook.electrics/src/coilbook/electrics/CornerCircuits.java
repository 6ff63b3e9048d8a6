package coilbook.electrics;

import coilbook.fleet.DriverKind;
import coilbook.fleet.LevelChange;
import java.util.ArrayList;
import java.util.List;

/** Puts a station's figures together into the circuit of a corner, tolerances on their unfavourable side, and knows what is missing. */
final class CornerCircuits {

    /** Least off-time of a cycle that is to end at rest, s. */
    private static final double REST = 5e-3;
    /** Time constants after which a circuit has settled: e^(−14) is a millionth. */
    private static final double SETTLE = 14;
    private static final double DIODE = 0.7;

    private final StationCircuit station;
    private final DriverFigures driver;
    private final CoilFigures coil;
    private final List<String> missing = new ArrayList<>();

    CornerCircuits(StationCircuit station) {
        this.station = station;
        driver = station.driver();
        coil = station.coil();
        if (driver.kind() == null) {
            missing.add(Data.DRIVER_KIND);
        } else {
            needForKind();
        }
        need(coil.lowestResistance20() + coil.resistance20() + coil.highestResistance20(), Data.COIL_RESISTANCE);
    }

    private void needForKind() {
        switch (driver.kind()) {
            case LINE_CAPACITOR -> {
                need(station.supply().nominalVoltage(), Data.MAINS_NOMINAL_VOLTAGE);
                need(station.supply().lowestVoltage(), Data.MAINS_LOWEST_VOLTAGE);
                need(station.supply().highestVoltage(), Data.MAINS_HIGHEST_VOLTAGE);
                need(station.supply().frequency(), Data.MAINS_FREQUENCY);
                need(driver.seriesResistance(), Data.SERIES_RESISTANCE);
                need(driver.capacitance(), Data.CAPACITANCE);
            }
            case TWO_LEVEL -> {
                need(driver.pullInVoltage(), Data.PULL_IN_VOLTAGE);
                need(driver.pullInTime(), Data.PULL_IN_TIME);
                need(driver.holdVoltage(), Data.HOLD_VOLTAGE);
            }
            case FIXED_DC -> need(driver.outputVoltage(), Data.OUTPUT_VOLTAGE);
            case CURRENT_REGULATED -> {
                need(driver.busVoltage(), Data.BUS_VOLTAGE);
                need(driver.peakCurrent(), Data.PEAK_CURRENT);
                need(driver.peakTime(), Data.PEAK_TIME);
                need(driver.holdCurrent(), Data.HOLD_CURRENT);
            }
            case RECTIFIED_AC, DIRECT_AC -> missing.add(Data.DRIVER_KIND);
        }
    }

    private void need(double value, String id) {
        if (Double.isNaN(value)) {
            missing.add(id);
        }
    }

    /** Data without which no circuit can be put together; the inductance is not among them. */
    List<String> missing() {
        return missing;
    }

    /** Those and further ones of the given, where their value is missing. */
    List<String> missingWith(Object... valueThenId) {
        List<String> all = new ArrayList<>(missing);
        for (int index = 0; index < valueThenId.length; index += 2) {
            if (Double.isNaN((Double) valueThenId[index])) {
                all.add((String) valueThenId[index + 1]);
            }
        }
        return all;
    }

    boolean hasInductance() {
        return !Double.isNaN(coil.inductance());
    }

    boolean lineOperated() {
        return driver.kind() == DriverKind.LINE_CAPACITOR;
    }

    boolean currentDriven() {
        return driver.kind() == DriverKind.CURRENT_REGULATED;
    }

    boolean dutyKnown() {
        return !Double.isNaN(station.meanRate()) && !Double.isNaN(station.onTime());
    }

    /** Rate that rules recovery and release: the burst rate if known, else the mean rate. */
    double quickRate() {
        return Double.isNaN(station.burstRate()) ? station.meanRate() : station.burstRate();
    }

    double voltage(Corner corner) {
        return switch (corner) {
            case LOW_HOT, LOW_COLD -> station.supply().lowestVoltage();
            case HIGH_COLD, HOT -> station.supply().highestVoltage();
            case NOMINAL -> station.supply().nominalVoltage();
        };
    }

    double ambient(Corner corner) {
        return switch (corner) {
            case LOW_HOT, HOT -> station.highestAmbient();
            case LOW_COLD, HIGH_COLD -> station.lowestAmbient();
            case NOMINAL -> station.nominalAmbient();
        };
    }

    double resistance20(Corner corner) {
        return switch (corner) {
            case LOW_HOT -> coil.highestResistance20();
            case LOW_COLD, HIGH_COLD -> coil.lowestResistance20();
            case HOT -> currentDriven() ? coil.highestResistance20() : coil.lowestResistance20();
            case NOMINAL -> coil.resistance20();
        };
    }

    Condition condition(Corner corner, double winding) {
        return new Condition(corner, voltage(corner), station.supply().frequency(), winding, ambient(corner));
    }

    /** The circuit of a corner at a rate and on-time. A missing inductance becomes next to nothing: the bound for heat and output current. */
    CircuitCase build(Corner corner, double winding, double rate, double onTime) {
        double resistance20 = resistance20(corner);
        double inductance = hasInductance() ? coil.inductance() : 1e-6 * resistance20;
        boolean closes = hasInductance() && coil.inductanceClosed() >= coil.inductance() && !Double.isNaN(coil.pullInCurrent())
                && !(coil.dropOutCurrent() > coil.pullInCurrent());
        CoilCircuit circuit = new CoilCircuit(resistance20, inductance, closes ? coil.inductanceClosed() : Double.NaN, coil.pullInCurrent(),
                coil.dropOutCurrent(), winding);
        MainsSource mains = lineOperated() ? new MainsSource(voltage(corner), station.supply().frequency(), 0) : null;
        return new CircuitCase(mains, driver(corner), circuit, or(station.cableResistance(), 0), rate, onTime, 1,
                or(station.openingDelay(), 0));
    }

    /** At the mean rate, which rules heat. */
    CircuitCase atDuty(Corner corner, double winding) {
        return build(corner, winding, station.meanRate(), station.onTime());
    }

    /** At the burst rate, which rules recovery; from rest if no rate is known. */
    CircuitCase quick(Corner corner, double winding) {
        double rate = quickRate();
        return build(corner, winding, Double.isNaN(rate) ? restedRate(station.onTime()) : rate, station.onTime());
    }

    /** One cycle that begins and ends at rest; without a known on-time one long enough for all to be seen. */
    CircuitCase rested(Corner corner, double winding) {
        double onTime = Double.isNaN(station.onTime()) ? longOnTime() : station.onTime();
        return build(corner, winding, restedRate(onTime), onTime);
    }

    /** Held on so long that the hold window, of whole half-waves, shows the hold without end. */
    CircuitCase heldOn(Corner corner, double winding) {
        double onTime = 2 * (SETTLE * slowest() + changeTime());
        if (lineOperated()) {
            double halfWave = 0.5 / station.supply().frequency();
            onTime = 2 * halfWave * Math.ceil(0.5 * onTime / halfWave + 1);
        }
        return build(corner, winding, 1 / (onTime * 1.001), onTime);
    }

    /** The rate of a cycle that ends with the coil at rest; the capacitor is full at the start of a first cycle anyway. */
    private double restedRate(double onTime) {
        double release = SETTLE * (hasInductance() ? coil.inductance() / coil.lowestResistance20() : 0);
        return 1 / (onTime + Math.max(REST, release));
    }

    private double longOnTime() {
        return 2 * (SETTLE * slowest() + changeTime()) + REST;
    }

    /** Slowest time constant, s. */
    private double slowest() {
        double slowest = hasInductance() ? Math.max(coil.inductance(), or(coil.inductanceClosed(), 0)) / coil.lowestResistance20() : 0;
        return lineOperated() ? Math.max(slowest, 1.5 * driver.capacitance() * driver.seriesResistance()) : slowest;
    }

    private double changeTime() {
        return Math.max(or(driver.pullInTime(), 0), or(driver.peakTime(), 0));
    }

    private DriverCircuit driver(Corner corner) {
        double drop = or(driver.switchDrop(), 0);
        double clamp = or(driver.clampVoltage(), DIODE);
        return switch (driver.kind()) {
            case LINE_CAPACITOR -> lineCapacitor(corner, drop, clamp);
            case TWO_LEVEL -> new DriverCircuit.TwoLevel(driver.pullInVoltage(), driver.pullInTime(), driver.holdVoltage(),
                    driver.levelChange() == null ? LevelChange.SOURCE : driver.levelChange(), drop, clamp);
            case FIXED_DC -> new DriverCircuit.FixedDc(driver.outputVoltage(), drop, clamp);
            case CURRENT_REGULATED -> new DriverCircuit.CurrentRegulated(driver.busVoltage(), driver.peakCurrent(), driver.peakTime(),
                    driver.holdCurrent(), drop, clamp);
            case RECTIFIED_AC, DIRECT_AC -> throw new IllegalStateException("not among the kinds that can be put together");
        };
    }

    private DriverCircuit lineCapacitor(Corner corner, double drop, double clamp) {
        boolean low = corner == Corner.LOW_HOT || corner == Corner.LOW_COLD;
        double side = corner == Corner.NOMINAL ? 0 : low ? 1 : -1;
        double series = driver.seriesResistance() * (1 + side * or(driver.seriesResistanceTolerance(), 0));
        double capacitance = driver.capacitance() * (1 - side * or(driver.capacitanceTolerance(), 0));
        return new DriverCircuit.LineCapacitor(series, capacitance, or(driver.rectifierDrop(), 0), drop, clamp, driver.bleedResistance());
    }

    static double or(double value, double otherwise) {
        return Double.isNaN(value) ? otherwise : value;
    }
}
