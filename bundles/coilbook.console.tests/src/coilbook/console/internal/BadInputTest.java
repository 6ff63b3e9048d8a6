package coilbook.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledIfSystemProperty;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import coilbook.register.OpenMode;
import coilbook.register.Register;

/** What is wrong ends with the code and the words promised for it, without a class name, and with the register as it was. */
class BadInputTest {

    private static final Pattern CLASS_NAME = Pattern.compile("Exception|\\bat [a-z]+\\.|\\b(java|coilbook|org|com)\\.[a-z]+\\.[a-zA-Z]");
    private static final String SOUND = "Site,Line,Tag,Country,Coil type\nDE7,L1,G1,DE,KM-24\n";

    @TempDir
    private Path folder;
    private String before;

    @BeforeEach
    void aSmallRegister() {
        Run demo = Run.in(folder, "demo", "--register", "fleet", "--stations", "9");
        assertEquals(0, demo.code(), demo::toString);
        before = Run.in(folder, "history", "--register", "fleet", "--json").out();
    }

    private void refused(Run run, int code, String... words) {
        assertEquals(code, run.code(), run::toString);
        for (String word : words) {
            assertTrue(run.err().contains(word), () -> "expected \"" + word + "\" in " + run);
        }
        assertFalse(CLASS_NAME.matcher(run.err()).find(), run::toString);
        assertEquals(before, Run.in(folder, "history", "--register", "fleet", "--json").out());
    }

    private Path file(String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text);
    }

    private Run bringIn(String name) {
        return Run.in(folder, "import", name, "--register", "fleet");
    }

    @Test
    void aSoundListComesIn() throws IOException {
        file("sound.csv", SOUND);
        Run run = bringIn("sound.csv");
        assertEquals(0, run.code(), run::toString);
        assertTrue(run.out().contains("1 rows read, 1 created"), run::toString);
    }

    @Test
    void aTruncatedWorkbook() throws IOException {
        byte[] whole = Files.readAllBytes(Run.demoData().resolve("plants.xlsx"));
        Files.write(folder.resolve("half.xlsx"), Arrays.copyOf(whole, whole.length / 2));
        refused(bringIn("half.xlsx"), 3, "half.xlsx");
    }

    @Test
    void textNamedAsAWorkbook() throws IOException {
        file("text.xlsx", "this is no workbook");
        refused(bringIn("text.xlsx"), 3, "text.xlsx");
    }

    @Test
    void aFolderAndAnEmptyFileAndNoFile() throws IOException {
        Files.createDirectory(folder.resolve("folder.csv"));
        file("empty.csv", "");
        refused(bringIn("folder.csv"), 3, "folder.csv", "folder");
        refused(bringIn("empty.csv"), 3, "empty.csv", "empty");
        refused(bringIn("none.csv"), 3, "none.csv");
    }

    @Test
    void aMissingColumn() throws IOException {
        file("short.csv", "Line,Country,Coil type\nL1,DE,KM-24\n");
        refused(bringIn("short.csv"), 3, "short.csv");
    }

    @Test
    void aNegativeResistance() throws IOException {
        file("negative.csv", SOUND.replace("Coil type\n", "Coil type,Winding resistance [Ω],Measured on\n").replace("KM-24\n",
                "KM-24,-10,2026-03-02\n"));
        refused(bringIn("negative.csv"), 3, "negative.csv", "row 2", "-10");
    }

    @Test
    void anUnknownCountry() throws IOException {
        file("country.csv", SOUND.replace("DE,KM", "Germny,KM"));
        refused(bringIn("country.csv"), 3, "country.csv", "row 2", "Germny", "Germany");
        Run json = Run.in(folder, "import", "country.csv", "--register", "fleet", "--json");
        assertEquals("Germny", json.json().get("rejected").get(0).get("value").textValue());
        assertEquals(2, json.json().get("rejected").get(0).get("row").intValue());
    }

    @Test
    void aRefusedFileLeavesNoRegisterBehind() throws IOException {
        file("country.csv", SOUND.replace("DE,KM", "Germny,KM"));
        Run run = Run.in(folder, "import", "country.csv", "--register", "deep/new");
        assertEquals(3, run.code(), run::toString);
        assertFalse(Files.exists(folder.resolve("deep")), run::toString);
    }

    @Test
    void aRegisterThatIsOpen() throws Exception {
        try (Register open = RuntimeServices.services().registers().get().open(folder.resolve("fleet"), OpenMode.EXISTING)) {
            Run run = Run.in(folder, "check", "--register", "fleet");
            assertEquals(4, run.code(), run::toString);
            assertFalse(CLASS_NAME.matcher(run.err()).find(), run::toString);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = { "check", "history", "audit" })
    void aMissingRegisterIsNotCreated(String command) throws IOException {
        List<String> arguments = command.equals("audit") ? List.of("audit", "--register", "none/such", "--out", "a.xlsx")
                : List.of(command, "--register", "none/such");
        refused(Run.in(folder, arguments.toArray(String[]::new)), 4, "such");
        try (Stream<Path> left = Files.list(folder)) {
            assertTrue(left.noneMatch(p -> p.getFileName().toString().startsWith("none")), "something was created");
        }
    }

    @Test
    void aFileThatIsNoRegister() throws IOException {
        Files.write(folder.resolve("junk.mv.db"),
                "this is no register, whatever its name says".repeat(200).getBytes(StandardCharsets.UTF_8));
        refused(Run.in(folder, "check", "--register", "junk"), 4, "junk");
        refused(Run.in(folder, "demo", "--register", "junk"), 3, "junk");
    }

    @Test
    void aDemoOnAnExistingRegister() {
        refused(Run.in(folder, "demo", "--register", "fleet"), 3, "fleet");
    }

    @Test
    void anIllFormedCase() throws IOException {
        file("case.json", "{\"mains\": {\"voltageV\": 120");
        refused(Run.in(folder, "waveform", "--case", "case.json"), 3, "case.json", "line 1");
    }

    @Test
    void aFolderThatIsNotThereForOutput() {
        refused(Run.in(folder, "audit", "--register", "fleet", "--out", "nowhere/audit.xlsx"), 3, "nowhere", "does not exist");
        refused(Run.in(folder, "audit", "--register", "fleet", "--out", "."), 3, "folder");
    }

    @Test
    @DisabledIfSystemProperty(named = "user.name", matches = "root", disabledReason = "root may write everywhere")
    void aFolderThatMayNotBeWritten() throws IOException {
        Path closed = Files.createDirectory(folder.resolve("closed"));
        assertTrue(closed.toFile().setWritable(false));
        refused(Run.in(folder, "audit", "--register", "fleet", "--out", "closed/audit.xlsx"), 3, "closed", "written");
        refused(Run.in(folder, "demo", "--register", "closed/fleet"), 4, "closed");
        assertTrue(closed.toFile().setWritable(true));
    }

    @ParameterizedTest
    @ValueSource(strings = { "chek", "check --sight X", "check --as-of tomorrow", "check --fail-on misfits", "audit", "import", "waveform",
            "demo --stations many", "demo --stations 0", "audit a.csv --register fleet --out a.xlsx", "" })
    void usageIsCorrected(String line) {
        refused(Run.in(folder, line.isEmpty() ? new String[0] : line.split(" ")), 2);
    }

    @Test
    void anUnknownSiteIsNamedWithTheNearest() {
        refused(Run.in(folder, "check", "--register", "fleet", "--site", "DE11"), 3, "DE11", "DE1");
    }

    @Test
    void whatNobodyExpectedIsLoggedInFull() throws IOException {
        Services broken = new Services(() -> {
            throw new IllegalStateException("planted");
        }, null, null, null, null, null);
        java.io.ByteArrayOutputStream err = new java.io.ByteArrayOutputStream();
        Terminal terminal = new Terminal(null, System.out, new java.io.PrintStream(err, true, StandardCharsets.UTF_8), false, "tester",
                new coilbook.jobs.RegisterPlace(java.util.Map.of("XDG_DATA_HOME", folder.toString()), folder, "Linux"), folder);
        assertEquals(5, new Console(broken, terminal, "0").run("check", "--register", "fleet"));
        String told = err.toString(StandardCharsets.UTF_8);
        assertFalse(CLASS_NAME.matcher(told).find(), told);
        try (Stream<Path> logs = Files.list(folder.resolve("coilbook").resolve("log"))) {
            Path log = logs.findFirst().orElseThrow();
            assertTrue(told.contains(log.toString()), told);
            assertTrue(Files.readString(log).contains("planted"));
        }
    }
}
