package coilbook.exchange.internal.out;

import java.util.ArrayList;
import java.util.List;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.ExchangeSheets.SheetColumn;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Field;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;

/** The sheet of one kind of row: its input columns as import expects them, then what is computed. */
final class EntitySheet {

    private final Kind<?> kind;
    private final List<SheetColumn> inputs;
    private final SheetOut out;

    /**
     * @param computed further columns; their cells are written after {@link #inputs}
     */
    EntitySheet(Book book, Kind<?> kind, List<Column> computed) {
        this.kind = kind;
        this.inputs = ExchangeSheets.columns(kind);
        List<Column> columns = new ArrayList<>();
        for (SheetColumn input : inputs) {
            columns.add(Column.of(input.heading(), FieldCells.width(input)));
        }
        columns.addAll(computed);
        this.out = book.sheet(kind.sheet(), columns, Math.max(1, kind.keyFields().size()));
    }

    Kind<?> kind() {
        return kind;
    }

    SheetOut out() {
        return out;
    }

    /** The place of a field's column, counted from 0. */
    int column(Kind<?> ofKind, String fieldId) {
        Field field = ofKind.field(fieldId);
        for (int i = 0; i < inputs.size(); i++) {
            if (inputs.get(i).field() == field) {
                return i;
            }
        }
        throw new IllegalArgumentException(kind + " has no column " + fieldId);
    }

    /** Begins a row with its inputs.
     *
     * @param rows the rows whose values stand side by side, found by their kind; a missing one leaves its cells empty
     */
    void begin(Row... rows) throws CoilbookException {
        out.begin();
        for (SheetColumn input : inputs) {
            Row row = find(rows, input.kind());
            if (input.field() != null) {
                FieldCells.write(out, input.field(), row);
            } else {
                out.text(row == null ? "" : input.kind().provenanceText(row));
            }
        }
    }

    private static Row find(Row[] rows, Kind<?> wanted) {
        for (Row row : rows) {
            if (row != null && row.getClass() == wanted.type()) {
                return row;
            }
        }
        return null;
    }
}
