package coilbook.console.internal.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

import coilbook.console.internal.ColumnMap;
import coilbook.console.internal.ExitCode;
import coilbook.console.internal.InputFiles;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.console.internal.Work;
import coilbook.console.internal.text.ImportReport;
import coilbook.exchange.Incoming;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Progress;
import coilbook.jobs.BringIn;
import coilbook.jobs.ImportOptions;
import coilbook.jobs.ImportResult;
import coilbook.jobs.RegisterPlace;
import coilbook.register.OpenMode;
import coilbook.register.Register;

/** {@code import}: exchange workbooks and flat lists into a register, as one step. */
@Command(name = "import", mixinStandardHelpOptions = true, description = "Bring exchange workbooks and flat lists into a register, as one step.", footer = "A register that is missing is created, unless a row is rejected.")
public final class ImportCommand implements Callable<Integer> {

    private final Services services;
    private final Terminal terminal;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "XLSX, CSV or TSV; - is standard input")
    private List<Path> files;
    @Mixin
    private RegisterOption register;
    @Option(names = "--columns", paramLabel = "MAP.json", description = "heading to field, where a heading is not recognised")
    private Path columns;
    @Option(names = "--dry-run", description = "say what would happen, and write nothing")
    private boolean dryRun;
    @Option(names = "--accept-partial", description = "write the sound rows even if others are rejected")
    private boolean acceptPartial;
    @Option(names = "--json", description = "one JSON object on standard output")
    private boolean json;

    public ImportCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        Map<String, String> map = columns == null ? Map.of() : ColumnMap.read(terminal.resolve(columns));
        ImportOptions options = new ImportOptions(map, acceptPartial, dryRun, terminal.user());
        ImportResult result;
        try (Work work = new Work(terminal); InputFiles inputs = new InputFiles(terminal, files)) {
            BringIn bringIn = services.bringIn().get();
            Incoming incoming = bringIn.read(inputs.paths(), map, work.progress());
            result = bring(bringIn, incoming, inputs.names(), options, work.progress());
            work.close();
            for (InputProblem notice : incoming.notices()) {
                terminal.tell("note: " + notice.sentence());
            }
        }
        ImportReport report = new ImportReport(result, options);
        report.rejections(terminal.err());
        if (json) {
            report.json(terminal.out());
        } else {
            report.text(terminal.out());
        }
        return result.rejected().isEmpty() ? ExitCode.DONE : ExitCode.BAD_INPUT;
    }

    /** Tries on a register in memory first where there is none yet, so that a file which is refused leaves no empty register behind. */
    private ImportResult bring(BringIn bringIn, Incoming incoming, String names, ImportOptions options, Progress progress)
            throws CoilbookException {
        Path base = register.base(terminal);
        if (!RegisterPlace.exists(base)) {
            ImportOptions trial = new ImportOptions(options.columns(), options.acceptPartial(), true, options.who());
            try (Register temporary = services.registers().get().temporary()) {
                ImportResult result = bringIn.bring(temporary, incoming, names, trial, progress);
                if (dryRun || !result.rejected().isEmpty() && !acceptPartial) {
                    return result;
                }
            }
        }
        try (Register open = services.registers().get().open(base, OpenMode.CREATE_IF_MISSING)) {
            return bringIn.bring(open, incoming, names, options, progress);
        }
    }
}
