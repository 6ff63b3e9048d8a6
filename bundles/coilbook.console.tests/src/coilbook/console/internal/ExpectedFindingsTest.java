package coilbook.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import com.fasterxml.jackson.databind.JsonNode;

/** The demonstration files against what was worked out by hand for them. */
class ExpectedFindingsTest {

    @TempDir
    private Path folder;

    private static TreeSet<String> found(JsonNode check) {
        TreeSet<String> found = new TreeSet<>();
        for (JsonNode finding : check.get("findings")) {
            found.add(finding.get("station").asText() + " | " + finding.get("criterion").asText() + " | " + finding.get("verdict").asText()
                    + " | "
                    + finding.get("hazard").asBoolean());
        }
        return found;
    }

    /** Written by hand for the demonstration files; the notes in the file say how each was worked out. */
    private static TreeSet<String> expected() throws IOException {
        TreeSet<String> expected = new TreeSet<>();
        List<String> lines = Files.readAllLines(Run.demoData().resolve("expected-findings.csv"), StandardCharsets.UTF_8);
        for (String line : lines.subList(1, lines.size())) {
            if (!line.isBlank() && !line.startsWith("#")) {
                String[] cells = line.split(",", 5);
                expected.add(cells[0].replace("\"", "") + " | " + cells[1] + " | " + cells[2] + " | " + cells[3].equals("yes"));
            }
        }
        assertFalse(expected.isEmpty(), "nothing is expected");
        return expected;
    }

    @Test
    void theDemonstrationFilesShowWhatWasWorkedOutByHand() throws IOException {
        Run brought = Run.in(folder, ThreadTest.files("import", "--register", "fleet", "--json"));
        assertEquals(0, brought.code(), brought::toString);
        Run check = Run.in(folder, "check", "--register", "fleet", "--json");
        assertEquals(0, check.code(), check::toString);
        TreeSet<String> unexpected = found(check.json());
        unexpected.removeAll(expected());
        TreeSet<String> missed = expected();
        missed.removeAll(found(check.json()));
        assertTrue(unexpected.isEmpty() && missed.isEmpty(), () -> "found but not expected:\n" + String.join("\n", unexpected)
                + "\nexpected but not found:\n" + String.join("\n", missed));
    }
}
