package coilbook.jobs;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import com.fasterxml.jackson.databind.JsonNode;

import coilbook.fleet.CoilbookException;

/** Case files from text to answer. Figures of the line-capacitor and RL cases are those of ngspice on the same circuit (kept with its netlists). */
class CaseFilesTest {

    private static final String LINE = """
            {"mains": {"voltageV": %s, "frequencyHz": %s, "phaseDeg": %s},
             "driver": {"kind": "line-capacitor", "seriesResistanceOhm": 430, "capacitanceMicrofarad": 6.8, "rectifierDropV": 1.4,
                        "switchDropV": 0, "clampVoltageV": 0.7},
             "coil": {"resistance20Ohm": 250, "inductanceMillihenry": 200, "temperatureC": 20, "dropOutCurrentA": 0.016},
             "cable": {"loopResistanceOhm": 0}, "duty": {"cyclesPerSecond": 2, "onTimeMs": 300}, "cycles": 1}
            """;
    private static final String REGULATED = """
            {"driver": {"kind": "two-level", "pullInVoltageV": 48, "pullInTimeMs": 3, "holdVoltageV": 6, "levelChange": "source",
                        "switchDropV": 0, "clampVoltageV": 0.7},
             "coil": {"resistance20Ohm": 10, "inductanceMillihenry": 8, "temperatureC": 20, "pullInCurrentA": 2, "dropOutCurrentA": 0.3},
             "cable": {"loopResistanceOhm": 0}, "duty": {"cyclesPerSecond": 20, "onTimeMs": 20}, "cycles": 2}
            """;

    private final CaseFiles cases = new CaseFiles();

    private CaseFiles.Solved solve(String json) throws CoilbookException {
        return cases.solve("case.json", json.getBytes(StandardCharsets.UTF_8));
    }

    @ParameterizedTest
    @CsvSource({ "120, 60, 90, 168.3054, 0.4484966, 1.35392, 301.905187, 0.2762435",
            "100, 50, 90, 140.0212, 0.3740673, 1.36392, 301.823927, 0.2422019",
            "230, 50, 90, 323.8686, 0.8652455, 1.36392, 0, 0.5606021" })
    void lineCapacitorCasesAgreeWithNgspice(double volts, double hertz, double phase, double source, double peak, double timeOfPeak,
            double tenPercent,
            double atThreeMs) throws CoilbookException {
        CaseFiles.Solved solved = solve(LINE.formatted(volts, hertz, phase));
        JsonNode cycle = solved.json().get("cycles").get(0);
        assertEquals(source, cycle.get("sourceVoltageAtSwitchOnV").doubleValue(), source * 5e-3);
        assertEquals(peak, cycle.get("peakCurrentA").doubleValue(), peak * 5e-3);
        assertEquals(timeOfPeak, cycle.get("timeOfPeakMs").doubleValue(), timeOfPeak * 5e-3);
        if (volts < 200) {
            assertEquals(tenPercent - 300, cycle.get("releaseTimeMs").doubleValue(), (tenPercent - 300) * 5e-3);
        }
        String[] lines = new String(cases.csv(solved), StandardCharsets.UTF_8).split("\r\n");
        assertEquals("time_s,source_V,coil_A", lines[0]);
        double[] sample = Arrays.stream(lines[31].split(",")).mapToDouble(Double::parseDouble).toArray();
        assertEquals(0.003, sample[0], 1e-12);
        assertEquals(atThreeMs, sample[2], atThreeMs * 5e-3);
    }

    @Test
    void aTwoLevelCaseAgreesWithNgspiceAndKeepsTheOrderOfItsKeys() throws CoilbookException {
        CaseFiles.Solved solved = solve(REGULATED);
        JsonNode cycle = solved.json().get("cycles").get(1);
        assertEquals(4.687115, cycle.get("peakCurrentA").doubleValue(), 4.687115 * 5e-3);
        assertEquals(0.591785753, cycle.get("windingEnergyJ").doubleValue(), 0.591785753 * 1e-2);
        List<String> keys = new ArrayList<>();
        cycle.fieldNames().forEachRemaining(keys::add);
        assertEquals(List.of("cycle", "sourceVoltageAtSwitchOnV", "peakCurrentA", "timeOfPeakMs", "timeToPullInMs", "holdMeanCurrentA",
                "holdMinimumCurrentA", "minimumAfterPeakCurrentA", "windingEnergyJ", "releaseTimeMs"), keys);
        List<String> steady = new ArrayList<>();
        solved.json().get("steady").fieldNames().forEachRemaining(steady::add);
        assertEquals(keys, steady);
    }

    @Test
    void aThresholdThatIsNotGivenIsNull() throws CoilbookException {
        JsonNode cycle = solve(LINE.formatted(120, 60, 0)).json().get("cycles").get(0);
        assertTrue(cycle.get("timeToPullInMs").isNull());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
            "\"resistance20Ohm\": 250 | \"resistence20Ohm\": 250 | coil.resistence20Ohm | the nearest is resistance20Ohm",
            "\"resistance20Ohm\": 250 | \"resistance20Ohm\": -250 | coil.resistance20Ohm | above 0",
            "\"resistance20Ohm\": 250, | '' | coil.resistance20Ohm | missing",
            "\"onTimeMs\": 300 | \"onTimeMs\": 500 | duty.onTimeMs | period of 500 ms",
            "line-capacitor | line-condenser | driver.kind | line-capacitor, two-level",
            "\"cycles\": 1 | \"cycles\": 1.5 | cycles | whole number", "\"cycles\": 1 | \"cycles\": \"one\" | cycles | a number from 1",
            "\"phaseDeg\": 0} | \"phaseDeg\": 0, \"volts\": 3} | mains.volts | voltageV" })
    void whatIsWrongIsNamedByKeyValueAndExpectation(String sound, String wrong, String key, String words) {
        String json = LINE.formatted(120, 60, 0).replace(sound, wrong);
        CoilbookException refused = assertThrows(CoilbookException.class, () -> solve(json));
        assertEquals(CoilbookException.Reason.BAD_INPUT, refused.reason());
        assertEquals(key, refused.problems().get(0).column());
        assertTrue(refused.getMessage().contains(words), refused::getMessage);
        assertTrue(refused.getMessage().startsWith("case.json"), refused::getMessage);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "{ \"mains\": | line 1", "[] | one JSON object", "{\"cycles\": 1, \"cycles\": 2} | stands twice",
            "{\"cycles\": 1} {} | not JSON", "nonsense | not JSON" })
    void whatIsNoCaseIsRefusedInWords(String json, String words) {
        CoilbookException refused = assertThrows(CoilbookException.class, () -> solve(json));
        assertEquals(CoilbookException.Reason.BAD_INPUT, refused.reason());
        assertTrue(refused.getMessage().contains(words), refused::getMessage);
        assertTrue(!refused.getMessage().contains("Exception") && !refused.getMessage().contains("fasterxml"), refused::getMessage);
    }

    @Test
    void missingFoldersAndEmptyFilesAreTold(@TempDir Path folder) throws Exception {
        Path empty = Files.createFile(folder.resolve("empty.json"));
        for (Path file : List.of(folder, empty, folder.resolve("none.json"))) {
            assertEquals(CoilbookException.Reason.BAD_INPUT, assertThrows(CoilbookException.class, () -> cases.solve(file)).reason());
        }
    }

    @Test
    void thePictureIsAPngAndTheSameEachTime() throws CoilbookException {
        CaseFiles.Solved solved = solve(REGULATED);
        byte[] picture = cases.png(solved);
        assertArrayEquals(new byte[] { (byte) 0x89, 'P', 'N', 'G' }, Arrays.copyOf(picture, 4));
        assertArrayEquals(picture, cases.png(solved));
    }
}
