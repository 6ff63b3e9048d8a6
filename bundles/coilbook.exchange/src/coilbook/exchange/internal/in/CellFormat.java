package coilbook.exchange.internal.in;

import org.apache.poi.ss.usermodel.DateUtil;

/**
 * What a number format says about the meaning of the number under it.
 *
 * @param date whether the number is the serial of a day
 * @param percent whether 0.1 is shown as 10 %
 * @param unit the text the format writes after the number, perhaps a unit; empty if none
 * @param padding the least count of digits, so that a serial 123 shown as 00123 is read as 00123; 0 if none
 */
record CellFormat(boolean date, boolean percent, String unit, int padding) {

    static final CellFormat GENERAL = new CellFormat(false, false, "", 0);

    static CellFormat of(int id, String code) {
        if (code == null || code.isEmpty() || code.equalsIgnoreCase("General")) {
            return DateUtil.isInternalDateFormat(id) ? new CellFormat(true, false, "", 0)
                    : id == 9 || id == 10 ? new CellFormat(false, true, "", 0) : GENERAL;
        }
        if (DateUtil.isADateFormat(id, code)) {
            return new CellFormat(true, false, "", 0);
        }
        return read(code);
    }

    private static CellFormat read(String code) {
        StringBuilder literal = new StringBuilder();
        boolean percent = false;
        boolean quoted = false;
        for (int i = 0; i < code.length(); i++) {
            char c = code.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (quoted) {
                literal.append(c);
            } else if (c == ';') {
                break;
            } else if (c == '\\' && i + 1 < code.length()) {
                literal.append(code.charAt(++i));
            } else if (c == '[') {
                i = Math.max(i, code.indexOf(']', i));
            } else if (c == '_' || c == '*') {
                i++;
            } else if (c == '%') {
                percent = true;
            }
        }
        int padding = code.matches("0{2,18}") ? code.length() : 0;
        return new CellFormat(false, percent, literal.toString().strip(), padding);
    }
}
