package coilbook.exchange.internal.in;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

import coilbook.fleet.InvalidValue;

/** Countries by code and name (ISO 3166-1, as the Java runtime knows it), and the one that was probably meant. */
class CountriesTest {

    private final Countries countries = new Countries();

    @Test
    void countriesAreKnownByCodeAndName() throws InvalidValue {
        assertEquals("DE", countries.code("Country", "Germany"));
        assertEquals("DE", countries.code("Country", "deu"));
        assertEquals("US", countries.code("Country", "USA"));
    }

    @Test
    void theNearestCountryIsNamed() {
        InvalidValue refused = assertThrows(InvalidValue.class, () -> countries.code("Country", "Germny"));
        assertTrue(refused.expected().endsWith("; the nearest is Germany (DE)"), refused::expected);
        assertTrue(assertThrows(InvalidValue.class, () -> countries.code("Country", "Atlantis")).expected().endsWith("its name"));
    }
}
