package coilbook.fleet;

import java.time.LocalDate;

/**
 * What a station had to do, and when: either cycle rate and on-time, or the pattern (with the line's speed or its own). The mean rate
 * rules heat; the burst rate, the shortest on-time and the shortest off-time rule opening, recovery and release.
 */
public record Duty(@Column(value = "Station", key = true, refersTo = Station.class) String station,
        @Column(value = "Duty since", key = true) LocalDate validFrom, @Column("Duty until") LocalDate validTo,
        @Column(value = "Cycle rate", unit = Unit.PER_SECOND, min = 0, max = 1000) Datum cycleRate,
        @Column(value = "On-time", unit = Unit.MILLISECOND, min = 0, above = true, max = 86400) Datum onTime,
        @Column(value = "Burst rate", unit = Unit.PER_SECOND, min = 0, above = true, max = 1000) Datum burstRate,
        @Column(value = "Pattern speed", unit = Unit.METRE_PER_SECOND, min = 0, above = true, max = 100) Datum speed,
        @Column(value = "Bead length", unit = Unit.MILLIMETRE, min = 0, above = true, max = 1000) Datum beadLength,
        @Column(value = "Gap", unit = Unit.MILLIMETRE, min = 0, above = true, max = 1000) Datum gap,
        @Column(value = "Pitch", unit = Unit.MILLIMETRE, min = 0, above = true, max = 1000) Datum pitch,
        @Column(value = "Running hours", unit = Unit.HOURS_PER_YEAR, min = 0, max = 8784) Datum hoursPerYear) implements Timed {
}
