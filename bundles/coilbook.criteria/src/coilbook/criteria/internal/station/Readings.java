package coilbook.criteria.internal.station;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import coilbook.fleet.Datum;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.StationView;
import coilbook.fleet.SubjectKind;

/** Readings of a view, none from after its day. */
final class Readings {

    private Readings() {
    }

    /** All readings of a quantity on the station itself. */
    static List<Reading> onStation(StationView view, ReadingQuantity quantity) {
        return on(view, SubjectKind.STATION, quantity);
    }

    /** All readings of a quantity on the station's circuit. */
    static List<Reading> onCircuit(StationView view, ReadingQuantity quantity) {
        return on(view, SubjectKind.CIRCUIT, quantity);
    }

    /** The newest reading of a quantity on the station as a measured value, or {@code null}. */
    static Datum newestOnStation(StationView view, ReadingQuantity quantity) {
        return onStation(view, quantity).stream().max(Comparator.comparing(Reading::takenAt)).map(r -> Datum.measured(r.value()))
                .orElse(null);
    }

    private static List<Reading> on(StationView view, SubjectKind kind, ReadingQuantity quantity) {
        List<Reading> found = new ArrayList<>();
        String subject = null;
        for (Reading reading : view.readings()) {
            if (reading.quantity() == quantity && reading.subjectKind() == kind && !reading.takenAt().toLocalDate().isAfter(view.asOf())) {
                if (subject == null) {
                    subject = kind == SubjectKind.STATION ? view.code() : view.circuit().key();
                }
                if (reading.subject().equals(subject)) {
                    found.add(reading);
                }
            }
        }
        return found;
    }
}
