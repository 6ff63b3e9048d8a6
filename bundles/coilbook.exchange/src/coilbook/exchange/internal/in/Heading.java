package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.List;

/**
 * A heading as written, and the ways to part it into a name and a unit: {@code Cable length [m]}, {@code Cable length (m)}, {@code Cable length, m},
 * {@code Cable length in m}, {@code Länge / m}, {@code Cable length m}.
 */
record Heading(String raw) {

    /** One way to read it; the unit is empty where none is parted off. */
    record Reading(String name, String unit) {
    }

    List<Reading> readings() {
        List<Reading> ways = new ArrayList<>();
        String text = Texts.strip(raw.replaceAll("[\\s\\u00a0\\u202f]+", " "));
        ways.add(new Reading(Texts.fold(text), ""));
        char last = text.isEmpty() ? ' ' : text.charAt(text.length() - 1);
        int open = last == ']' ? text.lastIndexOf('[') : last == ')' ? text.lastIndexOf('(') : -1;
        if (open > 0) {
            ways.add(way(text, open, open + 1, text.length() - 1));
        }
        cut(ways, text, ",");
        cut(ways, text, " in ");
        cut(ways, text, " / ");
        cut(ways, text, " ");
        return ways;
    }

    private static void cut(List<Reading> ways, String text, String mark) {
        int at = text.lastIndexOf(mark);
        if (at > 0 && at + mark.length() < text.length()) {
            ways.add(way(text, at, at + mark.length(), text.length()));
        }
    }

    private static Reading way(String text, int nameEnd, int unitFrom, int unitTo) {
        return new Reading(Texts.fold(text.substring(0, nameEnd)), Texts.strip(text.substring(unitFrom, unitTo)));
    }
}
