package coilbook.jobs;

import java.time.LocalDate;

import coilbook.register.StatusColumn;

/**
 * One cell of the Stations grid, as it was typed.
 *
 * @param station the station's code
 * @param text what was typed; blank takes the value away
 * @param since {@code null} corrects what stands there; a date ends what stood there and begins the new on that day, for columns that follow one another
 *            in time (parts, circuit, input setting, duty)
 */
public record CellEdit(String station, StatusColumn column, String text, LocalDate since) {

    /** A correction. */
    public static CellEdit correct(String station, StatusColumn column, String text) {
        return new CellEdit(station, column, text, null);
    }
}
