package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import coilbook.electrics.CycleRateLimit.Ruling;
import coilbook.fleet.LevelChange;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Corners of a station: closed forms where there are any, else the engine at the same condition, and what is said when data are missing. */
class StationDerivationTest {

    private static final double NONE = Double.NaN;
    private static final SupplyRange SUPPLY = new SupplyRange(120, 108, 132, 60);

    private static CoilFigures coil(double inductance, double pullIn, double thermal) {
        return new CoilFigures(9, 10, 11, inductance, NONE, pullIn, 0.3, thermal, NONE, NONE, 130, 10);
    }

    private static StationCircuit station(DriverFigures driver, CoilFigures coil, double rate, double onTime) {
        return new StationCircuit(SUPPLY, driver, coil, 0.5, 10, 40, 60, rate, rate, onTime, 2e-3, 3e-3, NONE);
    }

    private static StationCircuit twoLevel(CoilFigures coil) {
        return station(DriverFigures.twoLevel(48, 3e-3, 6, LevelChange.SOURCE, 0, 0.7), coil, 10, 0.02);
    }

    private static StationCircuit lineCapacitor(CoilFigures coil, double rate) {
        return station(DriverFigures.lineCapacitor(150, 0.05, 33e-6, 0.2, 1.8, 0.5, 0.9), coil, rate, 0.06);
    }

    private static CoilFigures mainsCoil(double pullIn) {
        return new CoilFigures(81, 90, 99, 0.08, NONE, pullIn, 0.1, 4, NONE, NONE, 155, 10);
    }

    @Test
    void twoLevelCorners() throws IllegalCaseException {
        StationElectrics electrics = StationDerivation.derive(twoLevel(coil(8e-3, 3.2, 4)));
        double hot = electrics.peakAtLow().at().windingTemperature();
        double resistance = 11 * (234.5 + hot) / 254.5 + 0.5;
        double tau = 8e-3 / resistance;
        assertEquals(48 / resistance * (1 - Math.exp(-3e-3 / tau)), electrics.peakAtLow().value(), 1e-9);
        assertEquals(-tau * Math.log(1 - 3.2 * resistance / 48), electrics.timeToPullIn().value(), 1e-9);
        double broken = electrics.breakEvenInductance().value();
        assertEquals(3.2, 48 / resistance * (1 - Math.exp(-3e-3 * resistance / broken)), 1e-9);
        assertEquals(6 / resistance, electrics.holdMinimum().value(), 1e-5);
        double cold = 9 * (234.5 + 10) / 254.5 + 0.5;
        assertEquals(48 / cold * (1 - Math.exp(-3e-3 * cold / 8e-3)), electrics.peakAtHigh().value(), 1e-9);
        assertEquals(48, electrics.busPeak().value());
        assertEquals(Corner.HIGH_COLD, electrics.peakAtHigh().at().corner());
        assertFalse(electrics.peakAtLow().isBound());
    }

    /** The steady temperature balances: heat per cycle at that temperature times rate times thermal resistance is the rise. */
    @Test
    void windingTemperatureBalances() throws IllegalCaseException {
        for (StationCircuit station : List.of(twoLevel(coil(8e-3, 3.2, 4)), lineCapacitor(mainsCoil(0.6), 5.3))) {
            StationElectrics electrics = StationDerivation.derive(station);
            double celsius = electrics.windingTemperature().value();
            assertEquals(60 + 4 * electrics.averagePower().value(), celsius, 0.01);
            SteadyResult steady = Waveforms.solve(electrics.cases().get(Corner.HOT)).steady();
            assertEquals(electrics.averagePower().value(), steady.meanWindingEnergy() * station.meanRate(),
                    0.01 * electrics.averagePower().value());
        }
    }

    /** Held on, a two-level driver is a winding on its hold voltage (closed form, cable left out). */
    @Test
    void stuckOn() throws IllegalCaseException {
        StationCircuit with = twoLevel(coil(8e-3, 3.2, 4));
        StationCircuit bare = new StationCircuit(with.supply(), with.driver(), with.coil(), 0, 10, 40, 60, 10, 10, 0.02, 2e-3, 3e-3, NONE);
        double expected = Temperature.voltageDriven(6, 9, 4, 60).celsius();
        assertEquals(expected, StationDerivation.derive(bare).stuckOnTemperature().value(), 0.01);
    }

    @Test
    void currentRegulatedRunsAway() throws IllegalCaseException {
        DriverFigures driver = DriverFigures.currentRegulated(48, 3, 3e-3, 2.3, 0, 24);
        StationElectrics electrics = StationDerivation.derive(station(driver, coil(8e-3, 2.5, 8), 1, 0.02));
        assertTrue(Double.isFinite(electrics.windingTemperature().value()));
        // the bus drives 2.3 A through 48 V / 2.3 A less the cable: from there on it is a voltage
        double saturated = Copper.temperatureOf(48 / 2.3 - 0.5, 11);
        assertEquals(saturated, electrics.saturationTemperature().value(), 1e-9);
        assertTrue(electrics.stuckOnTemperature().value() > saturated, "stuck on, it heats past the point where the bus saturates");
    }

    @Test
    void lineCapacitorHoldIsSweptColdAndHot() throws IllegalCaseException {
        StationElectrics electrics = StationDerivation.derive(lineCapacitor(mainsCoil(0.6), 5));
        double least = Double.MAX_VALUE;
        for (Corner corner : List.of(Corner.LOW_HOT, Corner.LOW_COLD)) {
            CircuitCase circuit = electrics.cases().get(corner);
            for (int degrees = 0; degrees < 180; degrees += 5) {
                CycleResult last = null;
                CircuitCase three = new CircuitCase(circuit.mains().atPhase(Math.toRadians(degrees)), circuit.driver(), circuit.coil(),
                        circuit.loopResistance(), circuit.cyclesPerSecond(), circuit.onTime(), 3, circuit.openingDelay());
                last = Waveforms.solve(three).cycles().get(2);
                least = Math.min(least, last.minimumAfterOpeningCurrent());
            }
        }
        assertEquals(least, electrics.holdMinimum().value(), 0.01 * least);
        assertEquals(132 * Math.sqrt(2) - 1.8, electrics.busPeak().value(), 1e-9);
        double square = 0;
        int steps = 200_000;
        for (int step = 0; step < steps; step++) {
            double over = Math.max(0, 132 * Math.sqrt(2) * Math.sin(Math.PI * (step + 0.5) / steps) - 1.8);
            square += over * over / steps;
        }
        assertEquals(square / (150 * 0.95), electrics.seriesResistorShorted().value(), 1e-4);
        assertTrue(electrics.seriesResistorStuckOn().value() < electrics.seriesResistorShorted().value());
        assertTrue(electrics.apparentPower().value() > electrics.averagePower().value());
        assertTrue(Double.isInfinite(electrics.decayTime().value()), "no bleed resistor");
    }

    @Test
    void rateLimits() throws IllegalCaseException {
        StationElectrics electrics = StationDerivation.derive(lineCapacitor(mainsCoil(0.85), 5));
        CycleRateLimit limit = electrics.cycleRate();
        double byHeat = limit.windingTemperature().value();
        StationElectrics there = StationDerivation.derive(lineCapacitor(mainsCoil(0.85), byHeat));
        assertEquals(145, there.windingTemperature().value(), 1.5);
        double recovery = limit.sourceRecovery().value();
        assertTrue(recovery > 0 && Double.isFinite(recovery));
        assertTrue(Double.isFinite(pullIn(electrics, 0.97 * recovery)), "below the limit every cycle pulls in");
        assertTrue(Double.isInfinite(pullIn(electrics, 1.05 * recovery)), "above it some do not");
        assertEquals(1 / (0.06 + electrics.releaseTime().value() + 3e-3), limit.release().value(), 1e-9);
        assertEquals(List.of(Data.VALVE_HIGHEST_RATE), limit.valve().missing());
        assertEquals(Math.min(byHeat, Math.min(recovery, limit.release().value())), limit.highest().value());
        assertTrue(limit.ruling() == Ruling.WINDING_TEMPERATURE || limit.ruling() == Ruling.SOURCE_RECOVERY);
    }

    private static double pullIn(StationElectrics electrics, double rate) throws IllegalCaseException {
        CircuitCase circuit = electrics.cases().get(Corner.LOW_HOT);
        CircuitCase at = new CircuitCase(circuit.mains(), circuit.driver(), circuit.coil(), circuit.loopResistance(), rate,
                circuit.onTime(), 1);
        double time = Waveforms.solve(at).steady().worst().timeToPullIn();
        return Double.isNaN(time) ? Double.POSITIVE_INFINITY : time;
    }

    @Test
    void withoutInductanceBoundsAreGiven() throws IllegalCaseException {
        StationElectrics electrics = StationDerivation.derive(twoLevel(coil(NONE, 3.2, 4)));
        assertEquals(List.of(Data.INDUCTANCE), electrics.peakAtLow().missing());
        assertTrue(electrics.breakEvenInductance().value() > 8e-3);
        assertEquals(List.of(Data.INDUCTANCE), electrics.peakAtHigh().bounded());
        assertEquals(48 / (9 * 244.5 / 254.5 + 0.5), electrics.peakAtHigh().value(), 1e-6);
        StationElectrics known = StationDerivation.derive(twoLevel(coil(8e-3, 3.2, 4)));
        assertTrue(electrics.windingTemperature().value() > known.windingTemperature().value());
        assertTrue(electrics.windingTemperature().isBound());
        assertEquals(6.0, electrics.holdMinimum().value() * (11 * Copper.factorAt(electrics.holdMinimum().at().windingTemperature()) + 0.5),
                1e-9);
    }

    @Test
    void withoutThermalResistanceTheHighestDissipationBoundsIt() throws IllegalCaseException {
        CoilFigures bounded = new CoilFigures(9, 10, 11, 8e-3, NONE, 3.2, 0.3, NONE, 20, 40, 130, 10);
        assertEquals(4, bounded.thermalResistanceOrBound(), 1e-12);
        StationElectrics electrics = StationDerivation.derive(twoLevel(bounded));
        assertEquals(List.of(Data.THERMAL_RESISTANCE), electrics.windingTemperature().bounded());
        CoilFigures unknown = new CoilFigures(9, 10, 11, 8e-3, NONE, 3.2, 0.3, NONE, NONE, NONE, 130, 10);
        StationElectrics without = StationDerivation.derive(twoLevel(unknown));
        assertEquals(List.of(Data.THERMAL_RESISTANCE), without.windingTemperature().missing());
        assertEquals(120, without.peakAtLow().at().windingTemperature(), "the hottest the class allows");
        assertTrue(without.peakAtLow().isBound());
    }

    @Test
    void missingDataAreNamed() throws IllegalCaseException {
        DriverFigures driver = DriverFigures.lineCapacitor(NONE, NONE, NONE, NONE, 1.4, 0, 0.7);
        StationElectrics electrics = StationDerivation.derive(station(driver, coil(8e-3, NONE, 4), NONE, NONE));
        assertEquals(List.of(Data.SERIES_RESISTANCE, Data.CAPACITANCE, Data.DUTY_ON_TIME, Data.DUTY_RATE, Data.PULL_IN_CURRENT),
                electrics.timeToPullIn().missing());
        assertEquals(List.of(Data.SERIES_RESISTANCE, Data.CAPACITANCE), electrics.peakAtHigh().missing());
        assertTrue(electrics.windingTemperature().missing().contains(Data.DUTY_RATE));
        assertTrue(electrics.cases().isEmpty());
        assertTrue(electrics.storedEnergy().missing().contains(Data.CAPACITANCE));
        DriverFigures none = new DriverFigures(null, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, null, NONE, NONE,
                NONE, NONE, NONE, NONE, NONE, NONE);
        StationElectrics unknown = StationDerivation.derive(station(none, coil(8e-3, 3.2, 4), 10, 0.02));
        assertTrue(unknown.peakAtLow().missing().contains(Data.DRIVER_KIND));
    }

    @Test
    void cacheGoesByExactInputs() throws IllegalCaseException {
        ElectricsCache cache = new ElectricsCache(2);
        StationElectrics first = cache.of(twoLevel(coil(8e-3, 3.2, 4)));
        assertSame(first, cache.of(twoLevel(coil(8e-3, 3.2, 4))));
        cache.of(twoLevel(coil(8.1e-3, 3.2, 4)));
        cache.of(twoLevel(coil(8.2e-3, 3.2, 4)));
        assertEquals(2, cache.size());
        assertEquals(first, cache.of(twoLevel(coil(8e-3, 3.2, 4))));
    }
}
