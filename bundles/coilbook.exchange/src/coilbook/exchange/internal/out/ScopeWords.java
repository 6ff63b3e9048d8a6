package coilbook.exchange.internal.out;

import java.util.ArrayList;
import java.util.List;

import coilbook.register.FleetScope;

/** A part of the fleet in words. */
final class ScopeWords {

    private static final int MOST_NAMED = 12;

    private ScopeWords() {
    }

    static String of(FleetScope scope) {
        if (scope.isAll()) {
            return "The whole fleet";
        }
        List<String> parts = new ArrayList<>();
        add(parts, "customer", scope.customers());
        add(parts, "site", scope.sites());
        add(parts, "line", scope.lines());
        add(parts, "station", scope.stations());
        String words = String.join("; ", parts);
        return words.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + words.substring(1);
    }

    private static void add(List<String> parts, String noun, List<String> codes) {
        if (!codes.isEmpty()) {
            String named = String.join(", ", codes.subList(0, Math.min(MOST_NAMED, codes.size())));
            parts.add((codes.size() == 1 ? noun : noun + "s") + " " + named
                    + (codes.size() > MOST_NAMED ? " and " + (codes.size() - MOST_NAMED) + " more" : ""));
        }
    }
}
