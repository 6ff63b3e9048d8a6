package coilbook.criteria.internal.station;

import java.time.LocalDate;

import coilbook.electrics.Copper;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.StationView;
import coilbook.fleet.SubjectKind;

/**
 * The newest reading of winding resistance that was taken on the very coil fitted, corrected to 20 °C. Without a winding temperature it is an
 * interval.
 *
 * @param reading as taken
 * @param lowest least resistance at 20 °C, Ω
 * @param highest greatest resistance at 20 °C, Ω; the same where the temperature was recorded
 * @param inDate whether it is no older than the fleet's interval
 * @param coldest winding temperature taken for {@link #highest}, °C
 * @param hottest winding temperature taken for {@link #lowest}, °C
 */
public record WindingReading(Reading reading, double lowest, double highest, boolean inDate, double coldest, double hottest) {

    /** Width of the interval of winding temperatures where none was recorded, K: about 16 % of resistance (common practice, no source). */
    private static final double UNKNOWN_TEMPERATURE_SPAN = 40;

    /** The reading of the coil fitted at a station, or {@code null} if none was taken. */
    public static WindingReading of(StationView view) {
        Reading newest = null;
        for (Reading reading : view.readings()) {
            if (reading.quantity() == ReadingQuantity.WINDING_RESISTANCE && isOfTheCoil(reading, view)
                    && !reading.takenAt().toLocalDate().isAfter(view.asOf())
                    && (newest == null || reading.takenAt().isAfter(newest.takenAt()))) {
                newest = reading;
            }
        }
        return newest == null ? null : correct(newest, view);
    }

    /** A reading on the item, or one at the station since the coil came there. */
    private static boolean isOfTheCoil(Reading reading, StationView view) {
        Fitting coil = view.fitting(FittedKind.COIL);
        if (coil == null) {
            return false;
        } else if (reading.subjectKind() == SubjectKind.ITEM) {
            return reading.subject().equals(coil.itemKey());
        }
        boolean anotherBefore = view.pastFittings().stream().anyMatch(f -> f.kind() == FittedKind.COIL);
        boolean since = coil.validFrom() == null ? !anotherBefore : !reading.takenAt().toLocalDate().isBefore(coil.validFrom());
        return reading.subjectKind() == SubjectKind.STATION && reading.subject().equals(view.code()) && since;
    }

    private static WindingReading correct(Reading reading, StationView view) {
        boolean inDate = view.asOf().isBefore(expiry(reading, view));
        Datum temperature = reading.temperature();
        double coldest;
        double hottest;
        if (temperature != null) {
            coldest = temperature.value();
            hottest = temperature.value();
        } else {
            CoilAmbient ambient = CoilAmbient.of(view);
            coldest = ambient.lowest().from().isKnown() ? ambient.lowest().from().value() : 0;
            double warmest = ambient.highest().to().isKnown() ? ambient.highest().to().value() : coldest;
            hottest = Math.max(coldest + UNKNOWN_TEMPERATURE_SPAN, warmest);
        }
        return new WindingReading(reading, Copper.resistance20(reading.value(), hottest), Copper.resistance20(reading.value(), coldest),
                inDate,
                coldest, hottest);
    }

    /** The first day on which a reading is out of date. */
    public static LocalDate expiry(Reading reading, StationView view) {
        long months = Math.round(view.fleetSettings().get(FleetSettings.WINDING_READING_INTERVAL));
        return reading.takenAt().toLocalDate().plusMonths(months).plusDays(1);
    }

    public boolean hasTemperature() {
        return reading.temperature() != null;
    }

    /** The instrument's uncertainty as a fraction, NaN where none was recorded. */
    public double uncertainty() {
        return Datum.orNaN(reading.uncertainty());
    }
}
