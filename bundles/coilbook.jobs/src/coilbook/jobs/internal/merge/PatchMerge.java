package coilbook.jobs.internal.merge;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.RowChange;

/**
 * Compares what files say with what the register holds, and makes one step of the difference. A line counts as a whole: if anything about it is
 * unsound, or it names a row whose line is, nothing of it is taken.
 */
public final class PatchMerge {

    private PatchMerge() {
    }

    /**
     * What the lines come to.
     *
     * @param rows the row changes of all sound lines, referenced rows first
     * @param incompleteTypes catalogue entries that the files named and nobody has described
     */
    public record Outcome(int read, int created, int changed, int unchanged, List<InputProblem> rejected, List<RowChange> rows,
            List<String> incompleteTypes) {

        /** The step, or {@code null} if nothing differs. */
        public Change change(String who, Instant when, String why) {
            return rows.isEmpty() ? null : new Change(who, when, why, rows);
        }
    }

    /** Lays the sound lines over the present rows; attempts are repeated while lines turn out to rest on unsound ones. */
    public static Outcome merge(Incoming incoming, PresentRows present, Progress progress) throws CoilbookException {
        List<InputProblem> rejected = new ArrayList<>(incoming.rejected());
        Set<Place> excluded = new HashSet<>();
        incoming.rejected().forEach(problem -> excluded.add(Place.of(problem)));
        while (true) {
            progress.check();
            Pass pass = new Pass(present);
            takeAll(incoming, false, pass, excluded, progress);
            takeAll(incoming, true, pass, excluded, progress);
            pass.finish();
            if (pass.badLines().isEmpty()) {
                return outcome(incoming, pass, rejected);
            }
            rejected.addAll(pass.problems());
            pass.badLines().forEach(line -> excluded.add(Place.of(line)));
        }
    }

    /** What counts only where a row is missing comes after all that describes rows, in whatever order the files stand. */
    private static void takeAll(Incoming incoming, boolean onlyIfMissing, Pass pass, Set<Place> excluded, Progress progress)
            throws CoilbookException {
        int done = 0;
        for (RowPatch patch : incoming.patches()) {
            if (patch.onlyIfMissing() == onlyIfMissing && !excluded.contains(Place.of(patch.source()))) {
                pass.take(patch);
            }
            if (++done % 1000 == 0) {
                progress.report("Comparing with the register", done, incoming.patches().size());
                progress.check();
            }
        }
    }

    private record Place(String file, String sheet, int row) {

        static Place of(InputProblem problem) {
            return new Place(problem.file(), problem.sheet(), problem.row());
        }

        static Place of(RowPatch.Source source) {
            return new Place(source.file(), source.sheet(), source.row());
        }
    }

    private static Outcome outcome(Incoming incoming, Pass pass, List<InputProblem> rejected) {
        int created = 0;
        int changed = 0;
        int unchanged = 0;
        for (Map.Entry<RowPatch.Source, List<Draft>> line : pass.lines().entrySet()) {
            Draft primary = pass.primaries().get(line.getKey());
            if (primary == null && !line.getValue().isEmpty()) {
                primary = line.getValue().get(0);
            }
            if (primary != null && primary.isNew() && line.getKey().equals(primary.lines.iterator().next())) {
                created++;
            } else if (line.getValue().stream().anyMatch(Draft::isChanged)) {
                changed++;
            } else {
                unchanged++;
            }
        }
        List<RowChange> rows = new ArrayList<>();
        Set<String> incomplete = new LinkedHashSet<>();
        List<Draft> drafts = new ArrayList<>(pass.all());
        drafts.sort(Comparator.comparingInt(draft -> Kind.ALL.indexOf(draft.kind)));
        for (Draft draft : drafts) {
            if (draft.isChanged()) {
                rows.add(draft.isNew() ? RowChange.insert(draft.after) : RowChange.replace(draft.before, draft.after));
                if (draft.incomplete && draft.isNew()) {
                    incomplete.add(References.noun(draft.kind) + " " + draft.after.key());
                }
            }
        }
        rejected.sort(Comparator.comparing(InputProblem::file).thenComparing(InputProblem::sheet).thenComparingInt(InputProblem::row));
        int lines = (int) rejected.stream().map(Place::of).distinct().count();
        int read = Math.max(incoming.read(), created + changed + unchanged + lines);
        // a row that says what another file said already comes without a patch of its own
        return new Outcome(read, created, changed, read - created - changed - lines, rejected, rows, List.copyOf(incomplete));
    }
}
