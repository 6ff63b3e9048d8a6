package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.apache.poi.ss.usermodel.BuiltinFormats;
import org.xml.sax.Attributes;
import org.xml.sax.SAXException;
import org.xml.sax.helpers.DefaultHandler;

/** The number formats of a workbook by the number of the cell style, read from its styles part. */
final class FormatTable extends DefaultHandler {

    private final Map<Integer, String> codes = new HashMap<>();
    private final List<CellFormat> byStyle = new ArrayList<>();
    private boolean inCellStyles;

    CellFormat get(String style) {
        int index = style == null ? 0 : Numbers.whole(style, 0);
        return index >= 0 && index < byStyle.size() ? byStyle.get(index) : CellFormat.GENERAL;
    }

    @Override
    public void startElement(String uri, String name, String qualified, Attributes attributes) throws SAXException {
        switch (name) {
            case "numFmt" -> codes.put(Numbers.whole(attributes.getValue("numFmtId"), -1), attributes.getValue("formatCode"));
            case "cellXfs" -> inCellStyles = true;
            case "xf" -> {
                if (inCellStyles) {
                    add(Numbers.whole(attributes.getValue("numFmtId"), 0));
                }
            }
            default -> {
            }
        }
        if (codes.size() > InputLimits.CELL_STYLES) {
            throw tooMany();
        }
    }

    private void add(int format) throws SAXException {
        if (byStyle.size() >= InputLimits.CELL_STYLES) {
            throw tooMany();
        }
        String code = codes.get(format);
        byStyle.add(CellFormat.of(format, code == null ? BuiltinFormats.getBuiltinFormat(format) : code));
    }

    private static LimitReached tooMany() {
        return new LimitReached("has more than " + InputLimits.CELL_STYLES + " cell styles, which is the limit");
    }

    @Override
    public void endElement(String uri, String name, String qualified) {
        if (name.equals("cellXfs")) {
            inCellStyles = false;
        }
    }
}
