package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.DriverCircuit;
import coilbook.fleet.LevelChange;

/**
 * Drivers whose output does not feel the mains: two-level, fixed direct voltage, current-regulated. Every stretch is one exponential or a
 * constant current, in closed form.
 */
final class RegulatedMachine extends CycleMachine {

    private final DriverCircuit driver;
    private final SteadyCurrentPiece piece = new SteadyCurrentPiece();

    RegulatedMachine(CircuitCase circuit) {
        super(circuit);
        driver = circuit.driver();
    }

    @Override
    void rest(double phase) {
        // a regulated source has no state of its own
    }

    @Override
    void setSource(double voltage) {
        // as above
    }

    @Override
    double source() {
        return 0;
    }

    @Override
    long work() {
        return 1;
    }

    @Override
    void begin() {
        if (driver instanceof DriverCircuit.TwoLevel twoLevel) {
            sourceAtSwitchOn = twoLevel.pullInVoltage();
            sourcePeak = Math.max(twoLevel.pullInVoltage(), onTime > twoLevel.pullInTime() ? twoLevel.holdVoltage() : 0);
        } else if (driver instanceof DriverCircuit.FixedDc fixed) {
            sourceAtSwitchOn = fixed.outputVoltage();
            sourcePeak = sourceAtSwitchOn;
        } else if (driver instanceof DriverCircuit.CurrentRegulated regulated) {
            sourceAtSwitchOn = regulated.busVoltage();
            sourcePeak = sourceAtSwitchOn;
        }
    }

    @Override
    void on() {
        if (plunger.closesAt() <= current) {
            movePlunger(0);
        }
        double change = changeTime();
        between(0, Math.min(change, holdStart), true);
        if (change < holdStart) {
            between(change, holdStart, false);
        }
        between(holdStart, Math.max(holdStart, Math.min(change, onTime)), true);
        if (change < onTime) {
            between(Math.max(change, holdStart), onTime, false);
        }
    }

    /** Time at which the driver passes from its first to its second level, s. */
    private double changeTime() {
        if (driver instanceof DriverCircuit.TwoLevel twoLevel) {
            return twoLevel.pullInTime();
        }
        return driver instanceof DriverCircuit.CurrentRegulated regulated ? regulated.peakTime() : Double.POSITIVE_INFINITY;
    }

    private void between(double from, double to, boolean first) {
        if (driver instanceof DriverCircuit.TwoLevel twoLevel) {
            twoLevel(twoLevel, from, to, first);
        } else if (driver instanceof DriverCircuit.FixedDc fixed) {
            voltage(fixed.outputVoltage(), from, to, Double.POSITIVE_INFINITY);
        } else if (driver instanceof DriverCircuit.CurrentRegulated regulated) {
            regulate(regulated, from, to, first ? regulated.peakCurrent() : regulated.holdCurrent());
        }
    }

    private void twoLevel(DriverCircuit.TwoLevel twoLevel, double from, double to, boolean first) {
        double time = from;
        if (!first && twoLevel.levelChange() == LevelChange.FREEWHEEL) {
            time = freewheelTo(twoLevel.holdVoltage() / resistance, from, to, 0);
        }
        voltage(first ? twoLevel.pullInVoltage() : twoLevel.holdVoltage(), time, to, Double.POSITIVE_INFINITY);
    }

    /** Freewheels into the clamp until the current is at the given value or the time is over; gives the time reached. */
    private double freewheelTo(double value, double from, double to, double shown) {
        if (current <= value || from >= to) {
            return from;
        }
        piece.start(current, -clampVoltage, resistance, plunger.inductance(), shown);
        double wait = piece.timeTo(value);
        double length = Math.min(wait, to - from);
        observe(from, length, false);
        freewheel(piece, from, length);
        if (wait > to - from) {
            return to;
        }
        current = value;
        return from + length;
    }

    /** The coil on a source voltage until the current is at a set point from below or the time is over; gives the time reached. */
    private double voltage(double source, double from, double to, double setPoint) {
        double time = from;
        while (time < to) {
            double drive = source - switchDrop;
            if (current <= 0 && drive <= 0) {
                current = 0;
                piece.startConstant(0, source);
                observe(time, to - time, true);
                return to;
            }
            piece.start(current, drive, resistance, plunger.inductance(), source);
            double left = to - time;
            double closes = rising(plunger.closesAt());
            double set = rising(setPoint);
            double zero = drive < 0 ? piece.timeTo(0) : Double.POSITIVE_INFINITY;
            double length = Math.min(Math.min(left, zero), Math.min(closes, set));
            observe(time, length, true);
            double charge = piece.charge(length);
            totals.add(Totals.SOURCE_ENERGY, source * charge);
            totals.add(Totals.SWITCH, charge);
            totals.add(Totals.CURRENT_SQUARE, piece.square(length));
            piece.at(length);
            current = Math.max(0, piece.current);
            time = length < left ? time + length : to;
            if (length == closes) {
                current = plunger.closesAt();
                movePlunger(time);
            } else if (length == set) {
                current = setPoint;
                return time;
            } else if (length == zero) {
                current = 0;
            }
        }
        return to;
    }

    private double rising(double value) {
        return value > current && value < Double.POSITIVE_INFINITY ? piece.timeTo(value) : Double.POSITIVE_INFINITY;
    }

    private void regulate(DriverCircuit.CurrentRegulated regulated, double from, double to, double setPoint) {
        double bus = regulated.busVoltage();
        double time = freewheelTo(setPoint, from, to, 0);
        boolean reaches = bus - switchDrop >= setPoint * resistance;
        while (time < to) {
            if (current >= setPoint && reaches) {
                chop(bus, setPoint, time, to);
                return;
            }
            time = voltage(bus, time, to, reaches ? setPoint : Double.POSITIVE_INFINITY);
        }
    }

    /** The current held at a set point by switching between bus and clamp; shares of time follow from the mean voltage of the coil being i·R. */
    private void chop(double bus, double setPoint, double from, double to) {
        double length = to - from;
        piece.startConstant(setPoint, bus);
        observe(from, length, true);
        double swing = bus - switchDrop + clampVoltage;
        double share = swing > 0 ? (setPoint * resistance + clampVoltage) / swing : 1;
        double charge = setPoint * length;
        totals.add(Totals.SOURCE_ENERGY, bus * charge * share);
        totals.add(Totals.SWITCH, charge * share);
        totals.add(Totals.CLAMP, charge * (1 - share));
        totals.add(Totals.CURRENT_SQUARE, setPoint * charge);
        current = setPoint;
    }

    private void observe(double from, double length, boolean driven) {
        if (from >= holdStart) {
            totals.add(Totals.HOLD_CURRENT, piece.charge(length));
            totals.add(Totals.HOLD_SQUARE, piece.square(length));
        }
        piece.at(length);
        double end = piece.current;
        double endSlope = piece.slope;
        piece.at(0);
        observer.stretch(piece, from, 0, piece.current, piece.slope, length, end, endSlope);
        if (sink != null) {
            sink.source(piece, from, length);
            if (driven) {
                sink.coil(piece, from, length);
            }
        }
    }

    private void movePlunger(double time) {
        current = plunger.close(current);
        observer.plungerClosed(time, current, plunger.holdsFluxAt());
    }

    @Override
    void off() {
        releaseCoil();
        if (sink != null) {
            piece.startConstant(0, 0);
            sink.source(piece, onTime, period - onTime);
        }
    }

    @Override
    double storedInSource() {
        return 0;
    }

    @Override
    double seriesResistance() {
        return 0;
    }

    @Override
    double rectifierDrop() {
        return 0;
    }

    @Override
    double bleedConductance() {
        return 0;
    }

    @Override
    double drawnPeak() {
        return 0;
    }
}
