package coilbook.register.internal.file;

import java.io.IOException;
import java.net.InetAddress;
import java.net.UnknownHostException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.List;

/**
 * The note beside an open register that says who has it. It is not the lock, which the operating system holds on the data file and drops with the
 * process; a note left behind by a killed process is overwritten.
 */
public final class LockNote {

    private LockNote() {
    }

    /** Writes the note; without one, others only learn that the register is in use. */
    public static void write(Path note) {
        String text = "user " + System.getProperty("user.name", "unknown") + "\nprocess " + ProcessHandle.current().pid() + "\nmachine "
                + machine()
                + "\nsince " + LocalDateTime.now().truncatedTo(ChronoUnit.SECONDS) + "\n";
        try {
            Files.writeString(note, text, StandardCharsets.UTF_8);
        } catch (IOException e) {
            note.toFile().delete();
        }
    }

    public static void remove(Path note) {
        note.toFile().delete();
    }

    /** Who has the register, in words: for example {@code by user ann, process 4711, machine pc7, since 2026-03-31T09:00:00}. */
    public static String holder(Path note) {
        try {
            if (Files.size(note) > 2000) {
                return "by another program";
            }
            List<String> lines = Files.readAllLines(note, StandardCharsets.UTF_8);
            return "by " + String.join(", ", lines).replaceAll("\\p{Cntrl}", "?");
        } catch (IOException e) {
            return "by another program";
        }
    }

    private static String machine() {
        try {
            return InetAddress.getLocalHost().getHostName();
        } catch (UnknownHostException e) {
            return "unknown";
        }
    }
}
