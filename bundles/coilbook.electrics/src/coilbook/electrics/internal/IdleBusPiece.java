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

    /**
     * While charging, the rectifier conducts until past the crest of the mains: before it, the capacitor cannot rise as steeply as the mains. Gives
     * the time at which it ends, or the length if that is sooner.
     */
    double conductsFor(double length) {
        double crest = Math.min(length, Math.max(0, (0.5 * Math.PI - theta) / line.omega));
        double end = Math.min(length, (Math.PI - theta) / line.omega);
        at(crest);
        double atCrest = margin();
        if (length <= crest || !(atCrest > 0)) {
            return crest;
        }
        at(end);
        double atEnd = margin();
        return atEnd > 0 ? end : Roots.marginEnds(this, crest, atCrest, end, atEnd);
    }

    /** Highest drawn current of a charge, A, or no more than the given one if it is not higher: the drawn current has a single crest. */
    double drawnCrest(double length, double known) {
        at(0.5 * length);
        if (2 * drawn < known) {
            return drawn;
        }
        double low = 0;
        double high = length;
        for (int step = 0; step < 25; step++) {
            double third = (high - low) / 3;
            at(low + third);
            double left = drawn;
            at(high - third);
            if (left < drawn) {
                low += third;
            } else {
                high -= third;
            }
        }
        return drawn;
    }

    /** Integral of the square of the drawn current while charging, A²·s: that of a constant, a sine, a cosine and an exponential. */
    double drawnSquare(double length) {
        double series = line.seriesResistance;
        double omega = line.omega;
        double a = -(line.bridgeDrop + constant) / series;
        double b = (line.mainsPeak - sineGain) / series;
        double c = -cosineGain / series;
        double d = -free / series;
        double sine0 = Math.sin(theta);
        double cosine0 = Math.cos(theta);
        double angle = theta + omega * length;
        double sine1 = Math.sin(angle);
        double cosine1 = Math.cos(angle);
        double decay = Math.exp(-rate * length);
        double sineIntegral = (cosine0 - cosine1) / omega;
        double cosineIntegral = (sine1 - sine0) / omega;
        double twist = (sine1 * cosine1 - sine0 * cosine0) / omega;
        double sineSquare = 0.5 * (length - twist);
        double cosineSquare = 0.5 * (length + twist);
        double product = 0.5 * (sine1 * sine1 - sine0 * sine0) / omega;
        double scale = 1 / (rate * rate + omega * omega);
        double decaySine = scale * (rate * sine0 + omega * cosine0 - decay * (rate * sine1 + omega * cosine1));
        double decayCosine = scale * (rate * cosine0 - omega * sine0 - decay * (rate * cosine1 - omega * sine1));
        double decayIntegral = (1 - decay) / rate;
        double decaySquare = (1 - decay * decay) / (2 * rate);
        double square = a * a * length + b * b * sineSquare + c * c * cosineSquare + d * d * decaySquare
                + 2 * (a * (b * sineIntegral + c * cosineIntegral + d * decayIntegral) + b * (c * product + d * decaySine)
                        + c * d * decayCosine);
        return Math.max(0, square);
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
