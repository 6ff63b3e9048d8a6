package coilbook.electrics;

import java.util.Map;

/**
 * What is derived for a station, each value at the corner where its margin is least. SI units.
 *
 * @param peakAtLow highest coil current of the on-time, least over mains phase, low corner with hot winding, A
 * @param timeToPullIn longest over mains phase, low corner with hot winding, s; infinite: the pull-in current is not reached
 * @param heldAtPullIn how long the flux then stays at that of pull-in, s
 * @param breakEvenInductance up to which pull-in is met within the pull-in time or on-time, low corner, hot winding, H; regulated voltages only
 * @param holdMinimum least current from the later of peak and opening complete, over cold and hot winding and mains phase, A; infinite: the
 *            on-time ends before, hold does not apply
 * @param holdMean mean over the second half of the on-time, least over phase, low corner with hot winding, A
 * @param belowDropOut longest unbroken time below the drop-out current in that window, s
 * @param releaseTime longest from switch-off to the drop-out current, s; infinite: not before the next switch-on
 * @param peakAtHigh highest coil current, high corner, A
 * @param busPeak highest voltage of the capacitor or source, high corner, V
 * @param workingPeak recurring peak of coil and cable to the other pole, clamp included, high corner, V
 * @param windingTemperature steady mean, at duty, hot corner, °C; infinite: there is no steady temperature
 * @param saturationTemperature where a current-regulated drive has no steady temperature below it: at which the bus saturates, °C
 * @param stuckOnTemperature steady mean with the driver held on without end, hot corner, °C; infinite likewise
 * @param averagePower heat in the winding at duty, hot corner, W
 * @param holdPower heat in the winding in hold, nominal corner, W
 * @param nominalPeak nominal corner, A
 * @param nominalHold mean over the second half of the on-time, nominal corner, A
 * @param nominalTemperature steady mean winding temperature, nominal corner, °C
 * @param cycleRate highest cycle rates
 * @param mainsRms mains current at duty, high corner, A
 * @param apparentPower from the mains at duty, high corner, VA
 * @param mainsPeak highest mains current in a cycle, high corner, A; line-operated only
 * @param seriesResistorPower at duty, hot corner, W; line-operated only, as the next two
 * @param seriesResistorStuckOn with the driver held on, W
 * @param seriesResistorShorted with the output shorted and the driver on, W
 * @param storedEnergy in the capacitor at the highest mains, J
 * @param decayTime until the capacitor is at 60 V through its bleed resistor, s; infinite without one
 * @param cases the circuit of each corner at its winding temperature, for charts; corners that cannot be computed are left out
 */
public record StationElectrics(Derived peakAtLow, Derived timeToPullIn, Derived heldAtPullIn, Derived breakEvenInductance,
        Derived holdMinimum, Derived holdMean, Derived belowDropOut, Derived releaseTime, Derived peakAtHigh, Derived busPeak,
        Derived workingPeak, Derived windingTemperature, Derived saturationTemperature, Derived stuckOnTemperature, Derived averagePower,
        Derived holdPower, Derived nominalPeak, Derived nominalHold, Derived nominalTemperature, CycleRateLimit cycleRate,
        Derived mainsRms, Derived apparentPower, Derived mainsPeak, Derived seriesResistorPower, Derived seriesResistorStuckOn,
        Derived seriesResistorShorted, Derived storedEnergy, Derived decayTime, Map<Corner, CircuitCase> cases) {

    public StationElectrics {
        cases = Map.copyOf(cases);
    }
}
