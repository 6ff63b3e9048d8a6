package coilbook.exchange.internal.in;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

import coilbook.fleet.InvalidValue;
import coilbook.fleet.QuantityText;
import coilbook.fleet.Unit;

/**
 * A mains supply in one cell: {@code 230 V 50 Hz}, {@code 230VAC, 50Hz}, {@code 120/60}, {@code 1~ 230 V 50 Hz}.
 *
 * @param voltage in V; {@code null} if the text has none
 * @param frequency in Hz; {@code null} if the text has none
 * @param phases the phases named, as written; empty if none
 */
record MainsText(Double voltage, Double frequency, String phases) {

    private static final String PHASES = "([13]\\s*(?:~|ph(?:ase)?s?\\b\\.?|x(?=\\s*\\d)))";
    private static final String NUMBER = "(\\d+(?:[.,]\\d+)?)";
    private static final Pattern MAINS = Pattern.compile("(?:" + PHASES + "[\\s,/]*)?(?:AC\\s*)?" + NUMBER
            + "\\s*(V(?:\\s*AC|\\s*~|AC|olts?)?)?(?:[\\s,;/@~]+|\\s*-\\s*|(?<=[VvCc~]))\\s*(?:AC\\s*)?" + NUMBER
            + "\\s*(Hz|Hertz|cycles|~)?(?:[\\s,/]*" + PHASES
            + ")?(?:\\s*AC)?", Pattern.CASE_INSENSITIVE);
    private static final Pattern VOLTS = Pattern.compile("(?:" + PHASES + "[\\s,/]*)?" + NUMBER + "\\s*V(?:\\s*AC|\\s*~|AC|olts?)?",
            Pattern.CASE_INSENSITIVE);
    private static final String EXPECTED = "a mains voltage and frequency such as 230 V 50 Hz";

    static MainsText parse(String heading, String text) throws InvalidValue {
        String plain = text.replace('\u00a0', ' ').replace('\u202f', ' ');
        Matcher both = MAINS.matcher(plain);
        if (both.matches()) {
            double volts = QuantityText.parse(heading, both.group(2), Unit.VOLT);
            double hertz = QuantityText.parse(heading, both.group(4), Unit.HERTZ);
            boolean named = both.group(3) != null && both.group(5) != null;
            boolean usual = hertz == 50 || hertz == 60;
            if (volts >= 1 && (named && hertz >= 10 && hertz <= 400 || usual && volts > 60)) {
                return new MainsText(volts, hertz, phases(both.group(1), both.group(6)));
            }
            throw new InvalidValue(heading, text, EXPECTED);
        }
        Matcher volts = VOLTS.matcher(plain);
        if (volts.matches()) {
            return new MainsText(QuantityText.parse(heading, volts.group(2), Unit.VOLT), null, phases(volts.group(1), null));
        }
        throw new InvalidValue(heading, text, EXPECTED);
    }

    private static String phases(String before, String after) {
        return before != null ? before.strip() : after != null ? after.strip() : "";
    }

    /** A code for a circuit that has none of its own, for example {@code 230V50HZ}. */
    static String code(Double voltage, Double frequency) {
        return (voltage == null ? "" : coilbook.fleet.FieldText.number(voltage) + "V")
                + (frequency == null ? "" : coilbook.fleet.FieldText.number(frequency) + "HZ");
    }
}
