package coilbook.workbench.tests.fake;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.IntStream;

import coilbook.charts.WaveformPlot;
import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.electrics.Trace;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.fleet.Provenance;
import coilbook.fleet.Unit;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.model.BroughtIn;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Steps;
import coilbook.workbench.internal.model.WaveformReport;
import coilbook.workbench.internal.model.WhyReport;

/** An invented fleet in memory: every seventh station has coil C-110, which is a nonconformity here; any other coil conforms. */
public final class FakeFleet implements FleetModel {

    public static final String BAD_COIL = "C-110";
    public static final String GOOD_COIL = "C-24";

    private record Step(int station, String before, String after) {
    }

    private final String name;
    private volatile boolean closed;
    private final boolean longNames;
    private final String[] coils;
    private final Deque<Step> done = new ArrayDeque<>();
    private final Deque<Step> undone = new ArrayDeque<>();

    public FakeFleet(String name, int stations, boolean longNames) {
        this.name = name;
        this.longNames = longNames;
        coils = new String[stations];
        for (int i = 0; i < stations; i++) {
            coils[i] = i % 7 == 3 ? BAD_COIL : GOOD_COIL;
        }
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public boolean isEditable(StatusColumn column) {
        return column == StatusColumn.COIL_TYPE || column == StatusColumn.CABLE_LENGTH;
    }

    @Override
    public boolean hasChoices(StatusColumn column) {
        return column == StatusColumn.COIL_TYPE;
    }

    @Override
    public long bringUpToDate(Progress progress) {
        return 0;
    }

    public boolean isClosed() {
        return closed;
    }

    private String customer(int i) {
        return i % 2 == 0 ? longNames ? "Sehr lange benannte Klebetechnik-Beteiligungsgesellschaft Nord-West" : "Aldmoor" : "Brennholm";
    }

    private String site(int i) {
        return (longNames ? "Werk mit einem ausgesprochen langen Ortsnamen an der Nebenstrecke " : "PLT") + String.format("%03d", i / 40);
    }

    private String line(int i) {
        return "L" + (1 + i / 10 % 4);
    }

    private String code(int i) {
        return site(i) + "/" + line(i) + "/=V" + (i % 10 + 1);
    }

    private int index(String station) {
        return IntStream.range(0, coils.length).filter(i -> code(i).equals(station)).findFirst().orElse(-1);
    }

    private synchronized StatusRow row(int i) {
        Object[] values = new Object[StatusColumn.values().length];
        boolean bad = coils[i].equals(BAD_COIL);
        boolean hazard = bad && i % 3 == 0;
        put(values, StatusColumn.STATION, code(i));
        put(values, StatusColumn.VERDICT, bad ? Verdict.NONCONFORMITY.label() : i % 5 == 0 ? Verdict.UNDETERMINED.label() : "conformity");
        put(values, StatusColumn.HAZARDS, hazard ? 1 : 0);
        put(values, StatusColumn.NONCONFORMITIES, bad ? 2 : 0);
        put(values, StatusColumn.CUSTOMER, customer(i));
        put(values, StatusColumn.SITE, site(i));
        put(values, StatusColumn.LINE, line(i));
        put(values, StatusColumn.TAG, "=V" + (i % 10 + 1));
        put(values, StatusColumn.DESCRIPTION,
                longNames ? "Auftragskopf an der zweiten Umlenkung hinter der Kaschierung, Bedienseite" : "Glue head");
        put(values, StatusColumn.COUNTRY, "DE");
        put(values, StatusColumn.MAINS_VOLTAGE, 230.0);
        put(values, StatusColumn.MAINS_FREQUENCY, 50.0);
        put(values, StatusColumn.COIL_TYPE, coils[i]);
        put(values, StatusColumn.CABLE_LENGTH, 4.5 + i % 9);
        put(values, StatusColumn.PEAK_CURRENT, bad ? 0.2123 : 0.98765);
        put(values, StatusColumn.WINDING_TEMPERATURE, 96.4321);
        put(values, StatusColumn.PROVENANCE, "catalogue");
        return new StatusRow(i + 1L, values);
    }

    private static void put(Object[] values, StatusColumn column, Object value) {
        values[column.ordinal()] = value;
    }

    private boolean in(FleetScope scope, StatusRow row) {
        return scope.isAll() || scope.customers().contains(row.get(StatusColumn.CUSTOMER))
                || scope.sites().contains(row.get(StatusColumn.SITE))
                || scope.lines().contains(row.get(StatusColumn.SITE) + "/" + row.get(StatusColumn.LINE))
                || scope.stations().contains(row.station());
    }

    @Override
    public long[] ids(StatusQuery query) {
        Comparator<StatusRow> order = Comparator.comparing(StatusRow::id);
        for (int i = query.sorts().size() - 1; i >= 0; i--) {
            StatusQuery.Sort sort = query.sorts().get(i);
            Comparator<StatusRow> by = Comparator.comparing(row -> String.valueOf(row.get(sort.column())));
            order = (sort.descending() ? by.reversed() : by).thenComparing(order);
        }
        return IntStream.range(0, coils.length).mapToObj(this::row).filter(row -> in(query.scope(), row))
                .filter(row -> query.filters().stream()
                        .allMatch(f -> String.valueOf(row.get(f.column())).toLowerCase().contains(f.expression().toLowerCase())))
                .sorted(order).mapToLong(StatusRow::id).toArray();
    }

    @Override
    public List<StatusRow> rows(long[] ids) {
        List<StatusRow> rows = new ArrayList<>();
        for (long id : ids) {
            rows.add(id > coils.length ? null : row((int) id - 1));
        }
        return rows;
    }

    @Override
    public Status.Counts counts(FleetScope scope) {
        List<StatusRow> rows = IntStream.range(0, coils.length).mapToObj(this::row).filter(row -> in(scope, row)).toList();
        long bad = rows.stream().filter(row -> BAD_COIL.equals(row.get(StatusColumn.COIL_TYPE))).count();
        long hazards = rows.stream().filter(row -> Objects.equals(1, row.get(StatusColumn.HAZARDS))).count();
        long open = rows.stream().filter(row -> "undetermined".equals(row.get(StatusColumn.VERDICT))).count();
        return new Status.Counts(rows.size(), hazards, 2 * bad, 0, open, 0);
    }

    @Override
    public List<Status.Place> places() {
        List<Status.Place> places = new ArrayList<>();
        for (int parity = 0; parity < 2; parity++) {
            if (coils.length <= parity) {
                break;
            }
            String customer = customer(parity);
            places.add(new Status.Place(customer, null, null, counts(new FleetScope(List.of(customer), List.of(), List.of(), List.of()))));
            for (int i = parity * 40; i < Math.min(coils.length, 2_000); i += 80) {
                places.add(new Status.Place(customer, site(i), null, new Status.Counts(40, i % 3, 6, 0, 4, 0)));
                for (int line = 1; line <= 4; line++) {
                    places.add(new Status.Place(customer, site(i), "L" + line, new Status.Counts(10, i % 2, 2, 0, 1, 0)));
                }
            }
        }
        return places;
    }

    @Override
    public List<String> choices(String station, StatusColumn column) {
        return List.of(BAD_COIL, GOOD_COIL, "C-48");
    }

    @Override
    public synchronized void edit(String station, StatusColumn column, String text, Progress progress) throws CoilbookException {
        if (column == StatusColumn.COIL_TYPE && !choices(station, column).contains(text)) {
            throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, "the catalogue has no coil type \"" + text + "\"");
        }
        int i = index(station);
        done.push(new Step(i, coils[i], text));
        undone.clear();
        coils[i] = text;
    }

    @Override
    public synchronized Steps steps() {
        return new Steps(done.isEmpty() ? null : words(done.peek()), done.isEmpty() ? 0 : 1,
                undone.isEmpty() ? null : words(undone.peek()));
    }

    private String words(Step step) {
        return "Coil type at " + code(step.station) + ": " + step.after;
    }

    @Override
    public synchronized void undo(Progress progress) {
        Step step = done.pop();
        coils[step.station] = step.before;
        undone.push(step);
    }

    @Override
    public synchronized void redo(Progress progress) {
        Step step = undone.pop();
        coils[step.station] = step.after;
        done.push(step);
    }

    @Override
    public WhyReport why(String station) {
        int i = index(station);
        if (i < 0) {
            return null;
        }
        StatusRow row = row(i);
        boolean bad = BAD_COIL.equals(row.get(StatusColumn.COIL_TYPE));
        boolean hazard = Objects.equals(1, row.get(StatusColumn.HAZARDS));
        List<WhyReport.Item> items = new ArrayList<>();
        items.add(item("pull-in-current", "Does the current reach the pull-in current?", bad ? Verdict.NONCONFORMITY : Verdict.CONFORMITY,
                false,
                bad ? "Peak current 0.21 A at 207 V, winding 96 °C; pull-in needs 0.90 A (catalogue)."
                        : "Peak current 0.99 A; pull-in needs 0.90 A.",
                List.of()));
        items.add(item("coil-class", "Is the coil made for this driver's output?", bad ? Verdict.NONCONFORMITY : Verdict.CONFORMITY, hazard,
                bad ? "The coil is rated 110 V DC; the driver gives 24 V DC." : "Rated 24 V DC, fed with 24 V DC.", List.of()));
        items.add(item("cycle-rate", "Is the cycle rate one that the valve can follow?",
                i % 5 == 0 ? Verdict.UNDETERMINED : Verdict.CONFORMITY, false,
                i % 5 == 0 ? "The closing delay of the valve is not recorded." : "6 cycles a second; 22 at most.",
                i % 5 == 0 ? List.of("Closing delay") : List.of()));
        return new WhyReport(station, items);
    }

    private static WhyReport.Item item(String id, String title, Verdict verdict, boolean hazard, String sentence, List<String> missing) {
        Evidence evidence = new Evidence(0.21, 0.9, Unit.AMPERE, "low", sentence, Provenance.CATALOGUE, Map.of());
        return new WhyReport.Item(new Finding(id, verdict, hazard, evidence, missing, false), title, "catalogue entry",
                "a coil of a lower voltage burns out");
    }

    @Override
    public WaveformReport waveform(String station, Corner corner) {
        int samples = 1500;
        double[] time = new double[samples];
        double[] voltage = new double[samples];
        double[] current = new double[samples];
        double end = corner == Corner.LOW ? 0.85 : corner == Corner.NOMINAL ? 1 : 1.1;
        for (int i = 0; i < samples; i++) {
            time[i] = 0.4 * i / samples;
            double inCycle = time[i] % 0.2;
            voltage[i] = 24 * end;
            current[i] = inCycle < 0.06 ? end * (1 - Math.exp(-inCycle * 300)) : end * Math.exp(-(inCycle - 0.06) * 120);
        }
        return new WaveformReport(station, corner, new WaveformPlot(station + " · " + corner, new Trace(time, voltage, current), 0.9, 0.4),
                "invented");
    }

    @Override
    public BroughtIn bringIn(List<Path> files, boolean acceptPartial, Progress progress) {
        return new BroughtIn(0, 0, 0, 0, List.of(), false);
    }

    @Override
    public void audit(FleetScope scope, Path out, Progress progress) {
        throw new UnsupportedOperationException("not part of these tests");
    }

    @Override
    public void close() {
        closed = true;
    }
}
