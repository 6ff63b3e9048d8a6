package coilbook.console.internal;

import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;

import picocli.CommandLine;

import coilbook.console.internal.command.AuditCommand;
import coilbook.console.internal.command.CheckCommand;
import coilbook.console.internal.command.DemoCommand;
import coilbook.console.internal.command.HistoryCommand;
import coilbook.console.internal.command.ImportCommand;
import coilbook.console.internal.command.RootCommand;
import coilbook.console.internal.command.WaveformCommand;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;

/** The command line: parses, runs, words what went wrong, and says how it ended. Knows no process; streams come in and a code goes out. */
public final class Console {

    private final Services services;
    private final Terminal terminal;
    private final String version;

    public Console(Services services, Terminal terminal, String version) {
        this.services = services;
        this.terminal = terminal;
        this.version = version;
    }

    /** Runs one command and returns the exit code. */
    public int run(String... arguments) {
        CommandLine commands = commands();
        if (arguments.length == 0) {
            commands.usage(terminal.err());
            return ExitCode.USAGE;
        }
        int code = commands.execute(arguments);
        terminal.out().flush();
        terminal.err().flush();
        return code;
    }

    private CommandLine commands() {
        CommandLine root = new CommandLine(new RootCommand());
        root.addSubcommand(new DemoCommand(services, terminal));
        root.addSubcommand(new ImportCommand(services, terminal));
        root.addSubcommand(new CheckCommand(services, terminal));
        root.addSubcommand(new AuditCommand(services, terminal));
        root.addSubcommand(new WaveformCommand(services, terminal));
        root.addSubcommand(new HistoryCommand(services, terminal));
        root.getCommandSpec().version("Coilbook " + version);
        root.getSubcommands().values().forEach(command -> command.getCommandSpec().version("Coilbook " + version));
        root.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
        root.setOut(writer(terminal.out()));
        root.setErr(writer(terminal.err()));
        root.setUsageHelpWidth(110);
        root.setParameterExceptionHandler(this::usage);
        root.setExecutionExceptionHandler((problem, command, parsed) -> failed(problem));
        return root;
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), true);
    }

    private int usage(CommandLine.ParameterException problem, String[] arguments) {
        terminal.tell("coilbook: " + words(problem));
        CommandLine.UnmatchedArgumentException.printSuggestions(problem, problem.getCommandLine().getErr());
        String name = problem.getCommandLine().getCommandSpec().qualifiedName(" ");
        terminal.tell("Run \"" + name + " --help\" for what it takes.");
        return ExitCode.USAGE;
    }

    /** An unknown word in our own terms; the library's message speaks of argument indexes. */
    private static String words(CommandLine.ParameterException problem) {
        if (problem instanceof CommandLine.UnmatchedArgumentException unmatched && !unmatched.getUnmatched().isEmpty()) {
            String first = unmatched.getUnmatched().get(0);
            boolean atTop = problem.getCommandLine().getParent() == null;
            return (first.startsWith("-") ? "unknown option " : atTop ? "unknown command " : "unexpected word ") + first;
        }
        return problem.getMessage();
    }

    private int failed(Exception problem) {
        if (problem instanceof CoilbookException told) {
            terminal.tell("coilbook: " + told.getMessage());
            for (InputProblem detail : told.problems()) {
                if (!told.getMessage().contains(detail.problem())) {
                    terminal.tell("  " + detail.sentence());
                }
            }
            return ExitCode.of(told.reason());
        }
        return unexpected(problem);
    }

    /** Words what nobody expected, with the log file that has the rest. */
    int unexpected(Throwable problem) {
        Path log = ErrorLog.write(problem,
                List.of(terminal.place().dataFolder().resolve("log"), Path.of(System.getProperty("java.io.tmpdir"))));
        terminal.tell("coilbook: something unexpected happened; "
                + (log == null ? "a log file could not be written." : "the log file " + log + " has the details."));
        return ExitCode.UNEXPECTED;
    }
}
