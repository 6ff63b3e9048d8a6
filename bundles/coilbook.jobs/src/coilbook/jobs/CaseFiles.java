package coilbook.jobs;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

import org.osgi.service.component.annotations.Component;

import com.fasterxml.jackson.databind.node.ObjectNode;

import coilbook.charts.ChartSize;
import coilbook.charts.ChartTheme;
import coilbook.charts.ChartWords;
import coilbook.charts.WaveformChart;
import coilbook.charts.WaveformPlot;
import coilbook.electrics.CircuitCase;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.Trace;
import coilbook.electrics.WaveformResult;
import coilbook.electrics.Waveforms;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.jobs.internal.InputFile;
import coilbook.jobs.internal.casefile.CaseReader;
import coilbook.jobs.internal.casefile.CaseResults;

/** One circuit in a file, without any register: reads the case, solves it, and gives the answer as data, samples and picture. */
@Component(service = CaseFiles.class)
public final class CaseFiles {

    private static final long MOST_BYTES = 1 << 20;
    private static final double SAMPLE_INTERVAL = 1e-4;
    private static final int MOST_SAMPLES = 200_000;

    /** A case with its answer. */
    public record Solved(String file, CircuitCase circuit, WaveformResult result) {

        /** The answer, its keys in their stable order. */
        public ObjectNode json() {
            return CaseResults.json(result);
        }
    }

    /**
     * Reads and solves a case file.
     *
     * @throws CoilbookException with reason BAD_INPUT, naming every key at fault, its value and what was expected
     */
    public Solved solve(Path file) throws CoilbookException {
        Path name = file.getFileName();
        return solve(name == null ? file.toString() : name.toString(), InputFile.bytes(file, MOST_BYTES));
    }

    /** As {@link #solve(Path)}, from the file's text. */
    public Solved solve(String name, byte[] json) throws CoilbookException {
        CircuitCase circuit = CaseReader.read(name, json);
        try {
            return new Solved(name, circuit, Waveforms.solve(circuit));
        } catch (IllegalCaseException e) {
            throw refused(name, e);
        }
    }

    /** The waveform of the cycles asked for as CSV with {@code time_s,source_V,coil_A}; a sample each 0.1 ms, fewer for long cases. */
    public byte[] csv(Solved solved) throws CoilbookException {
        return CaseResults.csv(trace(solved)).getBytes(StandardCharsets.UTF_8);
    }

    /** The waveform of the cycles asked for as a PNG picture. */
    public byte[] png(Solved solved) throws CoilbookException {
        WaveformPlot plot = new WaveformPlot(solved.file(), trace(solved), solved.circuit().coil().pullInCurrent(),
                solved.circuit().coil().dropOutCurrent());
        return WaveformChart.draw(plot, ChartTheme.LIGHT, new ChartSize(960, 600, 1), ChartWords.of(Locale.ENGLISH)).png();
    }

    private static Trace trace(Solved solved) throws CoilbookException {
        CircuitCase circuit = solved.circuit();
        double span = circuit.cycles() * circuit.period();
        try {
            return Waveforms.trace(circuit, Math.max(SAMPLE_INTERVAL, span / MOST_SAMPLES));
        } catch (IllegalCaseException e) {
            throw refused(solved.file(), e);
        }
    }

    private static CoilbookException refused(String name, IllegalCaseException e) {
        String key = CaseReader.jsonKey(e.field());
        InputProblem problem = new InputProblem(name, "", 0, key, e.value(), "expected " + e.expected());
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT,
                name + ", key " + key + ", value " + e.value() + ": expected " + e.expected(), List.of(problem), e);
    }
}
