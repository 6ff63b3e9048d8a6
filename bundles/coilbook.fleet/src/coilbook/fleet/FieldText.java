package coilbook.fleet;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;

/** How the value of a field is written as text and read from it; the same for grids, CSV and messages. */
public final class FieldText {

    private static final Set<String> YES = Set.of("yes", "y", "true", "1", "x", "ja", "oui", "si", "sí", "sim");
    private static final Set<String> NO = Set.of("no", "n", "false", "0", "nein", "non", "não", "nao");

    private FieldText() {
    }

    /** The value as text without its unit; empty for {@code null}. Quantities are shown in the field's unit, with a decimal point. */
    public static String format(Field field, Object value) {
        if (value == null) {
            return "";
        } else if (value instanceof Datum datum) {
            return number(field.unit().fromSi(datum.value()));
        } else if (value instanceof Double plain) {
            return number(plain);
        } else if (value instanceof Boolean yes) {
            return yes ? "yes" : "no";
        } else if (value instanceof Labelled term) {
            return term.label();
        } else if (value instanceof BigDecimal amount) {
            return amount.stripTrailingZeros().toPlainString();
        } else if (value instanceof List<?> texts) {
            return texts.stream().map(String::valueOf).collect(Collectors.joining(", "));
        }
        return value.toString();
    }

    /** A number as the shortest text that reads back the same, without an exponent where that is readable. */
    public static String number(double value) {
        if (value == Math.rint(value) && Math.abs(value) < 1e15) {
            return Long.toString((long) value);
        }
        double size = Math.abs(value);
        return size >= 1e-4 && size < 1e15 ? new BigDecimal(Double.toString(value)).toPlainString() : Double.toString(value);
    }

    /**
     * The value that a text means. Quantities may carry a unit of the same dimension.
     *
     * @param provenance given to a quantity
     * @return {@code null} for a blank text
     * @throws InvalidValue if the field cannot hold it
     */
    public static Object parse(Field field, String text, Provenance provenance) throws InvalidValue {
        String stripped = text == null ? "" : text.strip();
        Object value = stripped.isEmpty() ? null : parseText(field, stripped, provenance);
        field.check(value);
        return value;
    }

    private static Object parseText(Field field, String text, Provenance provenance) throws InvalidValue {
        return switch (field.type()) {
            case TEXT -> text;
            case QUANTITY -> new Datum(QuantityText.parse(field.heading(), text, field.unit()), provenance);
            case NUMBER -> QuantityText.parse(field.heading(), text, Unit.NONE);
            case INTEGER -> whole(field, text);
            case MONEY -> BigDecimal.valueOf(QuantityText.parse(field.heading(), text, Unit.NONE)).stripTrailingZeros();
            case YES_NO -> yesNo(field, text);
            case DATE -> date(field, text);
            case DATE_TIME -> dateTime(field, text);
            case TERM -> term(field, text);
            case TEXTS -> texts(text);
        };
    }

    private static Integer whole(Field field, String text) throws InvalidValue {
        double value = QuantityText.parse(field.heading(), text, Unit.NONE);
        if (value != Math.rint(value) || Math.abs(value) > Integer.MAX_VALUE) {
            throw new InvalidValue(field.heading(), text, "a whole number");
        }
        return (int) value;
    }

    private static Boolean yesNo(Field field, String text) throws InvalidValue {
        String word = text.toLowerCase(Locale.ROOT);
        if (YES.contains(word)) {
            return Boolean.TRUE;
        } else if (NO.contains(word)) {
            return Boolean.FALSE;
        }
        throw new InvalidValue(field.heading(), text, "yes or no");
    }

    private static LocalDate date(Field field, String text) throws InvalidValue {
        try {
            return LocalDate.parse(text);
        } catch (DateTimeParseException e) {
            throw new InvalidValue(field.heading(), text, "a date such as 2026-03-31");
        }
    }

    private static LocalDateTime dateTime(Field field, String text) throws InvalidValue {
        try {
            String iso = text.replace(' ', 'T');
            return iso.length() == 10 ? LocalDate.parse(iso).atStartOfDay() : LocalDateTime.parse(iso);
        } catch (DateTimeParseException e) {
            throw new InvalidValue(field.heading(), text, "a date and time such as 2026-03-31 14:05");
        }
    }

    private static Labelled term(Field field, String text) throws InvalidValue {
        String plain = plain(text);
        for (Labelled term : field.terms()) {
            if (plain(term.label()).equals(plain) || plain(((Enum<?>) term).name()).equals(plain)) {
                return term;
            }
        }
        throw new InvalidValue(field.heading(), text, expected(field));
    }

    private static String plain(String text) {
        return text.toLowerCase(Locale.ROOT).replaceAll("[\\s_-]+", "");
    }

    private static List<String> texts(String text) {
        List<String> parts = new ArrayList<>();
        Arrays.stream(text.split("[,;]")).map(String::strip).filter(part -> !part.isEmpty()).forEach(parts::add);
        return List.copyOf(parts);
    }

    /** What a field expects, in words: for messages and drop-downs. */
    public static String expected(Field field) {
        return switch (field.type()) {
            case TEXT, TEXTS -> "a text";
            case QUANTITY, NUMBER, INTEGER, MONEY -> expectedNumber(field);
            case YES_NO -> "yes or no";
            case DATE -> "a date such as 2026-03-31";
            case DATE_TIME -> "a date and time such as 2026-03-31 14:05";
            case TERM -> "one of " + field.terms().stream().map(Labelled::label).collect(Collectors.joining(", "));
        };
    }

    private static String expectedNumber(Field field) {
        String unit = field.unit() == Unit.NONE ? "" : " " + field.unit().symbol();
        String noun = field.type() == FieldType.INTEGER ? "a whole number" : "a number";
        boolean low = field.min() != Double.NEGATIVE_INFINITY;
        boolean high = field.max() != Double.POSITIVE_INFINITY;
        if (low && high) {
            return noun + (field.above() ? " above " : " from ") + number(field.unit().fromSi(field.min())) + unit
                    + (field.above() ? " up to " : " to ")
                    + number(field.unit().fromSi(field.max())) + unit;
        } else if (low) {
            return noun + (field.above() ? " above " : " of at least ") + number(field.unit().fromSi(field.min())) + unit;
        }
        return noun + (unit.isEmpty() ? "" : " in" + unit);
    }
}
