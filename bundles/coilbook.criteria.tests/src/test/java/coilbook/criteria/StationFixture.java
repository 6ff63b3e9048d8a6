package coilbook.criteria;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilKind;
import coilbook.fleet.CoilType;
import coilbook.fleet.Concession;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.FleetSetting;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.InputSetting;
import coilbook.fleet.InsulationClass;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.LevelChange;
import coilbook.fleet.Line;
import coilbook.fleet.MarketView;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;

/** Builds stations for tests: a complete, conforming one to begin with, then one value after the other changed or taken away. */
public final class StationFixture {

    public static final LocalDate TODAY = LocalDate.of(2026, 6, 1);
    public static final String STATION = "WERK/L1/=A1";

    private Station station = row(Station.class,
            Map.of("site", "WERK", "line", "L1", "tag", "=A1", "coils_on_channel", 1, "cable_length", metres(10),
                    "cable_temperature", Datum.catalogue(20)));
    private Site site = row(Site.class, Map.of("code", "WERK", "country", "DE", "ambient_lowest", Datum.nameplate(10), "ambient_nominal",
            Datum.nameplate(22), "ambient_highest", Datum.nameplate(40)));
    private Line line = row(Line.class, Map.of("site", "WERK", "code", "L1", "speed", Datum.nameplate(1.5)));
    private Circuit circuit = row(Circuit.class,
            Map.of("site", "WERK", "code", "M1", "nominal_voltage", Datum.nameplate(230), "nominal_frequency",
                    Datum.nameplate(50)));
    private Duty duty = row(Duty.class, Map.of("station", STATION, "cycle_rate", Datum.nameplate(10), "on_time", Datum.nameplate(0.02)));
    private ValveType valve = row(ValveType.class, Map.of("code", "V1", "opening_delay", Datum.catalogue(0.002), "closing_delay",
            Datum.catalogue(0.002), "highest_rate", Datum.catalogue(60)));
    private CableType cable = row(CableType.class, Map.of("code", "W1", "conductor_resistance", Datum.catalogue(0.0195), "rated_voltage",
            Datum.catalogue(300)));
    private CoilType coil = coil10();
    private DriverType driver = twoLevel();
    private TransformerType transformer;
    private List<InputSetting> settings = new ArrayList<>();
    private SettingChoice choice;
    private final List<Fitting> fittings = new ArrayList<>();
    private final List<Fitting> past = new ArrayList<>();
    private final List<Reading> readings = new ArrayList<>();
    private final List<Concession> concessions = new ArrayList<>();
    private final List<FleetSetting> fleetSettings = new ArrayList<>();
    private final Map<String, List<String>> places = new HashMap<>();
    private LocalDate asOf = TODAY;
    private MarketView market = MarketTables.view("DE", MarketTables.rows());

    private StationFixture() {
        setting("S230", 230, 200, 260, 47, 63);
        setting("P115", 115, 100, 130, 47, 63);
        choose("S230");
        fit(FittedKind.VALVE, "V1", "v-1");
        fit(FittedKind.COIL, "C10", "c-1");
        fit(FittedKind.DRIVER, "D1", "d-1");
        fit(FittedKind.CABLE, "W1", null);
    }

    /** 230 V 50 Hz, a two-level driver of 48 V for 3 ms and 6 V hold, a coil of 10 Ω and 8 mH. */
    public static StationFixture twoLevelStation() {
        return new StationFixture();
    }

    /** The same coil on 12 V for the whole on-time. */
    public static StationFixture fixedDcStation() {
        StationFixture fixture = new StationFixture();
        fixture.driver = row(DriverType.class, Map.of("code", "D1", "kind", DriverKind.FIXED_DC, "output_voltage", Datum.catalogue(12),
                "switch_drop", Datum.catalogue(0), "clamp_voltage", Datum.catalogue(47), "output_current_limit", Datum.catalogue(3),
                "coil_kind",
                CoilKind.DC, "coil_voltage_from", Datum.catalogue(24), "coil_voltage_to", Datum.catalogue(24), "isolated_from_mains",
                true));
        return fixture;
    }

    /** 120 V 60 Hz in the United States, a line-capacitor driver, a coil of 250 Ω and 0.2 H. */
    public static StationFixture lineCapacitorStation() {
        StationFixture fixture = new StationFixture();
        fixture.site("country", "US").market("US").circuit("nominal_voltage", Datum.nameplate(120)).circuit("nominal_frequency",
                Datum.nameplate(60));
        fixture.settings.clear();
        fixture.choice = null;
        fixture.setting("L120", 120, 100, 135, 47, 63);
        fixture.driver = row(DriverType.class,
                Map.ofEntries(Map.entry("code", "D1"), Map.entry("kind", DriverKind.LINE_CAPACITOR),
                        Map.entry("series_resistance", Datum.catalogue(430)),
                        Map.entry("series_resistance_tolerance", Datum.catalogue(0.05)),
                        Map.entry("series_resistor_rating", Datum.catalogue(50)),
                        Map.entry("capacitance", Datum.catalogue(33e-6)), Map.entry("capacitance_tolerance", Datum.catalogue(0.1)),
                        Map.entry("rectifier_drop", Datum.catalogue(1.4)), Map.entry("switch_drop", Datum.catalogue(0)),
                        Map.entry("clamp_voltage", Datum.catalogue(0.7)), Map.entry("capacitor_rating", Datum.catalogue(250)),
                        Map.entry("switch_rating", Datum.catalogue(400)), Map.entry("output_current_limit", Datum.catalogue(1)),
                        Map.entry("lowest_load", Datum.catalogue(200)), Map.entry("coil_kind", CoilKind.DC),
                        Map.entry("coil_voltage_from", Datum.catalogue(110)), Map.entry("coil_voltage_to", Datum.catalogue(120)),
                        Map.entry("isolated_from_mains", false)));
        fixture.coil = row(CoilType.class,
                Map.ofEntries(Map.entry("code", "C10"), Map.entry("rated_kind", CoilKind.DC),
                        Map.entry("rated_voltage", Datum.catalogue(115)),
                        Map.entry("resistance20", Datum.catalogue(250)), Map.entry("resistance_tolerance", Datum.catalogue(0.05)),
                        Map.entry("inductance", Datum.catalogue(0.2)), Map.entry("pull_in_current", Datum.catalogue(0.2)),
                        Map.entry("drop_out_current", Datum.catalogue(0.03)), Map.entry("ride_through", Datum.catalogue(0.002)),
                        Map.entry("highest_dissipation", Datum.catalogue(20)), Map.entry("thermal_resistance", Datum.catalogue(4)),
                        Map.entry("insulation_class", InsulationClass.H), Map.entry("insulation_voltage", Datum.catalogue(300)),
                        Map.entry("insulation_peak_voltage", Datum.catalogue(600))));
        return fixture;
    }

    private static CoilType coil10() {
        return row(CoilType.class,
                Map.ofEntries(Map.entry("code", "C10"), Map.entry("rated_kind", CoilKind.DC),
                        Map.entry("rated_voltage", Datum.catalogue(24)),
                        Map.entry("resistance20", Datum.catalogue(10)), Map.entry("resistance_tolerance", Datum.catalogue(0.05)),
                        Map.entry("inductance", Datum.catalogue(0.008)), Map.entry("pull_in_current", Datum.catalogue(1.2)),
                        Map.entry("drop_out_current", Datum.catalogue(0.2)), Map.entry("ride_through", Datum.catalogue(0.002)),
                        Map.entry("highest_dissipation", Datum.catalogue(20)), Map.entry("dissipation_ambient", Datum.catalogue(40)),
                        Map.entry("thermal_resistance", Datum.catalogue(5)), Map.entry("insulation_class", InsulationClass.F),
                        Map.entry("insulation_voltage", Datum.catalogue(150)), Map.entry("insulation_peak_voltage", Datum.catalogue(400))));
    }

    private static DriverType twoLevel() {
        return row(DriverType.class,
                Map.ofEntries(Map.entry("code", "D1"), Map.entry("kind", DriverKind.TWO_LEVEL),
                        Map.entry("pull_in_voltage", Datum.catalogue(48)),
                        Map.entry("pull_in_time", Datum.catalogue(0.003)), Map.entry("hold_voltage", Datum.catalogue(6)),
                        Map.entry("level_change", LevelChange.SOURCE), Map.entry("switch_drop", Datum.catalogue(0)),
                        Map.entry("clamp_voltage", Datum.catalogue(47)), Map.entry("output_current_limit", Datum.catalogue(6)),
                        Map.entry("lowest_load", Datum.catalogue(8)), Map.entry("coil_kind", CoilKind.DC),
                        Map.entry("coil_voltage_from", Datum.catalogue(24)), Map.entry("coil_voltage_to", Datum.catalogue(24)),
                        Map.entry("isolated_from_mains", true)));
    }

    private static Datum metres(double length) {
        return Datum.nameplate(length);
    }

    /** A row from values by field id. */
    public static <R extends Row> R row(Class<R> type, Map<String, ?> values) {
        Kind<R> kind = Kind.of(type);
        Object[] all = new Object[kind.fields().size()];
        values.forEach((id, value) -> all[kind.fields().indexOf(kind.field(id))] = value);
        try {
            return kind.create(all);
        } catch (InvalidValue e) {
            throw new AssertionError(e);
        }
    }

    private static <R extends Row> R with(R row, String fieldId, Object value) {
        Kind<R> kind = Kind.of(row);
        Field field = kind.field(fieldId);
        try {
            return kind.with(row, field, value);
        } catch (InvalidValue e) {
            throw new AssertionError(e);
        }
    }

    public StationFixture station(String field, Object value) {
        station = with(station, field, value);
        return this;
    }

    public StationFixture site(String field, Object value) {
        site = with(site, field, value);
        return this;
    }

    public StationFixture line(String field, Object value) {
        line = with(line, field, value);
        return this;
    }

    public StationFixture circuit(String field, Object value) {
        circuit = with(circuit, field, value);
        return this;
    }

    public StationFixture duty(String field, Object value) {
        duty = with(duty, field, value);
        return this;
    }

    public StationFixture valve(String field, Object value) {
        valve = with(valve, field, value);
        return this;
    }

    public StationFixture cable(String field, Object value) {
        cable = with(cable, field, value);
        return this;
    }

    public StationFixture coil(String field, Object value) {
        coil = with(coil, field, value);
        return this;
    }

    public StationFixture driver(String field, Object value) {
        driver = with(driver, field, value);
        return this;
    }

    public StationFixture withoutCircuit() {
        circuit = null;
        return this;
    }

    public StationFixture withoutDuty() {
        duty = null;
        return this;
    }

    public StationFixture withoutCoil() {
        coil = null;
        fittings.removeIf(f -> f.kind() == FittedKind.COIL);
        return this;
    }

    public StationFixture withoutDriver() {
        driver = null;
        settings.clear();
        choice = null;
        fittings.removeIf(f -> f.kind() == FittedKind.DRIVER);
        return this;
    }

    public StationFixture withoutValve() {
        valve = null;
        fittings.removeIf(f -> f.kind() == FittedKind.VALVE);
        return this;
    }

    public StationFixture withoutCable() {
        cable = null;
        fittings.removeIf(f -> f.kind() == FittedKind.CABLE);
        return this;
    }

    public StationFixture transformer(double primary, double secondary, Double regulation) {
        Map<String, Object> values = new HashMap<>(
                Map.of("code", "T1", "primary_voltage", Datum.catalogue(primary), "secondary_voltage", Datum.catalogue(secondary)));
        if (regulation != null) {
            values.put("regulation", Datum.catalogue(regulation));
        }
        transformer = row(TransformerType.class, values);
        return circuit("transformer_type", "T1");
    }

    public StationFixture setting(String code, double nominal, double lowest, double highest, double lowestHertz, double highestHertz) {
        settings.add(row(InputSetting.class,
                Map.of("driver_type", "D1", "code", code, "nominal_voltage", Datum.catalogue(nominal), "lowest_voltage",
                        Datum.catalogue(lowest),
                        "highest_voltage", Datum.catalogue(highest), "lowest_frequency", Datum.catalogue(lowestHertz), "highest_frequency",
                        Datum.catalogue(highestHertz))));
        return this;
    }

    public StationFixture setting(String code, String field, Object value) {
        settings.replaceAll(s -> s.code().equals(code) ? with(s, field, value) : s);
        return this;
    }

    public StationFixture onlySetting(String code) {
        settings.removeIf(s -> !s.code().equals(code));
        return this;
    }

    public StationFixture choose(String code) {
        choice = code == null ? null : new SettingChoice(STATION, null, null, code, Provenance.NAMEPLATE);
        return this;
    }

    public StationFixture fit(FittedKind kind, String type, String serial) {
        Map<String, Object> values = new HashMap<>(
                Map.of("station", STATION, "kind", kind, "valid_from", LocalDate.of(2024, 1, 10), "type", type));
        if (serial != null) {
            values.put("serial", serial);
            places.put(kind.label() + "/" + serial, List.of(STATION));
        }
        fittings.removeIf(f -> f.kind() == kind);
        fittings.add(row(Fitting.class, values));
        return this;
    }

    public StationFixture itemAlsoAt(String item, String other) {
        places.put(item, List.of(STATION, other));
        return this;
    }

    public StationFixture read(SubjectKind kind, String subject, ReadingQuantity quantity, LocalDate day, double value, Datum temperature,
            Datum uncertainty) {
        Map<String, Object> values = new HashMap<>(Map.of("subject_kind", kind, "subject", subject, "quantity", quantity, "taken_at",
                LocalDateTime.of(day.getYear(), day.getMonth(), day.getDayOfMonth(), 9, 0), "value", value));
        values.put("temperature", temperature);
        values.put("uncertainty", uncertainty);
        readings.add(row(Reading.class, values));
        return this;
    }

    public StationFixture readWinding(double ohm, Double celsius) {
        return read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE, TODAY.minusDays(40), ohm,
                celsius == null ? null : Datum.measured(celsius), null);
    }

    public StationFixture readMains(double volts) {
        return read(SubjectKind.CIRCUIT, "WERK/M1", ReadingQuantity.MAINS_VOLTAGE, TODAY.minusDays(30), volts, null, null);
    }

    public StationFixture concede(String criterion, LocalDate from, LocalDate to, String second, Double valueWhenGranted) {
        concessions.add(new Concession(STATION, criterion, from, to, "until the part comes", "first person", second, valueWhenGranted));
        return this;
    }

    public StationFixture fleet(String name, double value) {
        fleetSettings.add(new FleetSetting(name, value, null));
        return this;
    }

    public StationFixture market(String country) {
        market = MarketTables.view(country, MarketTables.rows());
        return this;
    }

    public StationFixture on(LocalDate day) {
        asOf = day;
        return this;
    }

    public StationView view() {
        InputSetting chosen = choice == null ? null
                : settings.stream().filter(s -> s.code().equals(choice.setting())).findFirst().orElse(null);
        Supply supply = circuit == null ? null : new Supply(STATION, null, null, circuit.key());
        return new StationView(asOf, station, line, site, null, supply, circuit, transformer, choice, chosen, settings, duty, null, valve,
                coil,
                driver, cable, fittings, past, readings, concessions, places, market, FleetSettings.of(fleetSettings));
    }
}
