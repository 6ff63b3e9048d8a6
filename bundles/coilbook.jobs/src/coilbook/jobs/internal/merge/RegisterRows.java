package coilbook.jobs.internal.merge;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import coilbook.exchange.RowPatch;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.Timed;
import coilbook.register.Register;

/** The present rows of an open register. What the patches name is fetched in one scan a kind where that is cheaper than one by one. */
public final class RegisterRows implements PresentRows {

    /** From this number on, one scan of a kind is cheaper than single look-ups. */
    private static final int SCAN_FROM = 500;

    private final Register register;
    private final Map<Kind<?>, Map<String, Row>> rows = new HashMap<>();
    private final Map<Kind<?>, Map<String, List<Timed>>> intervals = new HashMap<>();
    private final Set<Kind<?>> scanned = new HashSet<>();

    public RegisterRows(Register register, List<RowPatch> patches) throws CoilbookException {
        this.register = register;
        Map<Kind<?>, Set<String>> named = new HashMap<>();
        for (RowPatch patch : patches) {
            Kind<?> kind = patch.kind();
            Row skeleton = PatchRow.skeleton(patch);
            named.computeIfAbsent(kind, k -> new HashSet<>())
                    .add(Intervals.isSequence(kind) ? Intervals.subject(kind, skeleton) : kind.key(skeleton));
        }
        for (Map.Entry<Kind<?>, Set<String>> entry : named.entrySet()) {
            if (Intervals.isSequence(entry.getKey())) {
                scanIntervals(entry.getKey(), entry.getValue());
            } else if (entry.getValue().size() >= SCAN_FROM) {
                scan(entry.getKey(), entry.getValue());
            }
        }
    }

    private void scan(Kind<?> kind, Set<String> keys) throws CoilbookException {
        Map<String, Row> found = rows.computeIfAbsent(kind, k -> new HashMap<>());
        for (String key : keys) {
            found.put(key, null);
        }
        register.read(kind, row -> {
            if (keys.contains(row.key())) {
                found.put(row.key(), row);
            }
        });
    }

    private void scanIntervals(Kind<?> kind, Set<String> subjects) throws CoilbookException {
        Map<String, List<Timed>> found = intervals.computeIfAbsent(kind, k -> new HashMap<>());
        register.read(kind, row -> {
            String subject = Intervals.subject(kind, row);
            if (subjects.contains(subject)) {
                found.computeIfAbsent(subject, s -> new ArrayList<>(2)).add((Timed) row);
            }
        });
        scanned.add(kind);
    }

    @Override
    public Row find(Kind<?> kind, String key) throws CoilbookException {
        Map<String, Row> known = rows.computeIfAbsent(kind, k -> new HashMap<>());
        if (!known.containsKey(key)) {
            known.put(key, register.find(kind, key));
        }
        return known.get(key);
    }

    @Override
    public List<Timed> intervals(Kind<?> kind, String subject) throws CoilbookException {
        if (!scanned.contains(kind)) {
            throw new IllegalStateException("no row of " + kind + " was announced");
        }
        return intervals.get(kind).getOrDefault(subject, List.of());
    }
}
