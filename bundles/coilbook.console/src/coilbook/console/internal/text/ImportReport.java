package coilbook.console.internal.text;

import java.io.PrintStream;

import coilbook.console.internal.Json;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.jobs.ImportOptions;
import coilbook.jobs.ImportResult;

/** What bringing files in came to, for a person and for a program. */
public final class ImportReport {

    private final ImportResult result;
    private final ImportOptions options;

    public ImportReport(ImportResult result, ImportOptions options) {
        this.result = result;
        this.options = options;
    }

    /** What could not be taken, a line each. */
    public void rejections(PrintStream err) {
        for (InputProblem problem : result.rejected()) {
            err.println(problem.sentence());
        }
        if (!result.rejected().isEmpty()) {
            err.println("coilbook: " + result.rejected().size() + " value" + (result.rejected().size() == 1 ? "" : "s")
                    + " could not be taken; " + (options.acceptPartial() && !options.dryRun() ? "the sound rows were written."
                            : "nothing was written" + (options.acceptPartial() ? "." : " (--accept-partial writes the sound rows).")));
        }
    }

    /** The counts, for a person. */
    public void text(PrintStream out) {
        out.println(
                (options.dryRun() ? "Dry run, nothing written: " : "") + result.read() + " rows read, " + result.created() + " created, "
                        + result.changed() + " changed, " + result.unchanged() + " unchanged, "
                        + (result.read() - result.created() - result.changed() - result.unchanged()) + " rejected.");
        if (!result.incompleteTypes().isEmpty()) {
            out.println("Not in the catalogue, created as incomplete: " + String.join(", ", result.incompleteTypes()) + ".");
        }
    }

    /** The counts and rejections, for a program. */
    public void json(PrintStream out) throws CoilbookException {
        Json.write(out, generator -> {
            generator.writeNumberField("read", result.read());
            generator.writeNumberField("created", result.created());
            generator.writeNumberField("changed", result.changed());
            generator.writeNumberField("unchanged", result.unchanged());
            generator.writeArrayFieldStart("rejected");
            for (InputProblem problem : result.rejected()) {
                generator.writeStartObject();
                generator.writeStringField("file", problem.file());
                generator.writeStringField("sheet", problem.sheet());
                generator.writeNumberField("row", problem.row());
                generator.writeStringField("column", problem.column());
                generator.writeStringField("value", problem.value());
                generator.writeStringField("problem", problem.problem());
                generator.writeEndObject();
            }
            generator.writeEndArray();
            generator.writeArrayFieldStart("incompleteTypes");
            for (String type : result.incompleteTypes()) {
                generator.writeString(type);
            }
            generator.writeEndArray();
        });
    }
}
