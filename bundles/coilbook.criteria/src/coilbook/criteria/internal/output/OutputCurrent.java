package coilbook.criteria.internal.output;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.ElectricCriterion;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.Names;
import coilbook.criteria.internal.station.StationData;
import coilbook.criteria.internal.station.WindingResistance;
import coilbook.electrics.Data;
import coilbook.electrics.Derived;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.FittedKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The highest current stays within what the driver's channel and module give, and the coil is no lower a load than the driver allows. */
public final class OutputCurrent extends ElectricCriterion {

    public OutputCurrent(Function<StationCircuit, StationElectrics> derivation) {
        super(new Description("output-current",
                "Does the highest current stay within the driver’s output limit, and the coil above its lowest load?",
                "driver to coil", Scope.STATION,
                List.of("Output current limit", "Module current limit", "Lowest load", "Resistance at 20 °C", "Inductance",
                        "Coil ambient lowest",
                        "On-time", "the electrical values of the driver type"),
                "Output current limit, module current limit and lowest load (catalogue entry of the driver type)", "",
                "I_peak at highest mains and cold winding, resistance at − tolerance, ≤ limit (inductance not known: V/R, its bound); R₂₀ · (1 −"
                        + " tolerance) ≥ lowest load (circuit theory)",
                List.of("another coil", "another driver")), derivation);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics, StationData data) {
        DriverType driver = station.driver();
        if (driver == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.DRIVER, station)));
        }
        List<Finding> findings = new ArrayList<>();
        findings.add(current(station, electrics.peakAtHigh(), data, "channel",
                Fact.of(driver.outputCurrentLimit(), () -> Names.ofDriver("Output current limit", station))));
        if (driver.moduleCurrentLimit() != null) {
            findings.add(current(station, electrics.peakAtHigh(), data, "module", Fact.of(driver.moduleCurrentLimit(), () -> "")));
        }
        if (driver.lowestLoad() != null) {
            findings.add(load(station, data, Fact.of(driver.lowestLoad(), () -> "")));
        }
        Finding worst = findings.get(0);
        for (Finding finding : findings) {
            if (finding.verdict().compareTo(worst.verdict()) < 0) {
                worst = finding;
            }
        }
        return worst;
    }

    private Finding current(StationView station, Derived peak, StationData data, String of, Fact limit) {
        Judgement judgement = judgement().at(corner(peak.at())).restsOn(data.weakestOfCurrent()).restsOn(limit.provenance());
        List<String> missing = new ArrayList<>(data.missing(peak));
        missing.addAll(limit.missing());
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        boolean lineOperated = station.driver().kind() == DriverKind.LINE_CAPACITOR;
        if (lineOperated) {
            judgement.restsOn(data.weakest(Data.MAINS_HIGHEST_VOLTAGE));
        }
        conditions(judgement, peak.at(), lineOperated).compared(peak.value(), limit.value(), Unit.AMPERE)
                .number("Peak current", peak.value(), Unit.AMPERE).number("Limit of the " + of, limit.value(), Unit.AMPERE);
        String bound = peak.isBound() ? " at most" : "";
        String sentence = "Peak current" + bound + " " + Shown.of(peak.value(), Unit.AMPERE) + under(peak.at(), lineOperated)
                + data.channel().words() + "; the driver’s " + of + " gives " + Shown.beside(limit.value(), peak.value(), Unit.AMPERE)
                + source(limit.provenance());
        List<String> open = unfavourable(data, peak, data.ambient().lowest().narrowing());
        open.addAll(data.cable().missing());
        return conclude(judgement, Compare.ceiling(peak.value(), limit.value(), station.fleetSettings().get(FleetSettings.MARGIN)),
                sentence,
                List.of(), open);
    }

    /** Where the least resistance comes from: a reading without its uncertainty keeps the type's tolerance. */
    private static String from(StationView station) {
        WindingResistance winding = WindingResistance.of(station);
        String spread = " less " + Shown.of(winding.tolerance().value(), Unit.PERCENT);
        return winding.measured() ? "read " + Shown.of(winding.resistance20().value(), Unit.OHM) + spread
                : "catalogue " + Shown.of(winding.resistance20().value(), Unit.OHM) + spread;
    }

    private Finding load(StationView station, StationData data, Fact lowest) {
        Fact resistance = data.fact(Data.COIL_RESISTANCE).map(r -> data.circuit().coil().lowestResistance20());
        Judgement judgement = judgement().restsOn(Fact.weakest(resistance, lowest)).compared(resistance.value(), lowest.value(), Unit.OHM)
                .number("Resistance at 20 °C, least", resistance.value(), Unit.OHM).number("Lowest load", lowest.value(), Unit.OHM);
        if (!resistance.isKnown()) {
            return judgement.undetermined(resistance.missing());
        }
        String sentence = "The coil can be as low as " + Shown.of(resistance.value(), Unit.OHM) + " at 20 °C (" + from(station) + ")"
                + data.channel().words() + "; the driver’s lowest load is " + Shown.beside(lowest.value(), resistance.value(), Unit.OHM)
                + source(lowest.provenance());
        return judgement.is(Compare.floor(resistance.value(), lowest.value(), station.fleetSettings().get(FleetSettings.MARGIN)), sentence);
    }
}
