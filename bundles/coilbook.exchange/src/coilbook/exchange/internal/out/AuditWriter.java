package coilbook.exchange.internal.out;

import java.nio.file.Path;
import java.time.Clock;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

import org.osgi.service.component.annotations.Component;

import coilbook.criteria.Criteria;
import coilbook.criteria.Criterion;
import coilbook.exchange.AuditWorkbook;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.FleetSetting;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.PastStatus;
import coilbook.register.Register;
import coilbook.register.Status;

/**
 * Writes audit workbooks by streaming: rows go from the register's readers straight into the sheets. Whether a date is past is judged by the clock, because import
 * must refuse a workbook that no longer shows the present.
 */
@Component
public final class AuditWriter implements AuditWorkbook {

    private final Clock clock;

    /** For the service registry: the system's clock. */
    public AuditWriter() {
        this(Clock.systemDefaultZone());
    }

    public AuditWriter(Clock clock) {
        this.clock = clock;
    }

    @Override
    public void write(Register register, FleetScope scope, LocalDate asOf, Path out, Progress progress) throws CoilbookException {
        try {
            AtomicFile.write(out, temporary -> {
                try (Book book = new Book("Coilbook audit", ScopeWords.of(scope) + ", as of " + asOf, asOf)) {
                    new Writing(book, register, scope, asOf, asOf.isBefore(LocalDate.now(clock)), progress).audit();
                    progress.check();
                    progress.report("Packing the workbook", 0, 0);
                    book.write(temporary);
                }
            });
        } catch (Watch.Stopped e) {
            throw e.reason();
        }
    }

    /** One workbook being written. */
    private static final class Writing {

        private final Book book;
        private final Register register;
        private final FleetScope scope;
        private final LocalDate asOf;
        private final boolean past;
        private final Progress progress;
        private final Tally bySite = new Tally();
        private final Tally byCriterion = new Tally();
        private final Map<Kind<?>, EntitySheet> sheets = new LinkedHashMap<>();

        Writing(Book book, Register register, FleetScope scope, LocalDate asOf, boolean past, Progress progress) {
            this.book = book;
            this.register = register;
            this.scope = scope;
            this.asOf = asOf;
            this.past = past;
            this.progress = progress;
        }

        void audit() throws CoilbookException {
            if (past && !register.status().isUpToDate(asOf)) {
                try (PastStatus then = register.statusAsOf(AsOf.on(asOf), scope, progress)) {
                    audit(then);
                }
            } else {
                audit(register.status());
            }
        }

        private void audit(Status status) throws CoilbookException {
            StatusFeed feed = new StatusFeed(status, scope);
            Watch watch = new Watch(progress, feed.size());
            List<Criterion> criteria = Criteria.all();
            ScopeFilter filter = ScopeFilter.of(register, scope);
            Map<String, String> siteNames = siteNames(filter);

            // The order in which sheets are made is the order of their tabs; they are filled in the order in which they need one another.
            SummaryPage summary = new SummaryPage(book);
            FindingsSheet findings = new FindingsSheet(book, criteria, bySite, byCriterion);
            Lookups lookups = new Lookups();
            StationsSheet stations = new StationsSheet(book, lookups);
            CircuitsSheet circuits = new CircuitsSheet(book);
            MethodSheet method = new MethodSheet(book);
            for (Kind<?> kind : ExchangeSheets.KINDS) {
                if (kind.type() != Station.class && kind.type() != Circuit.class) {
                    sheets.put(kind, new EntitySheet(book, kind, List.of()));
                }
            }
            lookups.add(circuits.sheet(), circuits.keyColumn());
            for (Kind<?> kind : StationsSheet.LOOKED_UP) {
                if (kind.type() != Circuit.class) {
                    lookups.add(sheets.get(kind), 0);
                }
            }
            findings.write(status, scope, watch);
            MarketBands markets = MarketBands.of(register);
            read(Kind.of(Circuit.class), watch.each("Writing circuits", circuit -> {
                if (filter.has(circuit)) {
                    circuits.row(circuit, markets);
                    lookups.note(Kind.of(Circuit.class), circuit.key());
                }
            }));
            circuits.sheet().out().end();
            for (Map.Entry<Kind<?>, EntitySheet> sheet : sheets.entrySet()) {
                entity(sheet.getKey(), sheet.getValue(), filter, lookups, watch);
            }
            DerivedElectrics electrics = new DerivedElectrics();
            Map<String, Long> stationsBySite = new HashMap<>();
            siteNames.keySet().forEach(bySite::mention);
            register.stations(scope, AsOf.on(asOf), watch.eachStation("Writing stations", station -> {
                stations.row(station, electrics.of(station), feed.of(station.code()));
                stationsBySite.merge(station.station().site(), 1L, Long::sum);
                bySite.mention(station.station().site());
            }));
            stations.end();
            method.write(criteria, settings());
            Map<String, String> titles = new HashMap<>();
            criteria.forEach(criterion -> titles.put(criterion.id(), criterion.title()));
            summary.write(new SummaryPage.Content(ScopeWords.of(scope), asOf, !scope.isAll(), past, findings.out(), stations.out(), 0,
                    bySite, stationsBySite,
                    siteNames, byCriterion, titles));
        }

        private <R extends Row> void entity(Kind<R> kind, EntitySheet sheet, ScopeFilter filter, Lookups lookups, Watch watch)
                throws CoilbookException {
            boolean lookedUp = StationsSheet.LOOKED_UP.contains(kind);
            read(kind, watch.each("Writing " + kind.sheet().toLowerCase(java.util.Locale.ROOT), row -> {
                if (filter.has(row)) {
                    sheet.begin(row);
                    if (lookedUp) {
                        lookups.note(kind, row.key());
                    }
                }
            }));
            sheet.out().end();
        }

        /** Today's rows with all their intervals; for a past date what was true then. */
        private <R extends Row> void read(Kind<R> kind, java.util.function.Consumer<R> consumer) throws CoilbookException {
            if (past) {
                register.read(kind, AsOf.on(asOf), consumer);
            } else {
                register.read(kind, consumer);
            }
        }

        private Map<String, String> siteNames(ScopeFilter filter) throws CoilbookException {
            Map<String, String> names = new TreeMap<>();
            read(Kind.of(Site.class), site -> {
                if (filter.has(site)) {
                    names.put(site.code(), (site.name() == null ? "" : site.name() + ", ") + site.country());
                }
            });
            return names;
        }

        private FleetSettings settings() throws CoilbookException {
            List<FleetSetting> rows = new ArrayList<>();
            read(Kind.of(FleetSetting.class), rows::add);
            return FleetSettings.of(rows);
        }
    }
}
