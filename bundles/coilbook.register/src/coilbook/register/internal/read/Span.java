package coilbook.register.internal.read;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;

import org.jooq.Condition;
import org.jooq.impl.DSL;

import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.register.FleetScope;
import coilbook.register.internal.store.KindTable;

/**
 * A stretch of station codes, so that a part of a fleet is read through the index of codes.
 *
 * @param after the code before the first
 * @param before the code after the last; {@code null} = to the end
 * @param condition what else must hold
 */
record Span(String after, String before, Condition condition) {

    private static final KindTable<Station> TABLE = KindTable.of(Station.class);
    /** The character after the slash: every code that begins with {@code A/} lies between {@code A/} and {@code A0}. */
    private static final String PAST_SLASH = "0";

    /** The stretches of a scope in the order of the codes; none lies in another. */
    static List<Span> of(FleetScope scope, GroupRows groups) {
        if (scope.isAll()) {
            return List.of(new Span("", null, DSL.noCondition()));
        }
        TreeSet<String> sites = new TreeSet<>(scope.sites());
        groups.all(Site.class).stream().filter(site -> scope.customers().contains(site.customer())).forEach(site -> sites.add(site.code()));
        TreeSet<String> lines = new TreeSet<>(scope.lines());
        lines.removeIf(line -> within(line, sites));
        List<Span> spans = new ArrayList<>();
        for (String site : sites) {
            spans.add(new Span(site + "/", site + PAST_SLASH, TABLE.text("site").eq(site)));
        }
        for (String line : lines) {
            int slash = line.indexOf('/');
            if (slash > 0) {
                spans.add(new Span(line + "/", line + PAST_SLASH,
                        TABLE.text("site").eq(line.substring(0, slash)).and(TABLE.text("line").eq(line.substring(slash + 1)))));
            }
        }
        for (String station : new TreeSet<>(scope.stations())) {
            if (!within(station, sites) && !within(station, lines)) {
                spans.add(new Span(station, null, KindTable.KEY.eq(station)));
            }
        }
        spans.sort(Comparator.comparing(Span::after));
        return spans;
    }

    private static boolean within(String code, TreeSet<String> places) {
        for (int slash = code.indexOf('/'); slash > 0; slash = code.indexOf('/', slash + 1)) {
            if (places.contains(code.substring(0, slash))) {
                return true;
            }
        }
        return false;
    }

    /** What holds for the codes of this stretch after the given one. */
    Condition condition(String last) {
        Condition found = before == null ? condition : condition.and(KindTable.KEY.lt(before));
        return before == null && !after.isEmpty() ? found : found.and(KindTable.KEY.gt(last));
    }

    /** Whether the stretch is one code. */
    boolean isSingle() {
        return before == null && !after.isEmpty();
    }
}
