package coilbook.console.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.TreeSet;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import com.fasterxml.jackson.databind.JsonNode;

/** The whole way through the command line: files in, findings and audit workbook out, the same by every way there is. */
class ThreadTest {

    private static final String DAY = "2026-11-30";

    @TempDir
    private Path folder;

    static String[] files(String... rest) {
        List<String> arguments = new ArrayList<>(List.of(rest));
        for (String name : List.of("catalogue.xlsx", "plants.xlsx", "branch-list.xlsx")) {
            arguments.add(1, Run.demoData().resolve(name).toString());
        }
        return arguments.toArray(String[]::new);
    }

    private static List<String> fieldNames(JsonNode node) {
        List<String> names = new ArrayList<>();
        node.fieldNames().forEachRemaining(names::add);
        return names;
    }

    @Test
    void importCheckAndAuditGiveTheSame() throws IOException {
        Run brought = Run.in(folder, files("import", "--register", "fleet", "--json"));
        assertEquals(0, brought.code(), brought::toString);
        JsonNode first = brought.json();
        assertEquals(List.of("read", "created", "changed", "unchanged", "rejected", "incompleteTypes"), fieldNames(first));
        assertEquals(first.get("read").asInt(),
                first.get("created").asInt() + first.get("changed").asInt() + first.get("unchanged").asInt());
        JsonNode again = Run.in(folder, files("import", "--register", "fleet", "--json")).json();
        assertEquals(again.get("read").asInt(), again.get("unchanged").asInt(), again::toString);

        JsonNode check = Run.in(folder, "check", "--register", "fleet", "--json", "--as-of", DAY).json();
        Run ofFleet = Run.in(folder, "audit", "--register", "fleet", "--out", "one.xlsx", "--as-of", DAY, "--json");
        Run ofFiles = Run.in(folder, files("audit", "--out", "two.xlsx", "--as-of", DAY, "--json"));
        assertEquals(0, ofFleet.code(), ofFleet::toString);
        assertEquals(0, ofFiles.code(), ofFiles::toString);
        assertEquals(check.get("counts"), ofFleet.json().get("counts"));
        assertEquals(check.get("counts"), ofFiles.json().get("counts"));
        assertTrue(Files.size(folder.resolve("two.xlsx")) > 10_000);
        Run text = Run.in(folder, files("audit", "--out", "three.xlsx", "--as-of", DAY));
        assertTrue(text.out().indexOf("hazard") < text.out().indexOf("nonconformity"), text::toString);
        assertArrayEquals(Files.readAllBytes(folder.resolve("two.xlsx")), Files.readAllBytes(folder.resolve("three.xlsx")));
    }

    @Test
    void anAuditComesBackWithoutChangingARowAndAPastOneIsRefused() {
        assertEquals(0, Run.in(folder, files("import", "--register", "one")).code());
        assertEquals(0, Run.in(folder, "audit", "--register", "one", "--out", "one.xlsx").code());
        JsonNode back = Run.in(folder, "import", "one.xlsx", "--register", "one", "--json").json();
        assertEquals(back.get("read").asInt(), back.get("unchanged").asInt(), back::toString);
        Run elsewhere = Run.in(folder, "import", "one.xlsx", "--register", "two");
        assertEquals(0, elsewhere.code(), elsewhere::toString);
        assertEquals(Run.in(folder, "check", "--register", "one", "--json").out(),
                Run.in(folder, "check", "--register", "two", "--json").out());
        assertEquals(0, Run.in(folder, "audit", "--register", "one", "--out", "past.xlsx", "--as-of", "2026-06-30").code());
        Run past = Run.in(folder, "import", "past.xlsx", "--register", "two");
        assertEquals(3, past.code(), past::toString);
        assertTrue(past.err().contains("past date"), past::toString);
    }

    @Test
    void checkKeepsItsSchemaItsOrderAndItsBytes() {
        assertEquals(0, Run.in(folder, "demo", "--register", "fleet", "--stations", "200", "--seed", "7").code());
        Run check = Run.in(folder, "check", "--register", "fleet", "--json", "--remedies");
        assertEquals(0, check.code(), check::toString);
        JsonNode json = check.json();
        assertEquals(List.of("asOf", "stations", "counts", "findings"), fieldNames(json));
        assertEquals(200, json.get("stations").asInt());
        assertEquals(List.of("hazard", "nonconformity", "observation", "undetermined", "conceded"), fieldNames(json.get("counts")));
        TreeSet<String> criteria = new TreeSet<>();
        List<String> order = new ArrayList<>();
        int hazards = 0;
        int nonconformities = 0;
        int remedies = 0;
        for (JsonNode finding : json.get("findings")) {
            assertEquals(List.of("site", "line", "station", "criterion", "verdict", "hazard", "value", "limit", "unit", "corner",
                    "evidence", "missing",
                    "remedies", "conceded"), fieldNames(finding));
            order.add(String.join("\u0001", finding.get("site").asText(), finding.get("line").asText(), finding.get("station").asText()));
            boolean nonconformity = finding.get("verdict").asText().equals("nonconformity");
            hazards += finding.get("hazard").asBoolean() ? 1 : 0;
            nonconformities += nonconformity && !finding.get("hazard").asBoolean() ? 1 : 0;
            remedies += finding.get("remedies").size();
            if (nonconformity) {
                criteria.add(finding.get("criterion").asText());
            }
            assertEquals(finding.get("verdict").asText().equals("undetermined"), !finding.get("missing").isEmpty(), finding::toString);
            assertFalse(finding.get("evidence").asText().isBlank(), finding::toString);
        }
        List<String> sorted = new ArrayList<>(order);
        Collections.sort(sorted);
        assertEquals(sorted, order);
        assertEquals(hazards, json.get("counts").get("hazard").asInt());
        assertEquals(nonconformities, json.get("counts").get("nonconformity").asInt());
        assertTrue(remedies > 0, "no remedy is named");
        assertTrue(criteria.size() >= 10, criteria::toString);
        assertArrayEquals(check.outBytes(), Run.in(folder, "check", "--register", "fleet", "--json", "--remedies").outBytes());
    }

    @Test
    void theSameSeedGivesTheSameFindings() {
        for (String name : List.of("one", "two")) {
            assertEquals(0, Run.in(folder, "demo", "--register", name, "--stations", "100", "--seed", "3").code());
        }
        assertArrayEquals(Run.in(folder, "check", "--register", "one", "--json").outBytes(),
                Run.in(folder, "check", "--register", "two", "--json").outBytes());
    }

    @Test
    void failOnTellsByTheExitCode() {
        assertEquals(0, Run.in(folder, "demo", "--register", "fleet", "--stations", "100").code());
        assertEquals(1, Run.in(folder, "check", "--register", "fleet", "--fail-on", "hazard").code());
        assertEquals(1, Run.in(folder, "check", "--register", "fleet", "--fail-on", "observation").code());
        Run.in(folder, "demo", "--register", "sound", "--stations", "3");
        Run sound = Run.in(folder, "check", "--register", "sound", "--fail-on", "nonconformity");
        assertEquals(0, sound.code(), sound::toString);
        assertTrue(sound.out().contains("licensed electrician"), sound::toString);
    }

    @Test
    void aDryRunWritesNothingAndPartialAcceptanceTakesTheSoundRows() throws IOException {
        Files.writeString(folder.resolve("list.csv"), "Site,Line,Tag,Country,Coil type\nDE7,L1,G1,DE,KM-24\nXX1,L1,G1,Narnia,KM-24\n");
        Run dry = Run.in(folder, "import", "list.csv", "--register", "fleet", "--dry-run", "--accept-partial", "--json");
        assertEquals(3, dry.code(), dry::toString);
        assertEquals(1, dry.json().get("created").asInt(), dry::toString);
        assertFalse(Files.exists(folder.resolve("fleet.mv.db")));
        Run refused = Run.in(folder, "import", "list.csv", "--register", "fleet");
        assertEquals(3, refused.code(), refused::toString);
        assertFalse(Files.exists(folder.resolve("fleet.mv.db")));
        Run partial = Run.in(folder, "import", "list.csv", "--register", "fleet", "--accept-partial");
        assertEquals(3, partial.code(), partial::toString);
        assertEquals(1, Run.in(folder, "check", "--register", "fleet", "--json").json().get("stations").asInt());
    }

    @Test
    void standardInputAndOutputServeWhereADashStands() throws IOException {
        byte[] list = "Site,Line,Tag,Country,Coil type\nDE7,L1,=G1-K1,DE,KM-24\n".getBytes(StandardCharsets.UTF_8);
        Run brought = Run.in(folder, list, "import", "-", "--register", "fleet");
        assertEquals(0, brought.code(), brought::toString);
        Run history = Run.in(folder, "history", "--register", "fleet", "--station=DE7/L1/=G1-K1", "--json");
        assertEquals(1, history.json().get("entries").size(), history::toString);
        Run audit = Run.in(folder, "audit", "--register", "fleet", "--out", "-");
        assertEquals(0, audit.code(), audit::toString);
        assertEquals("PK", new String(audit.outBytes(), 0, 2, StandardCharsets.US_ASCII));
        byte[] circuit = ("{\"driver\": {\"kind\": \"fixed-dc\", \"outputVoltageV\": 24, \"switchDropV\": 0, \"clampVoltageV\": 0.7},"
                + "\"coil\": {\"resistance20Ohm\": 30, \"inductanceMillihenry\": 20, \"temperatureC\": 20},"
                + "\"duty\": {\"cyclesPerSecond\": 5, \"onTimeMs\": 60}, \"cycles\": 1}").getBytes(StandardCharsets.UTF_8);
        Run csv = Run.in(folder, circuit, "waveform", "--case", "-", "--csv", "-");
        assertTrue(csv.out().startsWith("time_s,source_V,coil_A\r\n0.00000000,24.0000000,0.00000000\r\n"), csv::toString);
        Run json = Run.in(folder, circuit, "waveform", "--case", "-", "--png", "wave.png", "--json");
        assertEquals(0.8, json.json().get("steady").get("peakCurrentA").asDouble(), 1e-3, json::toString);
        assertTrue(Files.size(folder.resolve("wave.png")) > 1000);
    }

    @Test
    void helpNamesWhatThereIsAndNothingElse() {
        Run help = Run.in(folder, "--help");
        assertEquals(0, help.code());
        for (String command : List.of("demo", "import", "check", "audit", "waveform", "history")) {
            assertTrue(help.out().contains("  " + command), help::toString);
            assertEquals(0, Run.in(folder, command, "--help").code());
        }
        for (String later : List.of("destination", "replace", "backup", "restore")) {
            assertFalse(help.out().contains(later), help::toString);
        }
        assertEquals("Coilbook 0.0.0", Run.in(folder, "--version").out().strip());
    }
}
