package coilbook.exchange.internal.out;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Criterion;
import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.exchange.internal.out.Tally.Count;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Unit;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.Status.StationFinding;

/** The sheet of findings: hazards first, then everything by site, line, station and criterion; each with its evidence and empty boxes for who and when. */
final class FindingsSheet {

    static final String NAME = "Findings";
    static final int SITE = 1;
    static final int CRITERION = 4;
    static final int VERDICT = 6;
    static final int HAZARD = 7;
    static final int CONCEDED = 8;

    private static final List<Column> COLUMNS = List.of(Column.of("Mark", 6), Column.of("Site", 10), Column.of("Line", 10),
            Column.of("Station", 22), Column.of("Criterion", 20), Column.of("Question", 32), Column.of("Verdict", 16),
            Column.of("Hazard", 8), Column.of("Conceded", 10), Column.of("Value", 10), Column.of("Limit", 10), Column.of("Unit", 6),
            Column.of("Corner", 9), Column.of("Evidence", 46), Column.of("Limit and its source", 38), Column.of("Provenance", 18),
            Column.of("Missing", 24), Column.of("What can be done", 38), Column.of("Responsible", 14), Column.of("Due", 12));

    private final SheetOut out;
    private final Map<String, Criterion> criteria = new HashMap<>();
    private final Tally bySite;
    private final Tally byCriterion;

    FindingsSheet(Book book, List<Criterion> criteria, Tally bySite, Tally byCriterion) {
        this.out = book.sheet(NAME, COLUMNS, 4);
        criteria.forEach(criterion -> this.criteria.put(criterion.id(), criterion));
        this.bySite = bySite;
        this.byCriterion = byCriterion;
    }

    SheetOut out() {
        return out;
    }

    void write(Status status, FleetScope scope, Watch watch) throws CoilbookException {
        status.findings(scope, watch.each("Writing hazards", finding -> {
            if (Count.of(finding.finding()) == Count.HAZARDS) {
                row(finding);
            }
        }));
        status.findings(scope, watch.each("Writing findings", finding -> {
            if (Count.of(finding.finding()) != Count.HAZARDS) {
                row(finding);
            }
        }));
        out.end();
    }

    private void row(StationFinding place) throws CoilbookException {
        Finding finding = place.finding();
        Evidence evidence = finding.evidence();
        Criterion criterion = criteria.get(finding.criterion());
        Count count = Count.of(finding);
        bySite.add(place.site(), count);
        byCriterion.add(finding.criterion(), count);
        Use mark = use(count);
        out.begin();
        out.text(count.symbol(), mark);
        out.text(place.site());
        out.text(place.line());
        out.text(place.station());
        out.text(finding.criterion());
        out.text(criterion == null ? "" : criterion.title(), Use.WRAPPED);
        out.text(finding.verdict().label(), mark);
        out.text(yes(finding.hazard()), finding.hazard() ? mark : Use.TEXT);
        out.text(yes(finding.conceded()));
        out.number(shown(evidence.unit(), evidence.value()), Use.NUMBER);
        out.number(shown(evidence.unit(), evidence.limit()), Use.NUMBER);
        out.text(evidence.unit() == null ? "" : evidence.unit().symbol());
        out.text(evidence.corner());
        out.text(evidence.sentence(), Use.WRAPPED);
        out.text(criterion == null ? "" : criterion.limitSource(), Use.WRAPPED);
        out.text(evidence.provenance() == null ? "" : evidence.provenance().label());
        out.text(String.join(", ", finding.missing()), Use.WRAPPED);
        out.text(criterion == null ? "" : String.join("; ", criterion.remedies()), Use.WRAPPED);
        out.box(Use.BOX);
        out.box(Use.BOX_DATE);
    }

    private static String yes(boolean value) {
        return value ? ExchangeSheets.YES : ExchangeSheets.NO;
    }

    private static double shown(Unit unit, double si) {
        return unit == null || Double.isNaN(si) || Double.isInfinite(si) ? si : unit.fromSi(si);
    }

    static Use use(Count count) {
        return switch (count) {
            case HAZARDS -> Use.HAZARD;
            case NONCONFORMITIES -> Use.NONCONFORMITY;
            case OBSERVATIONS -> Use.OBSERVATION;
            case UNDETERMINED -> Use.UNDETERMINED;
            case CONCEDED -> Use.CONCEDED;
        };
    }
}
