package coilbook.criteria;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.internal.Derivation;
import coilbook.criteria.internal.records.Concessions;
import coilbook.criteria.internal.records.Recheck;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.StationView;

/**
 * Computes and judges stations: a pure function of what a view holds, its day included. Safe for use by several threads; one assessor for a whole check is
 * best, since it remembers the electrics of equal circuits.
 */
public final class Assessor {

    private static final int CIRCUITS_REMEMBERED = 20_000;

    private final Derivation derivation;
    private final List<Criterion> criteria;

    public Assessor() {
        this(CIRCUITS_REMEMBERED);
    }

    /** @param circuitsRemembered how many different circuits' electrics are kept, at least one; about 5 kB each */
    public Assessor(int circuitsRemembered) {
        this.derivation = new Derivation(circuitsRemembered);
        this.criteria = Criteria.using(derivation);
    }

    /** The criteria it judges by, in the order of the findings. */
    public List<Criterion> criteria() {
        return criteria;
    }

    public Assessment assess(StationView view) {
        StationElectrics electrics = derivation.apply(StationCircuits.of(view));
        List<Finding> findings = new ArrayList<>(criteria.size());
        for (Criterion criterion : criteria) {
            findings.add(Concessions.apply(criterion.judge(view, electrics), view));
        }
        return new Assessment(view, electrics, findings, Recheck.on(view));
    }
}
