package coilbook.exchange.internal.in;

import java.math.BigDecimal;
import java.time.LocalDateTime;

import coilbook.fleet.FieldText;

/**
 * A filled cell as the file holds it; a blank one is {@code null}. Numbers keep every digit.
 *
 * @param text of a text, an error (such as {@code #N/A}), a yes/no or a formula without its value
 * @param number of a number, a date (its serial) or a yes/no (1 or 0)
 * @param moment of a date
 * @param format how the file shows the number
 */
record Cell(Type type, String text, double number, LocalDateTime moment, CellFormat format) {

    enum Type {
        TEXT, NUMBER, DATE, YES_NO, ERROR,
        /** A formula whose value the file does not carry. */
        UNCOMPUTED
    }

    static Cell text(String text) {
        return new Cell(Type.TEXT, text, 0, null, CellFormat.GENERAL);
    }

    static Cell number(double number, CellFormat format) {
        return new Cell(Type.NUMBER, null, number, null, format);
    }

    static Cell date(double serial, LocalDateTime moment) {
        return new Cell(Type.DATE, null, serial, moment, CellFormat.GENERAL);
    }

    static Cell yesNo(boolean yes) {
        return new Cell(Type.YES_NO, yes ? "TRUE" : "FALSE", yes ? 1 : 0, null, CellFormat.GENERAL);
    }

    static Cell error(String code) {
        return new Cell(Type.ERROR, code, 0, null, CellFormat.GENERAL);
    }

    static Cell uncomputed(String formula) {
        return new Cell(Type.UNCOMPUTED, formula, 0, null, CellFormat.GENERAL);
    }

    /** What stands there, for headings, codes and messages. */
    String shown() {
        return switch (type) {
            case TEXT, ERROR, UNCOMPUTED, YES_NO -> text;
            case DATE -> moment.toLocalTime().toSecondOfDay() == 0 ? moment.toLocalDate().toString() : moment.toString().replace('T', ' ');
            case NUMBER -> format.padding() > 0 && number >= 0 && number == Math.rint(number)
                    ? pad(new BigDecimal(number).toBigInteger().toString(), format.padding())
                    : FieldText.number(number);
        };
    }

    private static String pad(String digits, int width) {
        return "0".repeat(Math.max(0, width - digits.length())) + digits;
    }

    /** Whether a text has nothing to read; a text of spaces, also of non-breaking ones, is blank. */
    boolean isBlank() {
        return type == Type.TEXT && Texts.strip(text).isEmpty();
    }
}
