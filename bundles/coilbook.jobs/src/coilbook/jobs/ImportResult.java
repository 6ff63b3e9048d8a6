package coilbook.jobs;

import java.util.List;

import coilbook.fleet.InputProblem;

/**
 * What bringing files in came to. Counts are of the files' rows: {@code read} is the sum of created, changed, unchanged and the rows rejected.
 *
 * @param created rows whose subject was new to the register
 * @param changed rows that altered anything else
 * @param unchanged rows that said what the register knew
 * @param rejected what could not be taken; a row may have several entries
 * @param incompleteTypes catalogue types that a list named and the catalogue lacked, created with what the list says
 * @param written whether the register was altered
 */
public record ImportResult(int read, int created, int changed, int unchanged, List<InputProblem> rejected, List<String> incompleteTypes,
        boolean written) {

    public ImportResult {
        rejected = List.copyOf(rejected);
        incompleteTypes = List.copyOf(incompleteTypes);
    }
}
