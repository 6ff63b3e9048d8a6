package coilbook.fleet;

import java.time.LocalDate;

/**
 * The interval in which a part sat at a station, with why it came and why it left. The type is always known; the serial only where the piece is
 * (then {@code kind/serial} names an {@link Item}). Counter readings are cycles.
 */
public record Fitting(@Column(value = "Station", key = true, refersTo = Station.class) String station,
        @Column(value = "Kind", key = true) FittedKind kind, @Column(value = "Fitted since", key = true) LocalDate validFrom,
        @Column("Fitted until") LocalDate validTo, @Column(value = "Type", required = true) String type, @Column("Serial") String serial,
        @Column("Why it came") String whyItCame, @Column("Why it left") String whyItLeft,
        @Column("Failure mode") String failureMode, @Column("Failure mechanism") String failureMechanism,
        @Column("Detection method") String detectionMethod,
        @Column(value = "Counter at fitting", min = 0, max = 1e15) Datum counterAtFitting,
        @Column(value = "Counter at removal", min = 0, max = 1e15) Datum counterAtRemoval,
        @Column(value = "By", personal = true) String by, @Column(value = "Note", personal = true) String note) implements Timed {

    /** The key of the {@link Item}, or {@code null} where the piece is not known. */
    public String itemKey() {
        return serial == null ? null : kind.label() + "/" + serial;
    }
}
