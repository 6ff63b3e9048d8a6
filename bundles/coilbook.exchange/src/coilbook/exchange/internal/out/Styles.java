package coilbook.exchange.internal.out;

import java.util.EnumMap;
import java.util.Map;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * The cell styles of one workbook, each made once: a style a cell would exhaust the format's limit of 64,000. Colours of verdicts follow
 * IEC 60073: red for danger, yellow for an abnormal state, blue where somebody has to act (a value is missing), grey without meaning.
 */
final class Styles {

    /** What a cell is for. */
    enum Use {
        HEADING, COMPUTED_HEADING, TEXT, WRAPPED, NUMBER, WHOLE, WHOLE_LEFT, DATE, DATE_TIME, COMPUTED_TEXT, COMPUTED, COMPUTED_WHOLE,
        TITLE, SUBTITLE, NOTE, CAUTION,
        SIGNATURE, SIGNATURE_LABEL, BOX, BOX_DATE, LABEL, HAZARD, NONCONFORMITY, UNDETERMINED, OBSERVATION, CONCEDED, CONFORMITY, TOTAL
    }

    private static final String FONT = "Calibri";
    private static final byte[] INK = rgb(0x1F2933);
    private static final byte[] RULE = rgb(0xC3CAD1);

    private final XSSFWorkbook workbook;
    private final Map<Use, XSSFCellStyle> plain = new EnumMap<>(Use.class);
    private final Map<Use, XSSFCellStyle> quoted = new EnumMap<>(Use.class);

    Styles(XSSFWorkbook workbook) {
        this.workbook = workbook;
        workbook.getFontAt(0).setFontName(FONT);
        workbook.getFontAt(0).setFontHeightInPoints((short) 10);
        XSSFFont normal = font(10, false, INK);
        XSSFFont bold = font(10, true, INK);
        XSSFFont white = font(10, true, rgb(0xFFFFFF));
        for (Use use : Use.values()) {
            XSSFCellStyle style = workbook.createCellStyle();
            style.setFont(normal);
            style.setVerticalAlignment(VerticalAlignment.TOP);
            plain.put(use, style);
        }
        heading(Use.HEADING, white, 0x34495E);
        heading(Use.COMPUTED_HEADING, bold, 0xDDE3E9);
        wrap(Use.WRAPPED);
        for (Use text : new Use[] { Use.TEXT, Use.WRAPPED, Use.COMPUTED_TEXT }) {
            plain.get(text).setAlignment(HorizontalAlignment.LEFT);
            plain.get(text).setIndention((short) 1);
        }
        wrap(Use.NOTE);
        format(Use.WHOLE, "#,##0");
        format(Use.WHOLE_LEFT, "#,##0");
        plain.get(Use.WHOLE_LEFT).setAlignment(HorizontalAlignment.LEFT);
        format(Use.COMPUTED_WHOLE, "#,##0");
        format(Use.TOTAL, "#,##0");
        format(Use.DATE, "yyyy-mm-dd");
        format(Use.DATE_TIME, "yyyy-mm-dd hh:mm:ss");
        format(Use.COMPUTED, "#,##0.00##");
        plain.get(Use.DATE).setAlignment(HorizontalAlignment.LEFT);
        plain.get(Use.DATE_TIME).setAlignment(HorizontalAlignment.LEFT);
        for (Use computed : new Use[] { Use.COMPUTED, Use.COMPUTED_TEXT, Use.COMPUTED_WHOLE }) {
            fill(computed, 0xF3F5F7);
        }
        plain.get(Use.TITLE).setFont(font(18, true, INK));
        plain.get(Use.SUBTITLE).setFont(font(12, true, INK));
        plain.get(Use.LABEL).setFont(bold);
        plain.get(Use.TOTAL).setFont(bold);
        plain.get(Use.TOTAL).setBorderTop(BorderStyle.THIN);
        wrap(Use.CAUTION);
        box(Use.CAUTION, BorderStyle.MEDIUM, rgb(0xC00000));
        plain.get(Use.CAUTION).setVerticalAlignment(VerticalAlignment.CENTER);
        plain.get(Use.SIGNATURE).setBorderBottom(BorderStyle.THIN);
        plain.get(Use.SIGNATURE_LABEL).setFont(bold);
        plain.get(Use.SIGNATURE_LABEL).setVerticalAlignment(VerticalAlignment.BOTTOM);
        plain.get(Use.SIGNATURE).setVerticalAlignment(VerticalAlignment.BOTTOM);
        box(Use.BOX, BorderStyle.THIN, RULE);
        wrap(Use.BOX);
        box(Use.BOX_DATE, BorderStyle.THIN, RULE);
        format(Use.BOX_DATE, "yyyy-mm-dd");
        mark(Use.HAZARD, white, 0xC00000);
        mark(Use.NONCONFORMITY, bold, 0xFFD966);
        mark(Use.UNDETERMINED, bold, 0xBDD7EE);
        mark(Use.OBSERVATION, normal, 0xEDEDED);
        mark(Use.CONCEDED, normal, 0xEDEDED);
        mark(Use.CONFORMITY, normal, 0xFFFFFF);
        for (Use use : Use.values()) {
            XSSFCellStyle style = workbook.createCellStyle();
            style.cloneStyleFrom(plain.get(use));
            style.setQuotePrefixed(true);
            quoted.put(use, style);
        }
    }

    XSSFCellStyle get(Use use) {
        return plain.get(use);
    }

    /** The style for a text: where it begins like a formula, the one that keeps a spreadsheet program from ever taking it for one. */
    XSSFCellStyle forText(Use use, String text) {
        return looksLikeFormula(text) ? quoted.get(use) : plain.get(use);
    }

    static boolean looksLikeFormula(String text) {
        if (text.isEmpty()) {
            return false;
        }
        char first = text.charAt(0);
        return first == '=' || first == '+' || first == '-' || first == '@';
    }

    private void heading(Use use, XSSFFont font, int colour) {
        XSSFCellStyle style = plain.get(use);
        style.setFont(font);
        style.setWrapText(true);
        style.setVerticalAlignment(VerticalAlignment.CENTER);
        box(use, BorderStyle.THIN, RULE);
        fill(use, colour);
    }

    private void mark(Use use, XSSFFont font, int colour) {
        plain.get(use).setFont(font);
        fill(use, colour);
    }

    private void fill(Use use, int colour) {
        plain.get(use).setFillPattern(FillPatternType.SOLID_FOREGROUND);
        plain.get(use).setFillForegroundColor(new XSSFColor(rgb(colour)));
    }

    private void wrap(Use use) {
        plain.get(use).setWrapText(true);
    }

    private void format(Use use, String format) {
        plain.get(use).setDataFormat(workbook.createDataFormat().getFormat(format));
    }

    private void box(Use use, BorderStyle border, byte[] colour) {
        XSSFCellStyle style = plain.get(use);
        XSSFColor line = new XSSFColor(colour);
        style.setBorderTop(border);
        style.setBorderBottom(border);
        style.setBorderLeft(border);
        style.setBorderRight(border);
        style.setTopBorderColor(line);
        style.setBottomBorderColor(line);
        style.setLeftBorderColor(line);
        style.setRightBorderColor(line);
    }

    private XSSFFont font(int points, boolean bold, byte[] colour) {
        XSSFFont font = workbook.createFont();
        font.setFontName(FONT);
        font.setFontHeightInPoints((short) points);
        font.setBold(bold);
        font.setColor(new XSSFColor(colour));
        return font;
    }

    private static byte[] rgb(int colour) {
        return new byte[] { (byte) (colour >> 16), (byte) (colour >> 8), (byte) colour };
    }
}
