package coilbook.exchange.internal.out;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.regex.Pattern;

import org.apache.poi.ss.util.CellReference;

import coilbook.fleet.Kind;

/**
 * Where the rows of the catalogue and the circuits stand, so that a station's formulas can take their values from there. The formula looks the key up, and so
 * goes on working when a sheet is sorted; where a key has signs that a spreadsheet program would take for wildcards, or differs from another in case alone, it names
 * the cell.
 */
final class Lookups {

    private static final Pattern PLAIN = Pattern.compile("\\p{L}[\\p{L}\\p{N} ._()/+-]*");

    private final Map<Kind<?>, EntitySheet> sheets = new HashMap<>();
    private final Map<Kind<?>, Integer> keyColumns = new HashMap<>();
    private final Map<Kind<?>, Map<String, Integer>> rows = new HashMap<>();
    private final Map<Kind<?>, Map<String, Integer>> ignoringCase = new HashMap<>();
    private final Map<Kind<?>, Map<String, Boolean>> foundByKey = new HashMap<>();
    private final Map<Kind<?>, Map<Integer, Around>> arounds = new HashMap<>();

    /** A lookup's text before and after the cell with the key. */
    private record Around(String before, String after) {
    }

    /**
     * @param keyColumn where the whole key stands in one cell
     */
    void add(EntitySheet sheet, int keyColumn) {
        sheets.put(sheet.kind(), sheet);
        keyColumns.put(sheet.kind(), keyColumn);
        rows.put(sheet.kind(), new HashMap<>());
        ignoringCase.put(sheet.kind(), new HashMap<>());
    }

    /** Notes the row being written. */
    void note(Kind<?> kind, String key) {
        rows.get(kind).put(key, sheets.get(kind).out().row());
        ignoringCase.get(kind).merge(key.toLowerCase(Locale.ROOT), 1, Integer::sum);
    }

    /**
     * The formula that gives a field of a row.
     *
     * @param keyCell the cell with the row's key
     * @return {@code null} if the workbook has no such row
     */
    String formula(Kind<?> kind, String key, String keyCell, String fieldId) {
        return formula(kind, key, keyCell, sheets.get(kind).column(kind, fieldId));
    }

    /** The same of a column counted from 0. */
    String formula(Kind<?> kind, String key, String keyCell, int valueColumn) {
        Integer row = rows.get(kind).get(key);
        if (row == null) {
            return null;
        }
        if (!foundByKey.computeIfAbsent(kind, k -> new HashMap<>()).computeIfAbsent(key, k -> isFoundByKey(kind, k))) {
            return sheetName(kind) + "$" + CellReference.convertNumToColString(valueColumn) + "$" + row;
        }
        Around around = arounds.computeIfAbsent(kind, k -> new HashMap<>()).computeIfAbsent(valueColumn, c -> around(kind, c));
        return around.before + keyCell + around.after;
    }

    private boolean isFoundByKey(Kind<?> kind, String key) {
        return Objects.equals(ignoringCase.get(kind).get(key.toLowerCase(Locale.ROOT)), 1) && PLAIN.matcher(key).matches();
    }

    private Around around(Kind<?> kind, int valueColumn) {
        String keys = column(kind, keyColumns.get(kind));
        return new Around("INDEX(" + column(kind, valueColumn) + ",MATCH(", "," + keys + ",0))");
    }

    /** The cells of a column below its heading. */
    private String column(Kind<?> kind, int column) {
        String letters = CellReference.convertNumToColString(column);
        return sheetName(kind) + "$" + letters + "$2:$" + letters + "$" + sheets.get(kind).out().row();
    }

    private static String sheetName(Kind<?> kind) {
        return "'" + kind.sheet() + "'!";
    }
}
