package coilbook.register;

import java.time.Instant;
import java.time.LocalDate;

/**
 * Which past is asked for.
 *
 * @param trueOn what was true at the end of that day at the site
 * @param knownAt what the register knew at that instant; {@code null} for what it knows now
 */
public record AsOf(LocalDate trueOn, Instant knownAt) {

    public static AsOf on(LocalDate date) {
        return new AsOf(date, null);
    }
}
