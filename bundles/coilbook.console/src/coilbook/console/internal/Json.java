package coilbook.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.util.Map;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;

import coilbook.fleet.CoilbookException;

/** Writes one JSON object, its keys in the order they are given, lines ended the same way on every system. */
public final class Json {

    /** What stands in the object. */
    @FunctionalInterface
    public interface Body {
        void write(JsonGenerator generator) throws IOException, CoilbookException;
    }

    private Json() {
    }

    public static void write(PrintStream out, Body body) throws CoilbookException {
        DefaultIndenter lines = new DefaultIndenter("  ", "\n");
        DefaultPrettyPrinter pretty = new DefaultPrettyPrinter().withObjectIndenter(lines).withArrayIndenter(lines);
        try {
            JsonGenerator generator = new JsonFactory().createGenerator(out);
            generator.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
            generator.setPrettyPrinter(pretty);
            generator.writeStartObject();
            body.write(generator);
            generator.writeEndObject();
            generator.close();
            out.print("\n");
            out.flush();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** A value that is there already as a tree. */
    public static void tree(JsonGenerator generator, JsonNode node) throws IOException {
        if (node.isObject()) {
            generator.writeStartObject();
            for (Map.Entry<String, JsonNode> entry : node.properties()) {
                generator.writeFieldName(entry.getKey());
                tree(generator, entry.getValue());
            }
            generator.writeEndObject();
        } else if (node.isArray()) {
            generator.writeStartArray();
            for (JsonNode element : node) {
                tree(generator, element);
            }
            generator.writeEndArray();
        } else if (node.isIntegralNumber()) {
            generator.writeNumber(node.longValue());
        } else if (node.isNumber()) {
            generator.writeNumber(node.doubleValue());
        } else if (node.isNull()) {
            generator.writeNull();
        } else {
            generator.writeString(node.asText());
        }
    }

    /** A number, or null where there is none. */
    public static void number(JsonGenerator generator, String key, double value) throws IOException {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            generator.writeNullField(key);
        } else {
            generator.writeNumberField(key, value);
        }
    }

    /** A text, or null where it is empty. */
    public static void text(JsonGenerator generator, String key, String value) throws IOException {
        if (value == null || value.isEmpty()) {
            generator.writeNullField(key);
        } else {
            generator.writeStringField(key, value);
        }
    }
}
