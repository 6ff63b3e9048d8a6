package coilbook.fleet;

import java.util.Collection;
import java.util.Locale;

/** The known word that a mistyped one was most likely meant to be: least number of single-letter edits, no case. */
public final class NearestWord {

    private NearestWord() {
    }

    /** The nearest of the known words, or {@code null} if none is near: more than two edits and more than a third of the letters away. */
    public static String of(String word, Collection<String> known) {
        String best = null;
        int least = Math.max(2, word.length() / 3) + 1;
        for (String candidate : known) {
            int distance = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
            if (distance < least) {
                least = distance;
                best = candidate;
            }
        }
        return best;
    }

    private static int distance(String one, String other) {
        int[] row = new int[other.length() + 1];
        for (int j = 0; j < row.length; j++) {
            row[j] = j;
        }
        for (int i = 1; i <= one.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= other.length(); j++) {
                int change = diagonal + (one.charAt(i - 1) == other.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(change, Math.min(row[j], row[j - 1]) + 1);
            }
        }
        return row[other.length()];
    }
}
