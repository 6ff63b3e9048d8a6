package coilbook.register.internal.read;

import java.time.LocalDate;

import coilbook.fleet.StationView;

/**
 * A station read with all that belongs to it.
 *
 * @param id the number of its row, stable while it exists
 * @param turnsOn the next day on which another row becomes true or ceases to be, or {@code null}
 */
public record LoadedStation(long id, StationView view, LocalDate turnsOn) {
}
