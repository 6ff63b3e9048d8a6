package coilbook.criteria.internal.market;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.stream.Collectors;

import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;

/** Reads a shipped table: tab-separated, a heading row in the words of the columns, no quoting. A table that cannot be read is a fault of ours. */
public final class TableReader {

    private static final String TAB = "\t";

    private TableReader() {
    }

    public static <R extends Row> List<R> read(String name, Kind<R> kind) {
        try (InputStream in = TableReader.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the table " + name + " is not shipped");
            }
            return read(name, new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8)), kind);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static <R extends Row> List<R> read(String name, BufferedReader reader, Kind<R> kind) throws IOException {
        Map<String, Field> byHeading = kind.fields().stream().collect(Collectors.toMap(Field::headingWithUnit, Function.identity()));
        List<Field> columns = new ArrayList<>();
        String headings = Objects.requireNonNull(reader.readLine(), () -> name + " is empty");
        for (String heading : headings.split(TAB, -1)) {
            Field field = byHeading.get(heading);
            if (field == null) {
                throw new IllegalStateException(name + " has an unknown heading: " + heading);
            }
            columns.add(field);
        }
        List<R> rows = new ArrayList<>();
        int number = 1;
        for (String line = reader.readLine(); line != null; line = reader.readLine()) {
            number++;
            try {
                rows.add(row(line.split(TAB, -1), columns, kind));
            } catch (InvalidValue e) {
                throw new IllegalStateException(name + ", row " + number + ": " + e.getMessage(), e);
            }
        }
        return List.copyOf(rows);
    }

    /** A band for any country is an assumption; everything else is what a catalogue of markets says. */
    private static <R extends Row> R row(String[] cells, List<Field> columns, Kind<R> kind) throws InvalidValue {
        if (cells.length != columns.size()) {
            throw new InvalidValue("cells", cells.length, "as many as there are headings");
        }
        Provenance provenance = cells[0].equals("*") ? Provenance.ASSUMED : Provenance.CATALOGUE;
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < cells.length; i++) {
            Field field = columns.get(i);
            values[kind.fields().indexOf(field)] = FieldText.parse(field, cells[i], provenance);
        }
        return kind.create(values);
    }
}
