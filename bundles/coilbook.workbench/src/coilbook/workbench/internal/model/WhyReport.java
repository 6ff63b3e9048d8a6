package coilbook.workbench.internal.model;

import java.util.List;

import coilbook.criteria.Finding;

/**
 * The findings of one station with the words of their criteria.
 *
 * @param station its code
 * @param items one for each criterion, in the order of the criteria
 */
public record WhyReport(String station, List<Item> items) {

    public WhyReport {
        items = List.copyOf(items);
    }

    /**
     * One criterion's finding.
     *
     * @param title the criterion's question
     * @param limitSource where the limit comes from
     * @param hazardRule when breaking it can hurt, in words; empty if never
     */
    public record Item(Finding finding, String title, String limitSource, String hazardRule) {
    }
}
