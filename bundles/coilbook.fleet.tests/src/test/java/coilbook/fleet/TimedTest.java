package coilbook.fleet;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;

import org.junit.jupiter.api.Test;

/** A date means the end of that day at the site. */
class TimedTest {

    @Test
    void anIntervalHoldsItsFirstDayAndNotItsLast() {
        Supply supply = new Supply("A/B/C", LocalDate.of(2026, 2, 1), LocalDate.of(2026, 3, 1), "A/M");
        assertFalse(supply.trueOn(LocalDate.of(2026, 1, 31)));
        assertTrue(supply.trueOn(LocalDate.of(2026, 2, 1)));
        assertTrue(supply.trueOn(LocalDate.of(2026, 2, 28)));
        assertFalse(supply.trueOn(LocalDate.of(2026, 3, 1)));
        assertTrue(new Supply("A/B/C", null, null, "A/M").trueOn(LocalDate.MIN));
    }
}
