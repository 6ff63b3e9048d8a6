package coilbook.exchange.tests.out;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.exchange.internal.in.FleetFilesReader;
import coilbook.exchange.internal.out.AuditWriter;
import coilbook.exchange.internal.out.ExchangeWriter;
import coilbook.fleet.Field;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.register.FleetScope;

/** What is written is read back as it was: every value of every row, formula-like tags, wildcards and odd decimals included. */
class RoundTripTest {

    private static final Clock TODAY = Clock.fixed(FleetFixture.DAY.atTime(9, 30).toInstant(ZoneOffset.UTC), ZoneOffset.UTC);

    @TempDir
    Path folder;

    private FleetFixture fleet;

    @Test
    void anAuditWorkbookSaysOfEveryRowWhatTheRegisterHolds() throws Exception {
        fleet = FleetFixture.small();
        Path file = folder.resolve("audit.xlsx");
        new AuditWriter(TODAY).write(new FixtureRegister(fleet), FleetScope.all(), FleetFixture.DAY, file, Progress.NONE);
        Incoming incoming = read(file);
        assertFalse(incoming.partial());
        assertFalse(incoming.pastDate());
        assertSameRows(incoming);
    }

    @Test
    void aPlainExchangeWorkbookDoesToo() throws Exception {
        fleet = FleetFixture.small();
        Path file = folder.resolve("fleet.xlsx");
        new ExchangeWriter().write(new FixtureRegister(fleet), FleetFixture.DAY, file, Progress.NONE);
        assertSameRows(read(file));
    }

    @Test
    void aPartSaysThatItIsOne() throws Exception {
        fleet = FleetFixture.small();
        Path file = folder.resolve("part.xlsx");
        new AuditWriter(TODAY).write(new FixtureRegister(fleet), FleetScope.sites(List.of("=BIR")), FleetFixture.DAY, file, Progress.NONE);
        assertTrue(read(file).partial());
        Path past = folder.resolve("past.xlsx");
        new AuditWriter(Clock.offset(TODAY, java.time.Duration.ofDays(3))).write(new FixtureRegister(fleet), FleetScope.all(),
                FleetFixture.DAY, past,
                Progress.NONE);
        assertTrue(read(past).pastDate());
    }

    private static Incoming read(Path file) throws Exception {
        Incoming incoming = new FleetFilesReader().read(List.of(file), Map.of(), Progress.NONE);
        assertEquals(List.of(), incoming.rejected());
        return incoming;
    }

    private void assertSameRows(Incoming incoming) {
        List<String> differences = new ArrayList<>();
        for (Kind<?> kind : Kind.ALL) {
            List<RowPatch> patches = incoming.patches().stream().filter(patch -> patch.kind() == kind).toList();
            List<? extends Row> rows = fleet.rows(kind);
            assertEquals(rows.size(), patches.size(), kind.sheet());
            for (RowPatch patch : patches) {
                Row row = rows.stream().filter(candidate -> isOf(patch, candidate)).findFirst().orElse(null);
                if (row == null) {
                    differences.add(kind + " " + patch.values() + " is no row of the fleet");
                    continue;
                }
                for (Map.Entry<Field, Object> entry : patch.values().entrySet()) {
                    Object was = entry.getKey().get(row);
                    if (!java.util.Objects.equals(was, entry.getValue()) && !sameAmount(was, entry.getValue())) {
                        differences.add(kind + " " + row.key() + " " + entry.getKey() + ": was " + was + ", read " + entry.getValue());
                    }
                }
            }
        }
        assertEquals(List.of(), differences);
    }

    private static boolean sameAmount(Object was, Object read) {
        return was instanceof java.math.BigDecimal one && read instanceof java.math.BigDecimal other && one.compareTo(other) == 0;
    }

    private static boolean isOf(RowPatch patch, Row row) {
        for (Field field : patch.kind().keyFields()) {
            if (!java.util.Objects.equals(patch.values().get(field), field.get(row))) {
                return false;
            }
        }
        return true;
    }
}
