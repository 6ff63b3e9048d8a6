package coilbook.jobs.internal.merge;

import coilbook.fleet.InputProblem;

/** A line that cannot be taken, with the reason. */
final class RejectedLine extends Exception {

    private static final long serialVersionUID = 1L;

    private final transient InputProblem problem;

    RejectedLine(InputProblem problem) {
        super(problem.sentence());
        this.problem = problem;
    }

    InputProblem problem() {
        return problem;
    }
}
