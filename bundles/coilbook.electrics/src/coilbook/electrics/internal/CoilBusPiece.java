package coilbook.electrics.internal;

/**
 * Capacitor and coil joined by the closed switch, with the rectifier conducting or not. State: capacitor voltage v and coil current i,
 * <pre>
 * C dv/dt = gs (Vp sin θ − Vd − v) − i − gb v      (gs = 0 while the rectifier blocks)
 * L di/dt = v − Vsw − R i
 * </pre>
 * Solution: constant and sinusoidal response plus e^(−αt) times circular, linear or hyperbolic functions (textbook; REFERENCES 2.3).
 */
final class CoilBusPiece extends Piece {

    /** Panels of one length serve if the circuit's own time scale is not below this share of the mains'. */
    private static final double STIFF = 0.15;

    private final boolean conducting;
    private final double bridgeDrop;
    private final double switchDrop;
    private final double mainsPeak;
    private final double omega;
    private final double sourceConductance;
    private final double resistance;
    private final double inductance;
    private final double inverseCapacitance;

    private final double alpha;
    private final double delta;
    private final boolean swinging;
    /** Angular frequency when swinging, else half the difference of the two decay rates. */
    private final double beta;
    private final double slowRate;
    private final double fastRate;

    private final double busConstant;
    private final double currentConstant;
    private double busSine;
    private double busCosine;
    private double currentSine;
    private double currentCosine;

    /** Length of a standard panel, 0 if the circuit is too stiff for panels of one length. */
    private final double standard;
    private final double[] evenAt = new double[Walker.LAST + 1];
    private final double[] oddAt = new double[Walker.LAST + 1];
    private final double[] sineAt = new double[Walker.LAST + 1];
    private final double[] cosineAt = new double[Walker.LAST + 1];

    private double even;
    private double odd;
    private double panelSine;
    private double panelCosine;
    private double panelBusFree;
    private double panelCurrentFree;
    private double panelBusRate;
    private double panelCurrentRate;

    private double theta;
    private double busFree;
    private double currentFree;
    private double busFreeRate;
    private double currentFreeRate;
    private double closesAt;

    CoilBusPiece(LineParameters line, double inductance, boolean conducting) {
        this.conducting = conducting;
        this.inductance = inductance;
        bridgeDrop = line.bridgeDrop;
        switchDrop = line.switchDrop;
        mainsPeak = line.mainsPeak;
        omega = line.omega;
        resistance = line.resistance;
        sourceConductance = 1 / line.seriesResistance;
        inverseCapacitance = 1 / line.capacitance;
        double conductance = line.bleedConductance + (conducting ? sourceConductance : 0);
        double busRate = conductance * inverseCapacitance;
        double coilRate = resistance / inductance;
        double natural = inverseCapacitance / inductance;
        alpha = 0.5 * (busRate + coilRate);
        delta = 0.5 * (coilRate - busRate);
        double discriminant = delta * delta - natural;
        swinging = discriminant < 0;
        beta = Math.sqrt(Math.abs(discriminant));
        fastRate = alpha + beta;
        slowRate = (natural + busRate * coilRate) / fastRate;
        double drain = conducting ? sourceConductance * bridgeDrop : 0;
        currentConstant = -(drain + conductance * switchDrop) / (1 + conductance * resistance);
        busConstant = switchDrop + resistance * currentConstant;
        if (conducting) {
            double real = busRate * coilRate + natural - omega * omega;
            double imaginary = omega * (busRate + coilRate);
            double force = sourceConductance * mainsPeak * inverseCapacitance / (real * real + imaginary * imaginary);
            busSine = force * (coilRate * real + omega * imaginary);
            busCosine = force * (omega * real - coilRate * imaginary);
            currentSine = force * real / inductance;
            currentCosine = -force * imaginary / inductance;
        }
        double mainsPanel = mainsPanel();
        double shortest = Math.min(mainsPanel, naturalPanel(0));
        standard = shortest > STIFF * mainsPanel ? shortest : 0;
        for (int index = 1; index <= Walker.LAST; index++) {
            double offset = standard * (index == Walker.LAST ? 1 : Gauss.node(index - 1));
            propagate(offset);
            evenAt[index] = even;
            oddAt[index] = odd;
            sineAt[index] = Math.sin(omega * offset);
            cosineAt[index] = Math.cos(omega * offset);
        }
    }

    /** Begins the piece. Angle: that of the mains, rad; closesAt: current at which the plunger moves, or infinity. */
    void start(double startBus, double startCurrent, double startTheta, double startClosesAt) {
        theta = startTheta;
        closesAt = startClosesAt;
        busFree = startBus - busConstant;
        currentFree = startCurrent - currentConstant;
        if (conducting) {
            theta = LineParameters.halfWave(startTheta);
            double sine = Math.sin(theta);
            double cosine = Math.cos(theta);
            busFree -= busSine * sine + busCosine * cosine;
            currentFree -= currentSine * sine + currentCosine * cosine;
        }
        busFreeRate = delta * busFree - currentFree * inverseCapacitance;
        currentFreeRate = busFree / inductance - delta * currentFree;
    }

    /** Sets even and odd: e^(−αt) times cosine and times sine over frequency, or their hyperbolic or limiting likes. */
    private void propagate(double elapsed) {
        double angle = beta * elapsed;
        if (swinging) {
            double decay = Math.exp(-alpha * elapsed);
            even = decay * Math.cos(angle);
            odd = decay * Math.sin(angle) / beta;
        } else if (angle < 1e-3) {
            double square = angle * angle;
            double decay = Math.exp(-alpha * elapsed);
            even = decay * (1 + square * (0.5 + square / 24));
            odd = decay * elapsed * (1 + square * (1 / 6.0 + square / 120));
        } else {
            double slow = Math.exp(-slowRate * elapsed);
            double fast = Math.exp(-fastRate * elapsed);
            even = 0.5 * (slow + fast);
            odd = 0.5 * (slow - fast) / beta;
        }
    }

    @Override
    void at(double elapsed) {
        propagate(elapsed);
        bus = busConstant + even * busFree + odd * busFreeRate;
        current = currentConstant + even * currentFree + odd * currentFreeRate;
        double angle = theta + omega * elapsed;
        finish(Math.sin(angle), conducting ? Math.cos(angle) : 0);
    }

    /** Adds the forced response and sets what follows from bus and current. */
    private void finish(double sine, double cosine) {
        if (conducting) {
            bus += busSine * sine + busCosine * cosine;
            current += currentSine * sine + currentCosine * cosine;
            mains = mainsPeak * sine;
            drawn = (mains - bridgeDrop - bus) * sourceConductance;
        } else {
            mains = Math.abs(mainsPeak * sine);
            drawn = 0;
        }
        rectified = drawn;
        slope = (bus - switchDrop - resistance * current) / inductance;
    }

    @Override
    double standardPanel() {
        return standard;
    }

    @Override
    void beginStandard(double elapsed, double startBus, double startCurrent) {
        double angle = theta + omega * elapsed;
        panelSine = Math.sin(angle);
        panelCosine = Math.cos(angle);
        panelBusFree = startBus - busConstant - busSine * panelSine - busCosine * panelCosine;
        panelCurrentFree = startCurrent - currentConstant - currentSine * panelSine - currentCosine * panelCosine;
        panelBusRate = delta * panelBusFree - panelCurrentFree * inverseCapacitance;
        panelCurrentRate = panelBusFree / inductance - delta * panelCurrentFree;
    }

    @Override
    void standardPoint(int index) {
        bus = busConstant + evenAt[index] * panelBusFree + oddAt[index] * panelBusRate;
        current = currentConstant + evenAt[index] * panelCurrentFree + oddAt[index] * panelCurrentRate;
        finish(panelSine * cosineAt[index] + panelCosine * sineAt[index], panelCosine * cosineAt[index] - panelSine * sineAt[index]);
    }

    @Override
    double margin() {
        double forward = mains - bridgeDrop - bus;
        double rectifier = conducting ? Math.min(forward, bus + bridgeDrop) : -forward;
        return Math.min(rectifier, resistance * Math.min(current, closesAt - current));
    }

    /** What ended the piece, for the state last set. */
    Ending ending() {
        double forward = mains - bridgeDrop - bus;
        double least = conducting ? forward : -forward;
        Ending ending = Ending.RECTIFIER;
        if (conducting && bus + bridgeDrop < least) {
            least = bus + bridgeDrop;
            ending = Ending.EMPTY;
        }
        if (resistance * current < least) {
            least = resistance * current;
            ending = Ending.NO_CURRENT;
        }
        return resistance * (closesAt - current) < least ? Ending.PLUNGER : ending;
    }

    /** Ways in which the piece can end before its time. */
    enum Ending {
        RECTIFIER, EMPTY, NO_CURRENT, PLUNGER
    }

    @Override
    double panel(double elapsed) {
        return standard > 0 ? standard : Math.min(mainsPanel(), naturalPanel(elapsed));
    }

    private double mainsPanel() {
        return (conducting ? 2 : 2.5) / omega;
    }

    private double naturalPanel(double elapsed) {
        return swinging ? Math.min(panelForDecay(alpha, elapsed), alpha * elapsed > 40 ? UNLIMITED : 2 / beta)
                : Math.min(panelForDecay(fastRate, elapsed), panelForDecay(slowRate, elapsed));
    }
}
