package coilbook.electrics;

/**
 * Under what a value was computed.
 *
 * @param mainsVoltage V rms; NaN if unknown and without part in the value
 * @param frequency Hz; NaN likewise
 * @param windingTemperature °C; NaN likewise
 * @param ambient of the coil, °C; NaN likewise
 */
public record Condition(Corner corner, double mainsVoltage, double frequency, double windingTemperature, double ambient) {
}
