package coilbook.exchange.internal.in;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Datum;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;

/** Makes input files and reads them. */
final class Books {

    private Books() {
    }

    /** A workbook saved as spreadsheet programs save it. */
    static Path xlsx(Path folder, String name, Consumer<XSSFWorkbook> content) {
        Path path = folder.resolve(name);
        try (XSSFWorkbook book = new XSSFWorkbook(); OutputStream out = Files.newOutputStream(path)) {
            content.accept(book);
            book.write(out);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return path;
    }

    /** Appends rows of texts, numbers, dates and yes/no to a sheet; {@code null} leaves a cell blank. */
    static Sheet rows(XSSFWorkbook book, String sheet, Object[]... rows) {
        Sheet there = book.getSheet(sheet) == null ? book.createSheet(sheet) : book.getSheet(sheet);
        int next = there.getPhysicalNumberOfRows();
        for (Object[] values : rows) {
            Row row = there.createRow(next++);
            for (int i = 0; i < values.length; i++) {
                fill(book, row, i, values[i]);
            }
        }
        return there;
    }

    private static void fill(XSSFWorkbook book, Row row, int column, Object value) {
        if (value instanceof String text) {
            row.createCell(column).setCellValue(text);
        } else if (value instanceof Number number) {
            row.createCell(column).setCellValue(number.doubleValue());
        } else if (value instanceof Boolean yes) {
            row.createCell(column).setCellValue(yes);
        } else if (value instanceof LocalDate date) {
            row.createCell(column).setCellValue(date);
            row.getCell(column).setCellStyle(style(book, "yyyy-mm-dd"));
        }
    }

    static CellStyle style(XSSFWorkbook book, String format) {
        CellStyle style = book.createCellStyle();
        style.setDataFormat(book.createDataFormat().getFormat(format));
        return style;
    }

    static Object[] row(Object... values) {
        return values;
    }

    static Path text(Path folder, String name, String... lines) {
        try {
            return Files.writeString(folder.resolve(name), String.join("\r\n", lines) + "\r\n");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Incoming read(Path... files) throws CoilbookException {
        return new FleetFilesReader().read(List.of(files), Map.of(), Progress.NONE);
    }

    static Incoming read(Map<String, String> columns, Path... files) throws CoilbookException {
        return new FleetFilesReader().read(List.of(files), columns, Progress.NONE);
    }

    /** The patches of a kind. */
    static List<RowPatch> of(Incoming incoming, Class<? extends coilbook.fleet.Row> type) {
        return incoming.patches().stream().filter(patch -> patch.kind().type() == type).toList();
    }

    /** The value of a field of the only patch of a kind. */
    static Object only(Incoming incoming, Class<? extends coilbook.fleet.Row> type, String field) {
        List<RowPatch> patches = of(incoming, type);
        if (patches.size() != 1) {
            throw new AssertionError("one " + type.getSimpleName() + " expected, found " + patches + "; rejected " + incoming.rejected());
        }
        return value(patches.get(0), field);
    }

    static Object value(RowPatch patch, String field) {
        Object value = patch.values().get(Kind.of(patch.kind().type()).field(field));
        return value instanceof Datum datum ? datum.value() : value;
    }

    /** What was rejected, one sentence each. */
    static List<String> rejected(Incoming incoming) {
        return incoming.rejected().stream().map(problem -> problem.sentence()).toList();
    }
}
