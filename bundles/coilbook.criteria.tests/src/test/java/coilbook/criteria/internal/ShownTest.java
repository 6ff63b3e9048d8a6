package coilbook.criteria.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

import coilbook.criteria.Verdict;
import coilbook.fleet.Unit;

class ShownTest {

    @Test
    void fourSignificantDigitsWithTheUnit() {
        assertEquals("4.687 A", Shown.of(4.68711482, Unit.AMPERE));
        assertEquals("0.82 A", Shown.of(0.82, Unit.AMPERE));
        assertEquals("3 ms", Shown.of(0.003, Unit.MILLISECOND));
        assertEquals("1200 W", Shown.of(1200, Unit.WATT));
        assertEquals("−10 °C", Shown.of(-10, Unit.CELSIUS));
        assertEquals("0", Shown.of(0, Unit.NONE));
        assertEquals("10 %", Shown.of(0.1, Unit.PERCENT));
        assertEquals("123500 V", Shown.of(123456, Unit.VOLT));
    }

    @Test
    void numbersThatDifferLookDifferent() {
        assertEquals("4.6871 A", Shown.beside(4.6871, 4.68711, Unit.AMPERE));
        assertEquals("230.01 V", Shown.beside(230.01, 230, Unit.VOLT));
        assertEquals("230 V", Shown.beside(230, 230, Unit.VOLT));
    }

    @Test
    void limitsMetToNineDigitsAreMet() {
        assertEquals(Verdict.OBSERVATION, Compare.ceiling(1 + 1e-10, 1, 0.1));
        assertEquals(Verdict.NONCONFORMITY, Compare.ceiling(1 + 1e-8, 1, 0.1));
        assertEquals(Verdict.NONCONFORMITY, Compare.ceiling(Double.POSITIVE_INFINITY, 1, 0.1));
        assertEquals(Verdict.CONFORMITY, Compare.floor(Double.POSITIVE_INFINITY, 1, 0.1));
        assertEquals(Verdict.CONFORMITY, Compare.ceiling(0.9, 1, 0.1));
        assertEquals(Verdict.OBSERVATION, Compare.floor(1 - 1e-10, 1, 0.1));
        assertEquals(Verdict.NONCONFORMITY, Compare.floor(1 - 1e-8, 1, 0.1));
        assertEquals(Verdict.CONFORMITY, Compare.floor(1.1, 1, 0.1));
        assertEquals(Verdict.OBSERVATION, Compare.temperature(145, 145, 10));
        assertEquals(Verdict.CONFORMITY, Compare.temperature(135, 145, 10));
    }
}
