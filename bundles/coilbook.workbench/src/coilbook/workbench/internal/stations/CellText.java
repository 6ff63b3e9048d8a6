package coilbook.workbench.internal.stations;

import java.math.BigDecimal;
import java.math.MathContext;

import coilbook.fleet.FieldText;
import coilbook.fleet.FieldType;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.QuantityText;
import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.text.Texts;

/** How the cells of the stations grid are written and what may be typed into them. */
public final class CellText {

    /** Shown until the row has come. */
    public static final String PENDING = "…";
    private static final MathContext COMPUTED_DIGITS = new MathContext(4);

    private final Texts texts = Texts.of(CellText.class);

    /** The heading with the unit in square brackets. */
    public String heading(StatusColumn column) {
        String unit = column.unit().symbol();
        return unit.isEmpty() ? column.heading() : column.heading() + " [" + unit + "]";
    }

    /** What a heading's tooltip says. */
    public String headingHelp(StatusColumn column, boolean editable) {
        String kind = texts.get(column.isComputed() ? "help.computed" : editable ? "help.editable" : "help.fixed");
        return heading(column) + "\n" + kind;
    }

    /** The text of a cell. */
    public String cell(StatusColumn column, StatusRow row) {
        if (row == null) {
            return column == StatusColumn.STATION ? PENDING : "";
        }
        if (column == StatusColumn.VERDICT) {
            VerdictMark mark = VerdictMark.of(row);
            return mark == null ? "" : mark.symbol() + " " + texts.get(mark.key());
        }
        return value(column, row.get(column));
    }

    private static String value(StatusColumn column, Object value) {
        if (value == null) {
            return "";
        } else if (value instanceof Integer count && column.isComputed() && count == 0) {
            return "";
        } else if (value instanceof Double si) {
            double shown = column.unit().fromSi(si);
            if (Double.isNaN(shown) || Double.isInfinite(shown)) {
                return "";
            }
            return FieldText.number(column.isComputed() ? new BigDecimal(shown).round(COMPUTED_DIGITS).doubleValue() : shown);
        }
        return value.toString();
    }

    /** Whether numbers stand in the column, which are set to the right. */
    public static boolean isNumeric(StatusColumn column) {
        return column.type() == FieldType.QUANTITY || column.type() == FieldType.INTEGER;
    }

    /** What is wrong with a text typed into a cell, in words; {@code null} if nothing is. What it refers to is looked up later, not here. */
    public String problem(StatusColumn column, String text) {
        if (text == null || text.isBlank() || !isNumeric(column)) {
            return null;
        }
        try {
            QuantityText.parse(column.heading(), text, column.unit());
            return null;
        } catch (InvalidValue e) {
            return e.getMessage();
        }
    }

    /** What a screen reader says of a cell. */
    public String spoken(StatusColumn column, StatusRow row, boolean editable) {
        if (row == null) {
            return texts.get("spoken.pending");
        }
        String text = cell(column, row);
        String unit = text.isEmpty() ? "" : " " + column.unit().symbol();
        String shown = text.isEmpty() ? texts.get("spoken.empty") : text + unit;
        String kind = texts.get(column.isComputed() ? "spoken.computed" : editable ? "spoken.editable" : "spoken.fixed");
        return texts.get("spoken.cell", row.station(), column.heading(), shown.strip(), kind);
    }
}
