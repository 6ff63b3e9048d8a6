package coilbook.console.internal;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;

/** Where what nobody expected is written down in full, so that the person sees a sentence and the developer the rest. */
final class ErrorLog {

    private static final DateTimeFormatter STAMP = DateTimeFormatter.ofPattern("yyyyMMdd-HHmmss", Locale.ROOT);

    private ErrorLog() {
    }

    /** Writes it into the first folder that takes it; returns the file, or {@code null} if none does. */
    static Path write(Throwable problem, List<Path> folders) {
        StringWriter text = new StringWriter();
        PrintWriter writer = new PrintWriter(text);
        writer.println(LocalDateTime.now());
        problem.printStackTrace(writer);
        writer.flush();
        for (Path folder : folders) {
            try {
                Files.createDirectories(folder);
                Path file = Files.createTempFile(folder, "coilbook-" + LocalDateTime.now().format(STAMP) + "-", ".log");
                Files.writeString(file, text.toString());
                return file;
            } catch (IOException | RuntimeException e) {
                // the next folder may take it; without any, the message says so
            }
        }
        return null;
    }
}
