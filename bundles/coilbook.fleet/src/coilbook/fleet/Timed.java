package coilbook.fleet;

import java.time.LocalDate;

/**
 * A row that was true for an interval: from the beginning of {@code validFrom} to the end of the day before {@code validTo}, both dates
 * at the site; {@code null} leaves an end open.
 */
public interface Timed extends Row {

    LocalDate validFrom();

    LocalDate validTo();

    /** Whether the row was true at the end of the given day. */
    default boolean trueOn(LocalDate date) {
        return (validFrom() == null || !validFrom().isAfter(date)) && (validTo() == null || validTo().isAfter(date));
    }
}
