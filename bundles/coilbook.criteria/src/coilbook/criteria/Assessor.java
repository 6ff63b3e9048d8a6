package coilbook.criteria;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.internal.Derivation;
import coilbook.criteria.internal.ElectricCriterion;
import coilbook.criteria.internal.records.Concessions;
import coilbook.criteria.internal.records.Recheck;
import coilbook.criteria.internal.station.StationData;
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
        StationData data = new StationData(view);
        StationElectrics electrics = derivation.apply(data.circuit());
        List<Finding> findings = new ArrayList<>(criteria.size());
        for (Criterion criterion : criteria) {
            Finding finding = criterion instanceof ElectricCriterion electric ? electric.judge(view, electrics, data)
                    : criterion.judge(view, electrics);
            findings.add(Concessions.apply(finding, view));
        }
        return new Assessment(view, electrics, findings, Recheck.on(view));
    }
}
