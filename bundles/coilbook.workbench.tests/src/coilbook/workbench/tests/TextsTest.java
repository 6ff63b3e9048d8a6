package coilbook.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;

import coilbook.workbench.internal.Activator;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.stations.VerdictMark;
import coilbook.workbench.internal.text.Texts;

/** Every text that the code asks for is there, is a pattern that can be filled, and uses no word of a programmer's trade. */
class TextsTest {

    private static final Pattern ASKED = Pattern.compile("texts\\.get\\(\"([A-Za-z.]+)\"");
    private static final Pattern AREA = Pattern.compile("Texts\\.of\\(([A-Za-z]+)\\.class");
    private static final Pattern FORBIDDEN = Pattern.compile(
            "\\b(workspace|perspective|view part|plug-?in|bundle|refactor|exception|null|is safe)\\b",
            Pattern.CASE_INSENSITIVE);

    private static Path bundle() {
        String root = System.getProperty("coilbook.root");
        return Path.of(root == null ? "../.." : root).resolve("bundles/coilbook.workbench");
    }

    private static List<Path> files(String suffix) throws IOException {
        try (Stream<Path> all = Files.walk(bundle().resolve("src"))) {
            List<Path> found = all.filter(path -> path.toString().endsWith(suffix)).toList();
            assertFalse(found.isEmpty(), "no " + suffix + " below " + bundle());
            return found;
        }
    }

    private static Properties properties(Path file) throws IOException {
        Properties properties = new Properties();
        try (var in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
            properties.load(in);
        }
        return properties;
    }

    @Test
    void everyTextAskedForIsThere() throws IOException {
        List<String> missing = new ArrayList<>();
        int asked = 0;
        List<Path> sources = files(".java");
        for (Path source : sources) {
            String code = Files.readString(source);
            Properties texts = new Properties();
            Matcher area = AREA.matcher(code);
            while (area.find()) {
                String file = area.group(1) + ".java";
                for (Path other : sources) {
                    if (other.getFileName().toString().equals(file)) {
                        texts.putAll(properties(other.resolveSibling("texts.properties")));
                    }
                }
            }
            Matcher key = ASKED.matcher(code);
            while (key.find()) {
                asked++;
                if (!texts.containsKey(key.group(1)) && !key.group(1).endsWith(".") && !texts.isEmpty()) {
                    missing.add(source.getFileName() + " asks for " + key.group(1));
                }
            }
        }
        assertTrue(asked > 40, "only " + asked + " texts are asked for");
        assertEquals(List.of(), missing);
    }

    @Test
    void everyTextCanBeFilledAndSpeaksTheTradesLanguage() throws IOException {
        List<String> wrong = new ArrayList<>();
        int read = 0;
        for (Path file : files("texts.properties")) {
            for (var text : properties(file).entrySet()) {
                read++;
                String filled = new MessageFormat(text.getValue().toString(), Locale.ROOT).format(new Object[] { "A", "B", "C", "D", "E" });
                if (filled.isBlank() || FORBIDDEN.matcher(filled).find()) {
                    wrong.add(file.getParent().getFileName() + ": " + text);
                }
            }
        }
        assertTrue(read > 80, "only " + read + " texts");
        assertEquals(List.of(), wrong);
    }

    @Test
    void everyMarkAndCornerHasAWordInEveryLocale() {
        for (Locale locale : List.of(Locale.ROOT, Locale.GERMANY, Locale.JAPAN, new Locale("tr"))) {
            Texts texts = Texts.of(StationsPresenter.class, locale);
            for (VerdictMark mark : VerdictMark.values()) {
                assertFalse(texts.get(mark.key()).isBlank());
                assertFalse(mark.symbol().isBlank());
            }
        }
        for (Corner corner : Corner.values()) {
            assertTrue(Texts.of(coilbook.workbench.internal.waveform.WaveformPresenter.class).has("corner." + corner.name()));
        }
    }

    @Test
    void everyLabelOfTheWindowsModelIsThere() throws IOException {
        Properties labels = new Properties();
        try (InputStream in = Activator.class.getResourceAsStream("/OSGI-INF/l10n/bundle.properties")) {
            labels.load(new java.io.InputStreamReader(in, StandardCharsets.UTF_8));
        }
        Matcher key = Pattern.compile("\"%([a-z.]+)\"").matcher(Files.readString(bundle().resolve("Application.e4xmi")));
        int asked = 0;
        while (key.find()) {
            asked++;
            assertTrue(labels.containsKey(key.group(1)), key.group(1));
        }
        assertTrue(asked > 20, "only " + asked + " labels");
        assertFalse(
                Pattern.compile(" (label|commandName)=\"(?!%|Coilbook\")").matcher(Files.readString(bundle().resolve("Application.e4xmi")))
                        .find(),
                "a label that is no key");
    }
}
