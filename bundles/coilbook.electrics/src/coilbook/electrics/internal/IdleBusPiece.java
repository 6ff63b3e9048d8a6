package coilbook.electrics.internal;

/**
 * The capacitor without the coil: charged through the rectifier or resting. While the switch is on and no current flows, the coil takes over
 * as soon as the capacitor exceeds the switch drop.
 */
final class IdleBusPiece extends Piece {

    private final LineParameters line;
    private final boolean conducting;
    private final double rate;
    private final double constant;
    private double sineGain;
    private double cosineGain;
    private double theta;
    private double free;
    private double wakesAt;

    IdleBusPiece(LineParameters line, boolean conducting) {
        this.line = line;
        this.conducting = conducting;
        double source = conducting ? 1 / line.seriesResistance : 0;
        double conductance = source + line.bleedConductance;
        rate = conductance / line.capacitance;
        constant = conducting ? -source * line.bridgeDrop / conductance : 0;
        if (conducting) {
            double force = source * line.mainsPeak / line.capacitance / (rate * rate + line.omega * line.omega);
            sineGain = force * rate;
            cosineGain = -force * line.omega;
        }
    }

    /** Begins the piece; wakesAt: capacitor voltage at which the coil begins to carry current, or infinity. */
    void start(double bus0, double theta0, double wakes) {
        theta = conducting ? LineParameters.halfWave(theta0) : theta0;
        wakesAt = wakes;
        free = bus0 - constant - sineGain * Math.sin(theta) - cosineGain * Math.cos(theta);
    }

    @Override
    void at(double elapsed) {
        current = 0;
        slope = 0;
        bus = constant + (rate == 0 ? free : free * Math.exp(-rate * elapsed));
        double angle = theta + line.omega * elapsed;
        double sine = Math.sin(angle);
        if (conducting) {
            bus += sineGain * sine + cosineGain * Math.cos(angle);
            mains = line.mainsPeak * sine;
            drawn = (mains - line.bridgeDrop - bus) / line.seriesResistance;
        } else {
            mains = Math.abs(line.mainsPeak * sine);
            drawn = 0;
        }
        rectified = drawn;
    }

    @Override
    double margin() {
        double forward = mains - line.bridgeDrop - bus;
        return Math.min(conducting ? forward : -forward, wakesAt - bus);
    }

    /** True if the coil, not the rectifier, ended the piece. */
    boolean woke() {
        return wakesAt - bus <= margin();
    }

    @Override
    double panel(double elapsed) {
        return Math.min((conducting ? 2 : 2.5) / line.omega, panelForDecay(rate, elapsed));
    }
}
