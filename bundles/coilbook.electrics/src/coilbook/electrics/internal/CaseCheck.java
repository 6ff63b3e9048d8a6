package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CoilCircuit;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.MainsSource;

/** Refuses a case that cannot be computed; the ranges are far wider than any coil driver's. */
public final class CaseCheck {

    private static final int MOST_CYCLES = 100_000;

    private CaseCheck() {
    }

    public static void check(CircuitCase circuit) throws IllegalCaseException {
        if (circuit.driver() == null) {
            throw new IllegalCaseException("driver", Double.NaN, "a driver");
        }
        if (circuit.coil() == null) {
            throw new IllegalCaseException("coil", Double.NaN, "a coil");
        }
        coil(circuit.coil());
        range("cable.loopResistance", circuit.loopResistance(), 0, 1e6, "0 to 1e6 Ω");
        range("duty.cyclesPerSecond", circuit.cyclesPerSecond(), 1e-5, 1e5, "0.00001 to 100000 cycles a second");
        range("duty.onTime", circuit.onTime(), 1e-9, 1e5, "more than nothing, at most 100000 s");
        if (circuit.onTime() >= circuit.period()) {
            throw new IllegalCaseException("duty.onTime", circuit.onTime(), "shorter than the period of " + circuit.period() + " s");
        }
        range("duty.openingDelay", circuit.openingDelay(), 0, 1e5, "0 to 100000 s");
        if (circuit.cycles() < 1 || circuit.cycles() > MOST_CYCLES) {
            throw new IllegalCaseException("cycles", Integer.toString(circuit.cycles()), "1 to " + MOST_CYCLES);
        }
        driver(circuit.driver());
        if (Machines.feelsMains(circuit)) {
            mains(circuit.mains());
        }
    }

    private static void mains(MainsSource mains) throws IllegalCaseException {
        if (mains == null) {
            throw new IllegalCaseException("mains", Double.NaN, "the mains voltage and frequency");
        }
        range("mains.voltage", mains.voltageRms(), 1e-3, 1e5, "0.001 to 100000 V");
        range("mains.frequency", mains.frequency(), 1, 1e4, "1 to 10000 Hz");
        range("mains.phase", mains.phase(), -1e4, 1e4, "a finite angle");
    }

    private static void coil(CoilCircuit coil) throws IllegalCaseException {
        range("coil.resistance20", coil.resistance20(), 1e-6, 1e9, "0.000001 to 1e9 Ω");
        range("coil.inductance", coil.inductanceOpen(), 1e-9, 1e5, "1e-9 to 1e5 H");
        range("coil.temperature", coil.temperature(), -100, 1000, "-100 to 1000 °C");
        if (!Double.isNaN(coil.pullInCurrent())) {
            range("coil.pullInCurrent", coil.pullInCurrent(), 1e-9, 1e6, "more than 0, at most 1e6 A");
        }
        if (!Double.isNaN(coil.dropOutCurrent())) {
            range("coil.dropOutCurrent", coil.dropOutCurrent(), 0, 1e6, "0 to 1e6 A");
        }
        if (!Double.isNaN(coil.inductanceClosed())) {
            range("coil.inductanceClosed", coil.inductanceClosed(), 1e-9, 1e5, "1e-9 to 1e5 H");
            if (coil.inductanceClosed() < coil.inductanceOpen()) {
                throw new IllegalCaseException("coil.inductanceClosed", coil.inductanceClosed(),
                        "not less than with the plunger open, " + coil.inductanceOpen() + " H");
            }
            if (Double.isNaN(coil.pullInCurrent())) {
                throw new IllegalCaseException("coil.pullInCurrent", coil.pullInCurrent(),
                        "the current at which the plunger moves, since two inductances are given");
            }
            if (coil.dropOutCurrent() > coil.pullInCurrent()) {
                throw new IllegalCaseException("coil.dropOutCurrent", coil.dropOutCurrent(),
                        "not more than the pull-in current, " + coil.pullInCurrent() + " A");
            }
        }
    }

    private static void driver(DriverCircuit driver) throws IllegalCaseException {
        range("driver.switchDrop", driver.switchDrop(), 0, 1e5, "0 to 100000 V");
        range("driver.clampVoltage", driver.clampVoltage(), 0, 1e5, "0 to 100000 V");
        if (driver instanceof DriverCircuit.LineCapacitor line) {
            range("driver.seriesResistance", line.seriesResistance(), 1e-6, 1e9, "0.000001 to 1e9 Ω");
            range("driver.capacitance", line.capacitance(), 1e-12, 1e3, "1e-12 to 1000 F");
            range("driver.rectifierDrop", line.rectifierDrop(), 0, 1e5, "0 to 100000 V");
            if (!Double.isNaN(line.bleedResistance())) {
                range("driver.bleedResistance", line.bleedResistance(), 1e-3, 1e15, "0.001 to 1e15 Ω");
            }
        } else if (driver instanceof DriverCircuit.TwoLevel twoLevel) {
            voltage("driver.pullInVoltage", twoLevel.pullInVoltage());
            range("driver.pullInTime", twoLevel.pullInTime(), 0, 1e5, "0 to 100000 s");
            range("driver.holdVoltage", twoLevel.holdVoltage(), 0, 1e5, "0 to 100000 V");
            if (twoLevel.levelChange() == null) {
                throw new IllegalCaseException("driver.levelChange", Double.NaN, "source or freewheel");
            }
        } else if (driver instanceof DriverCircuit.FixedDc fixed) {
            voltage("driver.outputVoltage", fixed.outputVoltage());
        } else if (driver instanceof DriverCircuit.CurrentRegulated regulated) {
            voltage("driver.busVoltage", regulated.busVoltage());
            range("driver.peakCurrent", regulated.peakCurrent(), 1e-9, 1e6, "more than 0, at most 1e6 A");
            range("driver.peakTime", regulated.peakTime(), 0, 1e5, "0 to 100000 s");
            range("driver.holdCurrent", regulated.holdCurrent(), 0, 1e6, "0 to 1e6 A");
        }
    }

    private static void voltage(String field, double value) throws IllegalCaseException {
        range(field, value, 1e-6, 1e5, "more than 0, at most 100000 V");
    }

    private static void range(String field, double value, double least, double most, String expected) throws IllegalCaseException {
        if (!(value >= least && value <= most)) {
            throw new IllegalCaseException(field, value, expected);
        }
    }
}
