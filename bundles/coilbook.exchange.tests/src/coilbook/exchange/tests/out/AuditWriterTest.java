package coilbook.exchange.tests.out;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.AuditWriter;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Station;
import coilbook.register.FleetScope;

/** The audit workbook as another program reads it. */
class AuditWriterTest {

    private static final Clock TODAY = Clock.fixed(FleetFixture.DAY.atTime(9, 30).toInstant(ZoneOffset.UTC), ZoneOffset.UTC);
    private static final Clock LATER = Clock.fixed(FleetFixture.DAY.plusDays(40).atTime(9, 30).toInstant(ZoneOffset.UTC), ZoneOffset.UTC);

    @TempDir
    Path folder;

    private FixtureRegister register;

    @BeforeEach
    void fill() throws Exception {
        register = new FixtureRegister(FleetFixture.small());
    }

    private Path write(String name, FleetScope scope, Clock clock) throws CoilbookException {
        Path out = folder.resolve(name);
        new AuditWriter(clock).write(register, scope, FleetFixture.DAY, out, Progress.NONE);
        return out;
    }

    @Test
    void holdsOneSheetAKindAndTheAuditsOwn() throws Exception {
        List<String> expected = new ArrayList<>(List.of("Summary", "Findings", "Stations", "Circuits", "Method"));
        ExchangeSheets.KINDS.stream().map(Kind::sheet).filter(sheet -> !expected.contains(sheet)).forEach(expected::add);
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            List<String> sheets = new ArrayList<>();
            workbook.sheetIterator().forEachRemaining(sheet -> sheets.add(sheet.getSheetName()));
            assertEquals(expected, sheets);
        }
    }

    @Test
    void everyInputColumnStandsWhereImportExpectsIt() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            for (Kind<?> kind : ExchangeSheets.KINDS) {
                Row headings = workbook.getSheet(kind.sheet()).getRow(0);
                List<ExchangeSheets.SheetColumn> columns = ExchangeSheets.columns(kind);
                for (int i = 0; i < columns.size(); i++) {
                    assertEquals(columns.get(i).heading(), headings.getCell(i).getStringCellValue());
                }
                for (int i = columns.size(); i < headings.getLastCellNum(); i++) {
                    assertTrue(headings.getCell(i).getStringCellValue().endsWith(ExchangeSheets.COMPUTED),
                            headings.getCell(i).getStringCellValue());
                }
            }
        }
    }

    @Test
    void textThatLooksLikeAFormulaStaysText() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            Sheet stations = workbook.getSheet("Stations");
            int tag = Workbooks.column(stations, "Tag");
            for (String text : List.of("=A1+B2-Q3", "+Q1", "-K2", "@V5")) {
                Cell cell = Workbooks.row(stations, tag, text).getCell(tag);
                assertEquals(CellType.STRING, cell.getCellType());
                assertTrue(cell.getCellStyle().getQuotePrefixed(), text);
            }
            assertFalse(Workbooks.row(stations, tag, "V1").getCell(tag).getCellStyle().getQuotePrefixed());
            assertTrue(Workbooks.row(workbook.getSheet("Sites"), 0, "=BIR").getCell(0).getCellStyle().getQuotePrefixed());
        }
    }

    @Test
    void hazardsComeFirstAndEveryFindingIsThere() throws Exception {
        List<String> written = new ArrayList<>();
        register.findings(FleetScope.all(), finding -> written.add(finding.station() + " " + finding.finding().criterion()));
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            Sheet findings = workbook.getSheet("Findings");
            assertEquals(written.size(), findings.getLastRowNum());
            boolean past = false;
            int hazards = 0;
            List<String> rest = new ArrayList<>();
            for (int i = 1; i <= findings.getLastRowNum(); i++) {
                Row row = findings.getRow(i);
                boolean hazard = row.getCell(Workbooks.column(findings, "Hazard")).getStringCellValue().equals("yes")
                        && row.getCell(Workbooks.column(findings, "Conceded")).getStringCellValue().equals("no");
                assertFalse(hazard && past, "a hazard below other findings, row " + (i + 1));
                past = !hazard;
                hazards += hazard ? 1 : 0;
                String name = row.getCell(3).getStringCellValue() + " " + row.getCell(4).getStringCellValue();
                assertTrue(written.contains(name), name);
                if (!hazard) {
                    rest.add(name);
                }
            }
            assertEquals(4, hazards);
            List<String> inOrder = new ArrayList<>(written);
            inOrder.retainAll(rest);
            assertEquals(inOrder, rest);
        }
    }

    @Test
    void verdictsAreTellableWithoutColour() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            Sheet findings = workbook.getSheet("Findings");
            Map<String, String> marks = new java.util.HashMap<>();
            for (int i = 1; i <= findings.getLastRowNum(); i++) {
                Row row = findings.getRow(i);
                String sort = row.getCell(6).getStringCellValue() + " " + row.getCell(7) + " " + row.getCell(8);
                String mark = row.getCell(0).getStringCellValue();
                assertEquals(mark, marks.computeIfAbsent(sort, s -> mark));
            }
            assertEquals(marks.size(), marks.values().stream().distinct().count(), marks.toString());
            assertTrue(marks.size() >= 5, marks.toString());
        }
    }

    @Test
    void theSameInputGivesTheSameBytes() throws Exception {
        byte[] first = Files.readAllBytes(write("a.xlsx", FleetScope.all(), TODAY));
        Thread.sleep(2100);
        assertArrayEquals(first, Files.readAllBytes(write("b.xlsx", FleetScope.all(), TODAY)));
    }

    @Test
    void saysWhatItCovers() throws Exception {
        assertMarkers(write("a.xlsx", FleetScope.all(), TODAY), "no", "no");
        assertMarkers(write("b.xlsx", FleetScope.sites(List.of("ASH")), TODAY), "yes", "no");
        assertMarkers(write("c.xlsx", FleetScope.all(), LATER), "no", "yes");
    }

    private static void assertMarkers(Path file, String part, String past) throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(file)) {
            Sheet summary = workbook.getSheet(ExchangeSheets.SUMMARY);
            assertEquals(part, Workbooks.row(summary, 0, ExchangeSheets.PART_OF_FLEET).getCell(1).getStringCellValue());
            assertEquals(past, Workbooks.row(summary, 0, ExchangeSheets.PAST_DATE).getCell(1).getStringCellValue());
            assertEquals(FleetFixture.DAY,
                    Workbooks.row(summary, 0, ExchangeSheets.AS_OF).getCell(1).getLocalDateTimeCellValue().toLocalDate());
        }
    }

    @Test
    void aPartHoldsWhatBelongsToItAndNothingElse() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("b.xlsx", FleetScope.sites(List.of("ASH")), TODAY))) {
            assertEquals(FleetFixture.TAGS.size(), workbook.getSheet("Stations").getLastRowNum());
            for (String sheet : List.of("Sites", "Lines", "Circuits")) {
                assertEquals(1, workbook.getSheet(sheet).getLastRowNum(), sheet);
                assertEquals("ASH", workbook.getSheet(sheet).getRow(1).getCell(0).getStringCellValue());
            }
            assertEquals(4 * FleetFixture.TAGS.size(), workbook.getSheet("Fittings").getLastRowNum());
            assertEquals(FleetFixture.TAGS.size(), workbook.getSheet("Items").getLastRowNum());
            assertEquals(2, workbook.getSheet("Readings").getLastRowNum());
            assertEquals(2, workbook.getSheet("Coil types").getLastRowNum());
        }
    }

    @Test
    void printsAndScrollsAsAListShould() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            for (Sheet sheet : workbook) {
                assertTrue(sheet.getPrintSetup().getLandscape(), sheet.getSheetName());
                assertTrue(sheet.getFitToPage(), sheet.getSheetName());
                assertEquals(0, sheet.getPrintSetup().getFitHeight());
                assertTrue(sheet.getFooter().getRight().contains("&P"), sheet.getSheetName());
                assertTrue(sheet.getFooter().getLeft().contains("2026-03-31"), sheet.getFooter().getLeft());
                if (!sheet.getSheetName().equals("Summary")) {
                    assertEquals(0, sheet.getRepeatingRows().getFirstRow());
                    assertTrue(sheet.getPaneInformation().isFreezePane());
                    assertTrue(((XSSFSheet) sheet).getCTWorksheet().isSetAutoFilter(), sheet.getSheetName());
                }
            }
            XSSFSheet summary = workbook.getSheet("Summary");
            assertEquals(2, summary.getDrawingPatriarch().getCharts().size());
        }
    }

    @Test
    void carriesTheCautionsAndNeverCallsACircuitSafe() throws Exception {
        StringBuilder text = new StringBuilder();
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            for (Row row : workbook.getSheet("Summary")) {
                for (Cell cell : row) {
                    text.append(cell).append('\n');
                }
            }
        }
        for (String caution : List.of("isolate and lock out", "prove dead", "wait for capacitors to discharge", "Hot adhesive",
                "Local codes",
                "licensed electrician", "does not say that a circuit is safe")) {
            assertTrue(text.indexOf(caution) >= 0, caution);
        }
    }

    @Test
    void aFolderInThePlaceOfTheFileIsRefusedInWords() throws Exception {
        Path place = Files.createDirectory(folder.resolve("there.xlsx"));
        CoilbookException refusal = assertThrows(CoilbookException.class, () -> write("there.xlsx", FleetScope.all(), TODAY));
        assertEquals(CoilbookException.Reason.BAD_INPUT, refusal.reason());
        assertTrue(refusal.getMessage().contains("is a folder"), refusal.getMessage());
        assertTrue(Files.isDirectory(place));
    }

    @Test
    void aFileInThePlaceOfAFolderIsRefusedInWords() throws Exception {
        Files.writeString(folder.resolve("file"), "x");
        CoilbookException refusal = assertThrows(CoilbookException.class, () -> write("file/a.xlsx", FleetScope.all(), TODAY));
        assertEquals(CoilbookException.Reason.BAD_INPUT, refusal.reason());
        assertFalse(refusal.getMessage().contains("Exception"), refusal.getMessage());
    }

    @Test
    void cancellingLeavesNothingBehindAndTheOldFileAlone() throws Exception {
        Path old = Files.writeString(folder.resolve("a.xlsx"), "the last audit");
        Progress cancelled = new Progress() {
            @Override
            public void report(String step, long done, long total) {
                // not watched
            }

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        CoilbookException refusal = assertThrows(CoilbookException.class,
                () -> new AuditWriter(TODAY).write(register, FleetScope.all(), FleetFixture.DAY, old, cancelled));
        assertEquals(CoilbookException.Reason.CANCELLED, refusal.reason());
        assertEquals("the last audit", Files.readString(old));
        try (Stream<Path> left = Files.list(folder)) {
            assertEquals(List.of(old), left.toList());
        }
    }

    @Test
    void stationsWithAClosedFormCarryItAsFormulas() throws Exception {
        try (XSSFWorkbook workbook = Workbooks.open(write("a.xlsx", FleetScope.all(), TODAY))) {
            Sheet stations = workbook.getSheet("Stations");
            int kind = Workbooks.column(stations, "Driver kind (computed)");
            for (int i = 1; i <= stations.getLastRowNum(); i++) {
                Row row = stations.getRow(i);
                String driver = row.getCell(kind).getStringCellValue();
                List<String> formulas = new ArrayList<>(List.of("Nominal mains [V]", "Lowest mains [V]", "Highest mains [V]",
                        "Cable loop resistance [Ω]",
                        "Winding resistance, low corner [Ω]", "Winding resistance, high corner [Ω]", "Loop resistance, low corner [Ω]",
                        "Time constant, low corner [ms]", "Pull-in margin [%]", "Winding temperature at duty [°C]",
                        "Temperature margin [K]"));
                if (!driver.equals("line-capacitor")) {
                    formulas.addAll(
                            List.of("Peak current, low corner [A]", "Output current, high corner [A]", "Working voltage, peak [V]"));
                }
                if (driver.equals("two-level")) {
                    formulas.addAll(List.of("Time to pull in, low corner [ms]", "Hold current, settled, low corner [A]",
                            "Hold current, mean, low corner [A]",
                            "Hold current, least [A]", "Energy a cycle, upper bound [J]"));
                }
                for (String heading : formulas) {
                    Cell cell = row.getCell(Workbooks.column(stations, heading + ExchangeSheets.COMPUTED));
                    boolean measured = row.getCell(2).getStringCellValue().equals("=A1+B2-Q3") && heading.startsWith("Winding resistance");
                    assertTrue(cell != null && (measured || cell.getCellType() == CellType.FORMULA),
                            heading + " of " + Kind.of(Station.class).sheet() + " row " + (i + 1) + ", " + driver);
                }
            }
        }
    }
}
