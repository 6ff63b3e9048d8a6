package coilbook.electrics;

import coilbook.fleet.LevelChange;

/**
 * The electrical side of a driver, one record a kind, in SI units. A drop or clamp of 0 means ideal. The switch drop stands in the coil's
 * loop while the driver is on; while the switch is off, or freewheels, only the clamp voltage opposes the current.
 */
public sealed interface DriverCircuit {

    /** Drop of the output switch while on, V. */
    double switchDrop();

    /** Voltage against which the coil current decays while the switch is off, V. */
    double clampVoltage();

    /**
     * Mains, series resistor, full-wave rectifier, storage capacitor, switch, coil; not isolated.
     *
     * @param seriesResistance Ω
     * @param capacitance F
     * @param rectifierDrop drop of the whole bridge (two diodes), V
     * @param bleedResistance across the capacitor, Ω; NaN if there is none
     */
    record LineCapacitor(double seriesResistance, double capacitance, double rectifierDrop, double switchDrop, double clampVoltage,
            double bleedResistance) implements DriverCircuit {

        public LineCapacitor(double seriesResistance, double capacitance, double rectifierDrop, double switchDrop, double clampVoltage) {
            this(seriesResistance, capacitance, rectifierDrop, switchDrop, clampVoltage, Double.NaN);
        }
    }

    /**
     * A regulated pull-in voltage for a set time, then a regulated hold voltage.
     *
     * @param pullInVoltage V
     * @param pullInTime s
     * @param holdVoltage V
     * @param levelChange source: the current decays into the hold voltage; freewheel: into the clamp until it meets hold voltage ÷ loop
     *            resistance
     */
    record TwoLevel(double pullInVoltage, double pullInTime, double holdVoltage, LevelChange levelChange, double switchDrop,
            double clampVoltage) implements DriverCircuit {
    }

    /**
     * One direct voltage for the whole on-time.
     *
     * @param outputVoltage V
     */
    record FixedDc(double outputVoltage, double switchDrop, double clampVoltage) implements DriverCircuit {
    }

    /**
     * A bus voltage chopped to a peak current for a set time, then to a hold current; if the bus cannot reach a set point, the current is
     * what the bus gives.
     *
     * @param busVoltage V
     * @param peakCurrent A
     * @param peakTime s
     * @param holdCurrent A
     */
    record CurrentRegulated(double busVoltage, double peakCurrent, double peakTime, double holdCurrent, double switchDrop,
            double clampVoltage) implements DriverCircuit {
    }
}
