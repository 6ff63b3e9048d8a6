package coilbook.exchange.internal.out;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;

import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.streaming.SXSSFSheet;

import coilbook.exchange.internal.out.Styles.Use;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/**
 * One streamed sheet: headings in the first row, then rows from left to right, each cell once. What is behind is out of memory.
 */
final class SheetOut {

    /** The longest text a cell may hold (the format's limit). */
    private static final int LONGEST = SpreadsheetVersion.EXCEL2007.getMaxTextLength();

    private final SXSSFSheet sheet;
    private final Styles styles;
    private final List<Column> columns;
    private final String[] letters;
    private Row row;
    private int next;
    private int nextRow;

    /**
     * @param frozenColumns how many columns stay in sight, and are repeated on every printed page
     */
    SheetOut(SXSSFSheet sheet, Styles styles, List<Column> columns, int frozenColumns) {
        this.sheet = sheet;
        this.styles = styles;
        this.columns = List.copyOf(columns);
        this.letters = new String[columns.size()];
        for (int i = 0; i < columns.size(); i++) {
            letters[i] = "$" + CellReference.convertNumToColString(i);
            sheet.setColumnWidth(i, columns.get(i).width() * 256 + 128);
        }
        sheet.createFreezePane(frozenColumns, 1);
        sheet.setRepeatingRows(CellRangeAddress.valueOf("1:1"));
        if (frozenColumns > 0) {
            sheet.setRepeatingColumns(new CellRangeAddress(-1, -1, 0, frozenColumns - 1));
        }
        Row headings = sheet.createRow(nextRow++);
        int lines = 1;
        for (Column column : columns) {
            lines = Math.max(lines, Layout.lines(column.heading(), column.width() - 2));
        }
        headings.setHeightInPoints(Layout.height(lines));
        for (int i = 0; i < columns.size(); i++) {
            Cell cell = headings.createCell(i);
            cell.setCellStyle(styles.get(columns.get(i).computed() ? Use.COMPUTED_HEADING : Use.HEADING));
            cell.setCellValue(columns.get(i).heading());
        }
    }

    String name() {
        return sheet.getSheetName();
    }

    int columnCount() {
        return columns.size();
    }

    /** Begins the next row.
     *
     * @throws CoilbookException with reason BAD_INPUT if the format has no more rows
     */
    void begin() throws CoilbookException {
        if (nextRow >= SpreadsheetVersion.EXCEL2007.getMaxRows()) {
            throw new CoilbookException(Reason.BAD_INPUT, "The sheet " + name() + " would need more than "
                    + (SpreadsheetVersion.EXCEL2007.getMaxRows() - 1)
                    + " rows, which a workbook cannot hold. Write one workbook a customer or a site.");
        }
        row = sheet.createRow(nextRow++);
        next = 0;
    }

    /** The row being written, counted from 1 as formulas do. */
    int row() {
        return nextRow;
    }

    /** The rows written so far, the headings left out. */
    int rows() {
        return nextRow - 1;
    }

    /** The column that the next cell goes to, counted from 0. */
    int column() {
        return next;
    }

    /** The cell of a column in the row being written, for formulas of the same sheet; the column stays when the cell is copied sideways. */
    String here(int column) {
        return letters[column] + row();
    }

    void skip() {
        next++;
    }

    void text(String text, Use use) {
        if (text == null || text.isEmpty()) {
            next++;
            return;
        }
        Cell cell = cell();
        if (use == Use.WRAPPED) {
            grow(Layout.lines(text, columns.get(cell.getColumnIndex()).width()));
        }
        cell.setCellStyle(styles.forText(use, text));
        cell.setCellValue(text.length() > LONGEST ? text.substring(0, LONGEST - 1) + "…" : text);
    }

    /** Makes the row high enough for wrapped text: not every program measures it when it opens the file. */
    private void grow(int lines) {
        float height = Layout.height(lines);
        if (lines > 1 && height > row.getHeightInPoints()) {
            row.setHeightInPoints(height);
        }
    }

    void text(String text) {
        text(text, Use.TEXT);
    }

    /** A number; nothing where it is missing. */
    void number(double value, Use use) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            next++;
            return;
        }
        Cell cell = cell();
        cell.setCellStyle(styles.get(use));
        cell.setCellValue(value);
    }

    void date(LocalDate date) {
        if (date == null) {
            next++;
            return;
        }
        Cell cell = cell();
        cell.setCellStyle(styles.get(Use.DATE));
        cell.setCellValue(date);
    }

    void dateTime(LocalDateTime time) {
        if (time == null) {
            next++;
            return;
        }
        Cell cell = cell();
        cell.setCellStyle(styles.get(Use.DATE_TIME));
        cell.setCellValue(time);
    }

    /** An empty box for a person to fill in. */
    void box(Use use) {
        cell().setCellStyle(styles.get(use));
    }

    /** A formula with the value it gives, so that readers that do not calculate see it too. */
    void formula(String formula, double value, Use use) {
        Cell cell = cell();
        cell.setCellStyle(styles.get(use));
        cell.setCellFormula(formula);
        cell.setCellValue(value);
    }

    void formula(String formula, String value, Use use) {
        Cell cell = cell();
        cell.setCellStyle(styles.get(use));
        cell.setCellFormula(formula);
        cell.setCellValue(value);
    }

    /** Ends the sheet: filter buttons over everything written. */
    void end() {
        sheet.setAutoFilter(new CellRangeAddress(0, Math.max(1, nextRow - 1), 0, columns.size() - 1));
    }

    private Cell cell() {
        return row.createCell(next++);
    }
}
