package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;

import coilbook.fleet.CoilKind;
import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.CoilType;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;

/** Lines of a flat list: a line is a station with all that stands there. A blank cell, or one that holds only a dash, says nothing. */
final class FlatLines implements LineReader {

    /** What people write where they know nothing. */
    private static final Set<String> NOTHING = Set.of("-", "--", "---", "–", "—", "n/a", "n.a.", "?", "??", "unknown", "tbd", "not known",
            "k.a.", "unbekannt",
            "inconnu", "desconocido");
    private static final Set<String> CODES = Set.of(FlatLayout.SITE, FlatLayout.LINE, FlatLayout.STATION, FlatLayout.TAG);

    private final List<MappedColumn> columns;
    private final TableContext context;

    FlatLines(List<MappedColumn> columns, TableContext context) {
        this.columns = columns.stream().filter(column -> !column.target().isIgnored()).toList();
        this.context = context;
    }

    @Override
    public void line(int row, Cell[] cells) {
        context.gathering().countLine();
        List<InputProblem> problems = new ArrayList<>();
        FlatValues values = new FlatValues();
        for (MappedColumn column : columns) {
            Cell cell = column.index() < cells.length ? cells[column.index()] : null;
            if (cell != null && !saysNothing(column, cell)) {
                try {
                    read(column, cell, values);
                } catch (InvalidValue e) {
                    problems.add(context.problem(row, column.heading(), e));
                }
            }
        }
        if (problems.isEmpty()) {
            FlatStation station = new FlatStation(values, context, row);
            try {
                context.gathering().take(station.drafts());
                station.notices().forEach(context.gathering()::notice);
            } catch (InvalidValue e) {
                problems.add(context.problem(row, heading(e.column()), e));
            }
        }
        problems.forEach(context.gathering()::reject);
    }

    /** The file's own heading for a target's id or a field's heading, else that text itself. */
    private String heading(String wanted) {
        for (MappedColumn column : columns) {
            Field field = column.target().field();
            if (column.target().id().equals(wanted) || column.target().heading().equals(wanted)
                    || field != null && field.heading().equals(wanted)) {
                return column.heading();
            }
        }
        return wanted;
    }

    private static boolean saysNothing(MappedColumn column, Cell cell) {
        return cell.type() == Cell.Type.TEXT && !CODES.contains(column.target().id())
                && NOTHING.contains(Texts.strip(cell.text()).toLowerCase(Locale.ROOT));
    }

    private void read(MappedColumn column, Cell cell, FlatValues values) throws InvalidValue {
        Target target = column.target();
        if (target.quantity() != null) {
            double value = context.cells().number(target.heading(), cell, column.unit(), target.quantity().unit());
            ReadingValues.check(target.heading(), cell.shown(), target.quantity(), value);
            values.put(target.id(), value);
        } else if (target.id().equals(FlatLayout.MAINS)) {
            readMains(target, cell, values);
        } else if (target.id().equals("circuit.nominal_voltage") && cell.type() == Cell.Type.TEXT && isMains(cell.text())) {
            readMains(target, cell, values);
        } else if (target.id().equals(FlatLayout.WIRING)) {
            values.put(target.id(), WiringText.parse(target.heading(), context.cells().text(target.heading(), cell)));
        } else if (target.field() == null) {
            values.put(target.id(), context.pool().one(context.cells().text(target.heading(), cell)));
        } else {
            Provenance provenance = target.kind().type() == Reading.class ? Provenance.MEASURED : Provenance.NAMEPLATE;
            values.put(target.id(), context.value(target.kind().type(), target.field(), cell, column.unit(), provenance));
            addKind(target, cell, values);
        }
    }

    private static boolean isMains(String text) {
        try {
            return MainsText.parse("", Texts.strip(text)).frequency() != null;
        } catch (InvalidValue e) {
            return false;
        }
    }

    private void readMains(Target target, Cell cell, FlatValues values) throws InvalidValue {
        if (cell.type() == Cell.Type.NUMBER) {
            values.put(FlatLayout.MAINS,
                    new MainsText(context.cells().number(target.heading(), cell, "", coilbook.fleet.Unit.VOLT), null, ""));
        } else {
            values.put(FlatLayout.MAINS, MainsText.parse(target.heading(), context.cells().text(target.heading(), cell)));
        }
    }

    /** {@code 24 VDC} says the kind of current along with the voltage. */
    private static void addKind(Target target, Cell cell, FlatValues values) {
        if (target.id().equals("coil_type.rated_voltage") && cell.type() == Cell.Type.TEXT && values.get(target.id()) instanceof Datum) {
            String text = cell.text().toUpperCase(Locale.ROOT);
            CoilKind kind = text.contains("DC") ? CoilKind.DC : text.contains("AC") || text.contains("~") ? CoilKind.AC : null;
            String id = Kind.of(CoilType.class).id() + ".rated_kind";
            if (kind != null && values.get(id) == null) {
                values.put(id, kind);
            }
        }
    }
}
