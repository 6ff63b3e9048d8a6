package coilbook.exchange.internal.in;

import static coilbook.exchange.internal.in.Books.of;
import static coilbook.exchange.internal.in.Books.only;
import static coilbook.exchange.internal.in.Books.read;
import static coilbook.exchange.internal.in.Books.rejected;
import static coilbook.exchange.internal.in.Books.row;
import static coilbook.exchange.internal.in.Books.rows;
import static coilbook.exchange.internal.in.Books.text;
import static coilbook.exchange.internal.in.Books.value;
import static coilbook.exchange.internal.in.Books.xlsx;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.ss.usermodel.Sheet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.exchange.Incoming;
import coilbook.fleet.CoilType;
import coilbook.fleet.Duty;
import coilbook.fleet.Fitting;
import coilbook.fleet.Reading;
import coilbook.fleet.Station;

/** Numbers, units, dates and codes as people write them. */
class ValuesTest {

    @TempDir
    Path folder;

    /** The examples of the exchange contract and their like; factors are those of the SI and of the international yard (0.3048 m a foot). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "Coil voltage|24 VDC|24", "Coil voltage|120VAC|120", "Coil resistance|10 Ω|10",
            "Coil resistance|0.01 kohm|10",
            "Coil resistance [kΩ]|0.01|10", "Coil resistance|1.2k|1200", "Coil kΩ|1.2|1200", "Cable length|1,5 m|1.5",
            "Cable length|150 cm|1.5",
            "Cable length (ft)|10|3.048", "Cable length, mm|1500|1.5", "Cable length in cm|150|1.5", "Cable length m|1.5|1.5",
            "Cable length [m]|20 ft|6.096",
            "Cable length|1 234,5 mm|1.2345", "Cable length|1,234.5 mm|1.2345", "Cable length / m|2|2", "Cycles per minute|540|9",
            "Cycles/s|9|9",
            "Cycle rate [1/min]|540|9", "Cycle rate|9 Hz|9", "On-time|0,03 s|0.03", "On-time [ms]|30|0.03", "On-time|30ms|0.03",
            "Ambient highest|104 °F|40",
            "Ambient highest (°C)|40|40", "Line speed|90 m/min|1.5", "Line speed m/min|90|1.5", "Fluid pressure|4 bar|400000",
            "Running hours|5200|5200" })
    void unitsAreReadFromCellOrHeading(String heading, String cell, double si) throws Exception {
        Path file = text(folder, "list.csv", "Site|Line|Station|Coil|Measured on|" + heading, "S|L|1|C|2026-01-31|" + cell);
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        List<Double> found = incoming.patches().stream()
                .flatMap(patch -> patch.values().keySet().stream().map(field -> value(patch, field.id()))).filter(Double.class::isInstance)
                .map(Double.class::cast).toList();
        assertEquals(1, found.size(), "one number expected: " + incoming.patches());
        assertEquals(si, found.get(0), Math.abs(si) * 1e-14);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "Cable length|1,234|a number that can be read one way only: write 1.234 or 1234",
            "Cable length|12 V|a number in m",
            "Cable length|long|a number in m", "Cable length|-1|a number from 0 m to 1000 m", "Mains frequency|50-60|",
            "Mains voltage|230/400|",
            "Measured on|03/04/2026|a date that can be read one way only: write 2026-04-03 or 2026-03-04",
            "Measured on|45000|a date such as 2026-03-31 or 31 March 2026",
            "Measured on|31.02.2026|a date such as 2026-03-31 or 31 March 2026",
            "Measured on|31/03/26|a date such as 2026-03-31 or 31 March 2026",
            "Mains|M230|a mains voltage and frequency such as 230 V 50 Hz",
            "Wiring|3~|", "Coil rated kind|gleich|one of DC, AC, AC or DC" })
    void whatIsAmbiguousOrWrongIsRejectedWithWhatWasExpected(String heading, String cell, String expected) throws Exception {
        Path file = text(folder, "list.csv", "Site|Line|Station|Coil|" + heading, "S|L|1|C|" + cell);
        Incoming incoming = read(file);
        assertEquals(1, incoming.rejected().size(), "rejected: " + rejected(incoming));
        assertEquals(heading, incoming.rejected().get(0).column());
        assertEquals(cell, incoming.rejected().get(0).value());
        assertEquals(2, incoming.rejected().get(0).row());
        if (expected != null) {
            assertEquals("expected " + expected, incoming.rejected().get(0).problem());
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "Measured on|2026-03-31", "Measured on|31.03.2026", "Measured on|31.3.26",
            "Measured on|31/03/2026",
            "Measured on|03/31/2026", "Measured on|31 March 2026", "Measured on|31-Mar-2026", "Measured on|March 31, 2026",
            "Measured on|31. März 2026",
            "Measured on|31 mars 2026", "Measured on|31 de marzo de 2026", "Measured on|20260331", "Measured on|2026/3/31",
            "Measured on|31-03-2026" })
    void datesThatReadOneWayAreTaken(String heading, String cell) throws Exception {
        Path file = text(folder, "list.csv", "Site|Line|Station|Coil resistance|" + heading, "S|L|1|5|" + cell);
        assertEquals(LocalDateTime.of(2026, 3, 31, 0, 0), only(read(file), Reading.class, "taken_at"));
    }

    @Test
    void aHeadingThatSaysTheOrderOfADateSettlesIt() throws Exception {
        Incoming day = read(text(folder, "a.csv", "Site|Line|Station|Coil resistance|Measured on (dd/mm/yyyy)", "S|L|1|5|03/04/2026"));
        Incoming month = read(text(folder, "b.csv", "Site|Line|Station|Coil resistance|Measured on [MM/DD/YYYY]", "S|L|1|5|03/04/2026"));
        assertEquals(LocalDateTime.of(2026, 4, 3, 0, 0), only(day, Reading.class, "taken_at"));
        assertEquals(LocalDateTime.of(2026, 3, 4, 0, 0), only(month, Reading.class, "taken_at"));
    }

    @Test
    void pointsBeforeThreeDigitsAreAmbiguousWhereCommasAreDecimals() throws Exception {
        assertEquals("expected a number that can be read one way only: write 1,2340 or 1234",
                read(text(folder, "a.csv", "Site;Line;Station;Cable length [mm]", "S;L;1;1.234")).rejected().get(0).problem());
        assertEquals(0.001234,
                (double) only(read(text(folder, "b.csv", "Site,Line,Station,Cable length [mm]", "S,L,1,1.234")), Station.class,
                        "cable_length"),
                1e-18);
    }

    @Test
    void daysAreCountedFrom1904WhereTheWorkbookSaysSo() throws Exception {
        for (boolean from1904 : new boolean[] { false, true }) {
            Path file = xlsx(folder, "list.xlsx", book -> {
                book.getCTWorkbook().addNewWorkbookPr().setDate1904(from1904);
                Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Last inspection"), row("S", "L", "1", 40000));
                sheet.getRow(1).getCell(3).setCellStyle(Books.style(book, "dd.mm.yyyy"));
            });
            // 40000 days after 1899-12-30 and after 1904-01-01, by the calendar of java.time
            LocalDate expected = (from1904 ? LocalDate.of(1904, 1, 1) : LocalDate.of(1899, 12, 30)).plusDays(40000);
            assertEquals(expected, only(read(file), Station.class, "last_inspection"));
        }
    }

    @Test
    void formulasCountByTheirSavedValues() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Cable length", "Coil"), row("S", "L", "1"), row("S", "L", "2"));
            sheet.getRow(1).createCell(3).setCellFormula("2*3.25");
            sheet.getRow(1).createCell(4).setCellFormula("\"C\"&\"1\"");
            book.getCreationHelper().createFormulaEvaluator().evaluateAll();
            sheet.getRow(2).createCell(3).setCellFormula("1+1");
        });
        Incoming incoming = read(file);
        assertEquals(6.5, only(incoming, Station.class, "cable_length"));
        assertEquals("C1", only(incoming, Fitting.class, "type"));
        assertEquals("A", incoming.rejected().get(0).sheet());
        assertEquals("=1+1", incoming.rejected().get(0).value());
    }

    @Test
    void errorCellsAreReported() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Coil", "Colour"), row("S", "L", "1"), row("S", "L", "2"));
            sheet.getRow(1).createCell(3).setCellErrorValue(FormulaError.NA.getCode());
            sheet.getRow(2).createCell(4).setCellErrorValue(FormulaError.REF.getCode());
        });
        Incoming incoming = read(file);
        assertEquals(
                List.of("list.xlsx, sheet A, row 2, column Coil, value \"#N/A\": expected a value; the spreadsheet shows an error here"),
                rejected(incoming));
        assertEquals(1, of(incoming, Station.class).size());
    }

    @Test
    void whatANumberFormatSaysCounts() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A",
                    row("Site", "Line", "Station", "Coil", "Coil serial", "On-time", "Coil resistance", "Measured on"),
                    row("S", "L", 1, "C", 123, 0.03, 1.2, LocalDate.of(2026, 3, 31)));
            style(sheet, 4, Books.style(book, "00000"));
            style(sheet, 5, Books.style(book, "0.00\" s\""));
            style(sheet, 6, Books.style(book, "0.0\\ \"kΩ\""));
        });
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals("00123", only(incoming, Fitting.class, "serial"));
        assertEquals("1", only(incoming, Station.class, "tag"));
        assertEquals(0.03, only(incoming, Duty.class, "on_time"));
        assertEquals(1200.0, only(incoming, Reading.class, "value"));
    }

    private static void style(Sheet sheet, int column, org.apache.poi.ss.usermodel.CellStyle style) {
        Cell cell = sheet.getRow(1).getCell(column);
        cell.setCellStyle(style);
    }

    @Test
    void percentFormatsAndPlainPercentagesAreToldApart() throws Exception {
        Path file = xlsx(folder, "Coil types.xlsx", book -> {
            Sheet sheet = rows(book, "Coil types", row("Type", "Rated voltage [V]", "Resistance tolerance [%]"), row("A", 24, 0.07),
                    row("B", 24, 7),
                    row("C", 24, "7 %"));
            sheet.getRow(1).getCell(2).setCellStyle(Books.style(book, "0%"));
        });
        List<Object> tolerances = of(read(file), CoilType.class).stream().map(patch -> value(patch, "resistance_tolerance")).toList();
        assertEquals(List.of(0.07, 0.07, 0.07), tolerances);
    }

    @Test
    void aTagThatTheSpreadsheetMadeADateIsRejected() throws Exception {
        Path file = xlsx(folder, "list.xlsx",
                book -> rows(book, "A", row("Site", "Line", "Station", "Coil"), row("S", "L", LocalDate.of(2026, 2, 1), "C")));
        Incoming incoming = read(file);
        assertTrue(incoming.rejected().get(0).problem().contains("holds a date here"), rejected(incoming).toString());
    }

    @Test
    void numbersKeepEveryDigit() throws Exception {
        Path file = xlsx(folder, "list.xlsx",
                book -> rows(book, "A", row("Site", "Line", "Station", "Cable length"), row("S", "L", "1", 0.1 + 0.2)));
        assertEquals(0.1 + 0.2, only(read(file), Station.class, "cable_length"));
    }

    @Test
    void textFilesAreReadInTheCharacterSetsOfDesktops() throws Exception {
        String list = "Werk;Linie;Station;Kabellänge [m]\r\nMünster;L;1;6,5\r\n";
        for (Charset charset : List.of(StandardCharsets.UTF_8, Charset.forName("windows-1252"), StandardCharsets.UTF_16LE,
                StandardCharsets.UTF_16BE)) {
            for (String mark : charset.name().startsWith("UTF") ? List.of("", "\ufeff") : List.of("")) {
                Path file = Files.writeString(folder.resolve("list.csv"), mark + list, charset);
                Incoming incoming = read(file);
                assertEquals("Münster", only(incoming, Station.class, "site"), charset + mark);
                assertEquals(6.5, only(incoming, Station.class, "cable_length"));
            }
        }
    }

    @Test
    void delimitersAreFoundOut() throws Exception {
        for (String delimiter : List.of(",", ";", "\t", "|")) {
            Path file = text(folder, "list.tsv", String.join(delimiter, "Site", "Line", "Station", "Description"),
                    String.join(delimiter, "S", "L", "1",
                            "\"one; two, three\nand a second line\""),
                    String.join(delimiter, "S", "L", "2", ""));
            Incoming incoming = read(file);
            assertEquals("one; two, three\nand a second line", value(of(incoming, Station.class).get(0), "description"));
            assertEquals(3, of(incoming, Station.class).get(1).source().row());
        }
        assertEquals("S", only(read(text(folder, "excel.csv", "sep=;", "Site;Line;Station", "S;L;1")), Station.class, "site"));
    }

    @Test
    void nonBreakingSpacesAreSpaces() throws Exception {
        Path file = text(folder, "list.csv", "Site\u00a0,Line,Station,Cable\u00a0length", "\u00a0S,L,1,1\u00a0234\u00a0mm");
        assertEquals(1.234, only(read(file), Station.class, "cable_length"));
        assertEquals("S", only(read(file), Station.class, "site"));
    }
}
