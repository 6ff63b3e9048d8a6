package coilbook.criteria.internal.records;

import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.fleet.Concession;
import coilbook.fleet.StationView;

/**
 * Whether a concession accepts a nonconformity: valid on the day, for this criterion, a hazard with a second person's approval, and the evidence no worse
 * than when it was granted.
 */
public final class Concessions {

    private Concessions() {
    }

    public static Finding apply(Finding finding, StationView view) {
        if (finding.verdict() != Verdict.NONCONFORMITY) {
            return finding;
        }
        for (Concession concession : view.concessions()) {
            if (concession.criterion().equals(finding.criterion()) && concession.trueOn(view.asOf()) && isApproved(concession, finding)
                    && !isWorse(concession, finding.evidence())) {
                return new Finding(finding.criterion(), finding.verdict(), finding.hazard(), finding.evidence(), finding.missing(), true);
            }
        }
        return finding;
    }

    private static boolean isApproved(Concession concession, Finding finding) {
        String second = concession.secondApprover();
        return !finding.hazard() || second != null && !second.isBlank() && !second.strip().equalsIgnoreCase(concession.grantedBy().strip());
    }

    /** Farther beyond the limit than when it was granted. */
    private static boolean isWorse(Concession concession, Evidence evidence) {
        Double granted = concession.valueWhenGranted();
        if (granted == null || Double.isNaN(evidence.value()) || Double.isNaN(evidence.limit())) {
            return false;
        }
        return evidence.value() > evidence.limit() ? !Compare.atMost(evidence.value(), granted)
                : !Compare.atLeast(evidence.value(), granted);
    }
}
