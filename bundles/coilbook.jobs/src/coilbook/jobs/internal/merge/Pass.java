package coilbook.jobs.internal.merge;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
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
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;

/** One attempt to lay all lines that are still thought sound over the register; what turns out unsound is named and left out of the next attempt. */
final class Pass {

    private record RowId(Kind<?> kind, String key) {
    }

    private final PresentRows present;
    private final SequenceMerge sequences;
    private final Map<RowId, Draft> drafts = new LinkedHashMap<>();
    private final Map<RowPatch.Source, List<Draft>> byLine = new LinkedHashMap<>();
    private final Map<RowPatch.Source, Draft> primaries = new HashMap<>();
    private final List<InputProblem> problems = new ArrayList<>();
    private final Set<RowPatch.Source> bad = new LinkedHashSet<>();

    Pass(PresentRows present) {
        this.present = present;
        this.sequences = new SequenceMerge(present);
    }

    void take(RowPatch given) throws CoilbookException {
        try {
            RowPatch patch = normalised(given);
            byLine.computeIfAbsent(patch.source(), s -> new ArrayList<>(4));
            requireKey(patch);
            Draft draft = Intervals.isSequence(patch.kind()) ? sequences.take(patch) : takePlain(patch);
            if (draft != null) {
                byLine.get(patch.source()).add(draft);
                if (PatchRow.isPrimary(patch)) {
                    draft.primary = patch.source();
                    primaries.put(patch.source(), draft);
                }
            }
        } catch (RejectedLine e) {
            reject(e.problem(), given.source());
        } catch (InvalidValue e) {
            reject(PatchRow.problem(given, e), given.source());
        }
    }

    private void reject(InputProblem problem, RowPatch.Source line) {
        problems.add(problem);
        bad.add(line);
    }

    /** A supply may name its circuit without the site. */
    private static RowPatch normalised(RowPatch patch) {
        if (patch.kind().type() == Supply.class) {
            Field circuit = patch.kind().field("circuit");
            if (patch.values().get(circuit) instanceof String code
                    && patch.values().get(patch.kind().field("station")) instanceof String station) {
                String site = station.substring(0, Math.max(0, station.indexOf('/'))) + "/";
                return code.startsWith(site) ? patch : with(patch, circuit, site + code);
            }
        }
        return patch;
    }

    private static RowPatch with(RowPatch patch, Field field, Object value) {
        Map<Field, Object> values = new LinkedHashMap<>(patch.values());
        values.put(field, value);
        return new RowPatch(patch.kind(), values, patch.source(), patch.onlyIfMissing());
    }

    private static void requireKey(RowPatch patch) throws RejectedLine {
        for (Field field : patch.kind().keyFields()) {
            if (field.isRequired() && patch.values().get(field) == null) {
                throw new RejectedLine(PatchRow.problem(patch, field, null, "expected a value: it says which "
                        + References.noun(patch.kind()) + " is meant"));
            }
        }
    }

    private Draft takePlain(RowPatch patch) throws CoilbookException, RejectedLine, InvalidValue {
        Kind<?> kind = patch.kind();
        String key = kind.key(PatchRow.skeleton(patch));
        RowId id = new RowId(kind, key);
        Draft draft = drafts.get(id);
        if (draft == null) {
            draft = new Draft(kind, present.find(kind, key));
        }
        refuseSecondStatement(draft, patch);
        if (patch.onlyIfMissing()) {
            if (draft.after != null && !draft.incomplete) {
                draft.lines.add(patch.source());
                drafts.put(id, draft);
                return draft;
            }
            draft.incomplete = true;
        }
        apply(draft, patch);
        drafts.put(id, draft);
        return draft;
    }

    /** The same subject twice in one sheet is a mistake; in two files it is one, unless they agree. */
    static void refuseSecondStatement(Draft draft, RowPatch patch) throws RejectedLine {
        RowPatch.Source first = draft.primary;
        if (first != null && PatchRow.isPrimary(patch) && !first.equals(patch.source()) && first.file().equals(patch.source().file())
                && first.sheet().equals(patch.source().sheet())) {
            Field field = draft.kind.keyFields().get(draft.kind.keyFields().size() - 1);
            throw new RejectedLine(PatchRow.problem(patch, field, patch.values().get(field),
                    "expected each " + References.noun(draft.kind) + " once; it stands in row " + first.row() + " already"));
        }
    }

    /** Lays one line over a row, refusing what contradicts an earlier line. */
    static void apply(Draft draft, RowPatch patch) throws RejectedLine, InvalidValue {
        Kind<?> kind = draft.kind;
        Object[] values = draft.after == null ? new Object[kind.fields().size()] : kind.values(draft.after);
        boolean clears = clears(patch);
        for (Map.Entry<Field, Object> entry : patch.values().entrySet()) {
            Field field = entry.getKey();
            Object value = entry.getValue();
            int at = kind.fields().indexOf(field);
            RowPatch.Source stated = draft.statedBy.get(field);
            if (field.isKey() && draft.after != null) {
                continue;
            }
            if (value == null) {
                if (clears && stated == null) {
                    values[at] = null;
                }
            } else if (stated != null && !stated.equals(patch.source()) && !Objects.equals(values[at], value)) {
                throw new RejectedLine(
                        PatchRow.problem(patch, field, value, "expected what " + place(stated, patch.source()) + " says of the same "
                                + References.noun(kind) + ": " + FieldText.format(field, values[at])));
            } else {
                values[at] = value;
            }
        }
        draft.after = kind.create(values);
        patch.values().forEach((field, value) -> {
            if (value != null) {
                draft.statedBy.putIfAbsent(field, patch.source());
            }
        });
        draft.lines.add(patch.source());
    }

    private static String place(RowPatch.Source stated, RowPatch.Source here) {
        return (stated.file().equals(here.file()) ? "" : stated.file() + ", ")
                + (stated.sheet().equals(here.sheet()) || stated.sheet().isEmpty() ? "" : "sheet " + stated.sheet() + ", ") + "row "
                + stated.row();
    }

    /** Whether a blank cell of the line's sheet means that the value is to go: only where the sheet is about these rows. */
    static boolean clears(RowPatch patch) {
        String sheet = patch.source().sheet();
        return sheet.equals(patch.kind().sheet()) || sheet.equals(Kind.of(Station.class).sheet()) && Intervals.isSequence(patch.kind());
    }

    /** Looks at the whole once every line was taken: rows that name rows which are nowhere, intervals that overlap. */
    void finish() throws CoilbookException {
        for (Draft draft : all()) {
            if (!draft.isChanged()) {
                continue;
            }
            for (References.Reference reference : References.of(draft.after)) {
                Draft target = drafts.get(new RowId(reference.kind(), reference.key()));
                if ((target == null || target.after == null) && present.find(reference.kind(), reference.key()) == null) {
                    rejectAll(draft, reference.field(), String.valueOf(reference.field().get(draft.after)), "expected a "
                            + References.noun(reference.kind()) + " of the register or of these files; there is none called "
                            + reference.key());
                }
            }
        }
        for (Draft overlapping : sequences.overlapping()) {
            Field since = Intervals.since(overlapping.kind);
            rejectAll(overlapping, since, String.valueOf(since.get(overlapping.after)),
                    "expected an interval that overlaps no other of the same station");
        }
    }

    private void rejectAll(Draft draft, Field field, String value, String problem) {
        for (RowPatch.Source line : draft.lines) {
            if (bad.add(line)) {
                problems.add(PatchRow.problem(line, field.headingWithUnit(), value, problem));
            }
        }
    }

    Collection<Draft> all() {
        List<Draft> all = new ArrayList<>(drafts.values());
        all.addAll(sequences.drafts());
        return all;
    }

    List<InputProblem> problems() {
        return problems;
    }

    Set<RowPatch.Source> badLines() {
        return bad;
    }

    /** The rows that each line touched. */
    Map<RowPatch.Source, List<Draft>> lines() {
        return byLine;
    }

    Map<RowPatch.Source, Draft> primaries() {
        return primaries;
    }
}
