package coilbook.workbench.internal.model;

import java.util.List;

import coilbook.fleet.InputProblem;

/**
 * What came of bringing files in.
 *
 * @param written whether anything was written: not where something was rejected and partial acceptance was not asked for
 */
public record BroughtIn(int read, int created, int changed, int unchanged, List<InputProblem> rejected, boolean written) {

    public BroughtIn {
        rejected = List.copyOf(rejected);
    }
}
