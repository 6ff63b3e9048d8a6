package coilbook.register.internal.read;

import java.time.LocalDate;

/**
 * One state of the register: what it knew at a journal sequence, of what was true at the end of a day at the site.
 *
 * @param known the sequence
 * @param trueOn the day
 */
public record Snapshot(long known, LocalDate trueOn) {
}
