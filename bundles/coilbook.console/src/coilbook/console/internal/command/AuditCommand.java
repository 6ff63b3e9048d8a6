package coilbook.console.internal.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

import coilbook.console.internal.ColumnMap;
import coilbook.console.internal.ExitCode;
import coilbook.console.internal.InputFiles;
import coilbook.console.internal.Json;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.console.internal.Work;
import coilbook.console.internal.text.CheckReport;
import coilbook.console.internal.text.ImportReport;
import coilbook.fleet.CoilbookException;
import coilbook.jobs.Audit.Audited;
import coilbook.jobs.ImportOptions;
import coilbook.register.FleetScope;
import coilbook.register.OpenMode;
import coilbook.register.Register;

/** {@code audit}: an audit workbook of a register, or the whole way from files. */
@Command(name = "audit", mixinStandardHelpOptions = true, description = "Write the audit workbook of a register, or of files, for which no register is kept.")
public final class AuditCommand implements Callable<Integer> {

    private static final String DASH = "-";

    private final Services services;
    private final Terminal terminal;

    @Spec
    private CommandSpec spec;
    @Parameters(paramLabel = "FILE", arity = "0..*", description = "exchange workbooks and flat lists; - is standard input")
    private List<Path> files = new ArrayList<>();
    @Mixin
    private RegisterOption register;
    @Option(names = "--out", paramLabel = "FILE.xlsx", required = true, description = "where the workbook goes; - is standard output")
    private Path out;
    @Option(names = "--site", paramLabel = "CODE", description = "only this site; may be given several times")
    private List<String> sites = new ArrayList<>();
    @Option(names = "--customer", paramLabel = "CODE", description = "only this customer's sites")
    private String customer;
    @Option(names = "--as-of", paramLabel = "DATE", converter = DayConverter.class, description = "as of the end of this day at the site; default: today")
    private LocalDate asOf;
    @Option(names = "--columns", paramLabel = "MAP.json", description = "with files: heading to field, where a heading is not recognised")
    private Path columns;
    @Option(names = "--json", description = "one JSON object on standard output")
    private boolean json;

    public AuditCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        refuseMixtures();
        boolean toStandardOutput = out.toString().equals(DASH);
        Path folder = toStandardOutput ? Files.createTempDirectory("coilbook-audit") : null;
        try {
            Path workbook = toStandardOutput ? folder.resolve("audit.xlsx") : terminal.resolve(out);
            Audited audited = audit(workbook);
            report(audited, toStandardOutput ? null : workbook);
            if (toStandardOutput && audited.isWritten()) {
                Files.copy(workbook, terminal.out());
                terminal.out().flush();
            }
            return audited.isWritten() ? ExitCode.DONE : ExitCode.BAD_INPUT;
        } finally {
            if (folder != null) {
                delete(folder);
            }
        }
    }

    private void refuseMixtures() {
        if (!files.isEmpty() && (register.isGiven() || !sites.isEmpty() || customer != null)) {
            throw new ParameterException(spec.commandLine(), "--register, --site and --customer do not go with files");
        } else if (files.isEmpty() && columns != null) {
            throw new ParameterException(spec.commandLine(), "--columns goes with files only");
        } else if (json && out.toString().equals(DASH)) {
            throw new ParameterException(spec.commandLine(), "--json and --out - both want standard output");
        }
    }

    private Audited audit(Path workbook) throws CoilbookException {
        try (Work work = new Work(terminal)) {
            if (files.isEmpty()) {
                FleetScope scope = new FleetScope(customer == null ? List.of() : List.of(customer), sites, List.of(), List.of());
                try (Register open = services.registers().get().open(register.base(terminal), OpenMode.EXISTING)) {
                    return services.audit().get().ofRegister(open, scope, asOf, workbook, work.progress());
                }
            }
            Map<String, String> map = columns == null ? Map.of() : ColumnMap.read(terminal.resolve(columns));
            try (InputFiles inputs = new InputFiles(terminal, files)) {
                return services.audit().get().ofFiles(inputs.paths(), map, asOf, workbook, work.progress());
            }
        }
    }

    private void report(Audited audited, Path workbook) throws CoilbookException {
        if (audited.imported() != null) {
            ImportReport report = new ImportReport(audited.imported(), ImportOptions.by(terminal.user()));
            report.rejections(terminal.err());
            if (!json && workbook != null) {
                report.text(terminal.out());
            }
        }
        if (json) {
            Json.write(terminal.out(), generator -> {
                Json.text(generator, "out", audited.isWritten() ? workbook.toString() : null);
                if (audited.isWritten()) {
                    CheckReport.head(generator, audited.asOf(), audited.counts());
                } else {
                    generator.writeNumberField("rejected", audited.imported().rejected().size());
                }
            });
        } else if (audited.isWritten() && workbook != null) {
            CheckReport.counts(terminal.out(), audited.asOf(), audited.counts());
            terminal.out().println("The audit workbook is " + workbook + ".");
            CheckReport.cautions(terminal.out());
        }
    }

    private static void delete(Path folder) {
        try {
            Files.deleteIfExists(folder.resolve("audit.xlsx"));
            Files.deleteIfExists(folder);
        } catch (IOException e) {
            folder.toFile().deleteOnExit();
        }
    }
}
