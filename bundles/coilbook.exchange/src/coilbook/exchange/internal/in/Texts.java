package coilbook.exchange.internal.in;

import java.text.Normalizer;
import java.util.Locale;

/** Folding of texts for comparison, and stripping of every kind of space. */
final class Texts {

    private Texts() {
    }

    /** The text without spaces, no-break spaces and invisible marks at its ends. */
    static String strip(String text) {
        int from = 0;
        int to = text.length();
        while (from < to && isSpace(text.charAt(from))) {
            from++;
        }
        while (to > from && isSpace(text.charAt(to - 1))) {
            to--;
        }
        return from == 0 && to == text.length() ? text : text.substring(from, to);
    }

    private static boolean isSpace(char c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c) || c == '\u200b' || c == '\ufeff' || Character.isISOControl(c);
    }

    /** Lower case, without accents and punctuation, one space between words: {@code Serial-No.} and {@code serial no} become one. */
    static String fold(String text) {
        String plain = text.toLowerCase(Locale.ROOT).replace("ß", "ss").replace("ω", " ohm ").replace("#", " no ")
                .replace("№", " no ").replace("%", " percent ").replace("µ", "u").replace("μ", "u");
        plain = Normalizer.normalize(plain, Normalizer.Form.NFKD);
        StringBuilder folded = new StringBuilder(plain.length());
        boolean gap = false;
        for (int i = 0; i < plain.length(); i++) {
            char c = plain.charAt(i);
            if (Character.isLetterOrDigit(c)) {
                if (gap && folded.length() > 0) {
                    folded.append(' ');
                }
                folded.append(c);
                gap = false;
            } else if (Character.getType(c) != Character.NON_SPACING_MARK) {
                gap = true;
            }
        }
        return folded.toString();
    }

    /** How many letters must be changed, added or taken away, counted up to a bound; more is bound + 1. */
    static int distance(String one, String other, int bound) {
        if (Math.abs(one.length() - other.length()) > bound) {
            return bound + 1;
        }
        int[] before = new int[other.length() + 1];
        for (int j = 0; j < before.length; j++) {
            before[j] = j;
        }
        for (int i = 1; i <= one.length(); i++) {
            int[] now = new int[other.length() + 1];
            now[0] = i;
            int least = i;
            for (int j = 1; j <= other.length(); j++) {
                int change = before[j - 1] + (one.charAt(i - 1) == other.charAt(j - 1) ? 0 : 1);
                now[j] = Math.min(change, Math.min(before[j], now[j - 1]) + 1);
                least = Math.min(least, now[j]);
            }
            if (least > bound) {
                return bound + 1;
            }
            before = now;
        }
        return Math.min(before[other.length()], bound + 1);
    }
}
