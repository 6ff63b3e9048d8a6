package coilbook.exchange.internal.in;

import java.util.List;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;

/** The exceptions that refuse a whole file, in words for the person who gave it. */
final class Refusal {

    private Refusal() {
    }

    static CoilbookException of(String file, String problem) {
        return of(file, "", problem, null);
    }

    static CoilbookException of(String file, String sheet, String problem, Throwable cause) {
        InputProblem input = new InputProblem(file, sheet, 0, "", "", problem);
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, input.sentence(), List.of(input), cause);
    }

    static CoilbookException of(List<InputProblem> problems) {
        StringBuilder text = new StringBuilder();
        for (InputProblem problem : problems) {
            text.append(text.length() == 0 ? "" : "\n").append(problem.sentence());
        }
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, text.toString(), problems, null);
    }
}
