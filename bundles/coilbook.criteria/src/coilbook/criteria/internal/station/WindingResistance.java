package coilbook.criteria.internal.station;

import coilbook.fleet.CoilType;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;

/**
 * The resistance at 20 °C that the coil at a station is computed with: a reading of this very coil where it is in date, plausible and its winding
 * temperature was recorded, else the catalogue's. The instrument's uncertainty then takes the place of the type's tolerance; where none was recorded
 * the tolerance stays.
 *
 * @param resistance20 Ω at 20 °C
 * @param tolerance as a fraction
 * @param measured whether it rests on a reading
 */
public record WindingResistance(Fact resistance20, Fact tolerance, boolean measured) {

    /** A reading outside half to double the catalogue's resistance is of another coil or wrongly typed (common practice, no source). */
    private static final double PLAUSIBLE = 2;

    public static WindingResistance of(StationView view) {
        CoilType coil = view.coil();
        if (coil == null) {
            Fact none = Fact.missing(Names.noType(FittedKind.COIL, view));
            return new WindingResistance(none, none, false);
        }
        Fact tolerance = typeTolerance(view);
        WindingReading reading = WindingReading.of(view);
        if (reading != null && reading.inDate() && reading.hasTemperature() && isPlausible(reading.lowest(), coil.resistance20())) {
            Provenance how = reading.reading().temperature().provenance() == Provenance.ASSUMED ? Provenance.ASSUMED : Provenance.MEASURED;
            Fact uncertainty = Double.isNaN(reading.uncertainty()) ? tolerance : Fact.known(reading.uncertainty(), Provenance.MEASURED);
            return new WindingResistance(Fact.known(reading.lowest(), how), uncertainty, true);
        }
        return new WindingResistance(Fact.of(coil.resistance20(), () -> Names.ofCoil("Resistance at 20 °C", view)), tolerance, false);
    }

    /** The type's tolerance as a fraction, else the fleet's habit, assumed. */
    public static Fact typeTolerance(StationView view) {
        Datum tolerance = view.coil().resistanceTolerance();
        return tolerance != null ? Fact.known(tolerance.value(), tolerance.provenance())
                : Fact.known(view.fleetSettings().get(FleetSettings.RESISTANCE_TOLERANCE), Provenance.ASSUMED);
    }

    private static boolean isPlausible(double resistance20, Datum catalogue) {
        return catalogue == null || resistance20 > catalogue.value() / PLAUSIBLE && resistance20 < catalogue.value() * PLAUSIBLE;
    }

    /** Least resistance at 20 °C, Ω. */
    public Fact lowest() {
        return resistance20.with(tolerance, (r, t) -> r * (1 - t));
    }

    /** Greatest resistance at 20 °C, Ω. */
    public Fact highest() {
        return resistance20.with(tolerance, (r, t) -> r * (1 + t));
    }
}
