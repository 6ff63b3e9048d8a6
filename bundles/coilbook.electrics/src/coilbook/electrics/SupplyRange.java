package coilbook.electrics;

/**
 * The mains as a station may meet it, at the driver's input (behind a transformer, with its regulation). NaN: not known.
 *
 * @param nominalVoltage V rms
 * @param lowestVoltage lowest of the market's tolerance and any reading, V rms
 * @param highestVoltage highest of both, V rms
 * @param frequency Hz
 */
public record SupplyRange(double nominalVoltage, double lowestVoltage, double highestVoltage, double frequency) {
}
