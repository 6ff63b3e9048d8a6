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
import coilbook.electrics.Data;
import coilbook.electrics.Derived;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.FittedKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** In the worst case the current still reaches pull-in within the pull-in time, and stays there until the valve has opened. */
public final class PullInCurrent extends ElectricCriterion {

    public PullInCurrent(Function<StationCircuit, StationElectrics> derivation) {
        super(new Description("pull-in-current",
                "Does the worst-case current reach the pull-in current and stay there until the valve is open?",
                "driver to coil", Scope.STATION,
                List.of("Pull-in current", "Inductance", "Resistance at 20 °C", "Opening delay", "Thermal resistance", "Insulation class",
                        "Coil ambient highest", "Cycle rate", "On-time", "Cable type", "Cable length",
                        "the electrical values of the driver type"),
                "Pull-in current of the coil type and opening delay of the valve type (catalogue entries)", "",
                "two-level: I_peak = V/R · (1 − e^(−t_pull-in · R/L)) ≥ I_pull-in, R hot, with the cable; line-capacitor: the exact solution of"
                        + " capacitor and coil at the lowest mains, worst phase; break-even L* = R · t_pull-in / ln(1/(1 − I_pull-in · R/V)) (circuit"
                        + " theory)",
                List.of("another coil", "another driver", "another input setting", "a shorter or thicker cable", "a lower duty",
                        "measure inductance and pull-in current")),
                derivation);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics, StationData data) {
        Derived peak = electrics.peakAtLow();
        Fact pullIn = data.fact(Data.PULL_IN_CURRENT);
        Judgement judgement = judgement().at(corner(peak.at())).restsOn(data.weakestOfCurrent())
                .restsOn(data.weakest(Data.PULL_IN_CURRENT, Data.AMBIENT, Data.THERMAL_RESISTANCE));
        if (!peak.known() || !pullIn.isKnown()) {
            return withoutPeak(station, electrics, data, pullIn, judgement);
        }
        boolean lineOperated = station.driver().kind() == DriverKind.LINE_CAPACITOR;
        if (lineOperated) {
            judgement.restsOn(data.weakest(Data.MAINS_LOWEST_VOLTAGE));
        }
        conditions(judgement, peak.at(), lineOperated).compared(peak.value(), pullIn.value(), Unit.AMPERE)
                .number("Peak current", peak.value(), Unit.AMPERE).number("Pull-in current", pullIn.value(), Unit.AMPERE)
                .number("Cable", data.cable().value(), Unit.OHM)
                .number("Time to pull-in", electrics.timeToPullIn().value(), Unit.MILLISECOND);
        String needs = "; pull-in needs " + Shown.beside(pullIn.value(), peak.value(), Unit.AMPERE) + source(pullIn.provenance());
        String sentence = "Peak current " + Shown.of(peak.value(), Unit.AMPERE) + under(peak.at(), lineOperated) + data.channel().words()
                + needs;
        Verdict verdict = Compare.floor(peak.value(), pullIn.value(), station.fleetSettings().get(FleetSettings.MARGIN));
        if (verdict == Verdict.NONCONFORMITY) {
            return missed(electrics, data, pullIn, judgement, sentence);
        }
        return opening(station, electrics, data, judgement, verdict, sentence);
    }

    private Finding missed(StationElectrics electrics, StationData data, Fact pullIn, Judgement judgement, String sentence) {
        boolean certain = missedEvenInTheCoolest(data, StationElectrics::peakAtLow, peak -> !Compare.atLeast(peak, pullIn.value()));
        List<String> open = certain ? List.of() : unfavourable(data, electrics.peakAtLow(), data.ambient().highest().narrowing());
        return conclude(judgement, Verdict.NONCONFORMITY, sentence, List.of(), open);
    }

    /** Reached; it must stay there for the valve's opening delay. */
    private Finding opening(StationView station, StationElectrics electrics, StationData data, Judgement judgement, Verdict verdict,
            String sentence) {
        Datum delay = station.valve() == null ? null : station.valve().openingDelay();
        Fact opening = Fact.of(delay,
                () -> station.valve() == null ? Names.noType(FittedKind.VALVE, station) : Names.ofValve("Opening delay", station));
        Derived held = electrics.heldAtPullIn();
        List<String> missing = new ArrayList<>(opening.missing());
        missing.addAll(data.missing(held));
        judgement.number("Held at pull-in", held.value(), Unit.MILLISECOND).number("Opening delay", opening.value(), Unit.MILLISECOND)
                .restsOn(opening.provenance());
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing, sentence + ". " + Judgement.missingSentence(missing));
        }
        String stays = Shown.of(held.value(), Unit.MILLISECOND);
        String needed = Shown.beside(opening.value(), held.value(), Unit.MILLISECOND) + " to open" + source(opening.provenance());
        if (!Compare.atLeast(held.value(), opening.value())) {
            judgement.compared(held.value(), opening.value(), Unit.MILLISECOND);
            boolean certain = missedEvenInTheCoolest(data, StationElectrics::heldAtPullIn, time -> !Compare.atLeast(time, opening.value()));
            return conclude(judgement, Verdict.NONCONFORMITY, sentence + "; it stays there only " + stays + ", the valve needs " + needed,
                    List.of(),
                    certain ? List.of() : unfavourable(data, held, data.ambient().highest().narrowing()));
        }
        return conclude(judgement, verdict, sentence + "; it stays there " + stays + ", the valve needs " + needed, data.cable().missing(),
                List.of());
    }

    /** Without an inductance, pull-in is missed for certain where even the direct current of a cool winding is too little. */
    private static Finding withoutPeak(StationView station, StationElectrics electrics, StationData data, Fact pullIn,
            Judgement judgement) {
        Derived peak = electrics.peakAtLow();
        List<String> missing = new ArrayList<>(data.missing(peak));
        missing.addAll(pullIn.missing());
        Fact most = DirectCurrent.most(station, data);
        if (pullIn.isKnown() && most.isKnown() && !Compare.atLeast(most.value(), pullIn.value())) {
            return judgement.compared(most.value(), pullIn.value(), Unit.AMPERE).number("Pull-in current", pullIn.value(), Unit.AMPERE)
                    .number("Current without inductance", most.value(), Unit.AMPERE).restsOn(most.provenance()).is(Verdict.NONCONFORMITY,
                            "Even without inductance and with a cool winding the current is at most " + Shown.of(most.value(), Unit.AMPERE)
                                    + data.channel().words() + "; pull-in needs " + Shown.beside(pullIn.value(), most.value(), Unit.AMPERE)
                                    + source(pullIn.provenance()));
        }
        Fact ratio = Comparison.ratio(station, data);
        if (ratio.isKnown()) {
            return Comparison.judge(ratio, station, judgement, "peak current");
        }
        Derived breakEven = electrics.breakEvenInductance();
        if (pullIn.isKnown() && breakEven.known() && !Double.isInfinite(breakEven.value()) && breakEven.value() > 0
                && peak.missing().equals(List.of(Data.INDUCTANCE))) {
            return judgement.number("Break-even inductance", breakEven.value(), Unit.MILLIHENRY).undetermined(missing,
                    Judgement.missingSentence(missing) + "; pull-in is reached below " + Shown.of(breakEven.value(), Unit.MILLIHENRY)
                            + under(breakEven.at(), false));
        }
        return judgement.undetermined(missing);
    }
}
