package coilbook.jobs;

import java.util.Map;

/**
 * How files are brought in.
 *
 * @param columns heading to field where recognition cannot tell; may be empty
 * @param acceptPartial whether sound rows are written even if others are rejected
 * @param dryRun whether nothing is written at all
 * @param who the person in whose name the Change is recorded
 */
public record ImportOptions(Map<String, String> columns, boolean acceptPartial, boolean dryRun, String who) {

    public ImportOptions {
        columns = Map.copyOf(columns);
    }

    /** Everything or nothing, by headings alone. */
    public static ImportOptions by(String who) {
        return new ImportOptions(Map.of(), false, false, who);
    }
}
