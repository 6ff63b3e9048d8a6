package coilbook.exchange.internal.in;

import java.time.DateTimeException;
import java.time.ZoneId;

import coilbook.exchange.RowPatch;
import coilbook.fleet.Field;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Line;
import coilbook.fleet.Provenance;
import coilbook.fleet.Site;

/** What the readers of a table's lines share: where they are, and how values are read. */
record TableContext(String file, String sheet, CellReader cells, Gathering gathering, Pool pool, Countries countries) {

    InputProblem problem(int row, String column, String value, String words) {
        return new InputProblem(file, sheet, row, column, value, words);
    }

    InputProblem problem(int row, String column, InvalidValue e) {
        return problem(row, column, e.value(), "expected " + e.expected());
    }

    RowPatch.Source source(int row) {
        return new RowPatch.Source(file, sheet, row);
    }

    /** The value of a field, with what single fields ask beyond their type. */
    Object value(Class<?> kind, Field field, Cell cell, String unit, Provenance provenance) throws InvalidValue {
        Object value = cells.read(field, cell, unit, provenance);
        if (value instanceof String text) {
            if (kind == Site.class && field.id().equals("country")) {
                return countries.code(field.heading(), text);
            } else if (kind == Site.class && field.id().equals("time_zone")) {
                refuseUnknownZone(field, text);
            } else if ((kind == Site.class || kind == Line.class) && field.id().equals("code") && text.indexOf('/') >= 0) {
                throw new InvalidValue(field.heading(), text, "a code without /, which joins site, line and tag");
            }
        }
        return pool.one(value);
    }

    private static void refuseUnknownZone(Field field, String text) throws InvalidValue {
        try {
            ZoneId.of(text);
        } catch (DateTimeException e) {
            throw new InvalidValue(field.heading(), text, "a time zone such as Europe/Berlin");
        }
    }
}
