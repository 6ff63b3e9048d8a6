package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.internal.in.Recognition.NumberedRow;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Unit;

/** Reads one table: finds its headings, passes over what is no data, and hands each line to the reader of its sort of table. */
final class TableReader implements RowSink {

    private static final Set<String> TOTALS = Set.of("total", "totals", "grand total", "subtotal", "sub total", "sum", "summe", "gesamt",
            "gesamtsumme",
            "zwischensumme", "somme", "total general", "suma", "average", "mean", "count", "anzahl", "mittelwert", "durchschnitt",
            "moyenne", "promedio",
            "media", "soma");

    private final InputTable table;
    private final TableContext context;
    private final List<Layout> layouts;
    private final ColumnMap map;
    private List<NumberedRow> buffer = new ArrayList<>();
    private Layout layout;
    private List<MappedColumn> columns = List.of();
    private LineReader lines;
    private List<InputProblem> faults = List.of();
    private List<String> seen = List.of();

    TableReader(InputTable table, TableContext context, List<Layout> layouts, ColumnMap map) {
        this.table = table;
        this.context = context;
        this.layouts = layouts;
        this.map = map;
    }

    @Override
    public void row(int number, Cell[] cells) throws CoilbookException {
        if (buffer == null) {
            handle(number, cells);
            return;
        }
        if (filled(cells)) {
            buffer.add(new NumberedRow(number, cells));
        }
        if (buffer.size() == InputLimits.HEADING_ROWS) {
            recognise();
        }
    }

    /** Ends the table. */
    void finish() {
        if (buffer != null) {
            recognise();
        }
    }

    /** Whether headings were found and no needed column is missing. */
    boolean isRead() {
        return lines != null;
    }

    /** What is missing where headings were found but the table cannot be read. */
    List<InputProblem> faults() {
        return faults;
    }

    /** The texts of the row that looks most like headings, where none is known. */
    List<String> headingsSeen() {
        return seen;
    }

    private static boolean filled(Cell[] cells) {
        for (Cell cell : cells) {
            if (cell != null) {
                return true;
            }
        }
        return false;
    }

    private void recognise() {
        List<NumberedRow> rows = buffer;
        buffer = null;
        Set<String> names = new HashSet<>(List.of(Texts.fold(table.name()), Texts.fold(context.file().replaceFirst("\\.[^.]*$", ""))));
        Recognition found = Recognition.of(rows, layouts, map, table.name(), names);
        if (found.layout() == null) {
            seen = mostTexts(rows);
            return;
        }
        layout = found.layout();
        int headingRow = rows.get(found.at()).number();
        if (found.rival() != null) {
            faults = List.of(context.problem(headingRow, "", "", "the headings fit " + layout.name() + " as well as " + found.rival().name()
                    + "; name the sheet or the file after one of them"));
            return;
        }
        List<String> missing = missing(found.headings(), rows.subList(found.at() + 1, rows.size()));
        if (!missing.isEmpty()) {
            faults = missing.stream().map(column -> context.problem(headingRow, column, "", "missing column " + column)).toList();
            return;
        }
        report(headingRow, found.headings());
        start(found.headings().columns(), headingRow);
        int next = found.at() + 1;
        if (next < rows.size() && isUnitRow(rows.get(next).cells())) {
            columns = withUnits(rows.get(next).cells());
            start(columns, headingRow);
            next++;
        }
        rows.subList(next, rows.size()).forEach(row -> handle(row.number(), row.cells()));
    }

    private List<String> missing(HeadingRow headings, List<NumberedRow> data) {
        Set<String> ids = headings.ids();
        List<String> missing = new ArrayList<>(layout.missing(ids));
        if (layout instanceof FlatLayout && ids.contains(FlatLayout.STATION)
                && !(ids.contains(FlatLayout.SITE) && ids.contains(FlatLayout.LINE))) {
            MappedColumn station = headings.columns().stream().filter(column -> column.target().id().equals(FlatLayout.STATION)).findFirst()
                    .orElseThrow();
            boolean whole = data.stream().map(row -> cell(row.cells(), station))
                    .anyMatch(cell -> cell != null && cell.shown().indexOf('/') != cell.shown().lastIndexOf('/'));
            if (!whole) {
                missing.addAll(ids.contains(FlatLayout.SITE) ? List.of() : List.of("Site"));
                missing.addAll(ids.contains(FlatLayout.LINE) ? List.of() : List.of("Line"));
            }
        }
        return missing;
    }

    /** Says what becomes of headings that are not understood; one that nearly is must not be passed over in silence. */
    private void report(int row, HeadingRow headings) {
        for (Map.Entry<Integer, String> each : headings.unknown().entrySet()) {
            String near = Headings.nearest(each.getValue(), layout);
            if (near != null) {
                context.gathering().reject(context.problem(row, each.getValue(), "",
                        "the heading is not understood; if it means " + near
                                + ", write it so or say so in the column map, else map it to nothing"));
            } else {
                context.gathering().notice(context.problem(row, each.getValue(), "", "the column is not known and is passed over"));
            }
        }
        for (Map.Entry<Integer, String> each : headings.doubled().entrySet()) {
            context.gathering().reject(context.problem(row, each.getValue(), "",
                    "column " + Numbers.letters(each.getKey()) + " has the meaning of another column already; map one of them to nothing"));
        }
    }

    private void start(List<MappedColumn> found, int headingRow) {
        columns = found;
        if (layout instanceof KindLayout kind) {
            lines = new KindLines(kind, columns, context);
            return;
        }
        boolean dated = columns.stream().anyMatch(column -> column.target().id().equals(FlatLayout.READING_DATE));
        if (!dated) {
            for (MappedColumn column : columns) {
                if (column.target().quantity() != null) {
                    context.gathering().reject(context.problem(headingRow, column.heading(), "",
                            "readings need a column with their date, such as Measured on; the column is not taken"));
                }
            }
            columns = columns.stream().filter(column -> column.target().quantity() == null).toList();
        }
        lines = new FlatLines(columns, context);
    }

    private boolean isUnitRow(Cell[] cells) {
        int units = 0;
        for (MappedColumn column : columns) {
            Cell cell = cell(cells, column);
            if (cell != null && (cell.type() != Cell.Type.TEXT || column.target().isIgnored() || unit(cell, column) == null)) {
                return false;
            }
            units += cell != null && column.target().unit() != Unit.NONE ? 1 : 0;
        }
        return units > 0;
    }

    private static String unit(Cell cell, MappedColumn column) {
        String text = Texts.strip(cell.text());
        boolean bracketed = text.length() > 2 && (text.startsWith("[") && text.endsWith("]") || text.startsWith("(") && text.endsWith(")"));
        return HeadingRow.unit(bracketed ? Texts.strip(text.substring(1, text.length() - 1)) : text, column.target());
    }

    private List<MappedColumn> withUnits(Cell[] cells) {
        return columns.stream().map(column -> cell(cells, column) == null ? column
                : new MappedColumn(column.index(), column.heading(), unit(cell(cells, column), column), column.target())).toList();
    }

    private static List<String> mostTexts(List<NumberedRow> rows) {
        List<String> most = List.of();
        for (NumberedRow row : rows) {
            List<String> texts = new ArrayList<>();
            for (Cell cell : row.cells()) {
                if (cell != null && cell.type() == Cell.Type.TEXT) {
                    texts.add(Texts.strip(cell.text()));
                }
            }
            most = texts.size() > most.size() ? texts : most;
        }
        return most;
    }

    private static Cell cell(Cell[] cells, MappedColumn column) {
        return column.index() < cells.length ? cells[column.index()] : null;
    }

    private void handle(int number, Cell[] cells) {
        if (lines == null || !hasData(cells)) {
            return;
        }
        Cell first = first(cells);
        String word = first.type() == Cell.Type.TEXT && first.text().length() < 60 ? Texts.fold(first.text()) : "";
        if (!word.isEmpty() && isHeadingAgain(number, word, cells)) {
            return;
        }
        boolean flat = layout instanceof FlatLayout;
        if (isTotal(word, cells)) {
            return;
        } else if (flat && columns.size() > 1 && Recognition.distinct(cells) == 1) {
            context.gathering()
                    .notice(context.problem(number, "", shortened(first.shown()),
                            "a text alone in its row is passed over; it does not count for the rows"
                                    + " below"));
            return;
        }
        lines.line(number, cells);
    }

    private static String shortened(String text) {
        return text.length() > 80 ? text.substring(0, 79) + "…" : text;
    }

    private boolean hasData(Cell[] cells) {
        for (MappedColumn column : columns) {
            if (!column.target().isIgnored() && cell(cells, column) != null) {
                return true;
            }
        }
        return false;
    }

    private static Cell first(Cell[] cells) {
        for (Cell cell : cells) {
            if (cell != null) {
                return cell;
            }
        }
        throw new IllegalArgumentException("a blank row");
    }

    /** A heading row in the midst of the data; columns may stand in another order from there on. */
    private boolean isHeadingAgain(int number, String word, Cell[] cells) {
        if (layout.find(word) == null && columns.stream().noneMatch(column -> Texts.fold(column.heading()).equals(word))) {
            return false;
        }
        HeadingRow again = HeadingRow.read(layout, map, null, cells);
        int texts = 0;
        for (Cell cell : cells) {
            texts += cell != null && cell.type() == Cell.Type.TEXT ? 1 : 0;
        }
        int count = again.columns().size();
        if (count < 2 || count < 0.6 * again.filled() || texts < again.filled()) {
            return false;
        }
        if (layout.missing(again.ids()).isEmpty() && !again.columns().equals(columns) && again.count() >= columns.size() / 2) {
            report(number, again);
            start(again.columns(), number);
        }
        return true;
    }

    private boolean isTotal(String word, Cell[] cells) {
        boolean total = TOTALS.contains(word) || word.indexOf(' ') > 0 && TOTALS.contains(word.substring(0, word.indexOf(' ')));
        if (!total) {
            return false;
        }
        for (MappedColumn column : columns) {
            boolean needed = layout instanceof FlatLayout
                    ? Set.of(FlatLayout.SITE, FlatLayout.LINE, FlatLayout.STATION, FlatLayout.TAG).contains(column.target().id())
                    : column.target().field() != null && column.target().field().isRequired();
            if (needed && cell(cells, column) == null) {
                return true;
            }
        }
        return false;
    }
}
