package coilbook.workbench.internal.stations;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;

/**
 * How a verdict is shown: by a symbol and a word; colour comes on top. The colours follow IEC 60073: red for danger, yellow for caution; conformity gets
 * no colour, since green would say "safe", which no verdict here says.
 */
public enum VerdictMark {
    HAZARD("▲"), NONCONFORMITY("✖"), UNDETERMINED("?"), OBSERVATION("●"), CONCEDED("◇"), CONFORMITY("✔"), NOT_YET_RECORDED("○"),
    NOT_APPLICABLE("–");

    private final String symbol;

    VerdictMark(String symbol) {
        this.symbol = symbol;
    }

    public String symbol() {
        return symbol;
    }

    /** The mark of a finding. */
    public static VerdictMark of(Finding finding) {
        if (finding.conceded()) {
            return CONCEDED;
        }
        return finding.hazard() ? HAZARD : of(finding.verdict());
    }

    /** The mark of a verdict that is no hazard. */
    public static VerdictMark of(Verdict verdict) {
        return switch (verdict) {
            case NONCONFORMITY -> NONCONFORMITY;
            case UNDETERMINED -> UNDETERMINED;
            case OBSERVATION -> OBSERVATION;
            case CONFORMITY -> CONFORMITY;
            case NOT_YET_RECORDED -> NOT_YET_RECORDED;
            case NOT_APPLICABLE -> NOT_APPLICABLE;
        };
    }

    /** The mark of a station's row; {@code null} if it was not judged. */
    public static VerdictMark of(StatusRow row) {
        if (row.get(StatusColumn.HAZARDS) instanceof Number hazards && hazards.longValue() > 0) {
            return HAZARD;
        }
        Object word = row.get(StatusColumn.VERDICT);
        for (Verdict verdict : Verdict.values()) {
            if (verdict.label().equals(word)) {
                return of(verdict);
            }
        }
        for (VerdictMark mark : values()) {
            if (mark.name().equalsIgnoreCase(String.valueOf(word))) {
                return mark;
            }
        }
        return null;
    }

    /** The key of its word in the texts of the stations. */
    public String key() {
        return "mark." + name();
    }
}
