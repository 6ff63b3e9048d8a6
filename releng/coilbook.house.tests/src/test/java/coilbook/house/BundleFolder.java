package coilbook.house;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** A bundle as it lies in the checkout: its manifest and its sources, read as text. */
record BundleFolder(Path folder) {

    private static final Pattern IMPORT = Pattern.compile("(?m)^import\\s+(?:static\\s+)?([\\w.]+)");
    private static final Pattern QUALIFIED = Pattern
            .compile("(?<![\\w.\"])((?:java\\.sql|javax\\.sql|java\\.awt|org\\.[a-z]\\w*|com\\.[a-z]\\w*|coilbook)\\.\\w[\\w.]*)");
    private static final Pattern COMMENT_OR_TEXT = Pattern.compile("(?s)/\\*.*?\\*/|//[^\\n]*|\"\"\".*?\"\"\"|\"(?:\\\\.|[^\"\\\\\\n])*\"");

    /** All bundles of the checkout but the test modules. */
    static List<BundleFolder> all(Path root) throws IOException {
        try (Stream<Path> folders = Files.list(root.resolve("bundles"))) {
            return folders.filter(f -> !f.toString().endsWith(".tests") && Files.exists(f.resolve("META-INF/MANIFEST.MF"))).sorted()
                    .map(BundleFolder::new).toList();
        }
    }

    String name() {
        return names("Bundle-SymbolicName").get(0);
    }

    /** Every bundle and package the manifest names as needed. */
    Set<String> needed() {
        Set<String> needed = new TreeSet<>(names("Require-Bundle"));
        needed.addAll(names("Import-Package"));
        return needed;
    }

    /** Packages offered, each with its directives as written. */
    List<String> offered() {
        return clauses("Export-Package");
    }

    /** Every package or type the sources name, by import or in full. */
    Set<String> usedInSources() throws IOException {
        Set<String> used = new TreeSet<>();
        for (Path source : sources()) {
            String text = COMMENT_OR_TEXT.matcher(Files.readString(source)).replaceAll("\"\"");
            collect(IMPORT.matcher(text), used);
            collect(QUALIFIED.matcher(text.replaceAll("(?m)^(import|package)\\s[^;]*;", "")), used);
        }
        return used;
    }

    List<Path> sources() throws IOException {
        try (Stream<Path> files = Files.walk(folder.resolve("src"))) {
            return files.filter(f -> f.toString().endsWith(".java")).sorted().toList();
        }
    }

    private static void collect(Matcher matcher, Set<String> into) {
        while (matcher.find()) {
            into.add(matcher.group(1));
        }
    }

    private List<String> names(String header) {
        return clauses(header).stream().map(clause -> clause.split(";")[0].trim()).toList();
    }

    private List<String> clauses(String header) {
        try (InputStream in = Files.newInputStream(folder.resolve("META-INF/MANIFEST.MF"))) {
            Attributes attributes = new Manifest(in).getMainAttributes();
            String value = attributes.getValue(header);
            List<String> clauses = new ArrayList<>();
            if (value != null) {
                // Commas between quotes belong to version ranges and lists of friends.
                for (String clause : value.split(",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)")) {
                    clauses.add(clause.trim());
                }
            }
            return clauses;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
