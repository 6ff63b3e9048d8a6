package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/** What another process or another user makes of a register. */
class OtherProcessTest {

    @TempDir
    Path folder;

    /** Opens a register, says so, and waits to be ended. */
    static final class Holder {

        private Holder() {
        }

        public static void main(String[] arguments) throws Exception {
            try (Register register = FleetFixture.registers().open(Path.of(arguments[0]), OpenMode.CREATE_IF_MISSING)) {
                System.out.println("open " + ProcessHandle.current().pid());
                Thread.sleep(TimeUnit.MINUTES.toMillis(2));
            } catch (CoilbookException e) {
                System.out.println(e.reason() + ": " + e.getMessage());
            }
        }
    }

    @Test
    void aRegisterInUseElsewhereIsRefusedSayingByWhom() throws Exception {
        Path base = folder.resolve("r");
        ChildProcess holder = ChildProcess.start(Holder.class, base.toString());
        try {
            String opened = holder.line();
            assertTrue(opened.startsWith("open "), opened);
            CoilbookException refused = assertThrows(CoilbookException.class, () -> FleetFixture.registers().open(base, OpenMode.EXISTING));
            assertEquals(Reason.REGISTER, refused.reason());
            assertTrue(refused.getMessage().contains("in use") && refused.getMessage().contains("process " + opened.substring(5)),
                    refused.getMessage());
        } finally {
            holder.kill();
        }
        FleetFixture.registers().open(base, OpenMode.EXISTING).close();
        assertFalse(Files.exists(folder.resolve("r.lock-info")), "the note of the killed process is gone too");
    }

    @Test
    void aFolderThatMayNotBeWrittenIsSaid() throws Exception {
        Path locked = Files.createDirectory(folder.resolve("locked"));
        FleetFixture.registers().open(locked.resolve("old"), OpenMode.CREATE_NEW).close();
        Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("rwxr-xr-x"));
        Files.setPosixFilePermissions(locked, PosixFilePermissions.fromString("r-xr-xr-x"));
        for (String name : List.of("new", "deeper/new", "old")) {
            ChildProcess other = ChildProcess.start(asOrdinaryUser(), Holder.class, locked.resolve(name).toString());
            String said = other.line();
            other.kill();
            Assumptions.assumeTrue(said != null && !said.contains("AccessDenied") && !said.contains("Could not find"),
                    "an ordinary user may not read the classes here: " + said);
            assertTrue(said.startsWith("REGISTER: ") && said.contains("may not be written"), said);
        }
        try (Stream<Path> files = Files.list(locked)) {
            assertEquals(List.of("old.mv.db", "old.view.mv.db"), files.map(file -> file.getFileName().toString()).sorted().toList());
        }
    }

    /** Whatever root may not do shows nothing, so its rights are dropped. */
    private static List<String> asOrdinaryUser() {
        if (!System.getProperty("user.name").equals("root")) {
            return List.of();
        }
        Assumptions.assumeTrue(Files.isExecutable(Path.of("/usr/bin/setpriv")), "run as root, and setpriv is not there to drop its rights");
        return List.of("/usr/bin/setpriv", "--reuid=65534", "--regid=65534", "--clear-groups");
    }
}
