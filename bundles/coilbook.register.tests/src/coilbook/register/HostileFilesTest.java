package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.stream.Stream;

import org.h2.jdbcx.JdbcConnectionPool;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Customer;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.register.internal.file.FileInspection;

/** Files that are no register of ours, or more than that, are refused with words and never act. */
class HostileFilesTest {

    @TempDir
    Path folder;
    private Path base;
    private ClassLoader usual;

    /** The database looks for the code of a file in the thread's class loader: the planted code is there to be found. */
    @BeforeEach
    void showPlantedCode() {
        usual = Thread.currentThread().getContextClassLoader();
        Thread.currentThread().setContextClassLoader(MarkerTrigger.class.getClassLoader());
    }

    @AfterEach
    void hidePlantedCode() {
        Thread.currentThread().setContextClassLoader(usual);
        System.clearProperty(MarkerTrigger.WHERE);
    }

    @BeforeEach
    void makeRegister() throws Exception {
        base = folder.resolve("r");
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(1)), Progress.NONE);
        }
        FleetFixture.registers().open(base, OpenMode.EXISTING).close();
    }

    private Path data() {
        return folder.resolve("r.mv.db");
    }

    /** Runs statements in the file as its own program would, with every right. */
    private void alter(String... statements) throws SQLException {
        JdbcConnectionPool pool = JdbcConnectionPool.create("jdbc:h2:file:" + base + ";DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0",
                "coilbook", "");
        try (Connection connection = pool.getConnection(); Statement statement = connection.createStatement()) {
            for (String sql : statements) {
                statement.execute(sql);
            }
        }
        pool.dispose();
    }

    private CoilbookException refused() {
        CoilbookException refused = assertThrows(CoilbookException.class,
                () -> FleetFixture.registers().open(base, OpenMode.EXISTING).close());
        assertEquals(Reason.REGISTER, refused.reason());
        assertFalse(refused.getMessage().contains("Exception") || refused.getMessage().contains("org.h2"), refused.getMessage());
        assertFalse(Files.exists(folder.resolve("r.lock-info")), "no note is left");
        return refused;
    }

    private static void says(CoilbookException refused, String... words) {
        for (String word : words) {
            assertTrue(refused.getMessage().contains(word), refused.getMessage() + " should say " + word);
        }
    }

    /** Puts a trigger into a file and checks that connecting to it, and nothing more, runs it. */
    private Path plantTrigger(String table) throws Exception {
        Path marker = folder.resolve("trigger-ran");
        System.setProperty(MarkerTrigger.WHERE, marker.toString());
        alter("create trigger t before insert on " + table + " for each row call '" + MarkerTrigger.class.getName() + "'");
        Files.delete(marker);
        alter("select 1");
        assertTrue(Files.exists(marker), "connecting alone runs it");
        Files.delete(marker);
        return marker;
    }

    @Test
    void aTriggerIsRefusedBeforeItRuns() throws Exception {
        Path marker = plantTrigger("customer");
        says(refused(), "a trigger", "run code");
        assertFalse(Files.exists(marker), "it never ran");
    }

    @Test
    void aTriggerInTheViewOnlyCostsTheView() throws Exception {
        Path register = base;
        base = folder.resolve("r.view");
        Path marker = plantTrigger("status");
        base = register;
        try (Register opened = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            assertEquals(1, opened.head());
        }
        assertFalse(Files.exists(marker), "it never ran");
    }

    @ParameterizedTest
    @ValueSource(strings = { "create alias f as 'int f() { return 1; }'", "create alias f for 'java.lang.Math.sqrt'",
            "create linked table l('org.h2.Driver', 'jdbc:h2:mem:x', 'sa', '', '(select 1)')", "create view v as select * from customer",
            "create constant k value 1", "create domain d as integer check (value > 0)", "create schema other",
            "create table x (a integer default rand())", "create table x (a integer check (a > 0))",
            "create table x (a integer, b integer generated always as (a + 1))",
            "create sequence s", "create user u password 'x'", "create role r", "create synonym y for customer",
            "comment on table customer is 'x'",
            "create memory table m (a integer)", "create local temporary table x2 (a integer); create table \"a b\" (a integer)",
            "set ignorecase true" })
    void anythingBesidesPlainTablesIsRefused(String statement) throws Exception {
        alter(statement);
        says(refused(), "is not opened");
    }

    @Test
    void aDatabaseOfAnotherProgramIsRefused() throws Exception {
        Files.delete(data());
        alter("create table x (a integer)");
        says(refused(), "another program");
    }

    @Test
    void aNewerSchemaIsRefused() throws Exception {
        alter("update coilbook_register set schema_version = 99");
        says(refused(), "newer version", "99");
    }

    @Test
    void otherFilesAreRefused() throws Exception {
        Files.writeString(data(), "Customer;Site\nACME;Paris\n".repeat(1000));
        says(refused(), "no register");
        Files.writeString(data(), "");
        says(refused(), "empty");
        Files.write(data(), new byte[100_000]);
        says(refused(), "no register");
        Files.delete(data());
        Files.createDirectory(data());
        says(refused(), "folder");
    }

    @Test
    void aFileCutShortIsRefused() throws Exception {
        byte[] whole = Files.readAllBytes(data());
        for (int percent : new int[] { 99, 90, 50, 20, 5 }) {
            Files.write(data(), java.util.Arrays.copyOf(whole, (int) (whole.length / 100L * percent)));
            says(refused(), "damaged");
        }
        Files.write(data(), whole);
        FleetFixture.registers().open(base, OpenMode.EXISTING).close();
    }

    @Test
    void aFileOverwrittenInTheMiddleIsNotTakenForWhole() throws Exception {
        long length = Files.size(data());
        try (RandomAccessFile file = new RandomAccessFile(data().toFile(), "rw")) {
            for (long at = 3 * 4096; at < length - 4096; at += 64) {
                file.seek(at);
                file.write("damage".getBytes(java.nio.charset.StandardCharsets.US_ASCII));
            }
        }
        says(refused(), "damaged");
    }

    @Test
    void aMissingRegisterIsRefusedAndNothingIsMade() throws Exception {
        base = folder.resolve("deep/er/none");
        says(refused(), "There is no register");
        assertFalse(Files.exists(folder.resolve("deep")));
    }

    @Test
    void anExistingOneIsNotReplaced() {
        CoilbookException refused = assertThrows(CoilbookException.class, () -> FleetFixture.registers().open(base, OpenMode.CREATE_NEW));
        assertEquals(Reason.BAD_INPUT, refused.reason());
    }

    @Test
    void foldersAreMadeAndStrangeNamesAreSafe() throws Exception {
        for (String name : List.of("a b/c'd\"e", "~/x", "mem:x", "per%20cent!/zip:y", "ünï/çødé", "$(x) {y}", "file.mv.db")) {
            Path strange = folder.resolve("strange").resolve(name);
            FleetFixture.registers().open(strange, OpenMode.CREATE_IF_MISSING).close();
            String file = strange.toString().endsWith(".mv.db") ? strange.toString() : strange + ".mv.db";
            assertTrue(Files.exists(Path.of(file)), file);
            FleetFixture.registers().open(strange, OpenMode.EXISTING).close();
        }
        Path bad = folder.resolve("x;INIT=create table hacked(a int)");
        CoilbookException refused = assertThrows(CoilbookException.class,
                () -> FleetFixture.registers().open(bad, OpenMode.CREATE_IF_MISSING));
        says(refused, "semicolon");
        CoilbookException isFolder = assertThrows(CoilbookException.class,
                () -> FleetFixture.registers().open(folder, OpenMode.CREATE_IF_MISSING));
        says(isFolder, "folder");
        try (Stream<Path> files = Files.list(folder)) {
            assertTrue(files.map(Path::toString).noneMatch(file -> file.contains("INIT") || file.contains(".new-")));
        }
    }

    @Test
    void aRegisterInUseSaysByWhom() throws Exception {
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            CoilbookException again = assertThrows(CoilbookException.class, () -> FleetFixture.registers().open(base, OpenMode.EXISTING));
            says(again, "in use", "process " + ProcessHandle.current().pid(), System.getProperty("user.name"));
            assertEquals(1, register.head(), "the first goes on");
        }
        FleetFixture.registers().open(base, OpenMode.EXISTING).close();
    }

    /** A process killed deep in a long change leaves a log of many pages over many tables; that is no damage, and nothing of the change stays. */
    @Test
    void aLongUnfinishedChangeIsTakenBack() throws Exception {
        JdbcConnectionPool pool = JdbcConnectionPool.create("jdbc:h2:file:" + base + ";DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0",
                "coilbook", "");
        try (Connection connection = pool.getConnection(); Statement statement = connection.createStatement()) {
            connection.setAutoCommit(false);
            for (int round = 0; round < 3; round++) {
                int first = 1_000_000 + round * 20_000;
                statement.execute("insert into customer (row_id, version_id, row_key, code, seq_from) select x, x, 'U' || x, 'U' || x, 99"
                        + " from system_range(" + first + ", " + (first + 19_999) + ")");
                if (round == 1) {
                    statement.execute("update line set seq_to = 99");
                    statement.execute("update site set seq_to = 99");
                }
                statement.execute("checkpoint sync");
            }
            Files.copy(data(), folder.resolve("as-killed"));
            connection.rollback();
        }
        pool.dispose();
        Files.move(folder.resolve("as-killed"), data(), StandardCopyOption.REPLACE_EXISTING);
        FileInspection.check(data(), "COILBOOK_REGISTER");
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            int[] customers = new int[1];
            register.read(Kind.of(Customer.class), customer -> {
                assertFalse(customer.code().startsWith("U"), customer.code());
                customers[0]++;
            });
            assertTrue(customers[0] > 0, "what was acknowledged is there");
        }
    }
}
