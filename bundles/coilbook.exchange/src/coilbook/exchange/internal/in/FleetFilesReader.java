package coilbook.exchange.internal.in;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

import org.osgi.service.component.annotations.Component;

import coilbook.exchange.FleetFiles;
import coilbook.exchange.Incoming;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;

/** Reads exchange workbooks and flat lists; keeps nothing between readings. */
@Component
public final class FleetFilesReader implements FleetFiles {

    private static final int HEADINGS_NAMED = 12;
    private static final int ROWS_BETWEEN_REPORTS = 500;

    @Override
    public Incoming read(List<Path> files, Map<String, String> columns, Progress progress) throws CoilbookException {
        List<Layout> layouts = new ArrayList<>();
        for (Kind<?> kind : ExchangeSheets.KINDS) {
            layouts.add(new KindLayout(kind));
        }
        layouts.add(new FlatLayout());
        ColumnMap map = new ColumnMap(columns, layouts);
        Gathering gathering = new Gathering();
        Pool pool = new Pool();
        Countries countries = new Countries();
        for (Path path : files) {
            try (InputFile file = InputFiles.open(path, texts -> Headings.known(texts, layouts))) {
                new OneFile(file, layouts, map, gathering, pool, countries, progress).read();
            }
        }
        for (String heading : map.neverMet()) {
            gathering.notice(new InputProblem("column map", "", 0, heading, "", "no file has this heading"));
        }
        return gathering.incoming();
    }

    /** The reading of one file, sheet by sheet. */
    private record OneFile(InputFile file, List<Layout> layouts, ColumnMap map, Gathering gathering, Pool pool, Countries countries,
            Progress progress) {

        void read() throws CoilbookException {
            boolean marked = readSummary();
            boolean exchange = marked || file.tables().stream().filter(table -> ExchangeSheets.bySheet(table.name()) != null).count() > 1;
            List<InputProblem> faults = new ArrayList<>();
            List<InputProblem> unread = new ArrayList<>();
            List<String> seen = new ArrayList<>();
            boolean any = false;
            for (InputTable table : file.tables()) {
                if (exchange && ExchangeSheets.bySheet(table.name()) == null) {
                    if (!marked) {
                        unread.add(new InputProblem(file.name(), table.name(), 0, "", "",
                                "the sheet is none of an exchange workbook and is passed over"));
                    }
                    continue;
                }
                TableReader reader = read(table);
                any |= reader.isRead();
                faults.addAll(reader.faults());
                if (!reader.isRead() && reader.faults().isEmpty()) {
                    seen.addAll(reader.headingsSeen());
                    unread.add(
                            new InputProblem(file.name(), table.name(), 0, "", "", "the sheet has no known headings and is passed over"));
                }
            }
            if (!any && !faults.isEmpty()) {
                throw Refusal.of(faults);
            } else if (!any) {
                throw Refusal.of(file.name(), noHeading(seen));
            }
            faults.forEach(gathering::reject);
            unread.forEach(gathering::notice);
        }

        private boolean readSummary() throws CoilbookException {
            boolean marked = false;
            for (InputTable table : file.tables()) {
                if (table.name().equalsIgnoreCase(ExchangeSheets.SUMMARY)) {
                    SummaryReader summary = new SummaryReader();
                    table.read(summary);
                    marked |= summary.isMarked();
                    if (summary.isPartial()) {
                        gathering.markPartial();
                    }
                    if (summary.isPastDate()) {
                        gathering.markPastDate();
                    }
                }
            }
            return marked;
        }

        private TableReader read(InputTable table) throws CoilbookException {
            TableContext context = new TableContext(file.name(), table.name(), new CellReader(table.commaDecimals()), gathering, pool,
                    countries);
            TableReader reader = new TableReader(table, context, layouts, map);
            String step = "Reading " + file.name() + (table.name().isEmpty() ? "" : ", " + table.name());
            progress.report(step, 0, 0);
            table.read((number, cells) -> {
                if (number % ROWS_BETWEEN_REPORTS == 0) {
                    progress.check();
                    progress.report(step, number, 0);
                }
                reader.row(number, cells);
                gathering.refuseTooMany(file.name());
            });
            reader.finish();
            return reader;
        }

        private String noHeading(List<String> seen) {
            List<String> texts = seen.subList(0, Math.min(seen.size(), HEADINGS_NAMED));
            StringBuilder words = new StringBuilder("has no known headings; ");
            words.append(texts.isEmpty() ? "no text that could be one was found" : "found: " + String.join(" | ", texts));
            List<String> near = new ArrayList<>();
            for (String text : texts) {
                for (Layout layout : layouts) {
                    String nearest = Headings.nearest(text, layout);
                    if (nearest != null && near.stream().noneMatch(nearest::equals)) {
                        near.add(nearest);
                    }
                }
            }
            words.append(near.isEmpty() ? "" : "; near to: " + String.join(", ", near));
            return words.append(
                    "; expected the headings of an exchange workbook's sheet, or of a list with one station a row: Site, Line, Station, Circuit, Coil,"
                            + " Driver, Input setting …")
                    .toString();
        }
    }
}
