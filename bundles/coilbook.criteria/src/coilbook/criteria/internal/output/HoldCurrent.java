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
import coilbook.fleet.DriverKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * In the worst case the hold current stays above drop-out by the fleet's hold margin: its mean always, its least where it does not ripple; a dip below
 * drop-out may last no longer than the coil rides through.
 */
public final class HoldCurrent extends ElectricCriterion {

    public HoldCurrent(Function<StationCircuit, StationElectrics> derivation) {
        super(new Description("hold-current", "Does the worst-case hold current stay above drop-out with the fleet’s hold margin?",
                "driver to coil",
                Scope.STATION,
                List.of("Drop-out current", "Ride-through time", "Inductance", "Resistance at 20 °C", "Thermal resistance",
                        "Insulation class",
                        "Coil ambient lowest", "Coil ambient highest", "Cycle rate", "On-time", "Cable type", "Cable length",
                        "the electrical values of the driver type"),
                "Drop-out current and ride-through time of the coil type (catalogue entry), times the hold margin (fleet setting; common practice, no"
                        + " source)",
                "",
                "I_hold,mean ≥ hold margin · I_drop-out; time below I_drop-out ≤ ride-through time, from the later of peak and opening complete to"
                        + " switch-off; regulated: I_hold → V_hold / (R_hot + R_cable); line-capacitor: source 0.9003 · V_rms − rectifier drop, cold and hot"
                        + " winding, all phases (circuit theory)",
                List.of("another coil", "another driver", "another input setting", "a shorter or thicker cable",
                        "measure the drop-out current")),
                derivation);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics, StationData data) {
        Derived least = electrics.holdMinimum();
        Derived mean = electrics.holdMean();
        Fact dropOut = data.fact(Data.DROP_OUT_CURRENT);
        if (least.known() && Double.isInfinite(least.value())) {
            return judgement()
                    .notApplicable("The on-time ends before the valve is open and the current has passed its peak: there is no hold");
        }
        Judgement judgement = judgement().at("low").restsOn(data.weakestOfCurrent())
                .restsOn(data.weakest(Data.DROP_OUT_CURRENT, Data.AMBIENT, Data.THERMAL_RESISTANCE));
        List<String> missing = new ArrayList<>(data.missing(least));
        missing.addAll(data.missing(mean));
        missing.addAll(dropOut.missing());
        if (!missing.isEmpty()) {
            Fact ratio = Comparison.ratio(station, data);
            return ratio.isKnown() ? Comparison.judge(ratio, station, judgement, "hold current") : judgement.undetermined(missing);
        }
        boolean lineOperated = station.driver().kind() == DriverKind.LINE_CAPACITOR;
        if (lineOperated) {
            judgement.restsOn(data.weakest(Data.MAINS_LOWEST_VOLTAGE));
        }
        double factor = station.fleetSettings().get(FleetSettings.HOLD_MARGIN);
        double needed = factor * dropOut.value();
        conditions(judgement, mean.at(), lineOperated).number("Hold current, mean", mean.value(), Unit.AMPERE)
                .number("Hold current, least", least.value(), Unit.AMPERE).number("Drop-out current", dropOut.value(), Unit.AMPERE)
                .number("Hold margin", factor, Unit.NONE).number("Below drop-out", electrics.belowDropOut().value(), Unit.MILLISECOND);
        return judge(station, electrics, data, judgement, needed);
    }

    private Finding judge(StationView station, StationElectrics electrics, StationData data, Judgement judgement, double needed) {
        Derived least = electrics.holdMinimum();
        Derived mean = electrics.holdMean();
        boolean lineOperated = station.driver().kind() == DriverKind.LINE_CAPACITOR;
        double margin = station.fleetSettings().get(FleetSettings.MARGIN);
        Fact dropOut = data.fact(Data.DROP_OUT_CURRENT);
        String limit = "; " + Shown.beside(needed, mean.value(), Unit.AMPERE) + " needed, " + Shown.of(needed / dropOut.value(), Unit.NONE)
                + " × drop-out "
                + Shown.of(dropOut.value(), Unit.AMPERE) + source(dropOut.provenance());
        String about = "Hold current " + Shown.of(mean.value(), Unit.AMPERE) + " mean" + under(mean.at(), lineOperated)
                + data.channel().words();
        Verdict byMean = Compare.floor(mean.value(), needed, margin);
        if (byMean == Verdict.NONCONFORMITY) {
            return conclude(judgement.compared(mean.value(), needed, Unit.AMPERE), byMean, about + limit, List.of(),
                    missedEvenInTheCoolest(data, StationElectrics::holdMean, hold -> !Compare.atLeast(hold, needed)) ? List.of()
                            : unfavourable(data, mean, data.ambient().highest().narrowing()));
        } else if (!Compare.atLeast(least.value(), dropOut.value())) {
            return dip(station, electrics, data, judgement, about);
        }
        boolean ripples = !Compare.atLeast(least.value(), needed);
        Verdict verdict = ripples ? Verdict.OBSERVATION : Compare.floor(least.value(), needed, margin);
        judgement.compared(least.value(), needed, Unit.AMPERE);
        return conclude(judgement, verdict, about + ", " + Shown.beside(least.value(), needed, Unit.AMPERE) + " least" + limit,
                data.cable().missing(),
                List.of());
    }

    /** A dip below drop-out: bridged where it is shorter than the ride-through time. */
    private static Finding dip(StationView station, StationElectrics electrics, StationData data, Judgement judgement, String about) {
        Derived below = electrics.belowDropOut();
        Derived least = electrics.holdMinimum();
        double dropOut = data.fact(Data.DROP_OUT_CURRENT).value();
        Fact ride = Fact.of(station.coil().rideThrough(), () -> Names.ofCoil("Ride-through time", station));
        String dips = about + ", but it dips to " + Shown.beside(least.value(), dropOut, Unit.AMPERE) + under(least.at(), false)
                + ", below drop-out "
                + Shown.of(dropOut, Unit.AMPERE) + " for " + Shown.of(below.value(), Unit.MILLISECOND);
        judgement.number("Ride-through time", ride.value(), Unit.MILLISECOND).restsOn(ride.provenance());
        List<String> missing = new ArrayList<>(ride.missing());
        missing.addAll(data.missing(below));
        if (!missing.isEmpty()) {
            return judgement.compared(least.value(), dropOut, Unit.AMPERE).undetermined(missing,
                    dips + ". " + Judgement.missingSentence(missing));
        }
        boolean bridged = Compare.atMost(below.value(), ride.value());
        judgement.compared(below.value(), ride.value(), Unit.MILLISECOND);
        String rides = dips + "; the coil rides through " + Shown.beside(ride.value(), below.value(), Unit.MILLISECOND)
                + source(ride.provenance());
        return conclude(judgement, bridged ? Verdict.OBSERVATION : Verdict.NONCONFORMITY, rides, data.cable().missing(),
                unfavourable(data, least, data.ambient().lowest().narrowing()));
    }
}
