package coilbook.exchange.internal.out;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;

/** Findings counted as they pass by, in all and by one thing each of them has, such as its site. */
final class Tally {

    /** What findings are counted as; each counts once. */
    enum Count {
        HAZARDS("Hazards", "hazard", "▲"), NONCONFORMITIES("Nonconformities", "nonconformity", "■"),
        OBSERVATIONS("Observations", "observation", "●"),
        UNDETERMINED("Undetermined", "undetermined", "?"), CONCEDED("Conceded", "conceded", "○");

        private final String heading;
        private final String word;
        private final String symbol;

        Count(String heading, String word, String symbol) {
            this.heading = heading;
            this.word = word;
            this.symbol = symbol;
        }

        String heading() {
            return heading;
        }

        String word() {
            return word;
        }

        /** A sign that tells the verdicts apart without colour. */
        String symbol() {
            return symbol;
        }

        static Count of(Finding finding) {
            if (finding.conceded()) {
                return CONCEDED;
            } else if (finding.hazard()) {
                return HAZARDS;
            } else if (finding.verdict() == Verdict.NONCONFORMITY) {
                return NONCONFORMITIES;
            }
            return finding.verdict() == Verdict.OBSERVATION ? OBSERVATIONS : UNDETERMINED;
        }
    }

    private final long[] all = new long[Count.values().length];
    private final Map<String, long[]> byGroup = new HashMap<>();

    void add(String group, Count count) {
        all[count.ordinal()]++;
        byGroup.computeIfAbsent(group, g -> new long[all.length])[count.ordinal()]++;
    }

    /** Names a group that may have no findings. */
    void mention(String group) {
        byGroup.computeIfAbsent(group, g -> new long[all.length]);
    }

    long get(Count count) {
        return all[count.ordinal()];
    }

    long total() {
        long sum = 0;
        for (long one : all) {
            sum += one;
        }
        return sum;
    }

    long get(String group, Count count) {
        return byGroup.get(group)[count.ordinal()];
    }

    long total(String group) {
        long sum = 0;
        for (long one : byGroup.get(group)) {
            sum += one;
        }
        return sum;
    }

    /** The groups, the worst first: most hazards, then most nonconformities and so on, then by name. */
    List<String> worstFirst() {
        List<String> groups = new ArrayList<>(byGroup.keySet());
        groups.sort((one, other) -> {
            for (Count count : Count.values()) {
                int order = Long.compare(get(other, count), get(one, count));
                if (order != 0) {
                    return order;
                }
            }
            return one.compareTo(other);
        });
        return groups;
    }
}
