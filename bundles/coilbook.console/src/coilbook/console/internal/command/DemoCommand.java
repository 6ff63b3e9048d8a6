package coilbook.console.internal.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

import coilbook.console.internal.ExitCode;
import coilbook.console.internal.Json;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.console.internal.Work;
import coilbook.fleet.CoilbookException;
import coilbook.jobs.Demo;
import coilbook.register.OpenMode;
import coilbook.register.Register;

/** {@code demo}: a new register full of invented data. */
@Command(name = "demo", mixinStandardHelpOptions = true, description = "Fill a new register with invented, reproducible data.")
public final class DemoCommand implements Callable<Integer> {

    private final Services services;
    private final Terminal terminal;

    @Spec
    private CommandSpec spec;
    @Mixin
    private RegisterOption register;
    @Option(names = "--stations", paramLabel = "N", defaultValue = "120", description = "how many stations; default ${DEFAULT-VALUE}")
    private int stations;
    @Option(names = "--seed", paramLabel = "S", defaultValue = "1", description = "the same seed gives the same data; default ${DEFAULT-VALUE}")
    private long seed;
    @Option(names = "--json", description = "one JSON object on standard output")
    private boolean json;

    public DemoCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        if (stations < 1 || stations > Demo.MOST_STATIONS) {
            throw new ParameterException(spec.commandLine(),
                    "--stations is " + stations + "; expected a whole number from 1 to " + Demo.MOST_STATIONS);
        }
        Path base = register.base(terminal);
        fill(base);
        if (json) {
            Json.write(terminal.out(), generator -> {
                generator.writeStringField("register", base.toString());
                generator.writeNumberField("stations", stations);
                generator.writeNumberField("seed", seed);
            });
        } else {
            terminal.out().println(stations + " invented stations stand in " + base + ".");
        }
        return ExitCode.DONE;
    }

    /** A demonstration that could not be finished leaves no register that would stand in the way of the next. */
    private void fill(Path base) throws CoilbookException, IOException {
        boolean made = false;
        boolean complete = false;
        try (Work work = new Work(terminal); Register open = services.registers().get().open(base, OpenMode.CREATE_NEW)) {
            made = true;
            services.demo().get().fill(open, stations, seed, work.progress());
            complete = true;
        } finally {
            if (made && !complete) {
                Files.deleteIfExists(base.resolveSibling(base.getFileName() + ".mv.db"));
                Files.deleteIfExists(base.resolveSibling(base.getFileName() + ".view.mv.db"));
            }
        }
    }
}
