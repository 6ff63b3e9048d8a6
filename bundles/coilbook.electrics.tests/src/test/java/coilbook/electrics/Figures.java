package coilbook.electrics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Recorded figures of an outside judge, case and quantity to value, from a CSV resource with comment lines. */
final class Figures {

    private final Map<String, Map<String, double[]>> cases = new LinkedHashMap<>();

    private Figures() {
    }

    static Figures read(String resource) {
        Figures figures = new Figures();
        for (String line : lines(resource)) {
            String[] cell = line.split(",", -1);
            if (line.startsWith("#") || cell[0].equals("case")) {
                continue;
            }
            double closed = cell.length > 3 && !cell[3].isEmpty() ? Double.parseDouble(cell[3]) : Double.NaN;
            figures.cases.computeIfAbsent(cell[0], key -> new LinkedHashMap<>()).put(cell[1],
                    new double[] { Double.parseDouble(cell[2]), closed });
        }
        assertTrue(!figures.cases.isEmpty(), resource + " holds no figures");
        return figures;
    }

    private static List<String> lines(String resource) {
        try (BufferedReader reader = new BufferedReader(
                new InputStreamReader(Figures.class.getResourceAsStream(resource), StandardCharsets.UTF_8))) {
            return reader.lines().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Map<String, double[]> of(String name) {
        Map<String, double[]> figures = cases.get(name);
        assertTrue(figures != null && !figures.isEmpty(), "no figures of " + name);
        return figures;
    }

    boolean has(String name) {
        return cases.containsKey(name);
    }

    double value(String name, String quantity) {
        double[] value = of(name).get(quantity);
        assertTrue(value != null, "no " + quantity + " of " + name);
        return value[0];
    }

    double closedForm(String name, String quantity) {
        double[] value = of(name).get(quantity);
        assertTrue(value != null && !Double.isNaN(value[1]), "no closed form of " + quantity + " of " + name);
        return value[1];
    }

    /** Asserts that a computed value is within a relative tolerance of the recorded one. */
    void check(String name, String quantity, double computed, double tolerance) {
        near(name + " " + quantity, value(name, quantity), computed, tolerance);
    }

    static void near(String what, double expected, double computed, double tolerance) {
        assertEquals(expected, computed, tolerance * Math.abs(expected), what);
    }
}
