package coilbook.jobs.internal.merge;

import java.util.List;

import coilbook.exchange.RowPatch;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.Station;

/** Reads patches as rows that are not yet checked, and words what is wrong with them. */
final class PatchRow {

    private PatchRow() {
    }

    /** The row with what the patch says and nothing else; unchecked, for its key alone. */
    static Row skeleton(RowPatch patch) {
        List<Field> fields = patch.kind().fields();
        Object[] values = new Object[fields.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = patch.values().get(fields.get(i));
        }
        return patch.kind().construct(values);
    }

    /** Whether the line is about this row, rather than naming it in passing. */
    static boolean isPrimary(RowPatch patch) {
        return patch.kind().type() == Station.class || patch.kind().sheet().equals(patch.source().sheet());
    }

    static InputProblem problem(RowPatch patch, Field field, Object value, String expected) {
        return problem(patch.source(), field == null ? "" : field.headingWithUnit(),
                field == null || value == null ? "" : FieldText.format(field, value), expected);
    }

    static InputProblem problem(RowPatch patch, InvalidValue invalid) {
        Kind<?> kind = patch.kind();
        String heading = kind.fields().stream().filter(f -> f.heading().equals(invalid.column())).map(Field::headingWithUnit).findFirst()
                .orElse(invalid.column());
        return problem(patch.source(), heading, invalid.value(), "expected " + invalid.expected());
    }

    static InputProblem problem(RowPatch.Source source, String column, String value, String problem) {
        return new InputProblem(source.file(), source.sheet(), source.row(), column, value, problem);
    }
}
