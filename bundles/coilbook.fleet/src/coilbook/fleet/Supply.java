package coilbook.fleet;

import java.time.LocalDate;

/** Which circuit fed a station, and when. */
public record Supply(@Column(value = "Station", key = true, refersTo = Station.class) String station,
        @Column(value = "Supply since", key = true) LocalDate validFrom, @Column("Supply until") LocalDate validTo,
        @Column(value = "Circuit", required = true, refersTo = Circuit.class) String circuit) implements Timed {
}
