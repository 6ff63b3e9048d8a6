package coilbook.criteria.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.function.DoublePredicate;
import java.util.function.Function;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.Condition;
import coilbook.electrics.Derived;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * A criterion on derived electrics. Where an input is only bounded, a limit that is met at the unfavourable bound is met for certain, and one that is missed
 * at the favourable bound is missed for certain; everything between is undetermined.
 */
public abstract class ElectricCriterion extends DescribedCriterion {

    private final Function<StationCircuit, StationElectrics> derivation;

    /** @param derivation computes electrics; asked again only where a bound must be looked at from its other side */
    protected ElectricCriterion(Description description, Function<StationCircuit, StationElectrics> derivation) {
        super(description);
        this.derivation = derivation;
    }

    @Override
    public final Finding judge(StationView station, StationElectrics electrics) {
        return judge(station, electrics, new StationData(station));
    }

    /** The same with the station's data already looked up. */
    public abstract Finding judge(StationView station, StationElectrics electrics, StationData data);

    /**
     * Whether a limit that is missed in the warmest surroundings a coil can have is missed in the coolest too. False where the surroundings are known, or where
     * the value is bounded for other reasons: the first answer then stands.
     *
     * @param value taken from the electrics in the coolest surroundings
     */
    protected final boolean missedEvenInTheCoolest(StationData data, Function<StationElectrics, Derived> value, DoublePredicate missed) {
        if (data.ambient().highest().narrowing().isEmpty()) {
            return false;
        }
        Derived cooler = value.apply(derivation.apply(data.coolestCircuit()));
        return cooler.known() && cooler.bounded().isEmpty() && missed.test(cooler.value());
    }

    /** What keeps a limit that is missed from being missed for certain: data bounded on the unfavourable side. */
    protected static List<String> unfavourable(StationData data, Derived derived, List<String> furtherBounds) {
        LinkedHashSet<String> names = new LinkedHashSet<>(data.bounded(derived));
        names.addAll(furtherBounds);
        return new ArrayList<>(names);
    }

    /**
     * A finding, unless bounds leave it open.
     *
     * @param ifMet missing data that had to be taken on their favourable side
     * @param ifMissed missing data that had to be taken on their unfavourable side
     */
    protected static Finding conclude(Judgement judgement, Verdict verdict, String sentence, List<String> ifMet, List<String> ifMissed) {
        List<String> open = verdict == Verdict.NONCONFORMITY ? ifMissed : ifMet;
        if (open.isEmpty()) {
            return judgement.is(verdict, sentence);
        }
        String side = verdict == Verdict.NONCONFORMITY ? "unfavourable" : "favourable";
        return judgement.undetermined(open, Judgement.missingSentence(open) + "; taken on the " + side + " side: " + sentence);
    }

    /** ", winding 96 °C" and so on: the condition a value was computed for, as far as it plays a part. */
    protected static String under(Condition at, boolean lineOperated) {
        StringBuilder words = new StringBuilder();
        if (lineOperated && !Double.isNaN(at.mainsVoltage())) {
            words.append(" at ").append(Shown.of(at.mainsVoltage(), Unit.VOLT));
        }
        if (!Double.isNaN(at.windingTemperature())) {
            words.append(", winding ").append(Shown.of(at.windingTemperature(), Unit.CELSIUS));
        }
        return words.toString();
    }

    /** The conditions as numbers of the evidence. */
    protected static Judgement conditions(Judgement judgement, Condition at, boolean lineOperated) {
        if (lineOperated) {
            judgement.number("Mains voltage", at.mainsVoltage(), Unit.VOLT).number("Mains frequency", at.frequency(), Unit.HERTZ);
        }
        return judgement.number("Winding temperature", at.windingTemperature(), Unit.CELSIUS).number("Ambient", at.ambient(), Unit.CELSIUS);
    }

    /** The short name of a corner, as findings state it. */
    protected static String corner(Condition at) {
        return switch (at.corner()) {
            case LOW_HOT, LOW_COLD -> "low";
            case HIGH_COLD -> "high";
            case HOT -> "hot";
            case NOMINAL -> "nominal";
        };
    }

    /** " (catalogue)" and so on. */
    protected static String source(Provenance provenance) {
        return provenance == null ? "" : " (" + provenance.label() + ")";
    }
}
