package coilbook.electrics;

import coilbook.fleet.DriverKind;
import coilbook.fleet.LevelChange;

/**
 * A driver's electrical figures in SI units; NaN: not known or of no part in this kind. Tolerances are fractions. A missing drop counts as
 * ideal, a missing clamp as one silicon diode (0.7 V, common practice), a missing tolerance as none: whoever maps a register puts in what it
 * assumes.
 *
 * @param kind may be null: not recorded
 */
public record DriverFigures(DriverKind kind, double seriesResistance, double seriesResistanceTolerance, double capacitance,
        double capacitanceTolerance, double rectifierDrop, double switchDrop, double clampVoltage, double bleedResistance,
        double pullInVoltage, double pullInTime, double holdVoltage, LevelChange levelChange, double busVoltage, double peakCurrent,
        double peakTime, double holdCurrent, double outputVoltage, double efficiency, double powerFactor, double standbyPower) {

    private static final double NONE = Double.NaN;

    /** A line-capacitor driver without bleed resistor. */
    public static DriverFigures lineCapacitor(double seriesResistance, double seriesResistanceTolerance, double capacitance,
            double capacitanceTolerance, double rectifierDrop, double switchDrop, double clampVoltage) {
        return new DriverFigures(DriverKind.LINE_CAPACITOR, seriesResistance, seriesResistanceTolerance, capacitance, capacitanceTolerance,
                rectifierDrop, switchDrop, clampVoltage, NONE, NONE, NONE, NONE, null, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE);
    }

    /** A two-level driver. */
    public static DriverFigures twoLevel(double pullInVoltage, double pullInTime, double holdVoltage, LevelChange levelChange,
            double switchDrop, double clampVoltage) {
        return new DriverFigures(DriverKind.TWO_LEVEL, NONE, NONE, NONE, NONE, NONE, switchDrop, clampVoltage, NONE, pullInVoltage,
                pullInTime, holdVoltage, levelChange, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE);
    }

    /** A driver of one direct voltage. */
    public static DriverFigures fixedDc(double outputVoltage, double switchDrop, double clampVoltage) {
        return new DriverFigures(DriverKind.FIXED_DC, NONE, NONE, NONE, NONE, NONE, switchDrop, clampVoltage, NONE, NONE, NONE, NONE, null,
                NONE, NONE, NONE, NONE, outputVoltage, NONE, NONE, NONE);
    }

    /** A current-regulated driver. */
    public static DriverFigures currentRegulated(double busVoltage, double peakCurrent, double peakTime, double holdCurrent,
            double switchDrop, double clampVoltage) {
        return new DriverFigures(DriverKind.CURRENT_REGULATED, NONE, NONE, NONE, NONE, NONE, switchDrop, clampVoltage, NONE, NONE, NONE,
                NONE, null, busVoltage, peakCurrent, peakTime, holdCurrent, NONE, NONE, NONE, NONE);
    }
}
