package coilbook.electrics;

/**
 * What one cycle came to, SI units. NaN: the threshold was not given or not reached.
 *
 * @param cycle number, from 1
 * @param sourceVoltageAtSwitchOn capacitor voltage, or the regulated voltage, V
 * @param sourceVoltagePeak highest in the cycle, V
 * @param peakCurrent highest coil current of the on-time, A
 * @param timeOfPeak from switch-on, s
 * @param timeToPullIn from switch-on until the current first reaches the pull-in current, s
 * @param heldAtPullIn how long the flux then stays at or above that of pull-in, at most to switch-off, s
 * @param holdMeanCurrent mean over the second half of the on-time, A
 * @param holdMinimumCurrent least of the second half of the on-time, A
 * @param holdRmsCurrent rms over the second half of the on-time, A
 * @param minimumAfterPeakCurrent least from the peak to switch-off, A
 * @param minimumAfterOpeningCurrent least from the later of peak and opening complete to switch-off, A; NaN if the on-time ends before
 * @param belowDropOut longest unbroken time below the drop-out current in that window, s; NaN if there is no window or no threshold
 * @param currentAtSwitchOff A
 * @param releaseTime from switch-off until the current falls to the drop-out current, s
 * @param residualCurrent coil current at the end of the cycle, A
 * @param windingEnergy heat in the winding from this switch-on to the next, cable excluded, J
 * @param coilRmsCurrent over the whole cycle, A
 * @param mainsRmsCurrent over the whole cycle, A; zero for a regulated source, whose input the model does not hold
 * @param mainsPeakCurrent A
 * @param energies the account of the whole cycle
 */
public record CycleResult(int cycle, double sourceVoltageAtSwitchOn, double sourceVoltagePeak, double peakCurrent, double timeOfPeak,
        double timeToPullIn, double heldAtPullIn, double holdMeanCurrent, double holdMinimumCurrent, double holdRmsCurrent,
        double minimumAfterPeakCurrent, double minimumAfterOpeningCurrent, double belowDropOut, double currentAtSwitchOff,
        double releaseTime, double residualCurrent, double windingEnergy, double coilRmsCurrent, double mainsRmsCurrent,
        double mainsPeakCurrent, EnergyAccount energies) {
}
