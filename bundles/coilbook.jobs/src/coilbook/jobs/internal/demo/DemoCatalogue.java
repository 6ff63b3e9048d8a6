package coilbook.jobs.internal.demo;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

import coilbook.fleet.CableType;
import coilbook.fleet.CoilType;
import coilbook.fleet.DriverType;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.InputSetting;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.ProvenanceText;
import coilbook.fleet.Row;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;

/** The invented catalogue: one CSV a kind, headings as in the exchange workbook. Every maker, type and value is made up. */
public final class DemoCatalogue {

    private static final List<Class<? extends Row>> KINDS = List.of(TransformerType.class, ValveType.class, CoilType.class,
            DriverType.class,
            InputSetting.class, CableType.class);
    private static final String PROVENANCE = "Provenance";

    private DemoCatalogue() {
    }

    /** Every row, referenced ones first; read afresh at each call. */
    public static List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        for (Class<? extends Row> type : KINDS) {
            rows.addAll(rows(Kind.of(type)));
        }
        return rows;
    }

    private static <R extends Row> List<R> rows(Kind<R> kind) {
        String name = "catalogue/" + kind.sheet() + ".csv";
        CSVFormat format = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get();
        try (InputStream in = DemoCatalogue.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException(name + " is not part of the program");
            }
            try (Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8); CSVParser parser = CSVParser.parse(reader, format)) {
                List<R> rows = new ArrayList<>();
                for (CSVRecord line : parser) {
                    rows.add(row(kind, line));
                }
                return rows;
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InvalidValue e) {
            throw new IllegalStateException(name + ": " + e.column() + " is " + e.value() + ", expected " + e.expected(), e);
        }
    }

    private static <R extends Row> R row(Kind<R> kind, CSVRecord line) throws InvalidValue {
        String said = line.isMapped(PROVENANCE) ? line.get(PROVENANCE) : null;
        ProvenanceText provenance = ProvenanceText.parse(said, Provenance.CATALOGUE);
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < values.length; i++) {
            Field field = kind.fields().get(i);
            String text = line.isMapped(field.headingWithUnit()) ? line.get(field.headingWithUnit()) : null;
            values[i] = FieldText.parse(field, text, provenance.of(field));
        }
        return kind.create(values);
    }
}
