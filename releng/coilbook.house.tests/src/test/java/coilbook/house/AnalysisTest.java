package coilbook.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import edu.umd.cs.findbugs.BugCollectionBugReporter;
import edu.umd.cs.findbugs.BugInstance;
import edu.umd.cs.findbugs.DetectorFactoryCollection;
import edu.umd.cs.findbugs.FindBugs2;
import edu.umd.cs.findbugs.Priorities;
import edu.umd.cs.findbugs.Project;
import edu.umd.cs.findbugs.config.UserPreferences;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The static analyser (SpotBugs) over all our bundles in one run. What it may overlook stands, each with its reason, in
 * {@code releng/analysis/exclude.xml}.
 */
class AnalysisTest {

    private static final Path ROOT = Path.of(System.getProperty("coilbook.root", "../..")).toAbsolutePath().normalize();

    @TempDir
    private Path planted;

    @Test
    void nothingIsFoundInOurCode() throws Exception {
        List<Path> classes = new ArrayList<>();
        for (BundleFolder bundle : BundleFolder.all(ROOT)) {
            Path output = bundle.folder().resolve("target/classes");
            if (Files.isDirectory(output)) {
                classes.add(output);
            }
        }
        assertTrue(classes.size() >= 10, "compiled bundles: " + classes);
        BugCollectionBugReporter reporter = analyse(classes);
        int seen = reporter.getProjectStats().getNumClasses();
        assertTrue(seen > 100, "only " + seen + " classes were looked at");
        assertEquals("", told(reporter));
    }

    /** The analyser looks, rather than passing by finding nothing: a class with a known fault is found. */
    @Test
    void aPlantedFaultIsFound() throws Exception {
        Path target = Files.createDirectories(planted.resolve("coilbook/house"));
        String file = PlantedFault.class.getSimpleName() + ".class";
        try (var in = PlantedFault.class.getResourceAsStream(file)) {
            Files.copy(in, target.resolve(file));
        }
        String told = told(analyse(List.of(planted)));
        assertFalse(told.isEmpty());
        assertTrue(told.contains("NP_ALWAYS_NULL"), told);
    }

    private static BugCollectionBugReporter analyse(List<Path> classes) throws Exception {
        try (Project project = new Project(); FindBugs2 engine = new FindBugs2()) {
            classes.forEach(c -> project.addFile(c.toString()));
            platformJars().forEach(jar -> project.addAuxClasspathEntry(jar.toString()));
            BugCollectionBugReporter reporter = new BugCollectionBugReporter(project);
            reporter.setPriorityThreshold(Priorities.NORMAL_PRIORITY);
            engine.setProject(project);
            engine.setBugReporter(reporter);
            engine.setDetectorFactoryCollection(DetectorFactoryCollection.instance());
            engine.setUserPreferences(UserPreferences.createDefaultUserPreferences());
            engine.addFilter(ROOT.resolve("releng/analysis/exclude.xml").toString(), false);
            engine.execute();
            return reporter;
        }
    }

    /** The libraries our classes refer to, as they stand in the product. */
    private static List<Path> platformJars() throws IOException {
        Path products = ROOT.resolve("releng/coilbook.product/target/products");
        if (!Files.isDirectory(products)) {
            return List.of();
        }
        try (Stream<Path> files = Files.walk(products)) {
            return files.filter(f -> f.toString().endsWith(".jar") && f.getParent().endsWith("plugins"))
                    .filter(f -> !f.getFileName().toString().startsWith("coilbook.")).toList();
        }
    }

    private static String told(BugCollectionBugReporter reporter) {
        StringBuilder text = new StringBuilder();
        for (BugInstance bug : reporter.getBugCollection()) {
            text.append('\n').append(bug.getType()).append(": ").append(bug.getMessageWithoutPrefix()).append(" at ")
                    .append(bug.getPrimarySourceLineAnnotation());
        }
        return text.toString();
    }
}
