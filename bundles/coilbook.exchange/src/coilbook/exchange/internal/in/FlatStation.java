package coilbook.exchange.internal.in;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

import coilbook.exchange.RowPatch;
import coilbook.fleet.Circuit;
import coilbook.fleet.Controller;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Item;
import coilbook.fleet.ItemStatus;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.TypeStatus;
import coilbook.fleet.WiringSystem;

/** The rows that one line of a flat list speaks of. */
final class FlatStation {

    private final FlatValues values;
    private final TableContext context;
    private final RowPatch.Source source;
    private final List<Draft> drafts = new ArrayList<>();
    private final List<InputProblem> notices = new ArrayList<>();
    private String site;
    private String line;
    private String tag;
    private String station;

    FlatStation(FlatValues values, TableContext context, int row) {
        this.values = values;
        this.context = context;
        this.source = context.source(row);
    }

    /** What a person should know of this line though nothing is wrong with it. */
    List<InputProblem> notices() {
        return notices;
    }

    List<Draft> drafts() throws InvalidValue {
        place();
        addPlaces();
        addCircuit();
        addStation();
        for (FittedKind part : FittedKind.values()) {
            addPart(part);
        }
        addReadings();
        return drafts;
    }

    private void place() throws InvalidValue {
        site = values.text(FlatLayout.SITE);
        line = values.text(FlatLayout.LINE);
        tag = values.text(FlatLayout.TAG);
        String code = values.text(FlatLayout.STATION);
        if (code != null && (site == null || line == null)) {
            String[] parts = code.split("/", 3);
            if (parts.length < 3 || site != null && !site.equals(parts[0]) || line != null && !line.equals(parts[1])) {
                throw new InvalidValue(site == null ? "Site" : "Line", "",
                        "a value, or a whole station code such as SITE/LINE/TAG (blank cells are not filled"
                                + " from above)");
            }
            site = parts[0];
            line = parts[1];
            takeTag(code, parts[2]);
        } else if (code != null) {
            takeTag(code, code.startsWith(site + "/" + line + "/") ? code.substring(site.length() + line.length() + 2) : code);
        }
        require("Site", site);
        require("Line", line);
        require("Station", tag);
        station = context.pool().one(site + "/" + line) + "/" + tag;
        if (tag.indexOf('\n') >= 0) {
            throw new InvalidValue("Station", tag, "a code on one line");
        }
    }

    private void takeTag(String code, String last) throws InvalidValue {
        if (tag != null && !tag.equals(last)) {
            throw new InvalidValue("Station", code, "the same station as under Tag, " + tag);
        }
        tag = last;
    }

    private static void require(String heading, String value) throws InvalidValue {
        if (value == null || value.isBlank()) {
            throw new InvalidValue(heading, "", "a value (blank cells are not filled from above)");
        }
    }

    private Map<Field, Object> row(Kind<?> kind, Object... keys) {
        Map<Field, Object> row = new LinkedHashMap<>();
        for (int i = 0; i < keys.length; i++) {
            row.put(kind.keyFields().get(i), keys[i]);
        }
        return row;
    }

    private void add(Kind<?> kind, Map<Field, Object> row, Draft.Mode mode) {
        drafts.add(new Draft(new RowPatch(kind, row, source, mode == Draft.Mode.TYPE), mode));
    }

    private void addPlaces() {
        String customer = values.text("customer.code");
        if (customer != null) {
            Kind<?> kind = Kind.of(Customer.class);
            Map<Field, Object> row = row(kind, customer);
            values.fill(kind, row);
            add(kind, row, Draft.Mode.SHARED);
        }
        Kind<?> siteKind = Kind.of(Site.class);
        Map<Field, Object> siteRow = row(siteKind, site);
        if (customer != null) {
            siteRow.put(siteKind.field("customer"), customer);
        }
        values.fill(siteKind, siteRow);
        add(siteKind, siteRow, Draft.Mode.SHARED);
        Kind<?> lineKind = Kind.of(Line.class);
        Map<Field, Object> lineRow = row(lineKind, site, line);
        values.fill(lineKind, lineRow);
        add(lineKind, lineRow, Draft.Mode.SHARED);
    }

    private void addCircuit() throws InvalidValue {
        MainsText mains = (MainsText) values.get(FlatLayout.MAINS);
        Double voltage = agreed("Mains voltage", value("circuit.nominal_voltage"), mains == null ? null : mains.voltage());
        Double frequency = agreed("Mains frequency", value("circuit.nominal_frequency"), mains == null ? null : mains.frequency());
        String given = values.text("circuit.code");
        String code = given == null ? MainsText.code(voltage, frequency)
                : given.startsWith(site + "/") ? given.substring(site.length() + 1) : given;
        if (code.isEmpty()) {
            return;
        }
        Kind<?> kind = Kind.of(Circuit.class);
        Map<Field, Object> row = row(kind, site, context.pool().one(code));
        put(row, kind, "nominal_voltage", voltage);
        put(row, kind, "nominal_frequency", frequency);
        addWiring(row, kind, mains);
        values.fill(kind, row);
        add(kind, row, Draft.Mode.SHARED);
        Kind<?> supply = Kind.of(Supply.class);
        Map<Field, Object> supplyRow = row(supply, station, values.get("supply.valid_from"));
        supplyRow.put(supply.field("circuit"), context.pool().one(site + "/" + code));
        add(supply, supplyRow, Draft.Mode.CHILD);
    }

    private Double value(String id) {
        Datum datum = values.datum(id);
        return datum == null ? null : datum.value();
    }

    private static Double agreed(String heading, Double one, Double other) throws InvalidValue {
        if (one != null && other != null && !one.equals(other)) {
            throw new InvalidValue(heading, one, "the same as under Mains, " + other);
        }
        return one == null ? other : one;
    }

    private void put(Map<Field, Object> row, Kind<?> kind, String id, Double si) throws InvalidValue {
        if (si != null) {
            Datum datum = context.pool().one(new Datum(si, Provenance.NAMEPLATE));
            kind.field(id).check(datum);
            row.put(kind.field(id), datum);
        }
    }

    private void addWiring(Map<Field, Object> row, Kind<?> kind, MainsText mains) {
        WiringText wiring = (WiringText) values.get(FlatLayout.WIRING);
        if (wiring != null && wiring.connection() != null) {
            row.put(kind.field("connection"), wiring.connection());
        }
        if (wiring != null && wiring.system() != null) {
            row.put(kind.field("system"), wiring.system());
        } else if (mains != null && mains.phases().startsWith("1")) {
            row.put(kind.field("system"), WiringSystem.SINGLE_PHASE);
        } else if (mains != null && !mains.phases().isEmpty()) {
            notice("Mains", mains.phases(), "star or delta is not said, so the wiring system is left open");
        }
    }

    private void notice(String column, String value, String words) {
        notices.add(context.problem(source.row(), column, value, words));
    }

    private void addStation() {
        Kind<?> kind = Kind.of(Station.class);
        Map<Field, Object> row = row(kind, site, line, tag);
        String controller = values.text("station.controller");
        if (controller != null) {
            String code = controller.startsWith(site + "/") ? controller.substring(site.length() + 1) : controller;
            add(Kind.of(Controller.class), row(Kind.of(Controller.class), site, code), Draft.Mode.SHARED);
            row.put(kind.field("controller"), context.pool().one(site + "/" + code));
        }
        values.fill(kind, row);
        add(kind, row, Draft.Mode.OWN);
        String setting = values.text("setting_choice.setting");
        if (setting != null) {
            Kind<?> choice = Kind.of(SettingChoice.class);
            Map<Field, Object> chosen = row(choice, station, values.get("setting_choice.valid_from"));
            values.fill(choice, chosen);
            add(choice, chosen, Draft.Mode.CHILD);
        }
        Kind<?> duty = Kind.of(Duty.class);
        Map<Field, Object> done = row(duty, station, values.get("duty.valid_from"));
        int keys = done.size();
        values.fill(duty, done);
        if (done.size() > keys) {
            add(duty, done, Draft.Mode.CHILD);
        }
    }

    private void addPart(FittedKind part) throws InvalidValue {
        String type = values.text(part.label() + ".type");
        String serial = values.text(part.label() + ".serial");
        Kind<?> catalogue = FlatLayout.typeKind(part);
        Object maker = values.get(part.label() + ".maker");
        if (type == null) {
            if (serial != null) {
                throw new InvalidValue(name(part) + " type", "", "a type; the serial " + serial + " alone does not say what it is");
            } else if (maker != null || values.has(catalogue)) {
                notice(name(part) + " type", "", "no " + part.label() + " type is named, so what the line says of the type is not taken");
            }
            return;
        }
        Map<Field, Object> entry = row(catalogue, type);
        entry.put(catalogue.field("status"), TypeStatus.INCOMPLETE);
        if (maker != null) {
            entry.put(catalogue.field("maker"), maker);
        }
        values.fill(catalogue, entry);
        add(catalogue, entry, Draft.Mode.TYPE);
        if (serial != null) {
            Kind<?> item = Kind.of(Item.class);
            Map<Field, Object> piece = row(item, part, serial);
            piece.put(item.field("type"), type);
            piece.put(item.field("status"), ItemStatus.IN_SERVICE);
            add(item, piece, Draft.Mode.FIRST);
        }
        Kind<?> fitting = Kind.of(Fitting.class);
        Map<Field, Object> fitted = row(fitting, station, part, values.get(part.label() + ".since"));
        fitted.put(fitting.field("type"), type);
        if (serial != null) {
            fitted.put(fitting.field("serial"), serial);
        }
        add(fitting, fitted, Draft.Mode.CHILD);
    }

    private static String name(FittedKind part) {
        return part.label().substring(0, 1).toUpperCase(Locale.ROOT) + part.label().substring(1);
    }

    private void addReadings() throws InvalidValue {
        LocalDateTime taken = (LocalDateTime) values.get(FlatLayout.READING_DATE);
        for (ReadingQuantity quantity : ReadingQuantity.values()) {
            Object value = values.get(FlatLayout.READING + quantity.name().toLowerCase(Locale.ROOT));
            if (value == null) {
                continue;
            }
            if (taken == null) {
                throw new InvalidValue("Measured on", "", "the date of the reading, as a " + quantity.label() + " is given");
            }
            String serial = values.text("coil.serial");
            Draft onStation = reading(SubjectKind.STATION, station, quantity, taken, value, Draft.Mode.CHILD);
            Draft onItem = serial == null || !isOfTheCoil(quantity) ? null
                    : reading(SubjectKind.ITEM, FittedKind.COIL.label() + "/" + serial, quantity, taken, value, Draft.Mode.SHARED);
            drafts.add(onItem == null || context.gathering().contradicts(onItem) ? onStation : onItem);
        }
    }

    private static boolean isOfTheCoil(ReadingQuantity quantity) {
        return switch (quantity) {
            case WINDING_RESISTANCE, INSULATION_RESISTANCE, WINDING_INDUCTANCE, PULL_IN_CURRENT, DROP_OUT_CURRENT -> true;
            default -> false;
        };
    }

    private Draft reading(SubjectKind kind, String subject, ReadingQuantity quantity, LocalDateTime taken, Object value, Draft.Mode mode) {
        Kind<?> reading = Kind.of(Reading.class);
        Map<Field, Object> row = row(reading, kind, subject, quantity, taken);
        row.put(reading.field("value"), value);
        for (String id : List.of("temperature", "instrument", "by")) {
            Object more = values.get(FlatLayout.READING + id);
            boolean windings = quantity != ReadingQuantity.MAINS_VOLTAGE && quantity != ReadingQuantity.MAINS_FREQUENCY;
            if (more != null && (windings || !id.equals("temperature"))) {
                row.put(reading.field(id), more);
            }
        }
        return new Draft(new RowPatch(reading, row, source), mode);
    }
}
