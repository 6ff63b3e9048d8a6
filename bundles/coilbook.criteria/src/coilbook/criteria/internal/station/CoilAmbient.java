package coilbook.criteria.internal.station;

import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.Datum;
import coilbook.fleet.Provenance;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;

/**
 * The temperature a coil would have unpowered, in °C: as recorded for the station; else as read on the unpowered coil with the adhesive hot; else, on
 * a heated body, the mean of air and body weighted with their conductances, or the span between the two where those are not known; else that of the
 * site's air.
 */
public record CoilAmbient(Span lowest, Span nominal, Span highest) {

    /**
     * A temperature that lies between two; the same twice where it is known.
     *
     * @param narrowing what is missing to know it better; empty where it is known
     */
    public record Span(Fact from, Fact to, List<String> narrowing) {

        public Span {
            narrowing = List.copyOf(narrowing);
        }

        static Span exactly(Fact fact) {
            return new Span(fact, fact, fact.missing());
        }

        /** Whether one temperature is known, not only bounds. */
        public boolean isExact() {
            return from.isKnown() && narrowing.isEmpty();
        }

        public boolean hasBounds() {
            return from.isKnown() && to.isKnown();
        }
    }

    public static CoilAmbient of(StationView view) {
        Station station = view.station();
        Site site = view.site();
        Fact low = Fact.of(site == null ? null : site.ambientLowest(), () -> Names.ofSite("Ambient lowest", view));
        Fact mid = Fact.of(site == null ? null : site.ambientNominal(), () -> Names.ofSite("Ambient nominal", view));
        Fact high = Fact.of(site == null ? null : site.ambientHighest(), () -> Names.ofSite("Ambient highest", view));
        Datum unpowered = Readings.newestOnStation(view, ReadingQuantity.COIL_TEMPERATURE);
        return new CoilAmbient(span(view, station.coilAmbientLowest(), unpowered, low, mid),
                span(view, station.coilAmbientNominal(), unpowered, mid, mid),
                span(view, station.coilAmbientHighest(), unpowered, high, mid));
    }

    /** A reading was taken in some air temperature: it follows the air from the nominal one, at most kelvin for kelvin. */
    private static Span span(StationView view, Datum own, Datum unpowered, Fact air, Fact nominalAir) {
        if (own != null) {
            return Span.exactly(Fact.known(own.value(), own.provenance()));
        } else if (unpowered != null) {
            Fact read = Fact.known(unpowered.value(), unpowered.provenance());
            return Span.exactly(air.isKnown() && nominalAir.isKnown()
                    ? read.with(air, (r, a) -> r + a).with(nominalAir, (sum, a) -> sum - a)
                    : read.noStrongerThan(Provenance.ESTIMATED));
        }
        Datum body = view.station().bodyTemperature() != null ? view.station().bodyTemperature()
                : Readings.newestOnStation(view, ReadingQuantity.BODY_TEMPERATURE);
        return body == null ? Span.exactly(air) : onBody(view, air, Fact.known(body.value(), body.provenance()));
    }

    private static Span onBody(StationView view, Fact air, Fact body) {
        Fact toAir = Fact.of(view.station().conductanceToAir(), () -> Names.ofStation("Conductance to air", view));
        Fact toBody = Fact.of(view.station().conductanceToBody(), () -> Names.ofStation("Conductance to body", view));
        if (toAir.isKnown() && toBody.isKnown() || !air.isKnown()) {
            Fact heat = air.with(toAir, (t, g) -> t * g).with(body.with(toBody, (t, g) -> t * g), Double::sum);
            return Span.exactly(heat.with(toAir.with(toBody, Double::sum), (sum, conductance) -> sum / conductance));
        }
        List<String> narrowing = new ArrayList<>(Fact.allMissing(toAir, toBody));
        Fact cooler = air.with(body, Math::min);
        Fact warmer = air.with(body, Math::max);
        return new Span(cooler, warmer, narrowing);
    }
}
