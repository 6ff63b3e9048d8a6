package coilbook.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfSystemProperty;
import org.junit.jupiter.api.io.TempDir;

import com.fasterxml.jackson.databind.JsonNode;

/**
 * The audit workbooks of the demonstration fleets: coming back in they change nothing, and LibreOffice Calc, given them without any of our values,
 * calculates every formula to what we had written.
 */
class AuditWorkbookTest {

    /** A formula cell with its value. */
    private static final Pattern FORMULA_CELL = Pattern
            .compile("<c r=\"([A-Z]+[0-9]+)\"([^>]*)>\\s*<f(?:/>|[^>]*>[^<]*</f>)\\s*(?:<v>([^<]*)</v>)?");
    private static final double RELATIVE = 1e-9;
    private static final int FORMULAS_AT_LEAST = 2000;

    @TempDir
    private Path folder;

    @Test
    void theDemonstrationFilesComeBackUnchanged() {
        Run brought = Run.in(folder, ThreadTest.files("import", "--register", "fleet", "--json"));
        assertEquals(0, brought.code(), brought::toString);
        comesBackUnchanged();
    }

    @Test
    void anInventedFleetComesBackUnchanged() {
        assertEquals(0, Run.in(folder, "demo", "--register", "fleet", "--stations", "200", "--seed", "7").code());
        comesBackUnchanged();
    }

    private void comesBackUnchanged() {
        Run audit = Run.in(folder, "audit", "--register", "fleet", "--out", "audit.xlsx");
        assertEquals(0, audit.code(), audit::toString);
        Run back = Run.in(folder, "import", "audit.xlsx", "--register", "fleet", "--json");
        assertEquals(0, back.code(), back::toString);
        JsonNode counts = back.json();
        assertTrue(counts.get("read").asInt() > 500, back::toString);
        assertEquals(counts.get("read"), counts.get("unchanged"), back::toString);
        assertEquals(0, counts.get("rejected").size(), back::toString);
    }

    @Test
    @EnabledIfSystemProperty(named = "coilbook.judges", matches = "live")
    void libreOfficeCalculatesTheDemonstrationFilesAsWeDo() throws Exception {
        Run audit = Run.in(folder, ThreadTest.files("audit", "--out", "audit.xlsx", "--as-of", "2026-11-30"));
        assertEquals(0, audit.code(), audit::toString);
        isRecalculatedTheSame();
    }

    @Test
    @EnabledIfSystemProperty(named = "coilbook.judges", matches = "live")
    void libreOfficeCalculatesAnInventedFleetAsWeDo() throws Exception {
        assertEquals(0, Run.in(folder, "demo", "--register", "fleet", "--stations", "200", "--seed", "7").code());
        assertEquals(0, Run.in(folder, "audit", "--register", "fleet", "--out", "audit.xlsx").code());
        isRecalculatedTheSame();
    }

    private void isRecalculatedTheSame() throws Exception {
        Path audit = folder.resolve("audit.xlsx");
        Path bare = folder.resolve("bare.xlsx");
        strip(audit, bare);
        assertEquals(0, formulas(bare).values().stream().filter(value -> !value.isEmpty()).count(), "values of ours are left");
        Path log = folder.resolve("office.log");
        Process office = new ProcessBuilder("soffice", "-env:UserInstallation=" + folder.resolve("profile").toUri(), "--headless",
                "--convert-to", "xlsx", "--outdir", folder.resolve("recalculated").toString(), bare.toString()).redirectErrorStream(true)
                .redirectOutput(log.toFile()).start();
        assertTrue(office.waitFor(300, TimeUnit.SECONDS), "LibreOffice took too long");
        Path recalculated = folder.resolve("recalculated/bare.xlsx");
        assertTrue(Files.exists(recalculated), () -> "LibreOffice wrote nothing; see " + log);
        Map<String, String> ours = formulas(audit);
        Map<String, String> theirs = formulas(recalculated);
        assertTrue(ours.size() > FORMULAS_AT_LEAST, "only " + ours.size() + " formulas");
        List<String> differences = new ArrayList<>();
        ours.forEach((cell, value) -> {
            if (!same(value, theirs.get(cell))) {
                differences.add(cell + ": ours " + value + ", theirs " + theirs.get(cell));
            }
        });
        assertEquals(List.of(), differences.subList(0, Math.min(20, differences.size())), differences.size() + " differences");
    }

    private static boolean same(String ours, String theirs) {
        if (ours.equals(theirs)) {
            return true;
        }
        try {
            double one = Double.parseDouble(ours);
            double other = Double.parseDouble(String.valueOf(theirs));
            return Math.abs(one - other) <= RELATIVE * Math.abs(one);
        } catch (NumberFormatException e) {
            return false;
        }
    }

    /** The value beside every formula, as it stands in the file, by sheet and cell; empty if there is none. */
    private static Map<String, String> formulas(Path workbook) throws IOException {
        Map<String, String> values = new TreeMap<>();
        try (ZipInputStream in = new ZipInputStream(Files.newInputStream(workbook))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                if (isSheet(entry)) {
                    Matcher cell = FORMULA_CELL.matcher(new String(in.readAllBytes(), StandardCharsets.UTF_8));
                    while (cell.find()) {
                        values.put(entry.getName() + "!" + cell.group(1), cell.group(3) == null ? "" : cell.group(3));
                    }
                }
            }
        }
        return values;
    }

    private static void strip(Path workbook, Path to) throws IOException {
        try (ZipInputStream in = new ZipInputStream(Files.newInputStream(workbook));
                ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(to))) {
            for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
                out.putNextEntry(new ZipEntry(entry.getName()));
                byte[] bytes = in.readAllBytes();
                out.write(isSheet(entry)
                        ? new String(bytes, StandardCharsets.UTF_8).replaceAll("</f><v>[^<]*</v>", "</f>").getBytes(StandardCharsets.UTF_8)
                        : bytes);
                out.closeEntry();
            }
        }
    }

    private static boolean isSheet(ZipEntry entry) {
        return entry.getName().matches("xl/worksheets/sheet[0-9]+\\.xml");
    }
}
