package coilbook.fleet;

import java.time.LocalDate;
import java.time.LocalDateTime;

/**
 * A measured value on a station, an item ({@code kind/serial}) or a circuit ({@code site/circuit}). The value is in SI; sheets show it in the unit
 * of its quantity. The temperature is that of the part when it was measured. Uncertainty is a fraction of the value.
 */
public record Reading(@Column(value = "Subject kind", key = true) SubjectKind subjectKind,
        @Column(value = "Subject", key = true) String subject, @Column(value = "Quantity", key = true) ReadingQuantity quantity,
        @Column(value = "Taken at", key = true) LocalDateTime takenAt, @Column(value = "Value", required = true) Double value,
        @Column(value = "Temperature", unit = Unit.CELSIUS, min = -60, max = 300) Datum temperature,
        @Column(value = "Uncertainty", unit = Unit.PERCENT, min = 0, max = 1) Datum uncertainty, @Column("Instrument") String instrument,
        @Column("Calibrated on") LocalDate calibratedOn, @Column(value = "By", personal = true) String by,
        @Column("Conditions") String conditions, @Column(value = "Note", personal = true) String note) implements Row {
}
