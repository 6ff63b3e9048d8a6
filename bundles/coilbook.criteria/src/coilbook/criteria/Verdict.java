package coilbook.criteria;

import coilbook.fleet.Labelled;

/**
 * How evidence stands against a criterion, the worst first. The words are those of ISO 9000, except <em>observation</em> (common audit practice: met with a
 * small margin), <em>undetermined</em> (an input is missing or contradictory), <em>not yet recorded</em> (a first reading was never taken; counted apart,
 * never part of the headline) and <em>not applicable</em> (the criterion does not arise).
 */
public enum Verdict implements Labelled {
    NONCONFORMITY("nonconformity"), UNDETERMINED("undetermined"), OBSERVATION("observation"), CONFORMITY("conformity"),
    NOT_YET_RECORDED("not yet recorded"), NOT_APPLICABLE("not applicable");

    private final String label;

    Verdict(String label) {
        this.label = label;
    }

    @Override
    public String label() {
        return label;
    }

    /** Whether a finding with this verdict is reported and counted. */
    public boolean isReported() {
        return this == NONCONFORMITY || this == UNDETERMINED || this == OBSERVATION;
    }
}
