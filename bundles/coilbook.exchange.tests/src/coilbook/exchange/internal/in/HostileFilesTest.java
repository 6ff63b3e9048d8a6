package coilbook.exchange.internal.in;

import static coilbook.exchange.internal.in.Books.only;
import static coilbook.exchange.internal.in.Books.read;
import static coilbook.exchange.internal.in.Books.row;
import static coilbook.exchange.internal.in.Books.rows;
import static coilbook.exchange.internal.in.Books.text;
import static coilbook.exchange.internal.in.Books.xlsx;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Enumeration;
import java.util.function.UnaryOperator;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import java.util.zip.ZipOutputStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Station;

/** Files that are wrong, broken, or made to do harm end in a sentence that names them. */
class HostileFilesTest {

    @TempDir
    Path folder;

    private static String refused(Path file) {
        CoilbookException refusal = assertThrows(CoilbookException.class, () -> read(file));
        assertEquals(CoilbookException.Reason.BAD_INPUT, refusal.reason());
        String words = refusal.getMessage();
        assertTrue(words.startsWith(file.getFileName().toString()), words);
        assertFalse(words.matches("(?s).*(Exception|java\\.|org\\.|coilbook\\.).*"), words);
        assertFalse(refusal.problems().isEmpty());
        return words;
    }

    private static void assertRefused(Path file, String... parts) {
        String words = refused(file);
        for (String part : parts) {
            assertTrue(words.contains(part), words);
        }
    }

    private Path good() {
        return xlsx(folder, "good.xlsx", book -> rows(book, "A", row("Site", "Line", "Station", "Cable length"), row("S", "L", "1", 5)));
    }

    /** A copy of a workbook with one of its parts rewritten. */
    private Path rewritten(Path book, String name, String part, UnaryOperator<String> change) throws IOException {
        Path copy = folder.resolve(name);
        try (ZipFile from = new ZipFile(book.toFile()); ZipOutputStream to = new ZipOutputStream(Files.newOutputStream(copy))) {
            for (Enumeration<? extends ZipEntry> entries = from.entries(); entries.hasMoreElements();) {
                ZipEntry entry = entries.nextElement();
                to.putNextEntry(new ZipEntry(entry.getName()));
                byte[] bytes = from.getInputStream(entry).readAllBytes();
                to.write(entry.getName().equals(part)
                        ? change.apply(new String(bytes, StandardCharsets.UTF_8)).getBytes(StandardCharsets.UTF_8)
                        : bytes);
            }
        }
        return copy;
    }

    @Test
    void whatIsNoFileIsSaid() throws Exception {
        assertRefused(folder.resolve("none.xlsx"), "there is no such file");
        assertRefused(Files.createDirectory(folder.resolve("folder.xlsx")), "is a folder");
        assertRefused(Files.createFile(folder.resolve("empty.csv")), "is empty");
    }

    @Test
    void otherFormsAreNamedWithWhatToDo() throws Exception {
        assertRefused(text(folder, "text.xlsx", "Site,Line,Station", "S,L,1"), "is no workbook", ".csv");
        assertRefused(text(folder, "page.csv", "<!DOCTYPE html><html>"), "is a page");
        byte[] compound = new byte[4096];
        System.arraycopy(new byte[] { (byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0 }, 0, compound, 0, 4);
        assertRefused(Files.write(folder.resolve("old.xls"), compound), "save it as .xlsx");
        byte[] name = "EncryptedPackage".getBytes(StandardCharsets.UTF_16LE);
        System.arraycopy(name, 0, compound, 2048, name.length);
        assertRefused(Files.write(folder.resolve("locked.xlsx"), compound), "protected by a password");
        assertRefused(Files.write(folder.resolve("image.csv"), new byte[] { 1, 0, 2, 0, 0, 0, 3 }), "neither text nor");
        Path zip = folder.resolve("zip.xlsx");
        try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(zip))) {
            out.putNextEntry(new ZipEntry("a.txt"));
        }
        assertRefused(zip, "is a zip file, not an XLSX workbook");
    }

    @Test
    void aTruncatedWorkbookIsRefused() throws Exception {
        byte[] whole = Files.readAllBytes(good());
        for (int part = 1; part < 10; part++) {
            Path cut = Files.write(folder.resolve("cut.xlsx"), java.util.Arrays.copyOf(whole, whole.length * part / 10));
            assertRefused(cut, "damaged or cut off");
        }
    }

    @Test
    void damagedPartsAreRefused() throws Exception {
        assertRefused(rewritten(good(), "a.xlsx", "xl/worksheets/sheet1.xml", xml -> xml.substring(0, xml.length() / 2)), "damaged");
        assertRefused(rewritten(good(), "b.xlsx", "xl/sharedStrings.xml", xml -> "<sst/>"), "damaged");
        assertRefused(rewritten(good(), "c.xlsx", "xl/workbook.xml", xml -> "no xml"), "damaged");
        assertRefused(rewritten(good(), "d.xlsx", "[Content_Types].xml", xml -> "<Types/>"), "damaged");
    }

    @Test
    void entitiesAreNotExpanded() throws Exception {
        String declared = "<!DOCTYPE x [<!ENTITY a \"aaaaaaaaaa\"><!ENTITY b \"&a;&a;&a;&a;&a;&a;&a;&a;\">]>";
        for (String part : new String[] { "xl/worksheets/sheet1.xml", "xl/sharedStrings.xml", "xl/styles.xml", "xl/workbook.xml" }) {
            assertRefused(rewritten(good(), "entities.xlsx", part, xml -> xml.replaceFirst("\\?>", "?>" + declared)), "document type");
        }
    }

    @Test
    void aSmallBombIsRefused() throws Exception {
        Path bomb = rewritten(good(), "bomb.xlsx", "xl/worksheets/sheet1.xml",
                xml -> xml.replace("<sheetData>", " ".repeat(30_000_000) + "<sheetData>"));
        assertTrue(Files.size(bomb) < 100_000, "the bomb is small");
        assertRefused(bomb, "more than 100 times its size");
    }

    /** The directory of the zip file says small sizes; only unpacking shows the truth. */
    @Test
    void aBombThatLiesAboutItsSizeIsRefused() throws Exception {
        Path bomb = rewritten(good(), "bomb.xlsx", "xl/worksheets/sheet1.xml",
                xml -> xml.replace("<sheetData>", " ".repeat(30_000_000) + "<sheetData>"));
        byte[] bytes = Files.readAllBytes(bomb);
        byte[] name = "xl/worksheets/sheet1.xml".getBytes(StandardCharsets.US_ASCII);
        int patched = 0;
        for (int i = 46; i + name.length <= bytes.length; i++) {
            boolean central = bytes[i - 46] == 'P' && bytes[i - 45] == 'K' && bytes[i - 44] == 1 && bytes[i - 43] == 2;
            if (central && java.util.Arrays.equals(bytes, i, i + name.length, name, 0, name.length)) {
                bytes[i - 46 + 24] = 100;
                bytes[i - 46 + 25] = 0;
                bytes[i - 46 + 26] = 0;
                bytes[i - 46 + 27] = 0;
                patched++;
            }
        }
        assertEquals(1, patched);
        refused(Files.write(folder.resolve("liar.xlsx"), bytes));
    }

    @Test
    void sheetsOverTheLimitsAreRefused() throws Exception {
        assertRefused(rewritten(good(), "far.xlsx", "xl/worksheets/sheet1.xml", xml -> xml.replace("<row r=\"2\"", "<row r=\"99999999\"")),
                String.valueOf(InputLimits.ROWS));
        assertRefused(rewritten(good(), "wide.xlsx", "xl/worksheets/sheet1.xml", xml -> xml.replace("r=\"B2\"", "r=\"ZZZZ2\"")),
                String.valueOf(InputLimits.COLUMNS));
        assertRefused(rewritten(good(), "merged.xlsx", "xl/worksheets/sheet1.xml",
                xml -> xml.replace("</sheetData>", "</sheetData><mergeCells><mergeCell ref=\"A1:XFD1048576\"/></mergeCells>")),
                String.valueOf(InputLimits.CELLS));
    }

    @Test
    void veryLongTextsAreRefused() throws Exception {
        assertRefused(text(folder, "open.csv", "Site,Line,Station", "S,L,\"never closed", "x".repeat(40_000)),
                String.valueOf(InputLimits.CELL_CHARACTERS));
    }

    @Test
    void linksToOtherFilesAreNotFollowed() throws Exception {
        Path secret = text(folder, "secret.csv", "secret");
        Path linked = rewritten(good(), "linked.xlsx", "xl/_rels/workbook.xml.rels",
                xml -> xml.replace("</Relationships>",
                        "<Relationship Id=\"rIdX\" Type=\"http://schemas.openxmlformats.org/officeDocument/2006/relationships/externalLink\""
                                + " Target=\"" + secret.toUri() + "\" TargetMode=\"External\"/></Relationships>"));
        Path formula = rewritten(linked, "formula.xlsx", "xl/worksheets/sheet1.xml",
                xml -> xml.replaceFirst("<c r=\"D2\"[^>]*><v>", "<c r=\"D2\"><f>[1]secret!A1</f><v>"));
        assertEquals(5.0, only(read(formula), Station.class, "cable_length"));
    }

    @Test
    void aFormulaInATextIsAText() throws Exception {
        Path file = text(folder, "list.csv", "Site,Line,Station,Description", "S,L,1,\"=HYPERLINK(\"\"x\"\")\"");
        assertEquals("=HYPERLINK(\"x\")", only(read(file), Station.class, "description"));
    }

    @Test
    void unknownHeadingsAreListedWithTheNearestKnown() throws Exception {
        assertRefused(text(folder, "list.csv", "Foo,Bar,Coil tpye", "1,2,3"), "no known headings", "Foo | Bar | Coil tpye", "near to: ",
                "Coil type");
        assertRefused(xlsx(folder, "blank.xlsx", book -> book.createSheet("A")), "no known headings");
    }

    @Test
    void aMissingColumnIsNamed() throws Exception {
        assertRefused(text(folder, "list.csv", "Site,Station,Coil", "S,1,C"), "missing column Line");
        assertRefused(text(folder, "list2.csv", "Customer,Line,Tag,Coil", "S,1,C,D"), "missing column Site");
        assertRefused(
                xlsx(folder, "sites.xlsx",
                        book -> rows(book, "Sites", row("Site", "Customer", "Name", "Time zone"), row("S", "C", "N", "UTC"))),
                "sheet Sites", "missing column Country");
    }

    @Test
    void aListThatIsWrongThroughoutIsRefused() throws Exception {
        StringBuilder list = new StringBuilder("Site,Line,Station,Cable length");
        for (int i = 0; i <= InputLimits.REJECTIONS; i++) {
            list.append("\nS,L,").append(i).append(",long");
        }
        assertRefused(Files.writeString(folder.resolve("list.csv"), list), "more than " + InputLimits.REJECTIONS, "row 2",
                "column Cable length");
    }

    @Test
    void macrosAreNotRun() throws Exception {
        Path file = rewritten(good(), "macro.xlsm", "[Content_Types].xml", xml -> xml.replace(
                "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml",
                "application/vnd.ms-excel.sheet.macroEnabled.main+xml"));
        assertEquals(5.0, only(read(file), Station.class, "cable_length"));
    }
}
