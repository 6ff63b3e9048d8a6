package coilbook.exchange.internal.in;

import java.time.LocalDateTime;
import java.util.Arrays;

import org.apache.poi.ss.usermodel.DateUtil;
import org.xml.sax.Attributes;
import org.xml.sax.SAXException;
import org.xml.sax.helpers.DefaultHandler;

import coilbook.fleet.CoilbookException;

/** Reads the cells of one sheet as the file holds them: raw numbers, cached values of formulas, hidden rows and columns included. */
final class SheetParser extends DefaultHandler {

    /** Carries our own exception through the parser. */
    static final class Stopped extends SAXException {

        private static final long serialVersionUID = 1L;

        Stopped(CoilbookException cause) {
            super(cause);
        }
    }

    private final TextTable texts;
    private final FormatTable formats;
    private final boolean from1904;
    private final RowSink sink;
    private final CellCount count;
    private final StringBuilder content = new StringBuilder();
    private Cell[] cells = new Cell[64];
    private int width;
    private int row;
    private int column;
    private String type;
    private String style;
    private boolean formula;
    private String formulaText = "";
    private boolean hasValue;
    private boolean collecting;
    private int phonetic;

    SheetParser(TextTable texts, FormatTable formats, boolean from1904, RowSink sink, CellCount count) {
        this.texts = texts;
        this.formats = formats;
        this.from1904 = from1904;
        this.sink = sink;
        this.count = count;
    }

    @Override
    public void startElement(String uri, String name, String qualified, Attributes attributes) throws SAXException {
        switch (name) {
            case "row" -> startRow(attributes);
            case "c" -> startCell(attributes);
            case "v" -> startContent();
            case "t" -> collecting = phonetic == 0;
            case "is" -> startContent();
            case "rPh" -> phonetic++;
            case "f" -> startFormula();
            default -> {
            }
        }
    }

    private void startRow(Attributes attributes) throws SAXException {
        row = Numbers.whole(attributes.getValue("r"), row + 1);
        width = 0;
        column = -1;
        if (row < 1 || row > InputLimits.ROWS) {
            throw new LimitReached("has a row " + row + "; the limit is " + InputLimits.ROWS);
        }
    }

    private void startCell(Attributes attributes) throws SAXException {
        String reference = attributes.getValue("r");
        column = reference == null ? column + 1 : Numbers.column(reference);
        if (column < 0 || column >= InputLimits.COLUMNS) {
            throw new LimitReached("has a cell " + reference + "; the limit is " + InputLimits.COLUMNS + " columns");
        }
        type = attributes.getValue("t");
        style = attributes.getValue("s");
        formula = false;
        hasValue = false;
        content.setLength(0);
    }

    private void startFormula() {
        formula = true;
        content.setLength(0);
        collecting = true;
    }

    private void startContent() {
        content.setLength(0);
        hasValue = true;
        collecting = !"inlineStr".equals(type);
    }

    @Override
    public void endElement(String uri, String name, String qualified) throws SAXException {
        switch (name) {
            case "v", "t" -> collecting = false;
            case "f" -> endFormula();
            case "rPh" -> phonetic--;
            case "c" -> endCell();
            case "row" -> endRow();
            default -> {
            }
        }
    }

    private void endFormula() {
        collecting = false;
        formulaText = content.toString();
    }

    private void endCell() throws SAXException {
        Cell cell = cell();
        if (cell == null || cell.isBlank()) {
            return;
        }
        if (column >= cells.length) {
            cells = Arrays.copyOf(cells, Math.max(column + 1, cells.length * 2));
        }
        if (column >= width) {
            Arrays.fill(cells, width, column, null);
            width = column + 1;
        }
        cells[column] = cell;
    }

    private Cell cell() throws SAXException {
        if (!hasValue || content.length() == 0 && !"str".equals(type) && !"inlineStr".equals(type)) {
            return formula ? Cell.uncomputed("=" + formulaText) : null;
        }
        String value = content.toString();
        if (type == null || type.equals("n")) {
            return number(value);
        }
        return switch (type) {
            case "s" -> text(texts.get(Numbers.whole(value, -1)));
            case "str", "inlineStr" -> text(TextTable.unescaped(value));
            case "b" -> Cell.yesNo(value.strip().equals("1") || value.strip().equalsIgnoreCase("true"));
            case "e" -> Cell.error(value.strip());
            case "d" -> isoDate(value.strip());
            default -> throw new LimitReached("has a cell of the unknown kind " + type + " in row " + row);
        };
    }

    private static Cell text(String text) throws SAXException {
        if (text == null) {
            throw new LimitReached("is damaged: a cell refers to a text that is not there");
        }
        return Cell.text(text);
    }

    private static Cell isoDate(String value) {
        try {
            LocalDateTime moment = value.length() == 10 ? java.time.LocalDate.parse(value).atStartOfDay()
                    : LocalDateTime.parse(value.replace("Z", ""));
            return Cell.date(0, moment);
        } catch (java.time.format.DateTimeParseException e) {
            return Cell.text(value);
        }
    }

    private Cell number(String value) {
        double number;
        try {
            number = Double.parseDouble(value.strip());
        } catch (NumberFormatException e) {
            return Cell.error(value);
        }
        CellFormat format = formats.get(style);
        if (format.date() && DateUtil.isValidExcelDate(number)) {
            LocalDateTime moment = DateUtil.getLocalDateTime(number, from1904);
            if (moment != null) {
                return Cell.date(number, moment);
            }
        }
        return Double.isNaN(number) || Double.isInfinite(number) ? Cell.error(value)
                : Cell.number(number, format.date() ? CellFormat.GENERAL : format);
    }

    private void endRow() throws SAXException {
        if (width == 0) {
            return;
        }
        try {
            count.add(width);
            sink.row(row, Arrays.copyOf(cells, width));
        } catch (CoilbookException e) {
            throw new Stopped(e);
        }
    }

    @Override
    public void characters(char[] chars, int start, int length) throws SAXException {
        if (collecting) {
            if (content.length() + length > InputLimits.CELL_CHARACTERS) {
                throw new LimitReached(
                        "has a cell of more than " + InputLimits.CELL_CHARACTERS + " characters in row " + row + ", which is the limit");
            }
            content.append(chars, start, length);
        }
    }
}
