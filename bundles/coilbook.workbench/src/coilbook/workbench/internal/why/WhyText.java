package coilbook.workbench.internal.why;

import java.util.ArrayList;
import java.util.List;

/** A text with styles by meaning, without a word about fonts or colours. */
public final class WhyText {

    /** What a piece of text is. */
    public enum Style {
        TITLE, HAZARD, CAUTION, HEADING, NONCONFORMITY, PLAIN, MUTED
    }

    /** A styled piece: where it starts and how long it is. */
    public record Piece(int start, int length, Style style) {
    }

    private final StringBuilder text = new StringBuilder();
    private final List<Piece> pieces = new ArrayList<>();

    WhyText add(Style style, String words) {
        pieces.add(new Piece(text.length(), words.length(), style));
        text.append(words);
        return this;
    }

    WhyText line(Style style, String words) {
        return add(style, words).end();
    }

    WhyText end() {
        text.append('\n');
        return this;
    }

    public String text() {
        return text.toString();
    }

    public List<Piece> pieces() {
        return List.copyOf(pieces);
    }
}
