package coilbook.exchange.internal.in;

import org.xml.sax.Attributes;
import org.xml.sax.helpers.DefaultHandler;

/** Whether a workbook counts its days from 1904, as some older programs do. */
final class BookSettings extends DefaultHandler {

    private boolean from1904;

    boolean from1904() {
        return from1904;
    }

    @Override
    public void startElement(String uri, String name, String qualified, Attributes attributes) {
        if (name.equals("workbookPr")) {
            String value = attributes.getValue("date1904");
            from1904 = "1".equals(value) || "true".equals(value);
        }
    }
}
