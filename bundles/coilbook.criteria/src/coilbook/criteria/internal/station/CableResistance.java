package coilbook.criteria.internal.station;

import coilbook.electrics.Copper;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;

/**
 * Resistance of both conductors of the cable between driver and coil, in Ω: 2 · length · resistance per metre at the conductor's temperature. The
 * temperature is that recorded for the cable, else the highest of the site's air, else 20 °C, assumed.
 */
public final class CableResistance {

    private CableResistance() {
    }

    public static Fact of(StationView view) {
        Fact length = Fact.of(view.station().cableLength(), () -> Names.ofStation("Cable length", view));
        if (length.isKnown() && length.value() == 0) {
            return length;
        }
        Fact perMetre = view.cable() == null ? Fact.missing(Names.noType(FittedKind.CABLE, view))
                : Fact.of(view.cable().conductorResistance(), () -> "Conductor resistance of cable type " + view.cable().code());
        Fact loop = length.with(perMetre, (l, r) -> 2 * l * r);
        Datum own = view.station().cableTemperature();
        Datum temperature = own != null || view.site() == null ? own : view.site().ambientHighest();
        Fact celsius = temperature == null ? Fact.known(20, Provenance.ASSUMED) : Fact.known(temperature.value(), temperature.provenance());
        return loop.with(celsius, (r, t) -> r * Copper.factorAt(t));
    }
}
