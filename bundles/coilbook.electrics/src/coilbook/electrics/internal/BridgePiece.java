package coilbook.electrics.internal;

/**
 * The coil freewheels through the rectifier bridge: the capacitor is empty and all four diodes conduct, so that the bus stays at minus the
 * bridge drop while the mains still drives a current through the series resistor. It lasts as long as the coil carries more than that.
 */
final class BridgePiece extends Piece {

    private final LineParameters line;
    private final double inductance;
    private final double rate;
    private final double target;
    private double theta;
    private double startCurrent;

    BridgePiece(LineParameters line, double inductance) {
        this.line = line;
        this.inductance = inductance;
        rate = line.resistance / inductance;
        target = -(line.bridgeDrop + line.switchDrop) / line.resistance;
    }

    void start(double current0, double theta0) {
        startCurrent = current0;
        theta = theta0;
    }

    @Override
    void at(double elapsed) {
        bus = -line.bridgeDrop;
        current = startCurrent - (target - startCurrent) * Math.expm1(-rate * elapsed);
        slope = (bus - line.switchDrop - line.resistance * current) / inductance;
        mains = Math.abs(line.mainsPeak * Math.sin(theta + line.omega * elapsed));
        drawn = mains / line.seriesResistance;
        rectified = current - line.bleedConductance * line.bridgeDrop;
    }

    @Override
    double margin() {
        return current - drawn - line.bleedConductance * line.bridgeDrop;
    }

    @Override
    double panel(double elapsed) {
        return Math.min(2 / line.omega, panelForDecay(rate, elapsed));
    }
}
