package coilbook.criteria.internal.station;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.internal.Shown;
import coilbook.fleet.Circuit;
import coilbook.fleet.Datum;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.StationView;
import coilbook.fleet.TransformerType;
import coilbook.fleet.TransformerUse;
import coilbook.fleet.Unit;

/**
 * The voltage and frequency that reach a driver's input: the circuit's nominal voltage with its own tolerance, else the market's band, widened by
 * every reading, and taken through the circuit's transformer. The secondary voltage of a transformer is taken as that at no load: its regulation
 * lowers the low end.
 *
 * @param nominal V rms
 * @param low lowest to be expected, V rms
 * @param high highest to be expected, V rms
 * @param frequency nominal, Hz
 * @param frequencies nominal and every reading, Hz
 * @param lowBasis what the low end rests on, in words
 * @param highBasis what the high end rests on, in words
 */
public record InputVoltage(Fact nominal, Fact low, Fact high, Fact frequency, List<Double> frequencies, String lowBasis, String highBasis) {

    public InputVoltage {
        frequencies = List.copyOf(frequencies);
    }

    public static InputVoltage of(StationView view) {
        Circuit circuit = view.circuit();
        if (circuit == null) {
            Fact none = Fact.missing(Names.ofStation("Circuit", view));
            return new InputVoltage(none, none, none, none, List.of(), "", "");
        }
        Fact mains = Fact.of(circuit.nominalVoltage(), () -> Names.ofCircuit("Nominal voltage", circuit));
        Fact frequency = Fact.of(circuit.nominalFrequency(), () -> Names.ofCircuit("Nominal frequency", circuit));
        MarketTolerance band = mains.isKnown() && view.market() != null ? view.market().tolerance(mains.value()) : null;
        End low = end(mains, circuit.toleranceBelow(), -1, band == null ? null : band.lowest(),
                "Tolerance below", circuit);
        End high = end(mains, circuit.toleranceAbove(), 1, band == null ? null : band.highest(),
                "Tolerance above", circuit);
        for (Reading reading : Readings.onCircuit(view, ReadingQuantity.MAINS_VOLTAGE)) {
            low = low.lower(reading);
            high = high.higher(reading);
        }
        Transformer transformer = Transformer.of(view);
        low = new End(transformer.lowest(low.volts()), low.basis() + transformer.words());
        high = new End(transformer.highest(high.volts()), high.basis() + transformer.words());
        for (Reading reading : Readings.onStation(view, ReadingQuantity.MAINS_VOLTAGE)) {
            low = low.lower(reading);
            high = high.higher(reading);
        }
        List<Double> frequencies = new ArrayList<>();
        if (frequency.isKnown()) {
            frequencies.add(frequency.value());
        }
        Readings.onCircuit(view, ReadingQuantity.MAINS_FREQUENCY).forEach(r -> frequencies.add(r.value()));
        Readings.onStation(view, ReadingQuantity.MAINS_FREQUENCY).forEach(r -> frequencies.add(r.value()));
        return new InputVoltage(transformer.highest(mains), low.volts(), high.volts(), frequency, frequencies, low.basis(), high.basis());
    }

    private static End end(Fact mains, Datum own, int sign, Datum market, String heading, Circuit circuit) {
        if (own != null) {
            return new End(mains.map(v -> v * (1 + sign * own.value())).noStrongerThan(own.provenance()),
                    "circuit’s tolerance " + (sign < 0 ? "−" : "+") + Shown.of(own.value(), Unit.PERCENT));
        } else if (market != null) {
            return new End(mains.map(v -> v * market.value()).noStrongerThan(market.provenance()),
                    "market’s band " + Shown.of(market.value(), Unit.PERCENT) + " of nominal"
                            + (market.provenance() == Provenance.ASSUMED ? ", assumed" : ""));
        }
        return new End(mains.isKnown() ? Fact.missing(Names.ofCircuit(heading, circuit)) : mains, "");
    }

    /** One end of the band with what it rests on. */
    private record End(Fact volts, String basis) {

        End lower(Reading reading) {
            return volts.isKnown() && reading.value() < volts.value() ? at(reading) : this;
        }

        End higher(Reading reading) {
            return volts.isKnown() && reading.value() > volts.value() ? at(reading) : this;
        }

        private static End at(Reading reading) {
            return new End(Fact.known(reading.value(), Provenance.MEASURED), "reading of " + reading.takenAt().toLocalDate());
        }
    }

    /** The circuit's transformer, or none: a ratio, and the fall of voltage at full load. */
    private record Transformer(Fact ratio, Fact regulation, String words) {

        static Transformer of(StationView view) {
            TransformerType type = view.transformer();
            Circuit circuit = view.circuit();
            if (circuit.transformerUse() == TransformerUse.NONE || type == null && circuit.transformerType() == null) {
                return new Transformer(Fact.known(1, null), Fact.known(0, null), "");
            } else if (type == null) {
                Fact none = Fact.missing("Transformer type " + circuit.transformerType() + " in the catalogue");
                return new Transformer(none, none, "");
            }
            String of = " of transformer type " + type.code();
            Fact ratio = Fact.of(type.secondaryVoltage(), () -> "Secondary voltage" + of).with(
                    Fact.of(type.primaryVoltage(), () -> "Primary voltage" + of),
                    (secondary, primary) -> secondary / primary);
            return new Transformer(ratio, Fact.of(type.regulation(), () -> "Regulation" + of), " through transformer " + type.code());
        }

        Fact lowest(Fact mains) {
            return mains.with(ratio, (v, r) -> v * r).with(regulation, (v, fall) -> v * (1 - fall));
        }

        Fact highest(Fact mains) {
            return mains.with(ratio, (v, r) -> v * r);
        }
    }
}
