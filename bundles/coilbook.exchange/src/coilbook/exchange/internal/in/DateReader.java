package coilbook.exchange.internal.in;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import coilbook.fleet.InvalidValue;

/**
 * Dates as people write them. Taken are year-month-day, day.month.year with points (no country writes the month first with points), a month by its name,
 * and slashes or hyphens where only one reading is a date or the heading says the order. Anything else is refused, not guessed.
 */
final class DateReader {

    private static final Pattern YEAR_FIRST = Pattern.compile("(\\d{4})([-/.])(\\d{1,2})\\2(\\d{1,2})");
    private static final Pattern COMPACT = Pattern.compile("((?:19|20)\\d{2})(\\d{2})(\\d{2})");
    private static final Pattern POINTS = Pattern.compile("(\\d{1,2})\\.\\s?(\\d{1,2})\\.\\s?(\\d{4}|\\d{2})");
    private static final Pattern YEAR_LAST = Pattern.compile("(\\d{1,2})([-/])(\\d{1,2})\\2(\\d{4})");
    private static final Pattern DAY_NAME = Pattern
            .compile("(\\d{1,2})(?:st|nd|rd|th|er|º|\\.)?[\\s-]*(?:de\\s+)?(\\p{L}{3,})\\.?,?[\\s-]*(?:de\\s+)?(\\d{4})");
    private static final Pattern NAME_DAY = Pattern.compile("(\\p{L}{3,})\\.?[\\s-]*(\\d{1,2})(?:st|nd|rd|th)?,?[\\s-]+(\\d{4})");
    private static final Pattern TIMED = Pattern.compile("(.*\\d)[T\\s,]+(\\d{1,2}):(\\d{2})(?::(\\d{2}))?(?:\\s*(?:Uhr|h))?");
    private static final String[] MONTHS = { "jan january januar janvier enero janeiro ene",
            "feb february februar fevrier febrero fevereiro fev",
            "mar march marz maerz mars marzo marco mrz", "apr april avril abril avr abr", "may mai mayo maio",
            "jun june juni juin junio junho",
            "jul july juli juillet julio julho juil", "aug august aout agosto ago", "sep september sept septembre septiembre setembro set",
            "oct october oktober octobre octubre outubro okt out", "nov november novembre noviembre novembro",
            "dec december dezember decembre diciembre dezembro dez dic" };
    private static final Map<String, Integer> MONTH = months();

    private DateReader() {
    }

    private static Map<String, Integer> months() {
        Map<String, Integer> months = new HashMap<>();
        for (int i = 0; i < MONTHS.length; i++) {
            for (String name : MONTHS[i].split(" ")) {
                months.put(name, i + 1);
            }
        }
        return Map.copyOf(months);
    }

    /** The order that a heading's hint such as {@code dd/mm/yyyy} or {@code TT.MM.JJJJ} says, or {@code null} if it is no such hint. */
    static String order(String hint) {
        String letters = Texts.fold(hint).replace(" ", "").replaceAll("(.)\\1+", "$1");
        return switch (letters) {
            case "dmy", "tmj", "jma", "dma" -> "dmy";
            case "mdy" -> "mdy";
            case "ymd", "jmt", "amj", "amd" -> "ymd";
            default -> null;
        };
    }

    /** @param order from {@link #order}, or empty */
    static LocalDate date(String heading, String text, String order) throws InvalidValue {
        return dateTime(heading, text, order).toLocalDate();
    }

    /** As {@link #date}, with a time of day if there is one, else midnight. */
    static LocalDateTime dateTime(String heading, String text, String order) throws InvalidValue {
        String plain = Texts.strip(text.replace('\u00a0', ' '));
        LocalTime time = LocalTime.MIDNIGHT;
        try {
            Matcher timed = TIMED.matcher(plain);
            if (timed.matches()) {
                plain = Texts.strip(timed.group(1));
                time = LocalTime.of(Integer.parseInt(timed.group(2)), Integer.parseInt(timed.group(3)), Numbers.whole(timed.group(4), 0));
            }
            LocalDate date = day(heading, text, plain, order);
            if (date != null) {
                return sensible(heading, text, date).atTime(time);
            }
        } catch (DateTimeException e) {
            // falls through to the message, which names the value as it was written
        }
        throw new InvalidValue(heading, text, "a date such as 2026-03-31 or 31 March 2026");
    }

    /** Refuses what a slip of the spreadsheet makes of an empty or a wrong cell. */
    static LocalDate sensible(String heading, String shown, LocalDate date) throws InvalidValue {
        if (date.getYear() < 1950 || date.getYear() > 2199) {
            throw new InvalidValue(heading, shown, "a date from 1950 to 2199");
        }
        return date;
    }

    private static LocalDate day(String heading, String text, String plain, String order) throws InvalidValue {
        Matcher m = YEAR_FIRST.matcher(plain);
        if (m.matches()) {
            return of(m.group(1), m.group(3), m.group(4));
        }
        m = COMPACT.matcher(plain);
        if (m.matches()) {
            return of(m.group(1), m.group(2), m.group(3));
        }
        m = POINTS.matcher(plain);
        if (m.matches() && !order.equals("mdy")) {
            return of(m.group(3).length() == 2 ? "20" + m.group(3) : m.group(3), m.group(2), m.group(1));
        }
        m = DAY_NAME.matcher(plain);
        if (m.matches() && MONTH.containsKey(Texts.fold(m.group(2)))) {
            return LocalDate.of(Integer.parseInt(m.group(3)), MONTH.get(Texts.fold(m.group(2))), Integer.parseInt(m.group(1)));
        }
        m = NAME_DAY.matcher(plain);
        if (m.matches() && MONTH.containsKey(Texts.fold(m.group(1)))) {
            return LocalDate.of(Integer.parseInt(m.group(3)), MONTH.get(Texts.fold(m.group(1))), Integer.parseInt(m.group(2)));
        }
        m = YEAR_LAST.matcher(plain);
        return m.matches() ? yearLast(heading, text, m, order) : null;
    }

    private static LocalDate yearLast(String heading, String text, Matcher m, String order) throws InvalidValue {
        int first = Integer.parseInt(m.group(1));
        int second = Integer.parseInt(m.group(3));
        boolean dayFirst = order.equals("dmy") || order.isEmpty() && (second <= 12 && first > 12 || first == second);
        boolean monthFirst = order.equals("mdy") || order.isEmpty() && first <= 12 && second > 12;
        if (dayFirst) {
            return of(m.group(4), m.group(3), m.group(1));
        } else if (monthFirst) {
            return of(m.group(4), m.group(1), m.group(3));
        } else if (first > 12 || first == 0 || second == 0) {
            return null;
        }
        throw new InvalidValue(heading, text,
                "a date that can be read one way only: write " + of(m.group(4), m.group(3), m.group(1)) + " or "
                        + of(m.group(4), m.group(1), m.group(3)));
    }

    private static LocalDate of(String year, String month, String day) {
        return LocalDate.of(Integer.parseInt(year), Integer.parseInt(month), Integer.parseInt(day));
    }
}
