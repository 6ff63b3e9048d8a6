package coilbook.criteria.internal.records;

import java.time.LocalDate;

import coilbook.criteria.internal.station.WindingReading;
import coilbook.fleet.Concession;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.StationView;
import coilbook.fleet.Timed;

/** The first day after today on which nothing but the passing of time can turn a verdict of a station. */
public final class Recheck {

    private final LocalDate today;
    private LocalDate earliest;

    private Recheck(LocalDate today) {
        this.today = today;
    }

    /** {@code null} if no such day is known. Rows that only begin in the future are not seen: they are not part of a view of today. */
    public static LocalDate on(StationView view) {
        Recheck recheck = new Recheck(view.asOf());
        for (Concession concession : view.concessions()) {
            recheck.consider(concession.validFrom());
            recheck.consider(concession.validTo());
        }
        for (Reading reading : view.readings()) {
            recheck.consider(reading.takenAt().toLocalDate());
            if (reading.quantity() == ReadingQuantity.WINDING_RESISTANCE) {
                recheck.consider(WindingReading.expiry(reading, view));
            }
        }
        view.fittings().forEach(recheck::ends);
        recheck.ends(view.supply());
        recheck.ends(view.settingChoice());
        recheck.ends(view.duty());
        return recheck.earliest;
    }

    private void ends(Timed row) {
        if (row != null) {
            consider(row.validTo());
        }
    }

    private void consider(LocalDate day) {
        if (day != null && day.isAfter(today) && (earliest == null || day.isBefore(earliest))) {
            earliest = day;
        }
    }
}
