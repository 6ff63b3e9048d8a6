package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.FieldType;
import coilbook.fleet.QuantityText;
import coilbook.fleet.Unit;

/**
 * A row read as headings under one layout.
 *
 * @param columns what was recognised, each target once
 * @param unknown headings of no known meaning, by column
 * @param doubled headings whose meaning another column has already, by column
 */
record HeadingRow(List<MappedColumn> columns, Map<Integer, String> unknown, Map<Integer, String> doubled) {

    /**
     * @param above the row above, whose cells may be the first line of two-line headings; {@code null} if there is none
     */
    static HeadingRow read(Layout layout, ColumnMap map, Cell[] above, Cell[] cells) {
        List<MappedColumn> columns = new ArrayList<>();
        Map<Integer, String> unknown = new LinkedHashMap<>();
        Map<Integer, String> doubled = new LinkedHashMap<>();
        Map<String, MappedColumn> seen = new LinkedHashMap<>();
        int width = Math.min(Math.max(cells.length, above == null ? 0 : above.length), InputLimits.HEADING_COLUMNS);
        for (int i = 0; i < width; i++) {
            String own = text(cells, i);
            String upper = text(above, i);
            if (own.isEmpty() && upper.isEmpty()) {
                continue;
            }
            MappedColumn column = !own.isEmpty() && !upper.isEmpty() && !own.equals(upper) ? match(layout, map, i, upper + " " + own)
                    : null;
            column = column == null ? match(layout, map, i, own.isEmpty() ? upper : own) : column;
            if (column == null) {
                if (!own.isEmpty()) {
                    unknown.put(i, own);
                }
            } else if (column.target().isIgnored() || seen.putIfAbsent(column.target().id(), column) == null) {
                columns.add(column);
            } else {
                doubled.put(i, column.heading());
            }
        }
        return new HeadingRow(columns, unknown, doubled);
    }

    private static String text(Cell[] cells, int index) {
        Cell cell = cells == null || index >= cells.length ? null : cells[index];
        if (cell == null || cell.type() != Cell.Type.TEXT && cell.type() != Cell.Type.NUMBER) {
            return "";
        }
        String text = cell.shown();
        return text.length() > InputLimits.HEADING_CHARACTERS ? "" : Texts.strip(text);
    }

    private static MappedColumn match(Layout layout, ColumnMap map, int index, String text) {
        String said = map.get(text);
        Heading heading = new Heading(text);
        if (said != null) {
            Target target = said.isEmpty() ? Target.IGNORED : layout.byId(said);
            return target == null ? null : new MappedColumn(index, text, unitIn(heading, target), target);
        }
        if (text.endsWith(ExchangeSheets.COMPUTED.strip())) {
            return new MappedColumn(index, text, "", Target.IGNORED);
        }
        for (Heading.Reading way : heading.readings()) {
            Layout.Named named = layout.find(way.name());
            if (named != null && way.unit().isEmpty()) {
                return new MappedColumn(index, text, named.unit(), named.target());
            } else if (named != null) {
                String unit = unit(way.unit(), named.target());
                if (unit != null) {
                    return new MappedColumn(index, text, unit, named.target());
                }
            }
        }
        return null;
    }

    private static String unitIn(Heading heading, Target target) {
        for (Heading.Reading way : heading.readings()) {
            String unit = way.unit().isEmpty() ? null : unit(way.unit(), target);
            if (unit != null) {
                return unit;
            }
        }
        return "";
    }

    /** The unit (or the order of a date's parts) if the text is one for the target, else {@code null}. */
    static String unit(String text, Target target) {
        if (target.unit() != Unit.NONE) {
            return QuantityText.isUnit(text, target.unit()) ? text : null;
        }
        boolean date = target.field() != null && (target.field().type() == FieldType.DATE || target.field().type() == FieldType.DATE_TIME);
        return date ? DateReader.order(text) : null;
    }

    /** How many columns are understood and asked for. */
    int count() {
        return (int) columns.stream().filter(column -> !column.target().isIgnored()).count();
    }

    int filled() {
        return columns.size() + unknown.size() + doubled.size();
    }

    Set<String> ids() {
        return columns.stream().map(column -> column.target().id()).collect(Collectors.toSet());
    }
}
