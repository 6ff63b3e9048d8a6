package coilbook.jobs.internal.casefile;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Set;

import com.fasterxml.jackson.databind.JsonNode;

import coilbook.fleet.FieldText;
import coilbook.fleet.InputProblem;
import coilbook.fleet.NearestWord;

/** One JSON object of a case file. Everything that is wrong with it is gathered, so that a person mends a file once. */
final class CaseObject {

    private final String file;
    private final String path;
    private final JsonNode node;
    private final List<InputProblem> problems;

    /**
     * @param path the key in dotted form; empty for the whole file
     * @param node the object, or {@code null} if there is none
     * @param problems where what is wrong is gathered
     */
    CaseObject(String file, String path, JsonNode node, List<InputProblem> problems) {
        this.file = file;
        this.path = path;
        this.node = node;
        this.problems = problems;
    }

    boolean isPresent() {
        return node != null;
    }

    /** An object within; one that is missing is told of only if it is needed. */
    CaseObject object(String key, boolean required) {
        JsonNode child = node == null ? null : node.get(key);
        if (child == null || child.isNull()) {
            if (required && node != null) {
                problem(key, "", "expected an object with the " + key + "'s values; it is missing");
            }
            return new CaseObject(file, dotted(key), null, problems);
        }
        if (!child.isObject()) {
            problem(key, child.toString(), "expected an object in braces");
            return new CaseObject(file, dotted(key), null, problems);
        }
        return new CaseObject(file, dotted(key), child, problems);
    }

    /** Tells of every key that is not among the known ones, with the nearest that is. */
    void refuseOthers(Set<String> known) {
        if (node == null) {
            return;
        }
        Iterator<String> names = node.fieldNames();
        while (names.hasNext()) {
            String name = names.next();
            if (!known.contains(name)) {
                String nearest = NearestWord.of(name, known);
                problem(name, shown(node.get(name)), "expected no such key here"
                        + (nearest == null ? "; known are " + String.join(", ", new ArrayList<>(known)) : "; the nearest is " + nearest));
            }
        }
    }

    /** A number that must be there; NaN if it is not, which is told of. */
    double number(String key, Range range) {
        return number(key, range, Double.NaN, true);
    }

    /** A number, or the other value where it is missing or null. */
    double number(String key, Range range, double otherwise) {
        return number(key, range, otherwise, false);
    }

    private double number(String key, Range range, double otherwise, boolean required) {
        if (node == null) {
            return otherwise;
        }
        JsonNode value = node.get(key);
        if (value == null || value.isNull()) {
            if (required) {
                problem(key, "", "expected " + range.words() + "; it is missing");
            }
            return otherwise;
        }
        double number = value.isNumber() ? value.doubleValue() : Double.NaN;
        if (!range.holds(number)) {
            problem(key, shown(value), "expected " + range.words());
            return Double.NaN;
        }
        return number * range.factor();
    }

    /** A word of a list; {@code null} if it is missing or another, which is told of. */
    String word(String key, List<String> known, String otherwise) {
        JsonNode value = node == null ? null : node.get(key);
        if (value == null || value.isNull()) {
            if (node != null && otherwise == null) {
                problem(key, "", "expected one of " + String.join(", ", known) + "; it is missing");
            }
            return otherwise;
        }
        if (!value.isTextual() || !known.contains(value.textValue())) {
            problem(key, shown(value), "expected one of " + String.join(", ", known));
            return null;
        }
        return value.textValue();
    }

    void problem(String key, String value, String text) {
        problems.add(new InputProblem(file, "", 0, dotted(key), value, text));
    }

    private String dotted(String key) {
        return path.isEmpty() ? key : path + "." + key;
    }

    private static String shown(JsonNode value) {
        return value.isTextual() ? value.textValue() : value.toString();
    }

    /**
     * Which numbers a key may hold.
     *
     * @param least in the key's unit
     * @param most in the key's unit
     * @param above whether {@code least} itself is refused
     * @param unit the symbol, empty for none
     * @param factor from the key's unit to SI
     */
    record Range(double least, double most, boolean above, String unit, double factor) {

        boolean holds(double value) {
            return value >= least && value <= most && !(above && value == least);
        }

        String words() {
            return "a number " + (above ? "above " : "from ") + FieldText.number(least) + (above ? " up to " : " to ")
                    + FieldText.number(most)
                    + (unit.isEmpty() ? "" : " " + unit);
        }
    }
}
