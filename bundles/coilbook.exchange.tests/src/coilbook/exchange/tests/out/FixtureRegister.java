package coilbook.exchange.tests.out;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.CableType;
import coilbook.fleet.Change;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.Fitting;
import coilbook.fleet.FittedKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.MarketView;
import coilbook.fleet.Progress;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.fleet.Unit;
import coilbook.fleet.ValveType;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.JournalEntry;
import coilbook.register.PastStatus;
import coilbook.register.Register;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;

/** The fixture's rows behind the interfaces of a register, with made-up findings of every sort: what the writer is given, without a database. */
final class FixtureRegister implements Register, PastStatus {

    private final FleetFixture fleet;

    FixtureRegister(FleetFixture fleet) {
        this.fleet = fleet;
    }

    @Override
    public String name() {
        return "fixture";
    }

    @Override
    public long apply(Change change, Progress progress) {
        throw new UnsupportedOperationException("the writer only reads");
    }

    @Override
    public long undo(long seq, String who, Progress progress) {
        throw new UnsupportedOperationException("the writer only reads");
    }

    @Override
    public JournalEntry undoable() {
        return null;
    }

    @Override
    public long head() {
        return 1;
    }

    @Override
    public List<JournalEntry> journal(long afterSeq, int max) {
        return List.of();
    }

    @Override
    public Change change(long seq) {
        throw new UnsupportedOperationException("the writer asks for no change");
    }

    @Override
    public <R extends Row> R find(Kind<R> kind, String key) {
        return fleet.rows(kind).stream().filter(row -> row.key().equals(key)).findFirst().orElse(null);
    }

    private <R extends Row> R find(Class<R> type, String key) {
        return key == null ? null : find(Kind.of(type), key);
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, Consumer<R> consumer) {
        fleet.rows(kind).forEach(consumer);
    }

    @Override
    public <R extends Row> void read(Kind<R> kind, AsOf asOf, Consumer<R> consumer) {
        fleet.rows(kind).stream().filter(row -> !(row instanceof coilbook.fleet.Timed timed) || timed.trueOn(asOf.trueOn()))
                .forEach(consumer);
    }

    @Override
    public StationView station(String code, AsOf asOf) {
        Station station = find(Station.class, code);
        Site site = find(Site.class, station.site());
        Supply supply = first(Supply.class, row -> row.station().equals(code));
        SettingChoice choice = first(SettingChoice.class, row -> row.station().equals(code));
        Duty duty = first(Duty.class, row -> row.station().equals(code));
        List<Fitting> fittings = fleet.rows(Kind.of(Fitting.class)).stream().filter(row -> row.station().equals(code)).toList();
        Map<FittedKind, String> types = new HashMap<>();
        fittings.forEach(fitting -> types.put(fitting.kind(), fitting.type()));
        DriverType driver = find(DriverType.class, types.get(FittedKind.DRIVER));
        List<InputSetting> settings = fleet.rows(Kind.of(InputSetting.class)).stream().filter(row -> row.driverType().equals(driver.code()))
                .toList();
        InputSetting setting = settings.stream().filter(row -> row.code().equals(choice.setting())).findFirst().orElse(null);
        List<MarketTolerance> bands = fleet.rows(Kind.of(MarketTolerance.class)).stream().filter(row -> row.country().equals("*")).toList();
        List<Reading> readings = fleet.rows(Kind.of(Reading.class)).stream()
                .filter(row -> fittings.stream().anyMatch(fitting -> row.subject().equals(fitting.itemKey()))).toList();
        return new StationView(asOf.trueOn(), station, find(Line.class, station.lineKey()), site, find(Customer.class, site.customer()),
                supply,
                find(Circuit.class, supply.circuit()), null, choice, setting, settings, duty, null,
                find(ValveType.class, types.get(FittedKind.VALVE)),
                find(CoilType.class, types.get(FittedKind.COIL)), driver, find(CableType.class, types.get(FittedKind.CABLE)), fittings,
                List.of(), readings,
                List.of(), Map.of(), new MarketView(site.country(), null, bands, List.of()), FleetSettings.defaults());
    }

    private <R extends Row> R first(Class<R> type, java.util.function.Predicate<R> wanted) {
        return fleet.rows(Kind.of(type)).stream().filter(wanted).findFirst().orElse(null);
    }

    @Override
    public void stations(FleetScope scope, AsOf asOf, Consumer<StationView> consumer) {
        for (Station station : within(scope)) {
            consumer.accept(station(station.key(), asOf));
        }
    }

    List<Station> within(FleetScope scope) {
        return fleet.rows(Kind.of(Station.class)).stream().filter(row -> scope.isAll() || scope.sites().contains(row.site())).toList();
    }

    @Override
    public Status status() {
        return this;
    }

    @Override
    public PastStatus statusAsOf(AsOf asOf, FleetScope scope, Progress progress) {
        return this;
    }

    @Override
    public boolean isUpToDate(java.time.LocalDate today) {
        return true;
    }

    @Override
    public long bringUpToDate(java.time.LocalDate today, Progress progress) {
        return 0;
    }

    @Override
    public long[] ids(StatusQuery query) {
        List<Station> all = within(FleetScope.all());
        return within(query.scope()).stream().mapToLong(all::indexOf).toArray();
    }

    @Override
    public List<StatusRow> rows(long[] ids) {
        List<StatusRow> rows = new ArrayList<>();
        for (long id : ids) {
            Station station = within(FleetScope.all()).get((int) id);
            Object[] values = new Object[StatusColumn.values().length];
            values[StatusColumn.STATION.ordinal()] = station.key();
            List<Finding> findings = findings((int) id);
            boolean hazard = findings.stream().anyMatch(finding -> finding.hazard() && !finding.conceded());
            values[StatusColumn.VERDICT.ordinal()] = findings.get(0).verdict().label();
            values[StatusColumn.HAZARDS.ordinal()] = hazard ? 1 : 0;
            rows.add(new StatusRow(id, values));
        }
        return rows;
    }

    @Override
    public void each(StatusQuery query, Consumer<StatusRow> consumer) {
        rows(ids(query)).forEach(consumer);
    }

    @Override
    public void findings(FleetScope scope, Consumer<StationFinding> consumer) {
        List<Station> all = within(FleetScope.all());
        for (Station station : within(scope)) {
            for (Finding finding : findings(all.indexOf(station))) {
                consumer.accept(new StationFinding("GROUP", station.site(), station.line(), station.key(), finding));
            }
        }
    }

    /** Each station's findings by its place in the list: hazards, others, conceded and undetermined ones in turn. */
    private static List<Finding> findings(int station) {
        Verdict verdict = switch (station % 4) {
            case 2 -> Verdict.UNDETERMINED;
            case 3 -> Verdict.OBSERVATION;
            default -> Verdict.NONCONFORMITY;
        };
        Evidence evidence = new Evidence(0.82 + station, 0.9, Unit.AMPERE, "low",
                "Peak current 0.82 A at 108 V, winding 96 °C; pull-in needs 0.90 A (catalogue)", Provenance.CATALOGUE, Map.of());
        Finding first = new Finding("pull-in-current", verdict, station % 4 == 1, evidence,
                verdict == Verdict.UNDETERMINED ? List.of("Inductance of coil type C-24") : List.of(), station == 4);
        Finding second = new Finding("bus-stress", Verdict.OBSERVATION, false, Evidence.words("-margin small"), List.of(), false);
        return station % 3 == 0 ? List.of(first, second) : List.of(first);
    }

    @Override
    public Counts counts(FleetScope scope) {
        throw new UnsupportedOperationException("the writer counts what it writes");
    }

    @Override
    public List<Place> places() {
        throw new UnsupportedOperationException("the writer asks for no tree");
    }

    @Override
    public void close() {
        // nothing is open
    }
}
