package coilbook.electrics;

/**
 * A coil's figures in SI units, for all coils of the channel taken together; NaN: not known.
 *
 * @param lowestResistance20 least winding resistance at 20 °C: catalogue less its tolerance, or a measured one less the instrument's, Ω
 * @param resistance20 nominal, Ω
 * @param highestResistance20 Ω
 * @param inductance plunger open, H
 * @param inductanceClosed plunger pulled in, H; NaN: taken as with the plunger open
 * @param pullInCurrent A
 * @param dropOutCurrent A
 * @param thermalResistance winding to ambient, K/W
 * @param highestDissipation continuous, W, at dissipationAmbient, °C: stands in for a missing thermal resistance
 * @param classLimit limit of the insulation class, °C
 * @param hotSpotAllowance kept between mean winding and class limit, K
 */
public record CoilFigures(double lowestResistance20, double resistance20, double highestResistance20, double inductance,
        double inductanceClosed, double pullInCurrent, double dropOutCurrent, double thermalResistance, double highestDissipation,
        double dissipationAmbient, double classLimit, double hotSpotAllowance) {

    /** Highest mean winding temperature, °C. */
    public double highestWindingTemperature() {
        return classLimit - hotSpotAllowance;
    }

    /**
     * Thermal resistance, K/W: as given, else the bound that follows from the highest dissipation, which heats the winding to its class limit
     * less the allowance at most; NaN if neither is known.
     */
    public double thermalResistanceOrBound() {
        return Double.isNaN(thermalResistance) ? (highestWindingTemperature() - dissipationAmbient) / highestDissipation
                : thermalResistance;
    }
}
