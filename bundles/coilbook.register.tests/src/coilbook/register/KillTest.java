package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.sql.Connection;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.Change;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;
import coilbook.register.internal.file.FileInspection;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.JournalCheck;

/**
 * A process that records Changes is killed twenty times, mostly in the middle of one: every acknowledged Change is there afterwards, the last one that
 * was not acknowledged is there wholly or not at all, and the journal's digests agree with the rows.
 */
class KillTest {

    private static final int KILLS = 20;
    private static final int IMPORTED = 400;
    private static final long SEED = 20260331;

    @TempDir
    Path folder;

    /** Records Changes for ever, telling before each that it begins and after each that it was acknowledged. */
    static final class Recorder {

        private Recorder() {
        }

        public static void main(String[] arguments) throws Exception {
            try (Register register = FleetFixture.registers().open(Path.of(arguments[0]), OpenMode.EXISTING)) {
                System.out.println("ready " + register.head());
                for (int step = Integer.parseInt(arguments[1]);; step++) {
                    Change change = step % 3 == 0 ? anImport(register) : edits(register, step);
                    System.out.println("begin " + (register.head() + 1) + " " + change.rows().size());
                    long seq = register.apply(change, Progress.NONE);
                    System.out.println("done " + seq);
                }
            }
        }

        /** The next stations with all that belongs to them. */
        private static Change anImport(Register register) throws Exception {
            int[] count = new int[1];
            register.read(Kind.of(Station.class), station -> count[0]++);
            return FleetFixture.inserting(FleetFixture.stations(count[0], count[0] + IMPORTED));
        }

        private static Change edits(Register register, int step) throws Exception {
            List<RowChange> rows = new ArrayList<>();
            register.read(Kind.of(Duty.class), duty -> {
                if (rows.size() < 300) {
                    rows.add(RowChange.replace(duty,
                            new Duty(duty.station(), duty.validFrom(), null, Datum.measured(step % 900 + 1), null, null, null,
                                    null, null, null, null)));
                }
            });
            return rows.isEmpty() ? FleetFixture.inserting(List.of(SampleRows.bare(Customer.class, "code", "step " + step)))
                    : FleetFixture.change("Edit", rows);
        }
    }

    @Test
    void whatWasAcknowledgedIsThereAndNothingIsHalfThere() throws Exception {
        Path base = folder.resolve("r");
        try (Register register = FleetFixture.registers().open(base, OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(FleetFixture.shared(20)), Progress.NONE);
        }
        Random random = new Random(SEED);
        int inTheMiddle = 0;
        long acknowledged = 1;
        for (int kill = 0; kill < KILLS; kill++) {
            Run run = runAndKill(base, kill, random);
            acknowledged = Math.max(acknowledged, run.acknowledged());
            if (run.begun() > run.acknowledged()) {
                inTheMiddle++;
            }
            long head = check(base, run);
            assertTrue(head == acknowledged || head == acknowledged + 1 && run.begun() == head,
                    "kill " + kill + ": acknowledged " + acknowledged + ", begun " + run.begun() + ", found " + head);
            acknowledged = head;
        }
        assertTrue(inTheMiddle >= KILLS / 2, inTheMiddle + " of " + KILLS + " kills fell between begin and acknowledgement");
    }

    private record Run(long begun, int rows, long acknowledged) {
    }

    /** Lets some Changes pass, then kills a moment after the beginning of one. */
    private static Run runAndKill(Path base, int kill, Random random) throws Exception {
        ChildProcess recorder = ChildProcess.start(Recorder.class, base.toString(), Integer.toString(kill));
        String ready = recorder.line();
        assertTrue(ready != null && ready.startsWith("ready "), ready + (ready == null ? "" : recorder.isAlive() ? "" : recorder.rest()));
        long acknowledged = Long.parseLong(ready.substring(6));
        long begun = acknowledged;
        int rows = 0;
        int left = random.nextInt(4);
        for (String line = recorder.line(); line != null; line = recorder.line()) {
            String[] words = line.split(" ");
            if (words[0].equals("done")) {
                acknowledged = Long.parseLong(words[1]);
            } else {
                assertEquals("begin", words[0], line);
                begun = Long.parseLong(words[1]);
                rows = Integer.parseInt(words[2]);
                if (left-- == 0) {
                    TimeUnit.MICROSECONDS.sleep(random.nextInt(kill % 2 == 0 ? 20_000 : 150_000));
                    recorder.kill();
                }
            }
        }
        return new Run(begun, rows, acknowledged);
    }

    private static long check(Path base, Run run) throws Exception {
        FileInspection.check(Path.of(base + ".mv.db"), "COILBOOK_REGISTER");
        long head;
        try (Register register = FleetFixture.registers().open(base, OpenMode.EXISTING)) {
            head = register.head();
            JournalEntry last = register.journal(head - 1, 1).get(0);
            assertEquals(last.rows(), register.change(head).rows().size(), "the last change is whole");
            if (head == run.begun()) {
                assertEquals(run.rows(), last.rows());
            }
            int[] counts = new int[2];
            register.read(Kind.of(Station.class), station -> counts[0]++);
            register.read(Kind.of(Duty.class), duty -> counts[1]++);
            assertEquals(0, counts[0] % IMPORTED, "no half import");
            assertEquals(counts[0], counts[1]);
            List<Row> lines = new ArrayList<>();
            register.read(Kind.of(Line.class), lines::add);
            assertEquals(counts[0] / 50, lines.size());
        }
        try (Database database = Database.open(base.toString(), false); Connection connection = database.connection()) {
            assertEquals(0, new JournalCheck(new Codecs()).firstBroken(connection), "the journal's digests agree with the rows");
        }
        return head;
    }
}
