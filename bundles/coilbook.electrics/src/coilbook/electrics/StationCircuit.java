package coilbook.electrics;

/**
 * All that the electrics of a station are derived from; equal records give equal results, which is what a cache goes by. SI units; NaN: not
 * known.
 *
 * @param cableResistance both conductors at their temperature, Ω
 * @param lowestAmbient of the coil, °C
 * @param nominalAmbient of the coil, °C
 * @param highestAmbient of the coil, °C
 * @param meanRate cycles a second that rule heat
 * @param burstRate cycles a second within a burst: rules recovery and release
 * @param onTime shortest on-time, s
 * @param openingDelay of the valve, from pull-in, s; NaN counts as none
 * @param closingDelay of the valve, from drop-out, s
 * @param valveHighestRate cycles a second that the valve's mechanics allow
 */
public record StationCircuit(SupplyRange supply, DriverFigures driver, CoilFigures coil, double cableResistance, double lowestAmbient,
        double nominalAmbient, double highestAmbient, double meanRate, double burstRate, double onTime, double openingDelay,
        double closingDelay, double valveHighestRate) {
}
