package coilbook.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The manifests and the sources keep the floors, and the check sees a violation where one is planted. */
class FloorsTest {

    private static final Path ROOT = Path.of(System.getProperty("coilbook.root", "../.."));

    @TempDir
    private Path planted;

    @Test
    void manifestsKeepTheFloors() throws IOException {
        List<String> found = new ArrayList<>();
        List<BundleFolder> bundles = BundleFolder.all(ROOT);
        for (BundleFolder bundle : bundles) {
            found.addAll(Floors.violations(bundle.name(), bundle.needed()));
        }
        assertEquals(List.of(), found);
        assertTrue(bundles.size() >= 10, "only " + bundles.size() + " bundles were looked at");
    }

    @Test
    void sourcesKeepTheFloors() throws IOException {
        List<String> found = new ArrayList<>();
        for (BundleFolder bundle : BundleFolder.all(ROOT)) {
            found.addAll(Floors.violations(bundle.name(), bundle.usedInSources()));
        }
        assertEquals(List.of(), found);
    }

    @Test
    void onlyTheApiIsOpenToAll() throws IOException {
        List<String> found = new ArrayList<>();
        for (BundleFolder bundle : BundleFolder.all(ROOT)) {
            found.addAll(openInternals(bundle));
        }
        assertEquals(List.of(), found);
    }

    @ParameterizedTest
    @CsvSource({ "coilbook.fleet, Require-Bundle, coilbook.electrics", "coilbook.electrics, Require-Bundle, coilbook.register",
            "coilbook.fleet, Import-Package, org.jooq", "coilbook.register, Require-Bundle, org.eclipse.swt",
            "coilbook.charts, Require-Bundle, coilbook.register", "coilbook.console, Require-Bundle, coilbook.workbench",
            "coilbook.jobs, Import-Package, org.h2.jdbcx", "coilbook.console, Import-Package, org.apache.poi.xssf.usermodel",
            "coilbook.console, Require-Bundle, org.eclipse.jface", "coilbook.exchange, Require-Bundle, org.eclipse.core.runtime",
            "coilbook.jobs, Import-Package, coilbook.register.internal", "coilbook.workbench, Import-Package, org.eclipse.swt.internal.gtk",
            "coilbook.attic, Require-Bundle, coilbook.fleet", "coilbook.jobs, Require-Bundle, coilbook.attic" })
    void aPlantedManifestIsCaught(String bundle, String header, String needed) throws IOException {
        BundleFolder folder = plant(bundle, header + ": java.util.function," + needed + ";version=\"[1,2)\"");
        assertFalse(Floors.violations(folder.name(), folder.needed()).isEmpty(), () -> folder.needed().toString());
    }

    @ParameterizedTest
    @CsvSource({ "coilbook.jobs, 'import java.sql.Connection;'", "coilbook.exchange, 'import static org.h2.engine.Constants.X;'",
            "coilbook.jobs, 'class A { java.sql.Connection c; }'", "coilbook.criteria, 'import java.awt.Color;'",
            "coilbook.electrics, 'import coilbook.criteria.Finding;'", "coilbook.console, 'import coilbook.jobs.internal.A;'",
            "coilbook.console, 'import org.eclipse.swt.SWT;'", "coilbook.register, 'import org.apache.poi.ss.usermodel.Cell;'" })
    void aPlantedSourceIsCaught(String bundle, String source) throws IOException {
        BundleFolder folder = plant(bundle, "Bundle-Name: planted");
        Files.writeString(planted.resolve("src/A.java"), "package x;\n/* import java.sql.Driver; */\n" + source + "\n");
        assertFalse(Floors.violations(folder.name(), folder.usedInSources()).isEmpty(), source);
    }

    @Test
    void aPlantedOpenPackageIsCaught() throws IOException {
        assertEquals(1, openInternals(plant("coilbook.fleet", "Export-Package: coilbook.fleet,coilbook.fleet.internal")).size());
        assertEquals(1, openInternals(plant("coilbook.fleet",
                "Export-Package: coilbook.fleet.internal;x-friends:=\"coilbook.fleet.tests,coilbook.jobs\"")).size());
        assertEquals(0,
                openInternals(plant("coilbook.fleet", "Export-Package: coilbook.fleet.internal;x-friends:=\"coilbook.fleet.tests\""))
                        .size());
    }

    private static List<String> openInternals(BundleFolder bundle) {
        String friends = "x-friends:=\"" + bundle.name() + ".tests\"";
        return bundle.offered().stream().filter(e -> e.split(";")[0].contains(".internal") && !e.replace(" ", "").contains(friends))
                .map(e -> bundle.name() + " opens " + e).toList();
    }

    private BundleFolder plant(String bundle, String line) throws IOException {
        Files.createDirectories(planted.resolve("META-INF"));
        Files.createDirectories(planted.resolve("src"));
        Files.writeString(planted.resolve("META-INF/MANIFEST.MF"),
                "Manifest-Version: 1.0\nBundle-SymbolicName: " + bundle + ";singleton:=true\n" + folded(line) + "\n");
        return new BundleFolder(planted);
    }

    /** A manifest line holds 72 bytes; longer ones go on after a space. */
    private static String folded(String line) {
        return line.replaceAll("(.{70})", "$1\n ");
    }
}
