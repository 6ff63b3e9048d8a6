package coilbook.electrics;

/**
 * A coil as a circuit element. NaN stands for "not given" where so marked.
 *
 * @param resistance20 winding resistance at 20 °C, Ω
 * @param inductanceOpen inductance before the plunger moves, H
 * @param inductanceClosed inductance with the plunger pulled in, H; NaN: the same as before
 * @param pullInCurrent current at which the plunger moves, A; NaN: not given
 * @param dropOutCurrent current at which the plunger falls back, A; NaN: not given
 * @param temperature mean winding temperature, °C
 */
public record CoilCircuit(double resistance20, double inductanceOpen, double inductanceClosed, double pullInCurrent, double dropOutCurrent,
        double temperature) {

    /** Winding resistance at the winding's temperature, Ω. */
    public double resistance() {
        return Copper.resistanceAt(resistance20, temperature);
    }

    public CoilCircuit atTemperature(double celsius) {
        return new CoilCircuit(resistance20, inductanceOpen, inductanceClosed, pullInCurrent, dropOutCurrent, celsius);
    }
}
