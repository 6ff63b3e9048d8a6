package coilbook.jobs;

import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;

import coilbook.exchange.FleetFiles;
import coilbook.exchange.Incoming;
import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.jobs.internal.merge.PatchMerge;
import coilbook.jobs.internal.merge.RegisterRows;
import coilbook.register.Register;

/**
 * Brings files into a register as one Change: reads them, lays what they say over what the register holds, and writes the difference. Rows that a file
 * does not mention stay; nothing is ever removed.
 */
@Component(service = BringIn.class)
public final class BringIn {

    private final FleetFiles files;
    private final Clock clock;

    @Activate
    public BringIn(@Reference FleetFiles files) {
        this(files, Clock.systemUTC());
    }

    /** With a clock of one's own, for tests. */
    public BringIn(FleetFiles files, Clock clock) {
        this.files = files;
        this.clock = clock;
    }

    /**
     * What the files say, before any register is opened.
     *
     * @throws CoilbookException with reason BAD_INPUT for a file that cannot be read at all, or that shows a past date
     */
    public Incoming read(List<Path> paths, Map<String, String> columns, Progress progress) throws CoilbookException {
        Incoming incoming = files.read(paths, columns, progress);
        if (incoming.pastDate()) {
            throw new CoilbookException(CoilbookException.Reason.BAD_INPUT,
                    names(paths) + ": a workbook that shows a past date cannot be brought in; expected one that shows today.");
        }
        return incoming;
    }

    /** Reads files and brings them in. */
    public ImportResult run(Register register, List<Path> paths, ImportOptions options, Progress progress) throws CoilbookException {
        return bring(register, read(paths, options.columns(), progress), names(paths), options, progress);
    }

    /**
     * Brings in what was read. Nothing is written if a row was rejected, unless partial results are accepted, nor in a dry run.
     *
     * @param names the files' names, for the journal
     */
    public ImportResult bring(Register register, Incoming incoming, String names, ImportOptions options, Progress progress)
            throws CoilbookException {
        progress.report("Comparing with the register", 0, incoming.patches().size());
        PatchMerge.Outcome outcome = PatchMerge.merge(incoming, new RegisterRows(register, incoming.patches()), progress);
        boolean write = !options.dryRun() && (options.acceptPartial() || outcome.rejected().isEmpty());
        Change change = outcome.change(options.who(), clock.instant(), "Import of " + names);
        if (write && change != null) {
            register.apply(change, progress);
        }
        return new ImportResult(outcome.read(), outcome.created(), outcome.changed(), outcome.unchanged(), outcome.rejected(),
                outcome.incompleteTypes(), write && change != null);
    }

    /** The files' names without their folders, for messages and the journal. */
    public static String names(List<Path> paths) {
        return paths.stream().map(p -> p.getFileName() == null ? p.toString() : p.getFileName().toString())
                .collect(Collectors.joining(", "));
    }
}
