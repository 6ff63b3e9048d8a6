package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.util.List;

import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.JournalCheck;

/** When nothing more can be written, a person is told so and what was recorded before is there. A limit on the size of files stands for the full disk. */
class FullDiskTest {

    private static final Path LIMITER = Path.of("/usr/bin/prlimit");
    private static final int LIMIT_BYTES = 3_000_000;

    @TempDir
    Path folder;

    /** Records stations until it is refused. */
    static final class Filler {

        private Filler() {
        }

        public static void main(String[] arguments) throws Exception {
            long acknowledged = 1;
            try (Register register = FleetFixture.registers().open(Path.of(arguments[0]), OpenMode.EXISTING)) {
                for (int from = 0;; from += 1000) {
                    acknowledged = register.apply(FleetFixture.inserting(FleetFixture.stations(from, from + 1000)), Progress.NONE);
                }
            } catch (CoilbookException e) {
                System.out.println(acknowledged + " " + e.reason() + " " + e.getMessage());
            }
        }
    }

    @Test
    void aFullDiskIsSaidAndTheRegisterStaysWhole() throws Exception {
        Assumptions.assumeTrue(Files.isExecutable(LIMITER), "there is no prlimit to limit the size of files with");
        Path base = folder.resolve("r");
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(100)), Progress.NONE);
        }
        ChildProcess filler = ChildProcess.start(List.of(LIMITER.toString(), "--fsize=" + LIMIT_BYTES), Filler.class, base.toString());
        String said = filler.rest().strip();
        assertTrue(said.contains("REGISTER") && said.contains("disk is full"), said);
        long acknowledged = Long.parseLong(said.split(" ")[0]);
        assertTrue(acknowledged > 1, said);
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            assertEquals(acknowledged, register.head());
            assertEquals(1000 * 8 + 20, register.change(acknowledged).rows().size());
            register.apply(FleetFixture.inserting(FleetFixture.stations(99_000, 99_100)), Progress.NONE);
        }
        try (Database database = Database.open(base.toString(), false); Connection connection = database.connection()) {
            assertEquals(0, new JournalCheck(new Codecs()).firstBroken(connection));
        }
    }
}
