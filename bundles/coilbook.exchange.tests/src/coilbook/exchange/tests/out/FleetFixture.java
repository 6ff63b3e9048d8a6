package coilbook.exchange.tests.out;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilConnection;
import coilbook.fleet.CoilKind;
import coilbook.fleet.CoilType;
import coilbook.fleet.Concession;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.Fitting;
import coilbook.fleet.FittedKind;
import coilbook.fleet.InputSetting;
import coilbook.fleet.InsulationClass;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.LevelChange;
import coilbook.fleet.Line;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.ValveType;

/** A small invented fleet: every kind of driver with a closed form, and tags, types and notes that a spreadsheet program could take for something else. */
final class FleetFixture {

    static final LocalDate DAY = LocalDate.of(2026, 3, 31);
    static final List<String> TAGS = List.of("V1", "=A1+B2-Q3", "+Q1", "-K2", "@V5", "V6", "V7", "V8");
    private static final LocalDate SINCE = LocalDate.of(2024, 5, 6);

    private final Map<Kind<?>, List<Row>> rows = new LinkedHashMap<>();

    private FleetFixture() {
        Kind.ALL.forEach(kind -> rows.put(kind, new ArrayList<>()));
    }

    static FleetFixture small() throws InvalidValue {
        FleetFixture fleet = new FleetFixture();
        fleet.catalogue();
        fleet.places();
        String[] drivers = { "DUO-1", "STEADY-1", "LINECAP-1", "CHOP-1" };
        int i = 0;
        for (String site : List.of("ASH", "=BIR")) {
            for (String tag : TAGS) {
                fleet.station(site, tag, i, drivers[i % drivers.length]);
                i++;
            }
        }
        return fleet;
    }

    /** Rows of a kind, in the order of their keys. */
    @SuppressWarnings("unchecked")
    <R extends Row> List<R> rows(Kind<R> kind) {
        return ((List<R>) rows.get(kind)).stream().sorted(java.util.Comparator.comparing(Row::key)).toList();
    }

    List<Row> all() {
        List<Row> all = new ArrayList<>();
        Kind.ALL.forEach(kind -> all.addAll(rows.get(kind)));
        return all;
    }

    private void catalogue() throws InvalidValue {
        add(CoilType.class, "code", "C-24", "maker", "Invented Windings", "rated_kind", CoilKind.DC, "rated_voltage", 24, "resistance20",
                11.3,
                "resistance_tolerance", 0.06, "inductance", 0.0127, "pull_in_current", 1.55, "drop_out_current", 0.14, "thermal_resistance",
                4.2,
                "highest_dissipation", 24, "insulation_class", InsulationClass.H, "insulation_voltage", 250, "approved_drivers",
                List.of("DUO-1", "STEADY-1"),
                "price", new java.math.BigDecimal("58.5"), "stock", 3, "source", "=invented");
        add(CoilType.class, "code", "C-110*", "rated_kind", CoilKind.DC, "rated_voltage", 110, "resistance20", 95.5, "resistance_tolerance",
                0.1, "inductance",
                0.091, "pull_in_current", 0.33, "drop_out_current", 0.03, "thermal_resistance", 5.1, "insulation_class", InsulationClass.F,
                "insulation_voltage", 250);
        add(ValveType.class, "code", "VA-1", "opening_delay", 0.0015, "closing_delay", 0.0011, "highest_rate", 60, "coil_families",
                List.of("A", "B"));
        add(CableType.class, "code", "K-1", "cross_section", 1.0e-6, "conductor_resistance", 0.0195, "rated_voltage", 300,
                "temperature_rating", 105);
        add(DriverType.class, "code", "DUO-1", "kind", DriverKind.TWO_LEVEL, "pull_in_voltage", 42, "pull_in_time", 0.0037, "hold_voltage",
                6.5,
                "level_change", LevelChange.SOURCE, "switch_drop", 0.55, "clamp_voltage", 41, "isolated_from_mains", true,
                "output_current_limit", 5);
        add(DriverType.class, "code", "STEADY-1", "kind", DriverKind.FIXED_DC, "output_voltage", 24.5, "switch_drop", 0.4, "clamp_voltage",
                39,
                "isolated_from_mains", true);
        add(DriverType.class, "code", "LINECAP-1", "kind", DriverKind.LINE_CAPACITOR, "series_resistance", 145, "capacitance", 31e-6,
                "rectifier_drop", 1.7,
                "switch_drop", 0.3, "clamp_voltage", 45, "capacitor_rating", 250, "switch_rating", 400, "isolated_from_mains", false);
        add(DriverType.class, "code", "CHOP-1", "kind", DriverKind.CURRENT_REGULATED, "bus_voltage", 60, "peak_current", 2.1, "peak_time",
                0.003,
                "hold_current", 0.5, "switch_drop", 0.4, "clamp_voltage", 60, "isolated_from_mains", true);
        for (String driver : List.of("DUO-1", "STEADY-1", "LINECAP-1", "CHOP-1")) {
            add(InputSetting.class, "driver_type", driver, "code", "115", "nominal_voltage", 115, "lowest_voltage", 99, "highest_voltage",
                    133,
                    "lowest_frequency", 47, "highest_frequency", 63, "as_delivered", true);
            add(InputSetting.class, "driver_type", driver, "code", "230", "nominal_voltage", 230, "lowest_voltage", 198, "highest_voltage",
                    264,
                    "lowest_frequency", 47, "highest_frequency", 63);
        }
        add(MarketTolerance.class, "country", "GB", "nominal_from", 220, "nominal_to", 250, "lowest", 0.9, "highest", 1.1, "standard",
                "IEC 60038");
        add(MarketTolerance.class, "country", "*", "nominal_from", 0, "nominal_to", 1000, "lowest", 0.9, "highest", 1.1, "standard",
                "IEC 60038");
    }

    private void places() throws InvalidValue {
        add(Customer.class, "code", "GROUP", "name", "An invented group");
        add(Site.class, "code", "ASH", "customer", "GROUP", "name", "Ashby", "country", "US", "time_zone", "America/Chicago",
                "ambient_lowest", 12,
                "ambient_nominal", 22, "ambient_highest", 38);
        add(Site.class, "code", "=BIR", "customer", "GROUP", "name", "Birnam", "country", "GB", "time_zone", "Europe/London",
                "ambient_lowest", 10,
                "ambient_nominal", 21, "ambient_highest", 35);
        add(Line.class, "site", "ASH", "code", "L1", "machine", "Carton sealer", "speed", 1.2);
        add(Line.class, "site", "=BIR", "code", "L1", "machine", "+Tray former", "speed", 0.9);
        add(Circuit.class, "site", "ASH", "code", "M1", "nominal_voltage", 120, "nominal_frequency", 60, "tolerance_below", 0.05,
                "tolerance_above", 0.05,
                "protective_rating", 15);
        add(Circuit.class, "site", "=BIR", "code", "M1", "nominal_voltage", 230, "nominal_frequency", 50, "protective_rating", 16);
    }

    private void station(String site, String tag, int i, String driver) throws InvalidValue {
        String key = site + "/L1/" + tag;
        String coil = driver.equals("LINECAP-1") ? "C-110*" : "C-24";
        add(Station.class, "site", site, "line", "L1", "tag", tag, "position", i, "coil_connection", CoilConnection.SINGLE, "cable_length",
                4.5 + i * 0.1,
                "cable_temperature", 40, "coil_ambient_highest", 55 + i, "extra_low_voltage", !driver.equals("LINECAP-1"),
                "last_inspection",
                LocalDate.of(2025, 11, 3), "note", i % 3 == 0 ? "@see the <log> & ask" : null);
        add(Supply.class, "station", key, "valid_from", SINCE, "circuit", site + "/M1");
        add(SettingChoice.class, "station", key, "valid_from", SINCE, "setting", site.equals("ASH") ? "115" : "230", "provenance",
                Provenance.NAMEPLATE);
        add(Duty.class, "station", key, "valid_from", SINCE, "cycle_rate", 4 + i * 0.25, "on_time", 0.021, "hours_per_year", 3900);
        add(Fitting.class, "station", key, "kind", FittedKind.VALVE, "valid_from", SINCE, "type", "VA-1");
        add(Fitting.class, "station", key, "kind", FittedKind.COIL, "valid_from", SINCE, "type", coil, "serial", "S" + i);
        add(Item.class, "kind", FittedKind.COIL, "serial", "S" + i, "type", coil);
        add(Fitting.class, "station", key, "kind", FittedKind.DRIVER, "valid_from", SINCE, "type", driver);
        add(Fitting.class, "station", key, "kind", FittedKind.CABLE, "valid_from", SINCE, "type", "K-1");
        if (i == 1) {
            add(Reading.class, "subject_kind", SubjectKind.ITEM, "subject", "coil/S1", "quantity", ReadingQuantity.WINDING_RESISTANCE,
                    "taken_at",
                    LocalDateTime.of(2026, 1, 20, 14, 5, 30), "value", 11.9, "temperature", 26.5, "uncertainty", 0.005);
            add(Reading.class, "subject_kind", SubjectKind.CIRCUIT, "subject", "ASH/M1", "quantity", ReadingQuantity.INSULATION_RESISTANCE,
                    "taken_at",
                    LocalDateTime.of(2026, 1, 21, 9, 0), "value", 5.3e6);
            add(Concession.class, "station", key, "criterion", "pull-in-current", "valid_from", LocalDate.of(2026, 1, 1), "valid_to",
                    LocalDate.of(2026, 12, 1), "reason", "-spare on order", "granted_by", "A. Person");
        }
    }

    /** Adds a row of field ids and values; numbers for quantities are catalogue values in SI. */
    private <R extends Row> void add(Class<R> type, Object... pairs) throws InvalidValue {
        Kind<R> kind = Kind.of(type);
        Object[] values = new Object[kind.fields().size()];
        for (int i = 0; i < pairs.length; i += 2) {
            Field field = kind.field((String) pairs[i]);
            Object value = pairs[i + 1];
            if (value instanceof Number number && field.type() == FieldType.QUANTITY) {
                value = i % 4 == 0 ? Datum.catalogue(number.doubleValue()) : Datum.nameplate(number.doubleValue());
            } else if (value instanceof Number number && field.type() == FieldType.NUMBER) {
                value = number.doubleValue();
            }
            values[kind.fields().indexOf(field)] = value;
        }
        rows.get(kind).add(kind.create(values));
    }
}
