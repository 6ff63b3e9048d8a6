package coilbook.criteria;

import java.util.List;
import java.util.function.Function;

import coilbook.criteria.internal.Derivation;
import coilbook.criteria.internal.heat.CycleRate;
import coilbook.criteria.internal.heat.WindingTemperature;
import coilbook.criteria.internal.insulation.CoilInsulation;
import coilbook.criteria.internal.mains.BusStress;
import coilbook.criteria.internal.mains.InputFrequency;
import coilbook.criteria.internal.mains.InputNominal;
import coilbook.criteria.internal.mains.InputSettingRecorded;
import coilbook.criteria.internal.mains.InputTolerance;
import coilbook.criteria.internal.output.CoilClass;
import coilbook.criteria.internal.output.HoldCurrent;
import coilbook.criteria.internal.output.OutputCurrent;
import coilbook.criteria.internal.output.PullInCurrent;
import coilbook.criteria.internal.records.SerialUnique;
import coilbook.criteria.internal.winding.WindingResistanceCriterion;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;

/** Every criterion there is, in the order in which lists show them. */
public final class Criteria {

    private static final int FEW = 64;

    private Criteria() {
    }

    /** All criteria, for their texts and to judge with. */
    public static List<Criterion> all() {
        return using(new Derivation(FEW));
    }

    /** The criterion with that id.
     *
     * @throws IllegalArgumentException if there is none
     */
    public static Criterion byId(String id) {
        return all().stream().filter(c -> c.id().equals(id)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no criterion is called " + id));
    }

    /** All criteria, those on electrics asking a shared derivation where they need a further one. */
    static List<Criterion> using(Function<StationCircuit, StationElectrics> derivation) {
        Criterion coilInsulation = new CoilInsulation();
        Criterion outputCurrent = new OutputCurrent(derivation);
        return List.of(new InputNominal(), new InputTolerance(), new InputFrequency(), new InputSettingRecorded(), new BusStress(),
                new CoilClass(List.of(coilInsulation, outputCurrent)), new PullInCurrent(derivation), new HoldCurrent(derivation),
                outputCurrent,
                new WindingTemperature(derivation), new CycleRate(derivation), coilInsulation, new WindingResistanceCriterion(),
                new SerialUnique());
    }
}
