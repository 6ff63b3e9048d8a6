package coilbook.electrics.internal;

import coilbook.electrics.CoilCircuit;

/**
 * Where the plunger is, and the inductance that goes with it. Flux linkage is continuous when it moves; ½λ²(1/L_open − 1/L_closed) is the work
 * done on it. It moves in when the current first reaches the pull-in current and back, after switch-off, at the drop-out current: troughs during
 * the on-time do not let it go, since the ride-through time is mechanical and judged elsewhere.
 */
final class Plunger {

    private final double openInductance;
    private final double closedInductance;
    private final double pullIn;
    private final boolean moves;
    private boolean closed;
    private double work;

    Plunger(CoilCircuit coil) {
        openInductance = coil.inductanceOpen();
        moves = !Double.isNaN(coil.inductanceClosed()) && coil.inductanceClosed() != openInductance;
        closedInductance = moves ? coil.inductanceClosed() : openInductance;
        pullIn = coil.pullInCurrent();
    }

    void release() {
        closed = false;
        work = 0;
    }

    void clearWork() {
        work = 0;
    }

    boolean isClosed() {
        return closed;
    }

    double inductance() {
        return closed ? closedInductance : openInductance;
    }

    double openInductance() {
        return openInductance;
    }

    double closedInductance() {
        return closedInductance;
    }

    /** Current at which it will move in, A; infinity if it will not. */
    double closesAt() {
        return moves && !closed ? pullIn : Double.POSITIVE_INFINITY;
    }

    /** Moves it in; gives the current after the move. */
    double close(double current) {
        double flux = openInductance * current;
        work += 0.5 * flux * flux * (1 / openInductance - 1 / closedInductance);
        closed = true;
        return flux / closedInductance;
    }

    /** Moves it back; gives the current after the move. */
    double open(double current) {
        double flux = closedInductance * current;
        work -= 0.5 * flux * flux * (1 / openInductance - 1 / closedInductance);
        closed = false;
        return flux / openInductance;
    }

    /** Current, A, at which the flux is that of pull-in, with the present inductance. */
    double holdsFluxAt() {
        return pullIn * openInductance / inductance();
    }

    /** Work done on it since last cleared, J. */
    double work() {
        return work;
    }
}
