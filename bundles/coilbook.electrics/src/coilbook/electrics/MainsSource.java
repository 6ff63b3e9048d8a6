package coilbook.electrics;

/**
 * A sinusoidal mains supply.
 *
 * @param voltageRms voltage, V rms
 * @param frequency frequency, Hz
 * @param phase phase of the sine at t = 0, rad
 */
public record MainsSource(double voltageRms, double frequency, double phase) {

    /** Peak of the sine, V. */
    public double peak() {
        return Math.sqrt(2) * voltageRms;
    }

    /** Angular frequency, rad/s. */
    public double angularFrequency() {
        return 2 * Math.PI * frequency;
    }

    public MainsSource atPhase(double radians) {
        return new MainsSource(voltageRms, frequency, radians);
    }
}
