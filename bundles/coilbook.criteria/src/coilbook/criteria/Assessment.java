package coilbook.criteria;

import java.time.LocalDate;
import java.util.List;

import coilbook.electrics.StationElectrics;
import coilbook.fleet.StationView;

/**
 * A station computed and judged.
 *
 * @param findings one for each criterion, in the order of the criteria; conformity and not applicable included
 * @param recheckOn the earliest date on which the mere passing of time can turn a verdict, or {@code null}
 */
public record Assessment(StationView station, StationElectrics electrics, List<Finding> findings, LocalDate recheckOn) {

    public Assessment {
        findings = List.copyOf(findings);
    }

    /** Findings that are nonconformities, can hurt and are not conceded. */
    public long hazards() {
        return findings.stream().filter(f -> f.hazard() && !f.conceded()).count();
    }

    /** Findings of a verdict that are neither hazards nor conceded. */
    public long count(Verdict verdict) {
        return findings.stream().filter(f -> f.verdict() == verdict && !f.hazard() && !f.conceded()).count();
    }

    public long conceded() {
        return findings.stream().filter(Finding::conceded).count();
    }

    /** The worst verdict that is not conceded; conformity if nothing else is left. */
    public Verdict worst() {
        Verdict worst = Verdict.CONFORMITY;
        for (Finding finding : findings) {
            if (!finding.conceded() && finding.verdict().compareTo(worst) < 0) {
                worst = finding.verdict();
            }
        }
        return worst;
    }
}
