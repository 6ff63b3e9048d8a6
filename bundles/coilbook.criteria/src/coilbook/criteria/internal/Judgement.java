package coilbook.criteria.internal;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.Provenance;
import coilbook.fleet.Unit;

/** Gathers the evidence of one finding. Numbers are kept in the unit their name states. */
public final class Judgement {

    private final String criterion;
    private final Map<String, Double> numbers = new LinkedHashMap<>();
    private double value = Double.NaN;
    private double limit = Double.NaN;
    private Unit unit = Unit.NONE;
    private String corner = "";
    private Provenance provenance;
    private boolean hazard;

    Judgement(String criterion) {
        this.criterion = criterion;
    }

    /** What is compared, in SI. */
    public Judgement compared(double computed, double against, Unit shownIn) {
        this.value = computed;
        this.limit = against;
        this.unit = shownIn;
        return this;
    }

    public Judgement at(String atCorner) {
        this.corner = atCorner;
        return this;
    }

    /** A number the result was computed from, in SI; passed over where it is missing. */
    public Judgement number(String name, double si, Unit shownIn) {
        if (!Double.isNaN(si) && !Double.isInfinite(si)) {
            numbers.put(shownIn == Unit.NONE ? name : name + " [" + shownIn.symbol() + "]", shownIn.fromSi(si));
        }
        return this;
    }

    /** A provenance the result rests on; the weakest counts. */
    public Judgement restsOn(Provenance source) {
        this.provenance = Provenance.weaker(provenance, source);
        return this;
    }

    /** Whether breaking the criterion like this can hurt. */
    public Judgement hazard(boolean canHurt) {
        this.hazard = canHurt;
        return this;
    }

    public Finding is(Verdict verdict, String sentence) {
        return new Finding(criterion, verdict, hazard && verdict == Verdict.NONCONFORMITY, evidence(sentence), List.of(), false);
    }

    /** An input is missing or contradictory: which, in the words of the columns. */
    public Finding undetermined(Collection<String> missing, String sentence) {
        return new Finding(criterion, Verdict.UNDETERMINED, false, evidence(sentence), List.copyOf(new LinkedHashSet<>(missing)), false);
    }

    /** Inputs are missing, and nothing more can be said. */
    public Finding undetermined(Collection<String> missing) {
        return undetermined(missing, missingSentence(missing));
    }

    /** Whatever verdict a reading would decide, none was ever taken. */
    public Finding notYetRecorded(String missing, String sentence) {
        return new Finding(criterion, Verdict.NOT_YET_RECORDED, false, evidence(sentence), List.of(missing), false);
    }

    public Finding notApplicable(String reason) {
        return new Finding(criterion, Verdict.NOT_APPLICABLE, false, evidence(reason), List.of(), false);
    }

    /** "Not recorded: this; that." */
    public static String missingSentence(Collection<String> missing) {
        return "Not recorded: " + String.join("; ", new LinkedHashSet<>(missing));
    }

    private Evidence evidence(String sentence) {
        return new Evidence(value, limit, unit, corner, sentence, provenance, numbers);
    }
}
