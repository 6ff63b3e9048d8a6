package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.DriverCircuit;

/** The constants of a line-operated capacitor driver with its coil, as the pieces want them. SI units. */
final class LineParameters {

    final double mainsPeak;
    final double omega;
    final double seriesResistance;
    final double capacitance;
    final double bridgeDrop;
    final double switchDrop;
    final double bleedConductance;
    final double resistance;

    LineParameters(CircuitCase circuit, DriverCircuit.LineCapacitor driver) {
        mainsPeak = circuit.mains().peak();
        omega = circuit.mains().angularFrequency();
        seriesResistance = driver.seriesResistance();
        capacitance = driver.capacitance();
        bridgeDrop = driver.rectifierDrop();
        switchDrop = driver.switchDrop();
        bleedConductance = Double.isNaN(driver.bleedResistance()) ? 0 : 1 / driver.bleedResistance();
        resistance = circuit.totalResistance();
    }

    /** Capacitor voltage to which the mains peak charges it, V. */
    double fullCharge() {
        return Math.max(0, mainsPeak - bridgeDrop);
    }

    /** Angle within the rectified half-wave, rad, 0 to π. */
    static double halfWave(double theta) {
        double angle = theta % Math.PI;
        return angle < 0 ? angle + Math.PI : angle;
    }

    /** Voltage by which the rectified mains exceeds drop and capacitor, V: positive means that the rectifier conducts. */
    double forward(double bus, double theta) {
        return Math.abs(mainsPeak * Math.sin(theta)) - bridgeDrop - bus;
    }
}
