package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import coilbook.exchange.RowPatch;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.ProvenanceText;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;

/** Lines of one kind's sheet in an exchange workbook: a line is a row, on the sheet Stations with what is true of the station today. */
final class KindLines implements LineReader {

    private static final Kind<Station> STATION = Kind.of(Station.class);
    private static final Kind<Supply> SUPPLY = Kind.of(Supply.class);
    private static final Kind<SettingChoice> SETTING = Kind.of(SettingChoice.class);
    private static final Kind<Duty> DUTY = Kind.of(Duty.class);

    private final KindLayout layout;
    private final List<MappedColumn> columns;
    private final TableContext context;

    KindLines(KindLayout layout, List<MappedColumn> columns, TableContext context) {
        this.layout = layout;
        this.columns = columns.stream().filter(column -> !column.target().isIgnored()).toList();
        this.context = context;
    }

    @Override
    public void line(int row, Cell[] cells) {
        context.gathering().countLine();
        List<InputProblem> problems = new ArrayList<>();
        Map<Kind<?>, Map<Field, Object>> values = read(row, cells, problems);
        if (problems.isEmpty()) {
            try {
                context.gathering().take(drafts(row, values));
            } catch (InvalidValue e) {
                problems.add(context.problem(row, heading(e.column()), e));
            }
        }
        problems.forEach(context.gathering()::reject);
    }

    private String heading(String fieldHeading) {
        for (MappedColumn column : columns) {
            if (column.target().field() != null && column.target().field().heading().equals(fieldHeading)) {
                return column.heading();
            }
        }
        return fieldHeading;
    }

    private Map<Kind<?>, Map<Field, Object>> read(int row, Cell[] cells, List<InputProblem> problems) {
        Map<Kind<?>, ProvenanceText> provenances = provenances(row, cells, problems);
        Map<Kind<?>, Map<Field, Object>> values = new HashMap<>();
        MappedColumn readingValue = null;
        for (MappedColumn column : columns) {
            Target target = column.target();
            if (target.field() == null) {
                continue;
            }
            if (target.kind().type() == Reading.class && target.field().id().equals("value")) {
                readingValue = column;
                continue;
            }
            try {
                Provenance provenance = provenances.get(target.kind()).of(target.field());
                Object value = context.value(target.kind().type(), target.field(), cell(cells, column), column.unit(), provenance);
                if (target.kind() == layout.kind()) {
                    target.field().check(value);
                }
                values.computeIfAbsent(target.kind(), kind -> new LinkedHashMap<>()).put(target.field(), value);
            } catch (InvalidValue e) {
                problems.add(context.problem(row, column.heading(), e));
            }
        }
        if (readingValue != null && problems.isEmpty()) {
            readValue(row, cells, readingValue, values.get(layout.kind()), problems);
        }
        return values;
    }

    private void readValue(int row, Cell[] cells, MappedColumn column, Map<Field, Object> values, List<InputProblem> problems) {
        Field field = column.target().field();
        try {
            Cell cell = cell(cells, column);
            if (cell == null) {
                field.check(null);
                return;
            }
            ReadingQuantity quantity = (ReadingQuantity) values.get(layout.kind().field("quantity"));
            double value = context.cells().number(field.heading(), cell, column.unit(), quantity.unit());
            ReadingValues.check(field.heading(), cell.shown(), quantity, value);
            values.put(field, value);
        } catch (InvalidValue e) {
            problems.add(context.problem(row, column.heading(), e));
        }
    }

    private Map<Kind<?>, ProvenanceText> provenances(int row, Cell[] cells, List<InputProblem> problems) {
        Map<Kind<?>, String> texts = new HashMap<>();
        Map<Kind<?>, MappedColumn> from = new HashMap<>();
        for (MappedColumn column : columns) {
            Cell cell = column.target().field() == null ? cell(cells, column) : null;
            if (cell != null) {
                texts.put(column.target().kind(), cell.shown());
                from.put(column.target().kind(), column);
            }
        }
        boolean ownDuty = columns.stream().anyMatch(column -> column.target().field() == null && column.target().kind() == DUTY);
        if (!ownDuty && layout.isStations()) {
            texts.put(DUTY, texts.get(STATION));
        }
        Map<Kind<?>, ProvenanceText> provenances = new HashMap<>();
        for (Kind<?> kind : layout.kinds()) {
            Provenance usual = ExchangeSheets.usualProvenance(kind);
            try {
                provenances.put(kind, ProvenanceText.parse(texts.get(kind), usual));
            } catch (InvalidValue e) {
                if (from.containsKey(kind)) {
                    problems.add(context.problem(row, from.get(kind).heading(), e));
                }
                provenances.put(kind, usually(usual));
            }
        }
        return provenances;
    }

    private static ProvenanceText usually(Provenance usual) {
        try {
            return ProvenanceText.parse(null, usual);
        } catch (InvalidValue e) {
            throw new IllegalStateException(e);
        }
    }

    private static Cell cell(Cell[] cells, MappedColumn column) {
        return column.index() < cells.length ? cells[column.index()] : null;
    }

    private List<Draft> drafts(int row, Map<Kind<?>, Map<Field, Object>> values) throws InvalidValue {
        RowPatch.Source source = context.source(row);
        Map<Field, Object> own = values.get(layout.kind());
        List<Draft> drafts = new ArrayList<>();
        if (layout.isStations()) {
            String site = (String) own.get(STATION.field("site"));
            String line = (String) own.get(STATION.field("line"));
            own.put(STATION.field("line"), line.startsWith(site + "/") ? line.substring(site.length() + 1) : line);
            own.computeIfPresent(STATION.field("controller"), (field, code) -> withSite(site, (String) code));
        }
        drafts.add(new Draft(new RowPatch(layout.kind(), own, source), Draft.Mode.OWN));
        if (layout.isStations()) {
            String site = (String) own.get(STATION.field("site"));
            String station = site + "/" + own.get(STATION.field("line")) + "/" + own.get(STATION.field("tag"));
            Map<Field, Object> supply = values.get(SUPPLY);
            if (supply != null) {
                supply.computeIfPresent(SUPPLY.field("circuit"), (field, code) -> withSite(site, (String) code));
            }
            present(drafts, SUPPLY, supply, SUPPLY.field("circuit"), station, source);
            present(drafts, SETTING, values.get(SETTING), SETTING.field("setting"), station, source);
            present(drafts, DUTY, values.get(DUTY), null, station, source);
        }
        return drafts;
    }

    private static String withSite(String site, String code) {
        return code.startsWith(site + "/") ? code : site + "/" + code;
    }

    /** @param asked the value without which there is no such row; {@code null} where any quantity makes one */
    private static void present(List<Draft> drafts, Kind<?> kind, Map<Field, Object> values, Field asked, String station,
            RowPatch.Source source)
            throws InvalidValue {
        if (values == null) {
            return;
        }
        Object since = values.get(kind.field("valid_from"));
        boolean there = asked != null ? values.get(asked) != null
                : values.entrySet().stream().anyMatch(entry -> entry.getKey().type() == FieldType.QUANTITY && entry.getValue() != null);
        if (there) {
            Map<Field, Object> row = new LinkedHashMap<>();
            row.put(kind.field("station"), station);
            row.put(kind.field("valid_from"), since);
            row.putAll(values);
            drafts.add(new Draft(new RowPatch(kind, row, source), Draft.Mode.CHILD));
        } else if (since != null) {
            throw new InvalidValue(kind.field("valid_from").heading(), since, asked == null ? "a duty, as its date is given"
                    : "a value under " + asked.heading() + ", as its date is given");
        }
    }
}
