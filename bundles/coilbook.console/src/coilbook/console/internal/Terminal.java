package coilbook.console.internal;

import java.io.InputStream;
import java.io.PrintStream;
import java.nio.file.Path;

import coilbook.fleet.Progress;
import coilbook.jobs.RegisterPlace;

/**
 * What a run of the command line stands in.
 *
 * @param out results; nothing else goes there
 * @param err messages and progress
 * @param interactive whether a person watches {@code err}
 * @param user who is named in the journal
 * @param place where the person's own data stand
 * @param folder the caller's folder, against which relative paths count
 */
public record Terminal(InputStream in, PrintStream out, PrintStream err, boolean interactive, String user, RegisterPlace place,
        Path folder) {

    /** Progress on the terminal, or none in a pipe. */
    public Progress progress() {
        return interactive ? new ProgressLine(err) : Progress.NONE;
    }

    /** A path as the caller means it. */
    public Path resolve(Path path) {
        return folder.resolve(path).normalize();
    }

    /** One line for the person. */
    public void tell(String message) {
        err.println(message);
    }
}
