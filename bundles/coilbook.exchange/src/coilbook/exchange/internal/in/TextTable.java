package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.xml.sax.Attributes;
import org.xml.sax.SAXException;
import org.xml.sax.helpers.DefaultHandler;

/** The texts of a workbook that cells refer to by number. Phonetic guides are left out; formatted runs are joined. */
final class TextTable extends DefaultHandler {

    private static final Pattern ESCAPED = Pattern.compile("_x([0-9A-Fa-f]{4})_");

    private final List<String> texts = new ArrayList<>();
    private final StringBuilder text = new StringBuilder();
    private long characters;
    private boolean inText;
    private int phonetic;

    String get(int index) {
        return index >= 0 && index < texts.size() ? texts.get(index) : null;
    }

    @Override
    public void startElement(String uri, String name, String qualified, Attributes attributes) {
        switch (name) {
            case "si" -> text.setLength(0);
            case "t" -> inText = phonetic == 0;
            case "rPh" -> phonetic++;
            default -> {
            }
        }
    }

    @Override
    public void endElement(String uri, String name, String qualified) throws SAXException {
        switch (name) {
            case "si" -> add();
            case "t" -> inText = false;
            case "rPh" -> phonetic--;
            default -> {
            }
        }
    }

    private void add() throws SAXException {
        characters += text.length() + 24;
        if (characters > InputLimits.TEXT_CHARACTERS) {
            throw new LimitReached("holds more than " + InputLimits.TEXT_CHARACTERS + " characters of text, which is the limit");
        }
        texts.add(unescaped(text.toString()));
    }

    @Override
    public void characters(char[] chars, int start, int length) throws SAXException {
        if (inText) {
            if (text.length() + length > InputLimits.CELL_CHARACTERS) {
                throw new LimitReached(
                        "has a text of more than " + InputLimits.CELL_CHARACTERS + " characters in one cell, which is the limit");
            }
            text.append(chars, start, length);
        }
    }

    /** The text with {@code _x000A_} and the like put back, as spreadsheet programs write control characters. */
    static String unescaped(String text) {
        if (text.indexOf("_x") < 0) {
            return text;
        }
        Matcher matcher = ESCAPED.matcher(text);
        StringBuilder plain = new StringBuilder();
        while (matcher.find()) {
            matcher.appendReplacement(plain, Matcher.quoteReplacement(String.valueOf((char) Integer.parseInt(matcher.group(1), 16))));
        }
        return matcher.appendTail(plain).toString();
    }
}
