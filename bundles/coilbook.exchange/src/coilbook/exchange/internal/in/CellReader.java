package coilbook.exchange.internal.in;

import java.math.BigDecimal;
import java.util.regex.Pattern;

import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.FieldType;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Provenance;
import coilbook.fleet.QuantityText;
import coilbook.fleet.Unit;

/** The value of a field from a cell, whether it is a number, a date, or a text that means one. */
final class CellReader {

    private static final Pattern THOUSANDS_OR_DECIMALS = Pattern.compile("[+-]?[1-9]\\d{0,2}\\.\\d{3}(?!\\d|[.,]\\d).*");

    private final boolean commaDecimals;

    /** @param commaDecimals see {@link InputTable#commaDecimals} */
    CellReader(boolean commaDecimals) {
        this.commaDecimals = commaDecimals;
    }

    /**
     * @param cell may be {@code null}
     * @param unit of numbers that carry none; empty for the field's own
     * @return {@code null} for a blank cell
     * @throws InvalidValue if the field cannot hold what stands there; a missing required value is not refused here
     */
    Object read(Field field, Cell cell, String unit, Provenance provenance) throws InvalidValue {
        if (cell == null || cell.isBlank()) {
            return null;
        }
        refuseUnreadable(field.heading(), cell);
        Object value = switch (field.type()) {
            case TEXT, TERM, TEXTS -> FieldText.parse(field, text(field.heading(), cell), provenance);
            case QUANTITY -> new Datum(number(field.heading(), cell, unit, field.unit()), provenance);
            case NUMBER -> number(field.heading(), cell, unit, Unit.NONE);
            case INTEGER -> whole(field, cell);
            case MONEY -> money(number(field.heading(), cell, unit, Unit.NONE));
            case YES_NO ->
                FieldText.parse(field, cell.type() == Cell.Type.YES_NO ? cell.number() == 1 ? "yes" : "no" : cell.shown(), provenance);
            case DATE, DATE_TIME -> moment(field, cell, unit);
        };
        if (value != null) {
            field.check(value);
        }
        return value;
    }

    private static void refuseUnreadable(String heading, Cell cell) throws InvalidValue {
        if (cell.type() == Cell.Type.ERROR) {
            throw new InvalidValue(heading, cell.text(), "a value; the spreadsheet shows an error here");
        } else if (cell.type() == Cell.Type.UNCOMPUTED) {
            throw new InvalidValue(heading, cell.text(),
                    "a computed value; open the file in a spreadsheet program, let it calculate, and save it");
        }
    }

    /** A text or a code; a number counts as it is shown. */
    String text(String heading, Cell cell) throws InvalidValue {
        refuseUnreadable(heading, cell);
        if (cell.type() == Cell.Type.DATE) {
            throw new InvalidValue(heading, cell.shown(),
                    "a text; the spreadsheet holds a date here (format the cell as text and type it again)");
        } else if (cell.type() == Cell.Type.NUMBER && Math.abs(cell.number()) >= 1e15) {
            throw new InvalidValue(heading, cell.shown(),
                    "a text; the spreadsheet has lost digits of so long a number (format the cell as text)");
        }
        return Texts.strip(cell.shown());
    }

    /** The SI value of a quantity. */
    double number(String heading, Cell cell, String headingUnit, Unit expected) throws InvalidValue {
        refuseUnreadable(heading, cell);
        String unit = headingUnit.isEmpty() ? expected.symbol() : headingUnit;
        switch (cell.type()) {
            case NUMBER:
                return fromNumber(heading, cell, unit, expected);
            case TEXT:
                String text = Texts.strip(cell.text());
                if (commaDecimals && THOUSANDS_OR_DECIMALS.matcher(text).matches()) {
                    String digits = text.replaceAll("^([+-]?\\d+\\.\\d+).*", "$1");
                    throw new InvalidValue(heading, text,
                            "a number that can be read one way only: write " + digits.replace('.', ',') + "0 or "
                                    + digits.replace(".", ""));
                }
                return QuantityText.parse(heading, text, expected, unit);
            default:
                throw new InvalidValue(heading, cell.shown(), "a number" + (expected == Unit.NONE ? "" : " in " + expected.symbol()));
        }
    }

    private static double fromNumber(String heading, Cell cell, String unit, Unit expected) throws InvalidValue {
        CellFormat format = cell.format();
        if (format.percent()) {
            return QuantityText.toSi(heading, FieldText.number(cell.number() * 100) + " %", cell.number() * 100, "%", expected);
        }
        String shownUnit = !format.unit().isEmpty() && QuantityText.isUnit(format.unit(), expected) ? format.unit() : unit;
        return QuantityText.toSi(heading, cell.shown(), cell.number(), shownUnit, expected);
    }

    private Integer whole(Field field, Cell cell) throws InvalidValue {
        double value = number(field.heading(), cell, "", Unit.NONE);
        if (value != Math.rint(value) || Math.abs(value) > Integer.MAX_VALUE) {
            throw new InvalidValue(field.heading(), cell.shown(), "a whole number");
        }
        return (int) value;
    }

    private static BigDecimal money(double value) {
        return BigDecimal.valueOf(value).stripTrailingZeros();
    }

    private static Object moment(Field field, Cell cell, String order) throws InvalidValue {
        boolean day = field.type() == FieldType.DATE;
        if (cell.type() == Cell.Type.DATE) {
            DateReader.sensible(field.heading(), cell.shown(), cell.moment().toLocalDate());
            return day ? cell.moment().toLocalDate() : cell.moment();
        }
        String text = cell.shown();
        return day ? DateReader.date(field.heading(), text, order) : DateReader.dateTime(field.heading(), text, order);
    }
}
