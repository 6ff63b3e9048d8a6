package coilbook.electrics.internal;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.IllegalCaseException;

/** A line-operated capacitor driver with its coil. */
final class LineMachine extends CycleMachine {

    /** Pieces shorter than this share of the cycle that follow one another mean that two limits chatter within rounding. */
    private static final double TRIFLE = 1e-9;
    private static final int CHATTER = 6;
    /** By this share of the mains peak the capacitor must exceed the switch drop before a coil at rest takes over. */
    private static final double WAKE = 1e-12;
    /** Nearer to the crest than this, rad, a charge is nothing. */
    private static final double CREST = 1e-6;

    private final LineParameters line;
    private final Walker walker;
    private final CoilBusPiece[] charging;
    private final CoilBusPiece[] draining;
    private final BridgePiece[] bridge;
    private final IdleBusPiece idleCharging;
    private final IdleBusPiece idleResting;
    private final Recurrence begins;
    private final Recurrence leavesBridge;
    private final double phaseStep;

    private double bus;
    private double phase;
    private boolean conducting;
    private boolean bridging;
    private boolean carrying;
    private int trifles;
    private double blind;
    private Recurrence mark;

    LineMachine(CircuitCase circuit, DriverCircuit.LineCapacitor driver) {
        super(circuit);
        line = new LineParameters(circuit, driver);
        walker = new Walker(totals, observer);
        double open = plunger.openInductance();
        double closed = plunger.closedInductance();
        charging = new CoilBusPiece[] { new CoilBusPiece(line, open, true), new CoilBusPiece(line, closed, true) };
        draining = new CoilBusPiece[] { new CoilBusPiece(line, open, false), new CoilBusPiece(line, closed, false) };
        bridge = new BridgePiece[] { new BridgePiece(line, open), new BridgePiece(line, closed) };
        idleCharging = new IdleBusPiece(line, true);
        idleResting = new IdleBusPiece(line, false);
        double halfWave = Math.PI / line.omega;
        double currentScale = line.mainsPeak / resistance;
        begins = new Recurrence(halfWave, line.mainsPeak, currentScale);
        leavesBridge = new Recurrence(halfWave, line.mainsPeak, currentScale);
        phaseStep = phaseStep(circuit.mains().frequency(), circuit.cyclesPerSecond());
    }

    /** By how much the phase within the half-wave moves from one switch-on to the next, rad. */
    static double phaseStep(double frequency, double cyclesPerSecond) {
        double halfWaves = 2 * frequency / cyclesPerSecond;
        return Math.PI * (halfWaves - Math.rint(halfWaves));
    }

    @Override
    void rest(double startPhase) {
        bus = line.fullCharge();
        phase = LineParameters.halfWave(startPhase);
    }

    @Override
    void setSource(double voltage) {
        bus = voltage;
    }

    @Override
    double source() {
        return bus;
    }

    @Override
    long work() {
        return walker.work();
    }

    @Override
    void begin() {
        sourceAtSwitchOn = bus;
        walker.clear();
        walker.busPeak = bus;
        conducting = line.forward(bus, phase) > 0;
        bridging = false;
        carrying = current > 0 || bus > line.switchDrop;
        trifles = 0;
        blind = 0;
    }

    @Override
    void on() throws IllegalCaseException {
        if (plunger.closesAt() <= current) {
            movePlunger(0);
        }
        run(0, holdStart, false);
        run(holdStart, onTime, true);
    }

    private void run(double from, double to, boolean hold) throws IllegalCaseException {
        begins.forget();
        leavesBridge.forget();
        double time = from;
        while (time < to) {
            int inductance = plunger.isClosed() ? 1 : 0;
            double theta = phase + line.omega * time;
            double left = to - time;
            double went;
            mark = null;
            if (bridging) {
                went = bridgeStretch(bridge[inductance], theta, time, left, hold);
            } else if (carrying) {
                went = carryStretch((conducting ? charging : draining)[inductance], theta, time, left, hold);
            } else {
                went = idleStretch(conducting ? idleCharging : idleResting, theta, time, left, hold);
            }
            time = went < left ? time + went : to;
            guard(went);
            if (mark != null && sink == null) {
                time = repeat(mark, time, to);
            }
        }
    }

    private void turnRectifier() {
        conducting = !conducting;
        mark = conducting ? begins : null;
    }

    private double carryStretch(CoilBusPiece piece, double theta, double time, double left, boolean hold) throws IllegalCaseException {
        piece.start(bus, current, theta, plunger.closesAt());
        double went = walker.walk(piece, time, left, blind, true, hold);
        take(piece, time, went);
        if (walker.ended()) {
            switch (piece.ending()) {
                case RECTIFIER -> turnRectifier();
                case EMPTY -> {
                    bus = -line.bridgeDrop;
                    bridging = current > piece.mains / line.seriesResistance + line.bleedConductance * line.bridgeDrop;
                }
                case NO_CURRENT -> {
                    current = 0;
                    carrying = bus > line.switchDrop;
                }
                case PLUNGER -> movePlunger(time + went);
            }
        }
        return went;
    }

    private double bridgeStretch(BridgePiece piece, double theta, double time, double left, boolean hold) throws IllegalCaseException {
        piece.start(current, theta);
        double went = walker.walk(piece, time, left, blind, true, hold);
        take(piece, time, went);
        if (walker.ended()) {
            bridging = false;
            conducting = true;
            carrying = current > 0;
            mark = leavesBridge;
        }
        return went;
    }

    private double idleStretch(IdleBusPiece piece, double theta, double time, double left, boolean hold) throws IllegalCaseException {
        piece.start(bus, theta, line.switchDrop + WAKE * line.mainsPeak);
        double went = walker.walk(piece, time, left, blind, true, hold);
        take(piece, time, went);
        current = 0;
        if (walker.ended()) {
            if (piece.woke()) {
                carrying = true;
            } else {
                turnRectifier();
            }
        }
        return went;
    }

    private void take(Piece piece, double time, double went) {
        bus = piece.bus;
        current = Math.max(0, piece.current);
        if (sink != null) {
            sink.source(piece, time, went);
            sink.coil(piece, time, went);
        }
    }

    private void movePlunger(double time) {
        current = plunger.close(current);
        observer.plungerClosed(time, current, plunger.holdsFluxAt());
        begins.forget();
        leavesBridge.forget();
    }

    /** Makes sure that time goes on where two limits lie within rounding of each other. */
    private void guard(double went) {
        if (went > TRIFLE * period) {
            trifles = 0;
            blind = 0;
        } else if (++trifles > CHATTER) {
            blind = Math.max(2 * blind, 1e-3 * TRIFLE * period);
        }
    }

    /** Skips half-waves that would only repeat the last one; gives the time reached. */
    private double repeat(Recurrence recurrence, double time, double to) {
        double repetitions = recurrence.met(time, bus, current) ? Math.floor((to - time) / recurrence.length()) : 0;
        if (repetitions > 0) {
            totals.repeatSince(recurrence.totals(), repetitions);
            recurrence.forget();
            return Math.min(to, time + repetitions * recurrence.length());
        }
        recurrence.note(time, bus, current, totals);
        return time;
    }

    @Override
    void off() throws IllegalCaseException {
        double coilCurrent = current;
        bridging = false;
        current = 0;
        recharge();
        current = coilCurrent;
        releaseCoil();
        sourcePeak = walker.busPeak;
        phase = LineParameters.halfWave(phase + phaseStep);
    }

    /** The capacitor alone, while the coil goes its own way. */
    private void recharge() throws IllegalCaseException {
        begins.forget();
        double time = onTime;
        conducting = line.forward(bus, phase + line.omega * time) > 0;
        while (time < period) {
            double theta = phase + line.omega * time;
            double left = period - time;
            IdleBusPiece piece = conducting ? idleCharging : idleResting;
            piece.start(bus, theta, Double.POSITIVE_INFINITY);
            double went;
            boolean ended;
            if (line.bleedConductance > 0) {
                went = walker.walk(piece, time, left, blind, false, false);
                ended = walker.ended();
            } else if (conducting) {
                went = charge(piece, left, blind);
                ended = went < left;
            } else {
                went = Math.min(left, Math.max(blind, untilForward(theta)));
                ended = went < left;
                piece.at(went);
            }
            bus = piece.bus;
            if (sink != null) {
                sink.source(piece, time, went);
            }
            time = went < left ? time + went : period;
            guard(went);
            if (ended) {
                conducting = !conducting;
                if (conducting && sink == null) {
                    time = repeat(begins, time, period);
                }
            }
        }
    }

    /** One charge of the resting capacitor in closed form: what the rectifier carried is on the capacitor. Gives its length. */
    private double charge(IdleBusPiece piece, double left, double atLeast) {
        double went = Math.min(left, Math.max(atLeast, piece.conductsFor(left)));
        walker.drawnPeak = Math.max(walker.drawnPeak, piece.drawnCrest(went, walker.drawnPeak));
        double square = piece.drawnSquare(went);
        piece.at(went);
        double carried = line.capacitance * (piece.bus - bus);
        totals.add(Totals.DRAWN_SQUARE, square);
        totals.add(Totals.RECTIFIER, carried);
        totals.add(Totals.SOURCE_ENERGY, line.seriesResistance * square + line.bridgeDrop * carried
                + 0.5 * line.capacitance * (piece.bus - bus) * (piece.bus + bus));
        walker.busPeak = Math.max(walker.busPeak, piece.bus);
        return went;
    }

    /** Time until the mains next exceeds the resting capacitor, s; infinity if it never does. */
    private double untilForward(double theta) {
        double share = (bus + line.bridgeDrop) / line.mainsPeak;
        if (share >= 1) {
            return Double.POSITIVE_INFINITY;
        }
        double angle = LineParameters.halfWave(theta);
        double rise = Math.asin(Math.max(0, share));
        // at rest past the crest the mains is falling below the capacitor: the next half-wave is meant, whatever rounding says
        double wait = angle > 0.5 * Math.PI - CREST ? Math.PI + rise - angle : Math.max(0, rise - angle);
        return wait / line.omega;
    }

    @Override
    double storedInSource() {
        return 0.5 * line.capacitance * bus * bus;
    }

    @Override
    double seriesResistance() {
        return line.seriesResistance;
    }

    @Override
    double rectifierDrop() {
        return line.bridgeDrop;
    }

    @Override
    double bleedConductance() {
        return line.bleedConductance;
    }

    @Override
    double drawnPeak() {
        return walker.drawnPeak;
    }
}
