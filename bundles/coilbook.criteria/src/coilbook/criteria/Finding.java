package coilbook.criteria;

import java.util.List;

/**
 * Evidence judged against a criterion.
 *
 * @param criterion the criterion's stable id
 * @param verdict the result
 * @param hazard whether it can hurt someone: shock, burn, fire; only ever true for a nonconformity
 * @param evidence never {@code null}
 * @param missing the missing inputs in the words of the columns; empty unless undetermined or not yet recorded
 * @param conceded whether a valid concession accepts it; it is then counted apart
 */
public record Finding(String criterion, Verdict verdict, boolean hazard, Evidence evidence, List<String> missing, boolean conceded) {

    public Finding {
        missing = List.copyOf(missing);
        if (hazard && verdict != Verdict.NONCONFORMITY) {
            throw new IllegalArgumentException("only a nonconformity can be a hazard");
        }
    }
}
