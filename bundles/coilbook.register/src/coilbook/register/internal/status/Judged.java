package coilbook.register.internal.status;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.register.Status.Counts;
import coilbook.register.StatusColumn;

/**
 * A station computed and judged, as status rows need it.
 *
 * @param findings the reported ones, in the order in which they are to be listed
 * @param worst the worst verdict that is not conceded
 * @param counts of this one station
 * @param computed the values of computed columns, in SI; a missing key is an unknown value
 * @param recheckOn the earliest date on which the mere passing of time can turn a verdict, or {@code null}
 */
public record Judged(List<Finding> findings, Verdict worst, Counts counts, Map<StatusColumn, Object> computed, LocalDate recheckOn) {

    public Judged {
        findings = List.copyOf(findings);
        computed = Map.copyOf(computed);
    }
}
