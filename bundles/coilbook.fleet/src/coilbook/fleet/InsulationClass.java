package coilbook.fleet;

/**
 * Thermal class of an insulation system by IEC 60085; the letter is the customary one. The limit is the highest temperature of the
 * hottest spot, in °C.
 */
public enum InsulationClass implements Labelled {
    Y(90), A(105), E(120), B(130), F(155), H(180), N(200), R(220);

    private final int limitCelsius;

    InsulationClass(int limitCelsius) {
        this.limitCelsius = limitCelsius;
    }

    /** Highest temperature of the class in °C. */
    public int limitCelsius() {
        return limitCelsius;
    }

    @Override
    public String label() {
        return name();
    }
}
