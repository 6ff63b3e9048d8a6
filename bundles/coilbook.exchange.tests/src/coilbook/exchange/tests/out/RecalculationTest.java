package coilbook.exchange.tests.out;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.CellValue;
import org.apache.poi.ss.usermodel.FormulaEvaluator;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfSystemProperty;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.internal.out.AuditWriter;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;

/**
 * Every formula of a workbook, calculated anew by programs that had no part in writing it: the value that we wrote beside it must come out. The judges are the
 * formula evaluator of the spreadsheet library, always, and LibreOffice Calc, live, which opens the workbook with all our values taken out.
 */
class RecalculationTest {

    private static final double RELATIVE = 1e-9;
    private static final Clock TODAY = Clock.fixed(FleetFixture.DAY.atTime(9, 30).toInstant(ZoneOffset.UTC), ZoneOffset.UTC);

    @TempDir
    Path folder;

    private Path audit() throws Exception {
        Path file = folder.resolve("audit.xlsx");
        new AuditWriter(TODAY).write(new FixtureRegister(FleetFixture.small()), FleetScope.all(), FleetFixture.DAY, file, Progress.NONE);
        return file;
    }

    @Test
    void theLibrarysEvaluatorGetsOurValues() throws Exception {
        Path file = audit();
        Map<String, Object> evaluated = new TreeMap<>();
        try (XSSFWorkbook workbook = Workbooks.open(file)) {
            FormulaEvaluator evaluator = workbook.getCreationHelper().createFormulaEvaluator();
            for (Sheet sheet : workbook) {
                for (Row row : sheet) {
                    for (Cell cell : row) {
                        if (cell.getCellType() == CellType.FORMULA) {
                            evaluated.put(sheet.getSheetName() + "!" + cell.getAddress(), value(evaluator.evaluate(cell)));
                        }
                    }
                }
            }
        }
        compare(Workbooks.cachedValues(file), evaluated);
    }

    private static Object value(CellValue value) {
        return value.getCellType() == CellType.NUMERIC ? (Object) value.getNumberValue()
                : value.getCellType() == CellType.STRING ? value.getStringValue() : value.formatAsString();
    }

    @Test
    @EnabledIfSystemProperty(named = "coilbook.judges", matches = "live")
    void libreOfficeGetsOurValues() throws Exception {
        Path file = audit();
        Path stripped = folder.resolve("stripped.xlsx");
        Workbooks.strip(file, stripped);
        assertEquals(0, Workbooks.cachedValues(stripped).values().stream().filter(v -> v instanceof Double d && d != 0).count(),
                "our values must be out before another program calculates");
        Path results = folder.resolve("recalculated");
        Process office = new ProcessBuilder("soffice", "-env:UserInstallation=" + folder.resolve("profile").toUri(), "--headless",
                "--convert-to", "xlsx",
                "--outdir", results.toString(), stripped.toString()).redirectErrorStream(true)
                .redirectOutput(folder.resolve("office.log").toFile())
                .start();
        assertTrue(office.waitFor(180, TimeUnit.SECONDS), "LibreOffice took too long");
        Path recalculated = results.resolve("stripped.xlsx");
        assertTrue(Files.exists(recalculated), () -> "LibreOffice wrote nothing: " + log());
        compare(Workbooks.cachedValues(file), Workbooks.cachedValues(recalculated));
    }

    private String log() {
        try (InputStream in = Files.newInputStream(folder.resolve("office.log"))) {
            return new String(in.readAllBytes(), java.nio.charset.StandardCharsets.UTF_8);
        } catch (java.io.IOException e) {
            return e.getMessage();
        }
    }

    private static void compare(Map<String, Object> ours, Map<String, Object> theirs) {
        assertTrue(ours.size() > 400, "only " + ours.size() + " formulas");
        List<String> differences = ours.entrySet().stream().filter(entry -> !same(entry.getValue(), theirs.get(entry.getKey())))
                .map(entry -> entry.getKey() + ": ours " + entry.getValue() + ", theirs " + theirs.get(entry.getKey())).toList();
        assertEquals(List.of(), differences);
    }

    private static boolean same(Object ours, Object theirs) {
        if (ours instanceof Double one && theirs instanceof Double other) {
            return Math.abs(one - other) <= RELATIVE * Math.abs(one);
        }
        return ours.equals(theirs);
    }
}
