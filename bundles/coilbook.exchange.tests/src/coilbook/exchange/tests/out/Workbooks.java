package coilbook.exchange.tests.out;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** What the tests look at in a written workbook. */
final class Workbooks {

    private static final Pattern CACHED = Pattern.compile("(</f>)<v>[^<]*</v>");

    private Workbooks() {
    }

    static XSSFWorkbook open(Path file) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            return new XSSFWorkbook(in);
        }
    }

    /** The value that stands in every formula cell beside its formula, by sheet and reference. */
    static Map<String, Object> cachedValues(Path file) throws IOException {
        Map<String, Object> values = new TreeMap<>();
        try (XSSFWorkbook workbook = open(file)) {
            for (Sheet sheet : workbook) {
                for (Row row : sheet) {
                    for (Cell cell : row) {
                        if (cell.getCellType() == CellType.FORMULA) {
                            values.put(sheet.getSheetName() + "!" + cell.getAddress(), cached(cell));
                        }
                    }
                }
            }
        }
        return values;
    }

    private static Object cached(Cell cell) {
        return switch (cell.getCachedFormulaResultType()) {
            case NUMERIC -> cell.getNumericCellValue();
            case STRING -> cell.getStringCellValue();
            case BOOLEAN -> cell.getBooleanCellValue();
            default -> cell.getCachedFormulaResultType() + "";
        };
    }

    /** The same workbook without the values of its formula cells, so that whoever opens it has to calculate. */
    static void strip(Path file, Path to) throws IOException {
        try (ZipInputStream in = new ZipInputStream(Files.newInputStream(file));
                OutputStream raw = Files.newOutputStream(to);
                ZipOutputStream out = new ZipOutputStream(raw)) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                out.putNextEntry(new ZipEntry(entry.getName()));
                byte[] bytes = in.readAllBytes();
                if (entry.getName().startsWith("xl/worksheets/sheet")) {
                    String xml = new String(bytes, StandardCharsets.UTF_8);
                    bytes = CACHED.matcher(xml).replaceAll("$1").getBytes(StandardCharsets.UTF_8);
                }
                out.write(bytes);
                out.closeEntry();
            }
        }
    }

    /** The column of a heading in the first row, or -1. */
    static int column(Sheet sheet, String heading) {
        for (Cell cell : sheet.getRow(0)) {
            if (cell.getStringCellValue().equals(heading)) {
                return cell.getColumnIndex();
            }
        }
        return -1;
    }

    /** The first row below the headings with a text in a column. */
    static Row row(Sheet sheet, int column, String text) {
        for (Row row : sheet) {
            Cell cell = row.getRowNum() == 0 ? null : row.getCell(column);
            if (cell != null && cell.getCellType() == CellType.STRING && cell.getStringCellValue().equals(text)) {
                return row;
            }
        }
        throw new AssertionError("no row with " + text + " in " + sheet.getSheetName());
    }
}
