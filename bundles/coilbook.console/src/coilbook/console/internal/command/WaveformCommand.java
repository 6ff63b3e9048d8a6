package coilbook.console.internal.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

import com.fasterxml.jackson.databind.JsonNode;

import coilbook.console.internal.ExitCode;
import coilbook.console.internal.Json;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.fleet.CoilbookException;
import coilbook.jobs.CaseFiles;
import coilbook.jobs.OutputFile;

/** {@code waveform}: one circuit, no register needed. The answer is one JSON object, with {@code --json} or without. */
@Command(name = "waveform", mixinStandardHelpOptions = true, description = "Compute the waveform of one circuit; the answer is one JSON object on standard output.")
public final class WaveformCommand implements Callable<Integer> {

    private static final String DASH = "-";

    private final Services services;
    private final Terminal terminal;

    @Spec
    private CommandSpec spec;
    @Option(names = "--case", paramLabel = "FILE.json", required = true, description = "the circuit; - is standard input")
    private Path circuit;
    @Option(names = "--csv", paramLabel = "OUT.csv", description = "write time_s,source_V,coil_A; - is standard output, then without the JSON")
    private Path csv;
    @Option(names = "--png", paramLabel = "OUT.png", description = "draw voltage and current against time")
    private Path png;
    @Option(names = "--json", description = "one JSON object on standard output (always, unless --csv is -)")
    private boolean json;

    public WaveformCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        boolean csvOut = isDash(csv);
        boolean pngOut = isDash(png);
        if (csvOut && pngOut || json && (csvOut || pngOut)) {
            throw new ParameterException(spec.commandLine(), "only one thing can go to standard output");
        }
        Path csvFile = csv == null || csvOut ? null : checked(csv);
        Path pngFile = png == null || pngOut ? null : checked(png);
        CaseFiles cases = services.caseFiles().get();
        CaseFiles.Solved solved = isDash(circuit) ? cases.solve("standard input", terminal.in().readAllBytes())
                : cases.solve(terminal.resolve(circuit));
        if (csv != null) {
            put(csvFile, cases.csv(solved));
        }
        if (png != null) {
            put(pngFile, cases.png(solved));
        }
        if (!csvOut && !pngOut) {
            Json.write(terminal.out(), generator -> {
                for (Map.Entry<String, JsonNode> entry : solved.json().properties()) {
                    generator.writeFieldName(entry.getKey());
                    Json.tree(generator, entry.getValue());
                }
            });
        }
        return ExitCode.DONE;
    }

    private static boolean isDash(Path path) {
        return path != null && path.toString().equals(DASH);
    }

    private Path checked(Path path) throws CoilbookException {
        Path file = terminal.resolve(path);
        OutputFile.check(file);
        return file;
    }

    private void put(Path file, byte[] bytes) throws CoilbookException, IOException {
        if (file == null) {
            terminal.out().write(bytes);
            terminal.out().flush();
        } else {
            OutputFile.write(file, bytes);
        }
    }
}
