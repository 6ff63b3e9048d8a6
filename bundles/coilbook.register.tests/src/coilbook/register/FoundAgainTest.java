package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.RowChange;

/**
 * A file copied at the moment a Change is acknowledged, as a killed process leaves it, opens with that Change. Closing and opening in between leaves
 * gaps in the file, into which later pages are written: there the database alone forgets where the newest of them are.
 */
class FoundAgainTest {

    private static final int ROUNDS = 12;

    @TempDir
    Path folder;

    @Test
    void everyAcknowledgedChangeIsFoundInACopy() throws Exception {
        Path base = folder.resolve("r");
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(1)), Progress.NONE);
            register.apply(FleetFixture.inserting(FleetFixture.stations(0, 600)), Progress.NONE);
        }
        for (int round = 1; round <= ROUNDS; round++) {
            try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
                for (int step = 0; step < 3; step++) {
                    register.apply(FleetFixture.change("Rates", edits(register, 40 + 130 * (round + step) % 300, round * 3 + step)),
                            Progress.NONE);
                    checkCopy(register.head());
                }
            }
        }
    }

    private static List<RowChange> edits(Register register, int count, int rate) throws Exception {
        List<RowChange> rows = new ArrayList<>();
        register.read(Kind.of(Duty.class), duty -> {
            if (rows.size() < count) {
                rows.add(RowChange.replace(duty,
                        new Duty(duty.station(), duty.validFrom(), null, Datum.measured(rate), null, null, null, null, null, null, null)));
            }
        });
        return rows;
    }

    private void checkCopy(long head) throws Exception {
        Files.copy(folder.resolve("r.mv.db"), folder.resolve("copy.mv.db"), StandardCopyOption.REPLACE_EXISTING);
        Files.deleteIfExists(folder.resolve("copy.view.mv.db"));
        try (Register copy = FleetFixture.registers().open(folder.resolve("copy"), OpenMode.EXISTING)) {
            assertEquals(head, copy.head());
        }
    }
}
