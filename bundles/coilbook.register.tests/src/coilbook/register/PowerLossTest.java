package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.sql.Connection;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import org.h2.store.fs.FilePath;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.Change;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.Journal;
import coilbook.register.internal.store.JournalCheck;
import coilbook.register.internal.store.Migrations;
import coilbook.register.internal.store.RegisterStore;

/** Every acknowledged Change survives the loss of all writes that were not forced to the disk. */
class PowerLossTest {

    @TempDir
    Path folder;
    private final ForgetfulDisk disk = new ForgetfulDisk();

    @BeforeEach
    void mount() {
        FilePath.register(disk);
    }

    @AfterEach
    void unmount() {
        FilePath.unregister(disk);
    }

    @Test
    void acknowledgedChangesSurviveTheLossOfAllUnforcedWrites() throws Exception {
        Path base = folder.resolve("r");
        Path data = folder.resolve("r.mv.db");
        Random chance = new Random(7);
        try (Database database = Database.open(ForgetfulDisk.SCHEME + ":" + base, true)) {
            try (Connection connection = database.connection()) {
                Migrations.create(connection);
            }
            RegisterStore store = new RegisterStore(database, new Codecs(), new Journal(), RegisterStore.Room.ENDLESS);
            store.apply(FleetFixture.inserting(FleetFixture.shared(3)), Progress.NONE, (seq, change) -> {
            });
            for (int step = 1; step <= 12; step++) {
                long before = store.head();
                long acknowledged = store.apply(change(step), new BeforeCommit(() -> check(data, "between" + before + "-", before, chance)),
                        (seq, change) -> {
                        });
                check(data, "lost", acknowledged, null);
                check(data, "torn", acknowledged, chance);
            }
        }
    }

    /** Fails the power when all rows are written and nothing is committed. */
    private static final class BeforeCommit implements Progress {
        private final Executable powerLoss;
        private boolean done;

        BeforeCommit(Executable powerLoss) {
            this.powerLoss = powerLoss;
        }

        @Override
        public void report(String step, long rows, long total) {
            if (rows == total && !done) {
                done = true;
                assertDoesNotThrow(powerLoss);
            }
        }

        @Override
        public boolean isCancelled() {
            return false;
        }
    }

    private static Change change(int step) throws Exception {
        if (step % 3 == 1) {
            int from = step / 3 * 200;
            return FleetFixture.inserting(FleetFixture.stations(from, from + 200));
        }
        List<RowChange> rows = new ArrayList<>();
        for (Row row : FleetFixture.stations(0, 100)) {
            if (row instanceof Duty duty) {
                Duty before = step == 2 ? duty : withRate(duty, step % 3 == 2 ? step - 2 : step - 1);
                rows.add(RowChange.replace(before, withRate(duty, step)));
            }
        }
        return FleetFixture.change("Step " + step, rows);
    }

    private static Duty withRate(Duty duty, int rate) {
        return new Duty(duty.station(), duty.validFrom(), null, Datum.measured(rate), null, null, null, null, null, null, null);
    }

    private void check(Path data, String name, long acknowledged, Random chance) throws Exception {
        Path base = folder.resolve(name + acknowledged);
        ForgetfulDisk.afterPowerLoss(data, folder.resolve(name + acknowledged + ".mv.db"), chance);
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            assertEquals(acknowledged, register.head(), name);
            assertEquals(register.journal(acknowledged - 1, 1).get(0).rows(), register.change(acknowledged).rows().size(), name);
            List<Row> duties = new ArrayList<>();
            register.read(Kind.of(Duty.class), duties::add);
            assertEquals(0, duties.size() % 200);
        }
        try (Database database = Database.open(base.toString(), false); Connection connection = database.connection()) {
            assertEquals(0, new JournalCheck(new Codecs()).firstBroken(connection), name);
        }
    }
}
