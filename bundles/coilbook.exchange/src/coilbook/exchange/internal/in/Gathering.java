package coilbook.exchange.internal.in;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;

/** Everything read so far, each row once; the lines of several sheets and files that name the same row are joined here. */
final class Gathering {

    private static final double SAME = 1e-12;

    private final Map<Kind<?>, List<RowPatch>> byKind = new HashMap<>();
    private final Map<String, Held> held = new HashMap<>();
    private final List<InputProblem> rejected = new ArrayList<>();
    private final List<InputProblem> notices = new ArrayList<>();
    private int read;
    private boolean partial;
    private boolean pastDate;

    private static final class Held {

        private final int index;
        private boolean own;
        private Set<Field> contradicted = Set.of();

        Held(int index) {
            this.index = index;
        }
    }

    void countLine() {
        read++;
    }

    int lines() {
        return read;
    }

    void reject(InputProblem problem) {
        rejected.add(problem);
    }

    /** Ends the reading of a file that is wrong throughout: nobody reads so many lines, and the list would fill the memory. */
    void refuseTooMany(String file) throws CoilbookException {
        if (rejected.size() > InputLimits.REJECTIONS || notices.size() > InputLimits.REJECTIONS) {
            List<InputProblem> first = rejected.isEmpty() ? notices : rejected;
            throw Refusal.of(file, "more than " + InputLimits.REJECTIONS + " values cannot be taken, which is the limit; the first: "
                    + first.get(0).sentence());
        }
    }

    void notice(InputProblem notice) {
        notices.add(notice);
    }

    void markPartial() {
        partial = true;
    }

    void markPastDate() {
        pastDate = true;
    }

    /**
     * Takes all that a line says.
     *
     * @throws InvalidValue if another line says otherwise; then nothing of the line is taken
     */
    void take(List<Draft> drafts) throws InvalidValue {
        for (Draft draft : drafts) {
            refuseConflict(draft);
        }
        drafts.forEach(this::put);
    }

    /** Whether an earlier line says otherwise of the same row. */
    boolean contradicts(Draft draft) {
        Held before = draft.mode() == Draft.Mode.CHILD ? null : held.get(key(draft.patch()));
        return before != null && conflict(patch(draft.patch().kind(), before), draft.patch()) != null;
    }

    private void refuseConflict(Draft draft) throws InvalidValue {
        if (draft.mode() != Draft.Mode.OWN && draft.mode() != Draft.Mode.SHARED) {
            return;
        }
        Held before = held.get(key(draft.patch()));
        if (before == null) {
            return;
        }
        RowPatch other = patch(draft.patch().kind(), before);
        if (draft.mode() == Draft.Mode.OWN && before.own) {
            Field last = draft.patch().kind().keyFields().get(draft.patch().kind().keyFields().size() - 1);
            throw new InvalidValue(last.heading(), keyText(draft.patch()), "each row once; it stands in " + place(other) + " already");
        }
        Field field = other.onlyIfMissing() ? null : conflict(other, draft.patch());
        if (field != null) {
            throw new InvalidValue(field.heading(), FieldText.format(field, draft.patch().values().get(field)),
                    "the same for " + keyText(draft.patch()) + " as in " + place(other) + ", "
                            + FieldText.format(field, other.values().get(field)));
        }
    }

    private static String place(RowPatch patch) {
        return patch.source().file() + (patch.source().sheet().isEmpty() ? "" : ", sheet " + patch.source().sheet()) + ", row "
                + patch.source().row();
    }

    private RowPatch patch(Kind<?> kind, Held each) {
        return byKind.get(kind).get(each.index);
    }

    private void put(Draft draft) {
        RowPatch patch = draft.patch();
        List<RowPatch> rows = byKind.computeIfAbsent(patch.kind(), kind -> new ArrayList<>());
        if (draft.mode() == Draft.Mode.CHILD) {
            rows.add(patch);
            return;
        }
        String key = key(patch);
        Held before = held.get(key);
        if (before == null) {
            before = new Held(rows.size());
            held.put(key, before);
            rows.add(patch);
        } else {
            rows.set(before.index, joined(rows.get(before.index), draft, before));
        }
        before.own |= draft.mode() == Draft.Mode.OWN;
    }

    private RowPatch joined(RowPatch old, Draft draft, Held before) {
        RowPatch patch = draft.patch();
        if (old.onlyIfMissing() != patch.onlyIfMissing()) {
            return old.onlyIfMissing() ? patch : old;
        }
        Map<Field, Object> values = null;
        for (Map.Entry<Field, Object> entry : patch.values().entrySet()) {
            Field field = entry.getKey();
            Object now = old.values().get(field);
            boolean isNew = now == null && (entry.getValue() != null || !old.values().containsKey(field))
                    && !before.contradicted.contains(field);
            boolean contradicts = draft.mode() == Draft.Mode.TYPE && now != null && entry.getValue() != null
                    && !same(now, entry.getValue());
            if (isNew || contradicts) {
                values = values == null ? new LinkedHashMap<>(old.values()) : values;
                if (contradicts) {
                    values.remove(field);
                    contradict(old, patch, field, before);
                } else {
                    values.put(field, entry.getValue());
                }
            } else if (draft.mode() == Draft.Mode.FIRST && now != null && entry.getValue() != null && !same(now, entry.getValue())) {
                notices.add(problem(patch, field,
                        "it is " + FieldText.format(field, now) + " in " + place(old) + ", which counts; one serial at two places"));
            }
        }
        return values == null ? old : new RowPatch(old.kind(), values, old.source(), old.onlyIfMissing());
    }

    private void contradict(RowPatch old, RowPatch patch, Field field, Held before) {
        Set<Field> more = new HashSet<>(before.contradicted);
        more.add(field);
        before.contradicted = more;
        notices.add(problem(patch, field, "other lines say " + FieldText.format(field, old.values().get(field)) + " (" + place(old)
                + "); nothing is taken for the type " + keyText(patch)));
    }

    private static InputProblem problem(RowPatch patch, Field field, String words) {
        return new InputProblem(patch.source().file(), patch.source().sheet(), patch.source().row(), field.heading(),
                FieldText.format(field, patch.values().get(field)), words);
    }

    private static Field conflict(RowPatch old, RowPatch patch) {
        for (Map.Entry<Field, Object> entry : patch.values().entrySet()) {
            Object now = old.values().get(entry.getKey());
            if (now != null && entry.getValue() != null && !same(now, entry.getValue())) {
                return entry.getKey();
            }
        }
        return null;
    }

    private static boolean same(Object one, Object other) {
        if (one instanceof Datum a && other instanceof Datum b) {
            return same(a.value(), b.value());
        }
        return one instanceof Double a && other instanceof Double b ? same(a.doubleValue(), b.doubleValue()) : one.equals(other);
    }

    private static boolean same(double a, double b) {
        return a == b || Math.abs(a - b) <= SAME * Math.max(Math.abs(a), Math.abs(b));
    }

    private static String key(RowPatch patch) {
        return patch.kind().id() + '\u0000' + keyText(patch);
    }

    private static String keyText(RowPatch patch) {
        StringBuilder key = new StringBuilder();
        for (Field field : patch.kind().keyFields()) {
            key.append(key.length() == 0 ? "" : "/").append(FieldText.format(field, patch.values().get(field)));
        }
        return key.toString();
    }

    /** All of it, rows after those they refer to. */
    Incoming incoming() {
        List<RowPatch> patches = new ArrayList<>();
        for (Kind<?> kind : Kind.ALL) {
            patches.addAll(byKind.getOrDefault(kind, List.of()));
        }
        return new Incoming(read, patches, rejected, notices, partial, pastDate);
    }
}
