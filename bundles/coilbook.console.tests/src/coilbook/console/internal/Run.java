package coilbook.console.internal;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;

import coilbook.jobs.RegisterPlace;

/** One run of the command line within the test: what came out and how it ended. */
record Run(int code, byte[] outBytes, String err) {

    /** A command line in a folder; nothing outside the folder is touched. */
    static Run in(Path folder, String... arguments) {
        return in(folder, new byte[0], arguments);
    }

    static Run in(Path folder, byte[] input, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        RegisterPlace place = new RegisterPlace(Map.of("XDG_DATA_HOME", folder.resolve("data").toString()), folder.resolve("home"),
                "Linux");
        Terminal terminal = new Terminal(new ByteArrayInputStream(input), new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8), false, "tester", place, folder);
        int code = new Console(RuntimeServices.services(), terminal, "0.0.0").run(arguments);
        return new Run(code, out.toByteArray(), err.toString(StandardCharsets.UTF_8));
    }

    String out() {
        return new String(outBytes, StandardCharsets.UTF_8);
    }

    /** What was put out, as one JSON object. */
    JsonNode json() {
        try {
            return new ObjectMapper().readTree(outBytes);
        } catch (IOException e) {
            throw new UncheckedIOException(out() + err, e);
        }
    }

    /** The folder with the demonstration files. */
    static Path demoData() {
        return Path.of(System.getProperty("coilbook.root")).resolve("demo-data");
    }

    @Override
    public String toString() {
        return "exit " + code + "\n--- out\n" + (outBytes.length > 4000 ? outBytes.length + " bytes" : out()) + "\n--- err\n" + err;
    }
}
