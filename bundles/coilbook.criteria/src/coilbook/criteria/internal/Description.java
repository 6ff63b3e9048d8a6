package coilbook.criteria.internal;

import java.util.List;

import coilbook.criteria.Scope;

/** What a criterion says of itself; the texts of lists, help and the Method sheet. */
public record Description(String id, String title, String group, Scope scope, List<String> needs, String limitSource, String hazardRule,
        String formula, List<String> remedies) {

    public Description {
        needs = List.copyOf(needs);
        remedies = List.copyOf(remedies);
    }
}
