package coilbook.console.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;

import coilbook.fleet.CoilbookException;

/** The file that says heading → field where a heading is not recognised: one JSON object of texts. */
public final class ColumnMap {

    private static final String EXPECTED = "expected one JSON object such as {\"Our heading\": \"coil_type.resistance20\"}";

    private ColumnMap() {
    }

    public static Map<String, String> read(Path file) throws CoilbookException {
        if (!Files.exists(file)) {
            throw bad(file + ": there is no such file.");
        } else if (Files.isDirectory(file)) {
            throw bad(file + ": this is a folder; " + EXPECTED + ".");
        }
        try {
            JsonNode node = new ObjectMapper().readTree(Files.readAllBytes(file));
            if (node == null || !node.isObject()) {
                throw bad(file + ": " + EXPECTED + ".");
            }
            Map<String, String> map = new LinkedHashMap<>();
            Iterator<Map.Entry<String, JsonNode>> entries = node.fields();
            while (entries.hasNext()) {
                Map.Entry<String, JsonNode> entry = entries.next();
                if (!entry.getValue().isTextual()) {
                    throw bad(file + ", key " + entry.getKey() + ", value " + entry.getValue() + ": expected the name of a field.");
                }
                map.put(entry.getKey(), entry.getValue().textValue());
            }
            return map;
        } catch (JsonProcessingException e) {
            throw bad(file + ", line " + (e.getLocation() == null ? 1 : e.getLocation().getLineNr()) + ": " + EXPECTED + ".");
        } catch (IOException e) {
            throw bad(file + ": the file cannot be read.");
        }
    }

    private static CoilbookException bad(String message) {
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, message);
    }
}
