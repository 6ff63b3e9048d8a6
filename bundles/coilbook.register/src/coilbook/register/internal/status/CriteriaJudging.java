package coilbook.register.internal.status;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Assessment;
import coilbook.criteria.Assessor;
import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.electrics.CycleRateLimit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.register.Status.Counts;
import coilbook.register.StatusColumn;

/** Judges by the criteria. Margins are those of the criteria: the value's distance from its limit, at the corner where it is least. */
public final class CriteriaJudging implements Judging {

    private final Assessor assessor;
    private final String version;

    public CriteriaJudging(Assessor assessor) {
        this.assessor = assessor;
        this.version = EngineVersion.of(StationElectrics.class, "coilbook.electrics") + ", "
                + EngineVersion.of(Assessor.class, "coilbook.criteria");
    }

    @Override
    public String version() {
        return version;
    }

    @Override
    public Judged judge(StationView station) {
        Assessment assessment = assessor.assess(station);
        List<Finding> reported = assessment.findings().stream().filter(finding -> finding.verdict().isReported()).toList();
        Counts counts = new Counts(1, assessment.hazards(), assessment.count(Verdict.NONCONFORMITY), assessment.count(Verdict.OBSERVATION),
                assessment.count(Verdict.UNDETERMINED), assessment.conceded());
        return new Judged(reported, assessment.worst(), counts, computed(assessment), assessment.recheckOn());
    }

    private static Map<StatusColumn, Object> computed(Assessment assessment) {
        Map<StatusColumn, Object> values = new EnumMap<>(StatusColumn.class);
        StationElectrics electrics = assessment.electrics();
        if (electrics != null) {
            values.put(StatusColumn.PEAK_CURRENT, electrics.nominalPeak().value());
            values.put(StatusColumn.HOLD_CURRENT, electrics.nominalHold().value());
            values.put(StatusColumn.AVERAGE_POWER, electrics.averagePower().value());
            values.put(StatusColumn.WINDING_TEMPERATURE, electrics.windingTemperature().value());
            CycleRateLimit rate = electrics.cycleRate();
            if (rate.ruling() != CycleRateLimit.Ruling.NONE) {
                values.put(StatusColumn.HIGHEST_RATE, rate.highest().value());
                values.put(StatusColumn.RULING_LIMIT, rate.ruling().label());
            }
        }
        Provenance weakest = null;
        for (Finding finding : assessment.findings()) {
            Evidence evidence = finding.evidence();
            weakest = Provenance.weaker(weakest, evidence.provenance());
            switch (finding.criterion()) {
                case "pull-in-current" -> values.put(StatusColumn.PULL_IN_MARGIN, evidence.value() / evidence.limit() - 1);
                case "hold-current" -> values.put(StatusColumn.HOLD_MARGIN, evidence.value() / evidence.limit() - 1);
                case "winding-temperature" -> values.put(StatusColumn.TEMPERATURE_MARGIN, evidence.limit() - evidence.value());
                case "winding-resistance" -> values.put(StatusColumn.WINDING_READING, evidence.value());
                default -> {
                    // no column shows it
                }
            }
        }
        if (weakest != null) {
            values.put(StatusColumn.PROVENANCE, weakest.label());
        }
        return values;
    }
}
