package coilbook.electrics;

/**
 * A waveform in evenly spaced samples from the first switch-on. The arrays are the caller's own.
 *
 * @param time s
 * @param sourceVoltage capacitor voltage, or the regulated source's output, V
 * @param coilCurrent A
 */
public record Trace(double[] time, double[] sourceVoltage, double[] coilCurrent) {

    public int size() {
        return time.length;
    }
}
