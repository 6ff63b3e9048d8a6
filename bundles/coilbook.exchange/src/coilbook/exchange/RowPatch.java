package coilbook.exchange;

import java.util.Map;

import coilbook.fleet.Field;
import coilbook.fleet.Kind;

/**
 * What one line of an input file says of one row: only the fields it has a column for. In an exchange workbook a blank cell is a present key with
 * {@code null}; in a flat list a blank cell says nothing and is no key. What a patch does not mention stays as it is.
 *
 * @param values by field, each already checked; key fields included
 * @param source where it stands, for messages
 * @param onlyIfMissing whether it counts only where no such row exists: a catalogue entry that a flat list names, with what its line says of it
 */
public record RowPatch(Kind<?> kind, Map<Field, Object> values, Source source, boolean onlyIfMissing) {

    public RowPatch {
        values = FieldValues.of(values);
    }

    public RowPatch(Kind<?> kind, Map<Field, Object> values, Source source) {
        this(kind, values, source, false);
    }

    /** A place in an input file; the row counts from 1. */
    public record Source(String file, String sheet, int row) {
    }
}
