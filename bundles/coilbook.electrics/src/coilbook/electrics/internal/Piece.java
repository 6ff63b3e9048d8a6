package coilbook.electrics.internal;

/**
 * A stretch of time over which the circuit is linear and has an exact solution. {@link #at} sets the fields for a time since the piece
 * began; nothing is allocated. Units: V, A, A/s, s.
 */
abstract class Piece {

    /** No limit on the length of a panel. */
    static final double UNLIMITED = Double.MAX_VALUE;

    /** Voltage of the capacitor, or of the regulated source. */
    double bus;
    /** Coil current. */
    double current;
    /** Rate of change of the coil current. */
    double slope;
    /** Current drawn from the mains through the rectifier. */
    double drawn;
    /** Current through the rectifier: the drawn one, and what freewheels through the bridge. */
    double rectified;
    /** Rectified mains voltage ahead of the series resistor. */
    double mains;

    abstract void at(double elapsed);

    /** Positive while the equations of this piece hold, for the state last set by {@link #at}. */
    abstract double margin();

    /** Longest step over which eight Gauss points integrate squares to better than 1e-10, from a time since the piece began. */
    abstract double panel(double elapsed);

    /** Length of the panels whose points can be had by {@link #standardPoint}; 0 if there are none. */
    double standardPanel() {
        return 0;
    }

    /** Begins a panel of standard length from the state at its start. */
    void beginStandard(double elapsed, double startBus, double startCurrent) {
        throw new IllegalStateException("no standard panel");
    }

    /** Sets the fields for a point of the standard panel: 1 to 8 the Gauss points, 9 the end. */
    void standardPoint(int index) {
        throw new IllegalStateException("no standard panel");
    }

    /** Panel length that follows a decay of the given rate: short at first, wider as it dies away. */
    static double panelForDecay(double rate, double elapsed) {
        double decayed = rate * elapsed;
        return decayed > 40 || rate <= 0 ? UNLIMITED : (2 + decayed / 3) / rate;
    }
}
