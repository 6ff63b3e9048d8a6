package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Random circuits against ngspice: run live where the judges are ({@code coilbook.judges=live}), else against what ngspice 39.3 gave for the very
 * same circuits. Within 0.5 %, energies 1 %; both cycles. Run {@link #main} with a path to record anew.
 */
class NgspiceJudgeTest {

    private static final int LINE_CAPACITOR = 14;
    private static final int TWO_LEVEL = 8;
    private static final int FIXED = 6;
    private static final Pattern MEASURED = Pattern.compile("^([a-z0-9]+)\\s+=\\s+([-+0-9.eE]+).*");

    @TempDir
    Path folder;

    private static Map<String, CircuitCase> circuits() {
        RandomCircuits random = new RandomCircuits(393);
        Map<String, CircuitCase> circuits = new LinkedHashMap<>();
        for (int index = 0; index < LINE_CAPACITOR; index++) {
            circuits.put("line-capacitor-" + index, random.lineCapacitor(2));
        }
        for (int index = 0; index < TWO_LEVEL; index++) {
            circuits.put("two-level-" + index, random.twoLevel(2));
        }
        for (int index = 0; index < FIXED; index++) {
            circuits.put("fixed-dc-" + index, random.fixedDc(2));
        }
        return circuits;
    }

    private static Map<String, Double> run(CircuitCase circuit, Path folder, String name) throws IOException, InterruptedException {
        Path netlist = folder.resolve(name + ".cir");
        Path log = folder.resolve(name + ".log");
        Files.writeString(netlist, Netlist.of(circuit));
        ProcessBuilder builder = new ProcessBuilder("ngspice", "-b", netlist.toString()).redirectErrorStream(true)
                .redirectOutput(log.toFile());
        builder.environment().put("NGSPICE_MEAS_PRECISION", "9");
        Process process = builder.start();
        assertTrue(process.waitFor(5, TimeUnit.MINUTES), "ngspice did not end on " + netlist);
        Map<String, Double> measured = new LinkedHashMap<>();
        for (String line : Files.readAllLines(log, StandardCharsets.ISO_8859_1)) {
            Matcher matcher = MEASURED.matcher(line);
            if (matcher.matches()) {
                measured.put(matcher.group(1), Double.parseDouble(matcher.group(2)));
            }
        }
        return measured;
    }

    @Test
    void twoCyclesOfRandomCircuits() throws IOException, InterruptedException, IllegalCaseException {
        boolean live = "live".equals(System.getProperty("coilbook.judges"));
        Figures recorded = Figures.read("judge-ngspice.csv");
        Map<String, CircuitCase> circuits = circuits();
        int compared = 0;
        for (Map.Entry<String, CircuitCase> entry : circuits.entrySet()) {
            Map<String, Double> judge = new LinkedHashMap<>();
            if (live) {
                judge = run(entry.getValue(), folder, entry.getKey());
            } else {
                for (Map.Entry<String, double[]> figure : recorded.of(entry.getKey()).entrySet()) {
                    judge.put(figure.getKey(), figure.getValue()[0]);
                }
            }
            compared += compare(entry.getKey() + " " + entry.getValue(), judge, entry.getValue());
        }
        assertTrue(compared >= 9 * circuits.size(), "only " + compared + " figures compared");
    }

    private static int compare(String what, Map<String, Double> judge, CircuitCase circuit) throws IllegalCaseException {
        WaveformResult result = Waveforms.solve(circuit);
        CycleResult first = result.cycles().get(0);
        CycleResult second = result.cycles().get(1);
        Map<String, Double> ours = new LinkedHashMap<>();
        ours.put("peak1", first.peakCurrent());
        ours.put("mean1", first.holdMeanCurrent());
        ours.put("least1", first.holdMinimumCurrent());
        ours.put("heat1", first.windingEnergy());
        ours.put("off1", first.currentAtSwitchOff());
        ours.put("release1", circuit.onTime() + first.releaseTime());
        ours.put("peak2", second.peakCurrent());
        ours.put("mean2", second.holdMeanCurrent());
        ours.put("least2", second.holdMinimumCurrent());
        ours.put("heat2", second.windingEnergy());
        ours.put("bus2", second.sourceVoltageAtSwitchOn());
        int compared = 0;
        for (Map.Entry<String, Double> figure : judge.entrySet()) {
            String quantity = figure.getKey();
            double tolerance = quantity.startsWith("heat") ? 0.01 : 0.005;
            double expected = figure.getValue();
            if (quantity.startsWith("release")) {
                assertEquals(expected - circuit.onTime(), first.releaseTime(), tolerance * (expected - circuit.onTime()) + 1e-6, what);
            } else {
                double floor = quantity.startsWith("least") ? 1e-3 * first.peakCurrent() : 0;
                assertEquals(expected, ours.get(quantity), tolerance * Math.max(Math.abs(expected), floor), what + " " + quantity);
            }
            compared++;
        }
        return compared;
    }

    /** Records the figures of a live ngspice into a file. */
    public static void main(String[] arguments) throws IOException, InterruptedException {
        Path folder = Files.createTempDirectory("judge");
        StringBuilder text = new StringBuilder(
                "# ngspice 39.3 (Debian 12) on two cycles of random circuits, written by NgspiceJudgeTest.main\n");
        text.append("case,quantity,ngspice\n");
        for (Map.Entry<String, CircuitCase> entry : circuits().entrySet()) {
            for (Map.Entry<String, Double> figure : run(entry.getValue(), folder, entry.getKey()).entrySet()) {
                text.append(String.format(Locale.ROOT, "%s,%s,%.9g%n", entry.getKey(), figure.getKey(), figure.getValue()));
            }
        }
        Files.writeString(Path.of(arguments[0]), text);
    }
}
