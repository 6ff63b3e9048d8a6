package coilbook.electrics;

/**
 * Where the energy of one cycle went, from one switch-on to the next, J. What the source gave equals the sum of all others.
 *
 * @param source given by the mains or by the regulated source
 * @param winding heat in the winding, cable excluded
 * @param cable heat in the cable
 * @param seriesResistor heat in the series resistor of a line-operated driver
 * @param rectifier heat in the rectifier
 * @param outputSwitch heat in the output switch
 * @param clamp taken by the clamp during release and freewheeling
 * @param bleed heat in the bleed resistor
 * @param mechanical work done on the plunger, less what it gave back at drop-out
 * @param stored increase of what capacitor and coil hold
 */
public record EnergyAccount(double source, double winding, double cable, double seriesResistor, double rectifier, double outputSwitch,
        double clamp, double bleed, double mechanical, double stored) {

    /** Source less all uses, J: zero but for rounding. */
    public double imbalance() {
        return source - winding - cable - seriesResistor - rectifier - outputSwitch - clamp - bleed - mechanical - stored;
    }
}
