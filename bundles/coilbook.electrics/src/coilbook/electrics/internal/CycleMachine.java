package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CycleResult;
import coilbook.electrics.EnergyAccount;
import coilbook.electrics.IllegalCaseException;

/**
 * Runs a circuit cycle by cycle, carrying capacitor voltage, coil current and plunger from one to the next. One machine serves one thread; it
 * allocates nothing while it runs.
 */
abstract class CycleMachine {

    final double winding;
    final double resistance;
    final double period;
    final double onTime;
    final double holdStart;
    final double dropOut;
    final double clampVoltage;
    final double switchDrop;
    final Totals totals = new Totals();
    final Observer observer;
    final Plunger plunger;
    final SteadyCurrentPiece release = new SteadyCurrentPiece();

    double current;
    double sourceAtSwitchOn;
    double sourcePeak;
    SampleSink sink;

    private double currentAtSwitchOff;
    private double releaseTime;
    private double storedBefore;

    CycleMachine(CircuitCase circuit) {
        winding = circuit.coil().resistance();
        resistance = circuit.totalResistance();
        period = circuit.period();
        onTime = circuit.onTime();
        holdStart = 0.5 * onTime;
        dropOut = circuit.coil().dropOutCurrent();
        clampVoltage = circuit.driver().clampVoltage();
        switchDrop = circuit.driver().switchDrop();
        observer = new Observer(circuit.coil().pullInCurrent(), dropOut, holdStart, circuit.openingDelay());
        plunger = new Plunger(circuit.coil());
    }

    /** Puts the circuit into its state before the first switch-on, the mains at the given phase, rad. */
    final void restart(double phase) {
        current = 0;
        plunger.release();
        rest(phase);
    }

    /** Puts the circuit into a state before a switch-on: source voltage, V, coil current, A, plunger, and phase of the mains, rad. */
    final void resume(double source, double coilCurrent, boolean closed, double phase) {
        restart(phase);
        current = coilCurrent;
        if (closed) {
            plunger.close(0);
        }
        setSource(source);
    }

    /** Runs one cycle from switch-on to the next switch-on. */
    final void cycle() throws IllegalCaseException {
        totals.clear();
        plunger.clearWork();
        storedBefore = stored();
        observer.begin(current, plunger.holdsFluxAt());
        begin();
        on();
        observer.end(onTime);
        currentAtSwitchOff = current;
        off();
    }

    /** Source to its state at rest. */
    abstract void rest(double phase);

    /** Sets the source's own state, V. */
    abstract void setSource(double voltage);

    /** The source's own state, V. */
    abstract double source();

    /** Effort of the last cycle, in panels. */
    abstract long work();

    /** Notes the source at switch-on. */
    abstract void begin();

    /** From switch-on to switch-off. */
    abstract void on() throws IllegalCaseException;

    /** From switch-off to the next switch-on. */
    abstract void off() throws IllegalCaseException;

    /** Energy in the capacitor, J. */
    abstract double storedInSource();

    abstract double seriesResistance();

    abstract double rectifierDrop();

    abstract double bleedConductance();

    abstract double drawnPeak();

    private double stored() {
        return storedInSource() + 0.5 * plunger.inductance() * current * current;
    }

    /** The coil's own way after switch-off: into the clamp, to drop-out, to zero, at most to the end of the cycle. */
    final void releaseCoil() {
        releaseTime = current <= dropOut ? 0 : Double.NaN;
        double left = period - onTime;
        double since = 0;
        if (plunger.isClosed() && releaseTime == 0) {
            current = plunger.open(current);
        }
        while (left > since && current > 0) {
            release.start(current, -clampVoltage, resistance, plunger.inductance(), 0);
            double toZero = release.timeTo(0);
            double toDropOut = Double.isNaN(releaseTime) ? release.timeTo(dropOut) : Double.POSITIVE_INFINITY;
            if (Double.isNaN(toDropOut)) {
                toDropOut = Double.POSITIVE_INFINITY;
            }
            double length = Math.min(left - since, Math.min(toZero, toDropOut));
            freewheel(release, onTime + since, length);
            since += length;
            if (length == toDropOut) {
                current = dropOut;
                releaseTime = since;
                if (plunger.isClosed()) {
                    current = plunger.open(current);
                }
            } else if (length == toZero) {
                current = 0;
            } else {
                since = left;
            }
        }
        if (current == 0 && plunger.isClosed()) {
            plunger.open(0);
        }
        if (sink != null && since < left) {
            release.startConstant(0, 0);
            sink.coil(release, onTime + since, left - since);
        }
    }

    /** Adds a stretch in which the coil discharges into the clamp, and moves the current on. */
    final void freewheel(SteadyCurrentPiece piece, double start, double length) {
        totals.add(Totals.CLAMP, piece.charge(length));
        totals.add(Totals.CURRENT_SQUARE, piece.square(length));
        if (sink != null) {
            sink.coil(piece, start, length);
        }
        piece.at(length);
        current = Math.max(0, piece.current);
    }

    final CycleResult result(int number) {
        double square = totals.get(Totals.CURRENT_SQUARE);
        double bleed = bleedConductance() * totals.get(Totals.BUS_SQUARE);
        double drawn = totals.get(Totals.DRAWN_SQUARE);
        EnergyAccount energies = new EnergyAccount(totals.get(Totals.SOURCE_ENERGY), winding * square, (resistance - winding) * square,
                seriesResistance() * drawn, rectifierDrop() * totals.get(Totals.RECTIFIER), switchDrop * totals.get(Totals.SWITCH),
                clampVoltage * totals.get(Totals.CLAMP), bleed, plunger.work(), stored() - storedBefore);
        double holdLength = onTime - holdStart;
        return new CycleResult(number, sourceAtSwitchOn, sourcePeak, Math.max(0, observer.peak), observer.timeOfPeak, observer.timeToPullIn,
                observer.heldAtPullIn(), Math.max(0, totals.get(Totals.HOLD_CURRENT) / holdLength),
                Math.max(0, observer.holdMinimum),
                Math.sqrt(totals.get(Totals.HOLD_SQUARE) / holdLength), Math.max(0, observer.minimumAfterPeak),
                Math.max(0, observer.minimumAfterOpening()),
                observer.longestBelowDropOut(), currentAtSwitchOff, releaseTime, current, winding * square, Math.sqrt(square / period),
                Math.sqrt(drawn / period), drawnPeak(), energies);
    }
}
