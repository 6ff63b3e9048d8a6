package coilbook.house;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * The rules of the house: which bundle stands on which floor, and what it may use. A bundle uses only lower floors; nothing below the top
 * floor knows a screen; SQL stays in the register, spreadsheets in the exchange.
 */
final class Floors {

    /** Floor by bundle; a bundle that is not named here has no place in the house. */
    private static final Map<String, Integer> FLOOR = Map.ofEntries(Map.entry("coilbook.fleet", 1), Map.entry("coilbook.electrics", 2),
            Map.entry("coilbook.criteria", 3), Map.entry("coilbook.studies", 4), Map.entry("coilbook.register", 4),
            Map.entry("coilbook.charts", 4), Map.entry("coilbook.exchange", 5), Map.entry("coilbook.jobs", 6),
            Map.entry("coilbook.help", 6), Map.entry("coilbook.console", 7), Map.entry("coilbook.workbench", 7));

    private static final List<Rule> RULES = List.of(
            new Rule("Java alone up to the criteria", bundle -> floor(bundle) > 3, "org.", "com.", "net.", "info.", "picocli", "jakarta."),
            new Rule("no platform below the jobs", bundle -> floor(bundle) > 5, "org.eclipse."),
            new Rule("no screen outside the workbench", "coilbook.workbench"::equals, "org.eclipse.swt", "org.eclipse.jface",
                    "org.eclipse.e4.ui", "org.eclipse.e4.core", "org.eclipse.nebula", "javax.swing"),
            new Rule("no database outside the register", "coilbook.register"::equals, "java.sql", "javax.sql", "org.h2", "com.h2database",
                    "org.jooq", "jooq", "org.flywaydb", "wrapped.org.flywaydb", "org.postgresql"),
            new Rule("no spreadsheet library outside the exchange", "coilbook.exchange"::equals, "org.apache.poi", "wrapped.org.apache.poi",
                    "org.apache.xmlbeans", "org.openxmlformats"),
            new Rule("no window toolkit of Java outside charts, sheets and screens",
                    bundle -> List.of("coilbook.charts", "coilbook.exchange", "coilbook.workbench").contains(bundle), "java.awt"),
            new Rule("no internals of the platform", bundle -> false, "org.eclipse.e4.ui.internal", "org.eclipse.core.internal",
                    "org.eclipse.equinox.internal", "org.eclipse.swt.internal", "org.eclipse.jface.internal", "sun.", "com.sun."));

    /** Internals of the platform that may be used, each with its reason in {@code releng/decisions/09-platform-internals.md}. */
    private static final Map<String, String> PERMITTED = Map.of("org.eclipse.e4.ui.internal.workbench.swt.IEventLoopAdvisor",
            "coilbook.workbench");

    private Floors() {
    }

    /** What the names a bundle uses (bundles, packages, types) break; empty if nothing. */
    static List<String> violations(String bundle, Iterable<String> used) {
        List<String> found = new ArrayList<>();
        if (!FLOOR.containsKey(bundle)) {
            found.add(bundle + " has no floor");
            return found;
        }
        for (String name : used) {
            if (name.startsWith("coilbook.") && !isOf(bundle, name)) {
                ownHouse(bundle, name, found);
            }
            if (bundle.equals(PERMITTED.get(name))) {
                continue;
            }
            RULES.stream().filter(rule -> rule.brokenBy(bundle, name))
                    .forEach(rule -> found.add(bundle + " uses " + name + ": " + rule.text));
        }
        return found;
    }

    private static void ownHouse(String bundle, String name, List<String> found) {
        String other = FLOOR.keySet().stream().filter(candidate -> isOf(candidate, name)).findAny().orElse(null);
        if (other == null) {
            found.add(bundle + " uses " + name + ", which is of no bundle of the house");
        } else if (floor(other) >= floor(bundle)) {
            found.add(bundle + " (floor " + floor(bundle) + ") uses " + name + " (floor " + floor(other) + ")");
        } else if (name.startsWith(other + ".internal")) {
            found.add(bundle + " uses " + name + ", which is internal");
        }
    }

    private static boolean isOf(String bundle, String name) {
        return name.equals(bundle) || name.startsWith(bundle + ".");
    }

    private static int floor(String bundle) {
        return FLOOR.getOrDefault(bundle, 0);
    }

    private static final class Rule {
        private final String text;
        private final Predicate<String> exempt;
        private final List<String> prefixes;

        Rule(String text, Predicate<String> exempt, String... prefixes) {
            this.text = text;
            this.exempt = exempt;
            this.prefixes = List.of(prefixes);
        }

        boolean brokenBy(String bundle, String name) {
            return !exempt.test(bundle)
                    && prefixes.stream().anyMatch(p -> p.endsWith(".") ? name.startsWith(p) : name.equals(p) || name.startsWith(p + "."));
        }
    }
}
