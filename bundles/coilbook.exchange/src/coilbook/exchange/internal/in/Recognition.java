package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.Kind;

/**
 * Which row of a table holds its headings and which sort of table they make. Headings decide; the name of the sheet or the file only tips the scales
 * between two sorts that fit equally well.
 *
 * @param layout the sort of table, or {@code null} if no row fits any
 * @param at the heading row's place among the rows looked at
 * @param rival another sort that fits as well, or {@code null}
 */
record Recognition(Layout layout, int at, HeadingRow headings, Layout rival) {

    static final Recognition NONE = new Recognition(null, -1, null, null);

    private static final int LEAST = 2;
    private static final int LEAST_OF_INCOMPLETE = 3;
    private static final double LEAST_SHARE = 0.6;

    /** A row as it was handed over. */
    record NumberedRow(int number, Cell[] cells) {
    }

    private record Candidate(Layout layout, int at, HeadingRow headings, int score) {
    }

    /** @param names the names of the sheet and the file, folded */
    static Recognition of(List<NumberedRow> rows, List<Layout> layouts, ColumnMap map, String sheet, Set<String> names) {
        Kind<?> named = ExchangeSheets.bySheet(sheet);
        List<Candidate> best = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            if (distinct(rows.get(i).cells()) < LEAST) {
                continue;
            }
            for (Layout layout : layouts) {
                Candidate candidate = candidate(rows, i, layout, map, named, names);
                if (candidate != null && (best.isEmpty() || candidate.score >= best.get(0).score)) {
                    if (!best.isEmpty() && candidate.score > best.get(0).score) {
                        best.clear();
                    }
                    best.add(candidate);
                }
            }
        }
        if (best.isEmpty()) {
            return NONE;
        }
        Candidate first = best.get(0);
        Layout rival = best.stream().filter(other -> other.at == first.at && other.layout != first.layout).map(Candidate::layout)
                .findFirst().orElse(null);
        return new Recognition(first.layout, first.at, first.headings, rival);
    }

    private static Candidate candidate(List<NumberedRow> rows, int at, Layout layout, ColumnMap map, Kind<?> named, Set<String> names) {
        NumberedRow row = rows.get(at);
        boolean flat = layout instanceof FlatLayout;
        HeadingRow headings = HeadingRow.read(layout, map, flat ? above(rows, at) : null, row.cells());
        int count = headings.count();
        boolean complete = layout.missing(headings.ids()).isEmpty();
        boolean isNamed = layout instanceof KindLayout kind && kind.kind() == named;
        boolean fits;
        if (flat) {
            fits = count >= (complete ? LEAST : LEAST_OF_INCOMPLETE);
        } else {
            boolean keyed = ((KindLayout) layout).hasKeys(headings.ids()) && count >= LEAST_SHARE * headings.filled();
            fits = count >= LEAST && (isNamed || keyed);
        }
        if (!fits) {
            return null;
        }
        boolean hinted = names.contains(Texts.fold(layout.name())) || names.contains(singular(Texts.fold(layout.name())));
        return new Candidate(layout, at, headings, count * 100 + (complete ? 50 : 0) + (isNamed || hinted ? 25 : 0) + (flat ? 0 : 10));
    }

    private static String singular(String name) {
        return name.endsWith("s") ? name.substring(0, name.length() - 1) : name;
    }

    /** The row directly above if it may be the first line of two-line headings: more than a title. */
    private static Cell[] above(List<NumberedRow> rows, int at) {
        if (at == 0 || rows.get(at - 1).number() != rows.get(at).number() - 1) {
            return null;
        }
        Cell[] above = rows.get(at - 1).cells();
        return distinct(above) > 1 ? above : null;
    }

    /** How many different cells are filled; what a merged region covers counts once. */
    static int distinct(Cell[] cells) {
        int distinct = 0;
        Cell before = null;
        for (Cell cell : cells) {
            if (cell != null && cell != before) {
                distinct++;
                before = cell;
            }
        }
        return distinct;
    }
}
