package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Copper and winding temperature. Check values: resistance method with k = 234.5 (a published exercise gives 83.63 °C for 10 to 12.5 Ω); fixed
 * points, S2 and S3 duty of IEC 60034-1 worked outside this code with their closed forms.
 */
class TemperatureTest {

    private static final double DIGITS = 1e-6;

    @ParameterizedTest
    @CsvSource({ "-10,8.821218", "0,9.214145", "20,10", "25,10.196464", "40,10.785855", "80,12.357564", "100,13.143418", "130,14.322200",
            "155,15.304519", "180,16.286837" })
    void copper(double celsius, double ohms) {
        assertEquals(ohms, Copper.resistanceAt(10, celsius), DIGITS);
        assertEquals(celsius, Copper.temperatureOf(Copper.resistanceAt(10, celsius), 10), 1e-10);
    }

    @ParameterizedTest
    @CsvSource({ "11.2,45,10.198211", "10.4,28,10.083048", "13.7,95,10.581639", "310,80,250.858506" })
    void toTwentyDegrees(double measured, double celsius, double resistance20) {
        assertEquals(resistance20, Copper.resistance20(measured, celsius), DIGITS);
    }

    @Test
    void riseByResistance() {
        assertEquals(83.625, Copper.temperatureOf(12.5, 10), 1e-9);
        assertEquals(108.040, Copper.temperatureOf(13.2, Copper.resistance20(10, 25)), 1e-9);
        assertEquals(97.872449, Copper.temperatureOf(12.9, Copper.resistance20(9.8, 18)), DIGITS);
    }

    @ParameterizedTest
    @CsvSource({ "6,10,5,25,41.592279,3.318456", "6,10,5,40,55.781247,3.156249", "6,10,5,80,93.947437,2.789487",
            "14.142135623731,10,5,25,100.883321,15.176664", "24,10,5,25,195.468358,34.093672", "40,250,5,25,53.297659,5.659532",
            "40,250,5,60,85.453684,5.090737", "12,10,5,25,82.757500,11.551500" })
    void voltageDriven(double voltage, double resistance, double thermal, double ambient, double celsius, double power)
            throws IllegalCaseException {
        Temperature.Steady closed = Temperature.voltageDriven(voltage, resistance, thermal, ambient);
        assertEquals(celsius, closed.celsius(), DIGITS);
        assertEquals(power, closed.power(), DIGITS);
        Temperature.Steady found = Temperature.steady(ambient, thermal,
                at -> voltage * voltage / Copper.resistanceAt(resistance, at), 1e-9);
        assertEquals(celsius, found.celsius(), DIGITS);
        assertEquals(power, found.power(), DIGITS);
    }

    @ParameterizedTest
    @CsvSource({ "0.6,44.750529,3.950106", "1.0,88.447433,12.689487", "1.4142135623731,192.961165,33.592233" })
    void currentDriven(double current, double celsius, double power) throws IllegalCaseException {
        Temperature.Steady closed = Temperature.currentDriven(current, 10, 5, 25);
        assertEquals(celsius, closed.celsius(), 2e-6);
        assertEquals(power, closed.power(), DIGITS);
        Temperature.Steady found = Temperature.steady(25, 5, at -> current * current * Copper.resistanceAt(10, at), 1e-9);
        assertEquals(celsius, found.celsius(), 2e-6);
    }

    @Test
    void runawayIsSaidNotLooped() throws IllegalCaseException {
        assertTrue(Temperature.currentDriven(2.3, 10, 5, 25).runsAway());
        assertTrue(Temperature.steady(25, 5, at -> 2.3 * 2.3 * Copper.resistanceAt(10, at), 1e-9).runsAway());
        assertEquals(25, Temperature.steady(25, 5, at -> 0, 1e-9).celsius());
    }

    @ParameterizedTest
    @CsvSource({ "60,9.516258", "300,39.346934", "600,63.212056", "1200,86.466472", "1800,95.021293", "3000,99.326205" })
    void warmUp(double time, double rise) {
        assertEquals(rise, Temperature.riseAfter(time, 100, 600), DIGITS);
        assertEquals(time, Temperature.timeToRise(Temperature.riseAfter(time, 100, 600), 100, 600), 1e-6);
    }

    @Test
    void shortTimeDuty() {
        assertEquals(415.888308, Temperature.timeToRise(100, 200, 600), DIGITS);
        assertTrue(Double.isInfinite(Temperature.timeToRise(200, 200, 600)));
    }

    @ParameterizedTest
    @CsvSource({ "0.15,44.071347,18.836752", "0.25,69.986402,33.059235", "0.40,104.309202,57.246104" })
    void intermittentDuty(double share, double highest, double lowest) {
        assertEquals(highest, Temperature.highestRise(share * 600, 600, 200, 600), DIGITS);
        assertEquals(lowest, Temperature.lowestRise(share * 600, 600, 200, 600), DIGITS);
    }
}
