package coilbook.jobs.internal.casefile;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.CoilCircuit;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.MainsSource;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.FieldText;
import coilbook.fleet.InputProblem;
import coilbook.fleet.LevelChange;
import coilbook.jobs.internal.casefile.CaseObject.Range;

/** Reads a case file: strict JSON, every key known, every value in its range. */
public final class CaseReader {

    private static final Range VOLTS = new Range(0, 1e5, true, "V", 1);
    private static final Range DROP = new Range(0, 1e5, false, "V", 1);
    private static final Range AMPERES = new Range(0, 1e6, true, "A", 1);
    private static final Range OHMS = new Range(0, 1e9, true, "Ω", 1);
    private static final Range CABLE_OHMS = new Range(0, 1e6, false, "Ω", 1);
    private static final Range MILLIHENRIES = new Range(0, 1e8, true, "mH", 1e-3);
    private static final Range MICROFARADS = new Range(0, 1e9, true, "µF", 1e-6);
    private static final Range MILLISECONDS = new Range(0, 1e8, true, "ms", 1e-3);
    private static final Range DEGREES = new Range(-36000, 36000, false, "°", Math.PI / 180);
    private static final Range CELSIUS = new Range(-100, 1000, false, "°C", 1);
    private static final Range HERTZ = new Range(1, 10000, false, "Hz", 1);
    private static final Range RATE = new Range(0, 1e5, true, "cycles a second", 1);
    private static final Range CYCLES = new Range(1, 100_000, false, "cycles", 1);

    private static final Map<String, List<String>> KINDS = new LinkedHashMap<>();
    private static final Map<String, String> JSON_KEYS = Map.ofEntries(Map.entry("mains.voltage", "mains.voltageV"),
            Map.entry("mains.frequency", "mains.frequencyHz"), Map.entry("mains.phase", "mains.phaseDeg"),
            Map.entry("coil.resistance20", "coil.resistance20Ohm"), Map.entry("coil.inductance", "coil.inductanceMillihenry"),
            Map.entry("coil.inductanceClosed", "coil.inductanceClosedMillihenry"), Map.entry("coil.temperature", "coil.temperatureC"),
            Map.entry("coil.pullInCurrent", "coil.pullInCurrentA"), Map.entry("coil.dropOutCurrent", "coil.dropOutCurrentA"),
            Map.entry("cable.loopResistance", "cable.loopResistanceOhm"), Map.entry("duty.onTime", "duty.onTimeMs"));

    static {
        KINDS.put("line-capacitor", List.of("seriesResistanceOhm", "capacitanceMicrofarad", "rectifierDropV"));
        KINDS.put("two-level", List.of("pullInVoltageV", "pullInTimeMs", "holdVoltageV", "levelChange"));
        KINDS.put("fixed-dc", List.of("outputVoltageV"));
        KINDS.put("current-regulated", List.of("busVoltageV", "peakCurrentA", "peakTimeMs", "holdCurrentA"));
    }

    private final String file;
    private final List<InputProblem> problems = new ArrayList<>();

    private CaseReader(String file) {
        this.file = file;
    }

    /**
     * @param file the file's name, for messages
     * @throws CoilbookException naming every key that is wrong, its value and what was expected
     */
    public static CircuitCase read(String file, byte[] json) throws CoilbookException {
        return new CaseReader(file).read(json);
    }

    /** The name in a case file of a field of the circuit records. */
    public static String jsonKey(String field) {
        return JSON_KEYS.getOrDefault(field, field);
    }

    private CircuitCase read(byte[] json) throws CoilbookException {
        CaseObject whole = new CaseObject(file, "", parse(json), problems);
        whole.refuseOthers(ordered("mains", "driver", "coil", "cable", "duty", "cycles"));
        DriverCircuit driver = driver(whole.object("driver", true));
        MainsSource mains = mains(whole.object("mains", driver == null || driver instanceof DriverCircuit.LineCapacitor));
        CoilCircuit coil = coil(whole.object("coil", true));
        CaseObject cable = whole.object("cable", false);
        cable.refuseOthers(ordered("loopResistanceOhm"));
        double loop = cable.isPresent() ? cable.number("loopResistanceOhm", CABLE_OHMS) : 0;
        CaseObject duty = whole.object("duty", true);
        duty.refuseOthers(ordered("cyclesPerSecond", "onTimeMs"));
        double rate = duty.number("cyclesPerSecond", RATE);
        double onTime = duty.number("onTimeMs", MILLISECONDS);
        if (onTime >= 1 / rate) {
            duty.problem("onTimeMs", FieldText.number(onTime * 1e3), "expected less than the period of "
                    + FieldText.number(1e3 / rate) + " ms");
        }
        double cycles = whole.number("cycles", CYCLES);
        if (!Double.isNaN(cycles) && cycles != Math.rint(cycles)) {
            whole.problem("cycles", Double.toString(cycles), "expected a whole number of cycles");
        }
        if (!problems.isEmpty()) {
            throw refused();
        }
        return new CircuitCase(mains, driver, coil, loop, rate, onTime, (int) cycles);
    }

    private CoilbookException refused() {
        StringBuilder text = new StringBuilder();
        for (InputProblem problem : problems) {
            text.append(text.length() == 0 ? "" : "\n").append(sentence(problem));
        }
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, text.toString(), problems, null);
    }

    private static String sentence(InputProblem problem) {
        return problem.file() + (problem.column().isEmpty() ? "" : ", key " + problem.column())
                + (problem.value().isEmpty() ? "" : ", value " + problem.value()) + ": " + problem.problem();
    }

    private JsonNode parse(byte[] json) throws CoilbookException {
        JsonMapper mapper = JsonMapper.builder().enable(JsonParser.Feature.STRICT_DUPLICATE_DETECTION)
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS).enable(DeserializationFeature.FAIL_ON_READING_DUP_TREE_KEY).build();
        try {
            JsonNode node = mapper.readTree(json);
            if (node == null || !node.isObject()) {
                problems.add(new InputProblem(file, "", 0, "", "", "expected one JSON object in braces"
                        + (node == null || node.isMissingNode() ? "; the file is empty" : "")));
                throw refused();
            }
            return node;
        } catch (JsonProcessingException e) {
            JsonLocation at = e.getLocation();
            String where = at == null ? "" : " at line " + at.getLineNr() + ", column " + at.getColumnNr();
            String original = e.getOriginalMessage();
            String why = original != null && original.startsWith("Duplicate field '")
                    ? "the key " + original.substring("Duplicate field".length()).strip() + " stands twice"
                    : "this is not JSON";
            problems.add(new InputProblem(file, "", 0, "", "", "expected a case as JSON; " + why + where));
            throw refused();
        } catch (IOException e) {
            problems.add(new InputProblem(file, "", 0, "", "", "expected a case as JSON text in UTF-8"));
            throw refused();
        }
    }

    private static Set<String> ordered(String... keys) {
        return new LinkedHashSet<>(List.of(keys));
    }

    private static MainsSource mains(CaseObject mains) {
        mains.refuseOthers(ordered("voltageV", "frequencyHz", "phaseDeg"));
        if (!mains.isPresent()) {
            return null;
        }
        return new MainsSource(mains.number("voltageV", VOLTS), mains.number("frequencyHz", HERTZ), mains.number("phaseDeg", DEGREES, 0));
    }

    private static CoilCircuit coil(CaseObject coil) {
        coil.refuseOthers(ordered("resistance20Ohm", "inductanceMillihenry", "inductanceClosedMillihenry", "temperatureC", "pullInCurrentA",
                "dropOutCurrentA"));
        return new CoilCircuit(coil.number("resistance20Ohm", OHMS), coil.number("inductanceMillihenry", MILLIHENRIES),
                coil.number("inductanceClosedMillihenry", MILLIHENRIES, Double.NaN), coil.number("pullInCurrentA", AMPERES, Double.NaN),
                coil.number("dropOutCurrentA", AMPERES, Double.NaN), coil.number("temperatureC", CELSIUS));
    }

    private static DriverCircuit driver(CaseObject driver) {
        String kind = driver.word("kind", List.copyOf(KINDS.keySet()), null);
        if (kind == null) {
            return null;
        }
        Set<String> known = ordered("kind");
        known.addAll(KINDS.get(kind));
        known.addAll(List.of("switchDropV", "clampVoltageV"));
        driver.refuseOthers(known);
        double drop = driver.number("switchDropV", DROP);
        double clamp = driver.number("clampVoltageV", DROP);
        return switch (kind) {
            case "line-capacitor" -> new DriverCircuit.LineCapacitor(driver.number("seriesResistanceOhm", OHMS),
                    driver.number("capacitanceMicrofarad", MICROFARADS), driver.number("rectifierDropV", DROP), drop, clamp);
            case "two-level" ->
                new DriverCircuit.TwoLevel(driver.number("pullInVoltageV", VOLTS), driver.number("pullInTimeMs", MILLISECONDS),
                        driver.number("holdVoltageV", DROP), levelChange(driver), drop, clamp);
            case "fixed-dc" -> new DriverCircuit.FixedDc(driver.number("outputVoltageV", VOLTS), drop, clamp);
            default -> new DriverCircuit.CurrentRegulated(driver.number("busVoltageV", VOLTS), driver.number("peakCurrentA", AMPERES),
                    driver.number("peakTimeMs", MILLISECONDS), driver.number("holdCurrentA", AMPERES), drop, clamp);
        };
    }

    private static LevelChange levelChange(CaseObject driver) {
        return "freewheel".equals(driver.word("levelChange", List.of("source", "freewheel"), "source")) ? LevelChange.FREEWHEEL
                : LevelChange.SOURCE;
    }
}
