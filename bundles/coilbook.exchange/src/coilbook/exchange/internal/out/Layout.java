package coilbook.exchange.internal.out;

/** How much room text takes, estimated, because measuring fonts costs more than writing the cells and differs between machines. */
final class Layout {

    private static final float LINE = 13.5f;
    private static final int MOST_LINES = 12;
    /** Letters are narrower than the digits that column widths are counted in: this many of them take the room of that many digits. */
    private static final int LETTERS = 11;
    private static final int DIGITS = 10;

    private Layout() {
    }

    /** The lines that a text takes when it is broken between words. */
    static int lines(String text, int columnWidth) {
        int width = Math.max(1, columnWidth * LETTERS / DIGITS);
        int lines = 1;
        int used = 0;
        int word = 0;
        for (int i = 0; i <= text.length(); i++) {
            char c = i < text.length() ? text.charAt(i) : ' ';
            if (c != ' ' && c != '\n') {
                word++;
                continue;
            }
            if (used > 0 && used + word > width) {
                lines++;
                used = 0;
            }
            lines += Math.max(0, word - 1) / width;
            used += word + 1;
            word = 0;
            if (c == '\n') {
                lines++;
                used = 0;
            }
        }
        return Math.min(lines, MOST_LINES);
    }

    /** The height of a row in points. */
    static float height(int lines) {
        return LINE * lines + 2;
    }
}
