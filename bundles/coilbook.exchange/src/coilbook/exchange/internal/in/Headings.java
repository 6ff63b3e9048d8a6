package coilbook.exchange.internal.in;

import java.util.List;

/** The nearest known heading to one that is not known. */
final class Headings {

    private Headings() {
    }

    /** The proper heading of a column that the text nearly names, or {@code null} if it is near to none. */
    static String nearest(String heading, Layout layout) {
        String best = null;
        int least = Integer.MAX_VALUE;
        for (Heading.Reading way : new Heading(heading).readings()) {
            if (way.name().isEmpty()) {
                continue;
            }
            int bound = way.name().length() < 6 ? 0 : way.name().length() < 10 ? 1 : 2;
            boolean parted = !way.unit().isEmpty() && !plainWord(way.unit());
            for (String name : layout.names()) {
                int distance = way.unit().isEmpty() || parted ? Texts.distance(way.name(), name, bound) : bound + 1;
                if (distance <= bound && distance < least) {
                    least = distance;
                    best = layout.find(name).target().heading();
                }
            }
        }
        return best == null || best.isEmpty() ? null : best;
    }

    /** Whether the text behind a heading is a word more, as in {@code Coil colour}, and no unit gone wrong. */
    private static boolean plainWord(String text) {
        return text.chars().allMatch(Character::isLetter) && text.length() > 4;
    }

    /** How many texts are headings of some layout: for telling delimiters apart. */
    static int known(List<String> texts, List<Layout> layouts) {
        int most = 0;
        for (Layout layout : layouts) {
            int known = 0;
            for (String text : texts) {
                known += new Heading(text).readings().stream().anyMatch(way -> layout.find(way.name()) != null) ? 1 : 0;
            }
            most = Math.max(most, known);
        }
        return most;
    }
}
