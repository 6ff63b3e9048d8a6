package coilbook.criteria.internal.heat;

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
import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.CycleRateLimit;
import coilbook.electrics.Data;
import coilbook.electrics.Derived;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The duty is no faster than winding, source, release and valve allow: the mean rate against heat, the burst rate against the others. */
public final class CycleRate extends ElectricCriterion {

    public CycleRate(Function<StationCircuit, StationElectrics> derivation) {
        super(new Description("cycle-rate", "Is the duty within the highest cycle rate, and which limit rules it?", "temperature",
                Scope.STATION,
                List.of("Cycle rate", "Burst rate", "On-time", "Thermal resistance", "Insulation class", "Coil ambient highest",
                        "Inductance",
                        "Pull-in current", "Drop-out current", "Highest cycle rate", "Closing delay",
                        "the electrical values of the driver type"),
                "Limit of the thermal class (IEC 60085) less the hot-spot allowance; recovery of the source up to pull-in; release time and the valve’s"
                        + " closing delay; highest cycle rate of the valve type (catalogue entry)",
                "",
                "f_heat = (θ_class − allowance − θ_ambient) / (R_th · winding energy per cycle); f_release = 1 / (t_on + t_release + closing delay);"
                        + " f_recovery: every cycle still pulls in; f_valve (circuit theory)",
                List.of("a lower duty", "another coil", "another driver", "another valve")), derivation);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics, StationData data) {
        CycleRateLimit limits = electrics.cycleRate();
        Fact mean = data.duty().meanRate();
        Fact burst = data.duty().burstRate();
        List<Part> parts = List.of(new Part(CycleRateLimit.Ruling.WINDING_TEMPERATURE, limits.windingTemperature(), mean),
                new Part(CycleRateLimit.Ruling.SOURCE_RECOVERY, limits.sourceRecovery(), burst),
                new Part(CycleRateLimit.Ruling.RELEASE_TIME, limits.release(), burst),
                new Part(CycleRateLimit.Ruling.VALVE_MECHANICS, limits.valve(), burst));
        List<String> missing = new ArrayList<>();
        Part worst = null;
        for (Part part : parts) {
            missing.addAll(part.rate().missing());
            missing.addAll(data.missing(part.limit()));
            if (part.isKnown() && (worst == null || part.load() > worst.load())) {
                worst = part;
            }
        }
        Judgement judgement = judgement().restsOn(data.weakestOfCurrent()).restsOn(data.weakest(Data.DUTY_RATE, Data.DUTY_ON_TIME))
                .number("Cycle rate", mean.value(), Unit.PER_SECOND).number("Burst rate", burst.value(), Unit.PER_SECOND);
        parts.forEach(p -> judgement.number("Highest by " + p.ruling().label(), p.limit().value(), Unit.PER_SECOND));
        if (worst != null) {
            judgement.restsOn(provenance(data, worst.ruling()));
        }
        return judge(data, judgement, worst, missing);
    }

    private Finding judge(StationData data, Judgement judgement, Part worst, List<String> missing) {
        if (worst == null) {
            return judgement.undetermined(missing);
        }
        judgement.at(corner(worst.limit().at()));
        boolean broken = !Compare.atMost(worst.rate().value(), worst.limit().value());
        if (!broken && !missing.isEmpty()) {
            return judgement.undetermined(missing);
        } else if (Double.isInfinite(worst.limit().value())) {
            return judgement.is(Verdict.CONFORMITY,
                    "Duty " + Shown.of(worst.rate().value(), Unit.PER_SECOND) + "; nothing limits it at this on-time");
        }
        judgement.compared(worst.rate().value(), worst.limit().value(), Unit.PER_SECOND);
        String which = worst.ruling() == CycleRateLimit.Ruling.WINDING_TEMPERATURE ? "mean" : "highest";
        String sentence = "Duty " + Shown.of(worst.rate().value(), Unit.PER_SECOND) + " " + which + "; "
                + Shown.beside(worst.limit().value(), worst.rate().value(), Unit.PER_SECOND) + " allowed, ruled by "
                + worst.ruling().label();
        return conclude(judgement, broken ? Verdict.NONCONFORMITY : Verdict.CONFORMITY, sentence, List.of(), open(data, worst));
    }

    /** Data bounded on the unfavourable side; a limit by heat that is missed in warm surroundings may be met in cooler ones. */
    private List<String> open(StationData data, Part worst) {
        if (worst.ruling() != CycleRateLimit.Ruling.WINDING_TEMPERATURE) {
            return data.bounded(worst.limit());
        }
        double rate = worst.rate().value();
        if (data.cable().isKnown()
                && missedEvenInTheCoolest(data, e -> e.cycleRate().windingTemperature(), highest -> !Compare.atMost(rate, highest))) {
            return List.of();
        }
        List<String> bounds = new ArrayList<>(data.ambient().highest().narrowing());
        bounds.addAll(data.cable().missing());
        return unfavourable(data, worst.limit(), bounds);
    }

    private static Provenance provenance(StationData data, CycleRateLimit.Ruling ruling) {
        return switch (ruling) {
            case WINDING_TEMPERATURE -> data.weakest(Data.THERMAL_RESISTANCE, Data.AMBIENT);
            case SOURCE_RECOVERY -> data.weakest(Data.PULL_IN_CURRENT);
            case RELEASE_TIME -> data.weakest(Data.DROP_OUT_CURRENT, Data.VALVE_CLOSING_DELAY);
            case VALVE_MECHANICS -> data.weakest(Data.VALVE_HIGHEST_RATE);
            case NONE -> null;
        };
    }

    /** A limit with the rate that it rules. */
    private record Part(CycleRateLimit.Ruling ruling, Derived limit, Fact rate) {

        boolean isKnown() {
            return limit.known() && rate.isKnown();
        }

        double load() {
            return limit.value() == 0 ? rate.value() > 0 ? Double.POSITIVE_INFINITY : 0 : rate.value() / limit.value();
        }
    }
}
