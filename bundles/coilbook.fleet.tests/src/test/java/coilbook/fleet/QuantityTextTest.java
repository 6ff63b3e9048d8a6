package coilbook.fleet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Unit prefixes after the SI brochure; 1 ft = 0.3048 m and 1 psi = 6894.757 Pa are exact or customary definitions (from memory). */
class QuantityTextTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "24 VDC|VOLT|24", "120VAC|VOLT|120", "0.4 kV|VOLT|400", "10 Ω|OHM|10", "0.01 kohm|OHM|10",
            "10 mohm|OHM|0.01", "4.7k|OHM|4700", "2 MΩ|MEGAOHM|2000000", "1,5 m|METRE|1.5", "5 ft|METRE|1.524", "50 Hz|HERTZ|50",
            "90/min|PER_SECOND|1.5", "33 µF|MICROFARAD|0.000033", "33|MICROFARAD|0.000033", "8 mH|MILLIHENRY|0.008", "0.2 H|MILLIHENRY|0.2",
            "68 °F|CELSIUS|20", "180C|CELSIUS|180", "7|PERCENT|0.07", "3 ms|MILLISECOND|0.003", "1.234,5|NONE|1234.5",
            "1 234,5|NONE|1234.5",
            "1,234.5|NONE|1234.5", "0,125|AMPERE|0.125", "850 mA|AMPERE|0.85", "1e-3|OHM|0.001", ".5|AMPERE|0.5", "-5|CELSIUS|-5",
            "60 m/min|METRE_PER_SECOND|1", "26 Ω/km|OHM_PER_KILOMETRE|0.026", "145 psi|BAR|999739.80750936" })
    void readsWhatPeopleWrite(String text, Unit unit, double si) throws InvalidValue {
        assertEquals(si, QuantityText.parse("Value", text, unit), Math.abs(si) * 1e-12);
    }

    @ParameterizedTest
    @ValueSource(strings = { "abc", "10 V", "1,234", "--3", "1e999", "12 apples", "" })
    void refusesWhatItCannotReadOneWay(String text) {
        InvalidValue refused = assertThrows(InvalidValue.class, () -> QuantityText.parse("Resistance", text, Unit.OHM));
        assertEquals("Resistance", refused.column());
        assertTrue(refused.expected().contains("number"), refused.expected());
    }

    @Test
    void anAmbiguousCommaNamesBothReadings() {
        InvalidValue refused = assertThrows(InvalidValue.class, () -> QuantityText.parse("Resistance", "1,234", Unit.OHM));
        assertTrue(refused.expected().contains("1.234") && refused.expected().contains("1234"), refused.expected());
    }

    @ParameterizedTest
    @ValueSource(doubles = { 0.001, 3, 33, 4.7, 0.1, 12.4, 999.999, 1e-9, 6.8 })
    void everyUnitReadsBackWhatItShows(double shown) {
        for (Unit unit : Unit.values()) {
            assertEquals(shown, unit.fromSi(unit.toSi(shown)), unit.name());
        }
    }
}
