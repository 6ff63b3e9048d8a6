package coilbook.exchange.internal.out;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.FieldType;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;

/** How the value of a field goes into a cell, such that import reads the very same value back. */
final class FieldCells {

    private static final int NARROW = 11;
    private static final int PROVENANCE_WIDTH = 30;

    private FieldCells() {
    }

    static void write(SheetOut out, Field field, Row row) {
        Object value = row == null ? null : field.get(row);
        if (value == null) {
            out.skip();
        } else if (value instanceof Datum datum) {
            out.number(ExchangeSheets.shown(field.unit(), datum.value()), Use.NUMBER);
        } else if (value instanceof LocalDate date) {
            out.date(date);
        } else if (value instanceof LocalDateTime time) {
            out.dateTime(time);
        } else if (value instanceof BigDecimal amount) {
            out.number(amount.doubleValue(), Use.NUMBER);
        } else if (value instanceof Integer whole) {
            out.number(whole, Use.NUMBER);
        } else if (value instanceof Double plain) {
            boolean reading = row instanceof Reading && field.id().equals("value");
            out.number(reading ? ExchangeSheets.shown(((Reading) row).quantity().unit(), plain) : plain, Use.NUMBER);
        } else {
            out.text(FieldText.format(field, value));
        }
    }

    /** A width that suits what a column mostly holds, with room for the longest word of its heading. */
    static int width(ExchangeSheets.SheetColumn column) {
        if (column.field() == null) {
            return PROVENANCE_WIDTH;
        }
        int usual = switch (column.field().type()) {
            case TEXT -> textWidth(column.field());
            case TEXTS -> 26;
            case TERM -> 16;
            case DATE -> NARROW;
            case DATE_TIME -> 19;
            case QUANTITY, NUMBER, INTEGER, YES_NO, MONEY -> NARROW;
        };
        return Math.max(usual, longestWord(column.heading()) + 3);
    }

    private static int textWidth(Field field) {
        return switch (field.id()) {
            case "note", "source", "remark", "description", "reason", "conditions", "why", "applies", "alternatives" -> 34;
            case "name", "standard", "station", "subject", "machine" -> 22;
            default -> field.isKey() && field.type() == FieldType.TEXT ? 14 : 16;
        };
    }

    static int longestWord(String heading) {
        int longest = 0;
        for (String word : heading.split("[\\s-]+")) {
            longest = Math.max(longest, word.length());
        }
        return longest;
    }
}
