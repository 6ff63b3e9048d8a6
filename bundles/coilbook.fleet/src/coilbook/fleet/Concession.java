package coilbook.fleet;

import java.time.LocalDate;

/** A nonconformity accepted at a station for a reason, by a person, until a date (ISO 9000); a hazard needs a second approver. */
public record Concession(@Column(value = "Station", key = true, refersTo = Station.class) String station,
        @Column(value = "Criterion", key = true) String criterion, @Column(value = "Granted on", key = true) LocalDate validFrom,
        @Column(value = "Ends on", required = true) LocalDate validTo, @Column(value = "Reason", required = true) String reason,
        @Column(value = "Granted by", required = true, personal = true) String grantedBy,
        @Column(value = "Second approver", personal = true) String secondApprover,
        @Column("Value when granted") Double valueWhenGranted) implements Timed {
}
