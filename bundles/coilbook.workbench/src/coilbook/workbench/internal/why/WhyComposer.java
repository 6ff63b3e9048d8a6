package coilbook.workbench.internal.why;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.workbench.internal.model.WhyReport;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.stations.VerdictMark;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.why.WhyText.Style;

/** Puts a station's findings into words: hazards first, under the cautions; what is met and what does not arise last and short. */
final class WhyComposer {

    private final Texts texts = Texts.of(WhyComposer.class);
    private final Texts marks = Texts.of(StationsPresenter.class);

    WhyText nothing() {
        return new WhyText().line(Style.MUTED, texts.get("nothing"));
    }

    WhyText failed(String words) {
        return new WhyText().line(Style.PLAIN, words);
    }

    WhyText compose(WhyReport report) {
        WhyText out = new WhyText().line(Style.TITLE, report.station());
        List<WhyReport.Item> told = new ArrayList<>(report.items().stream().filter(WhyComposer::isTold).toList());
        told.sort(Comparator.comparing(item -> VerdictMark.of(item.finding())));
        if (told.isEmpty()) {
            out.line(Style.PLAIN, texts.get("allMet"));
        }
        if (told.stream().anyMatch(item -> item.finding().verdict() == Verdict.NONCONFORMITY)) {
            out.line(Style.CAUTION, texts.get("caution"));
        }
        told.forEach(item -> finding(out, item));
        list(out, report, Verdict.NOT_YET_RECORDED, "notYetRecorded");
        list(out, report, Verdict.CONFORMITY, "met");
        list(out, report, Verdict.NOT_APPLICABLE, "notApplicable");
        return out;
    }

    private static boolean isTold(WhyReport.Item item) {
        return item.finding().verdict().isReported() || item.finding().conceded();
    }

    private void finding(WhyText out, WhyReport.Item item) {
        Finding finding = item.finding();
        VerdictMark mark = VerdictMark.of(finding);
        Style style = mark == VerdictMark.HAZARD ? Style.HAZARD : mark == VerdictMark.NONCONFORMITY ? Style.NONCONFORMITY : Style.HEADING;
        out.end();
        out.add(style, mark.symbol() + " " + marks.get(mark.key()));
        out.line(Style.HEADING, "  " + item.title());
        out.line(Style.PLAIN, finding.evidence().sentence());
        if (!finding.missing().isEmpty()) {
            out.line(Style.PLAIN, texts.get("missing", String.join(", ", finding.missing())));
        }
        if (finding.hazard() && !item.hazardRule().isBlank()) {
            out.line(Style.PLAIN, texts.get("hazard", item.hazardRule()));
        }
        if (!item.limitSource().isBlank()) {
            out.line(Style.MUTED, texts.get("limit", item.limitSource()));
        }
        if (finding.evidence().provenance() != null) {
            out.line(Style.MUTED, texts.get("provenance", finding.evidence().provenance().label()));
        }
    }

    private void list(WhyText out, WhyReport report, Verdict verdict, String key) {
        List<WhyReport.Item> items = report.items().stream()
                .filter(item -> item.finding().verdict() == verdict && !item.finding().conceded())
                .toList();
        if (items.isEmpty()) {
            return;
        }
        out.end();
        out.line(Style.HEADING, VerdictMark.of(verdict).symbol() + " " + texts.get(key, items.size()));
        for (WhyReport.Item item : items) {
            String evidence = item.finding().evidence().sentence();
            out.line(Style.MUTED, "    " + item.title() + (evidence.isBlank() ? "" : " — " + evidence));
        }
    }
}
