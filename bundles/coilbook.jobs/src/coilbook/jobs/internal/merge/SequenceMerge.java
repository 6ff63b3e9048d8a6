package coilbook.jobs.internal.merge;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;

import coilbook.exchange.RowPatch;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.Fitting;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.Timed;

/**
 * Rows that follow one another in time. A line that says another content without a date corrects the present interval; with a later date it closes the
 * present interval and opens a new one; the same content is no change.
 */
final class SequenceMerge {

    private record SequenceId(Kind<?> kind, String subject) {
    }

    private final PresentRows present;
    private final Map<SequenceId, List<Draft>> sequences = new LinkedHashMap<>();

    SequenceMerge(PresentRows present) {
        this.present = present;
    }

    /** The interval that the line ends up describing, or {@code null} if it says nothing. */
    Draft take(RowPatch patch) throws CoilbookException, RejectedLine, InvalidValue {
        Kind<?> kind = patch.kind();
        if (saysNothing(patch)) {
            return null;
        }
        List<Draft> sequence = sequence(kind, Intervals.subject(kind, PatchRow.skeleton(patch)));
        LocalDate since = (LocalDate) patch.values().get(Intervals.since(kind));
        LocalDate until = (LocalDate) patch.values().get(Intervals.until(kind));
        Draft exact = patch.values().containsKey(Intervals.since(kind)) ? starting(sequence, since) : null;
        Draft open = open(sequence);
        if (exact == null && since == null && until == null) {
            exact = open;
        }
        if (exact != null) {
            Pass.refuseSecondStatement(exact, patch);
            Pass.apply(exact, patch);
            return exact;
        }
        if (since != null && until == null && open != null && !open.isNew() && open.primary == null) {
            return follow(sequence, open, patch, since);
        }
        return create(sequence, patch, null);
    }

    private static boolean saysNothing(RowPatch patch) {
        return patch.kind().type() != Fitting.class && patch.values().entrySet().stream()
                .allMatch(e -> e.getValue() == null || e.getKey().isKey() || e.getKey().id().equals("valid_to")
                        || e.getKey().id().equals("provenance"));
    }

    private Draft follow(List<Draft> sequence, Draft open, RowPatch patch, LocalDate since) throws RejectedLine, InvalidValue {
        if (sameContent(open.after, patch)) {
            open.lines.add(patch.source());
            return open;
        }
        Kind<?> kind = patch.kind();
        LocalDate openSince = ((Timed) open.after).validFrom();
        if (openSince != null && openSince.isAfter(since)) {
            throw new RejectedLine(PatchRow.problem(patch, Intervals.since(kind), since, "expected a date after " + openSince
                    + ", since when the register has " + content(open.after) + "; what was true earlier needs an until date"));
        }
        Draft opened = create(sequence, patch, kind.type() == Fitting.class ? null : open.after);
        open.after = withUntil(open.after, since);
        open.lines.add(patch.source());
        return opened;
    }

    @SuppressWarnings("unchecked")
    private static <R extends Row> Row withUntil(Row row, LocalDate until) throws InvalidValue {
        Kind<R> kind = (Kind<R>) Kind.of(row);
        return kind.with((R) row, Intervals.until(kind), until);
    }

    /** A new interval; what the line leaves out is carried on from the one before, where one is given. */
    private static Draft create(List<Draft> sequence, RowPatch patch, Row base) throws RejectedLine, InvalidValue {
        Kind<?> kind = patch.kind();
        Draft draft = new Draft(kind, null);
        RowPatch full = patch;
        if (base != null) {
            Map<Field, Object> values = new LinkedHashMap<>();
            for (Field field : kind.fields()) {
                if (!field.isKey() && field != Intervals.until(kind)) {
                    values.put(field, field.get(base));
                }
            }
            patch.values().forEach((field, value) -> {
                if (value != null || Pass.clears(patch)) {
                    values.put(field, value);
                }
            });
            full = new RowPatch(kind, values, patch.source(), patch.onlyIfMissing());
        }
        Pass.apply(draft, full);
        sequence.add(draft);
        return draft;
    }

    private static boolean sameContent(Row row, RowPatch patch) {
        Kind<?> kind = patch.kind();
        for (Map.Entry<Field, Object> entry : patch.values().entrySet()) {
            Field field = entry.getKey();
            boolean counts = !field.isKey() && field != Intervals.until(kind) && (entry.getValue() != null || Pass.clears(patch));
            if (counts && !Objects.equals(field.get(row), entry.getValue())) {
                return false;
            }
        }
        return true;
    }

    private static String content(Row row) {
        Kind<?> kind = Kind.of(row);
        for (Field field : kind.fields()) {
            if (!field.isKey() && field != Intervals.until(kind) && field.get(row) != null) {
                return FieldText.format(field, field.get(row));
            }
        }
        return "another row";
    }

    private List<Draft> sequence(Kind<?> kind, String subject) throws CoilbookException {
        SequenceId id = new SequenceId(kind, subject);
        List<Draft> sequence = sequences.get(id);
        if (sequence == null) {
            sequence = new ArrayList<>(2);
            for (Timed row : present.intervals(kind, subject)) {
                sequence.add(new Draft(kind, row));
            }
            sequences.put(id, sequence);
        }
        return sequence;
    }

    private static Draft starting(List<Draft> sequence, LocalDate since) {
        for (Draft draft : sequence) {
            if (Objects.equals(((Timed) draft.after).validFrom(), since)) {
                return draft;
            }
        }
        return null;
    }

    private static Draft open(List<Draft> sequence) {
        Draft open = null;
        for (Draft draft : sequence) {
            Timed row = (Timed) draft.after;
            if (row.validTo() == null && (open == null || isLater(row, (Timed) open.after))) {
                open = draft;
            }
        }
        return open;
    }

    private static boolean isLater(Timed one, Timed other) {
        return one.validFrom() != null && (other.validFrom() == null || one.validFrom().isAfter(other.validFrom()));
    }

    /** Changed intervals that overlap another of their sequence. Parts may be recorded so, which a criterion reports; the rest may not. */
    Set<Draft> overlapping() {
        Set<Draft> found = new LinkedHashSet<>();
        for (Map.Entry<SequenceId, List<Draft>> entry : sequences.entrySet()) {
            if (entry.getKey().kind().type() == Fitting.class) {
                continue;
            }
            List<Draft> sequence = entry.getValue();
            for (int i = 0; i < sequence.size(); i++) {
                for (int j = i + 1; j < sequence.size(); j++) {
                    Draft one = sequence.get(i);
                    Draft other = sequence.get(j);
                    if ((one.isChanged() || other.isChanged()) && overlap((Timed) one.after, (Timed) other.after)) {
                        found.add(other.isChanged() ? other : one);
                    }
                }
            }
        }
        return found;
    }

    private static boolean overlap(Timed one, Timed other) {
        return before(one.validFrom(), other.validTo()) && before(other.validFrom(), one.validTo());
    }

    private static boolean before(LocalDate from, LocalDate to) {
        return from == null || to == null || from.isBefore(to);
    }

    List<Draft> drafts() {
        List<Draft> all = new ArrayList<>();
        sequences.values().forEach(all::addAll);
        return all;
    }
}
