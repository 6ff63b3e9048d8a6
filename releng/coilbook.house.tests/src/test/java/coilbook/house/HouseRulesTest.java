package coilbook.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Habits that no compiler checks: the size of source files, and the list of libraries with their licences. */
class HouseRulesTest {

    private static final Path ROOT = Path.of(System.getProperty("coilbook.root", "../.."));
    private static final int LONGEST_SOURCE = 400;

    @Test
    void noSourceFileIsTooLongToRead() throws IOException {
        List<String> found = new ArrayList<>();
        int looked = 0;
        for (BundleFolder bundle : BundleFolder.all(ROOT)) {
            for (Path source : bundle.sources()) {
                looked++;
                long lines = Files.readString(source).lines().count();
                if (lines > LONGEST_SOURCE) {
                    found.add(source.getFileName() + " has " + lines + " lines");
                }
            }
        }
        assertEquals(List.of(), found);
        assertTrue(looked > 100, "only " + looked + " sources were looked at");
    }

    @Test
    void everyLibraryOfTheProductStandsInTheListOfLicences() throws IOException {
        List<String> listed = new ArrayList<>();
        Matcher rows = Pattern.compile("(?m)^\\| (`[^|]*)\\|[^|]*\\|[^|]*\\|$").matcher(Files.readString(ROOT.resolve("DEVELOPERS.md")));
        while (rows.find()) {
            Matcher names = Pattern.compile("`([^`]+)`").matcher(rows.group(1));
            while (names.find()) {
                listed.add(names.group(1));
            }
        }
        List<String> shipped = shipped();
        assertTrue(shipped.size() > 50, "only " + shipped.size() + " bundles were found in the product");
        assertEquals(List.of(), shipped.stream().filter(name -> listed.stream().noneMatch(name::startsWith)).toList());
    }

    private static List<String> shipped() throws IOException {
        try (Stream<Path> files = Files.walk(ROOT.resolve("releng/coilbook.product/target/products"))) {
            return files.filter(f -> f.toString().endsWith(".jar") && f.getParent().endsWith("plugins"))
                    .map(f -> f.getFileName().toString()).filter(name -> !name.startsWith("coilbook.")).distinct().sorted().toList();
        }
    }
}
