package coilbook.jobs.internal.demo;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.SplittableRandom;

import coilbook.fleet.Circuit;
import coilbook.fleet.Connection;
import coilbook.fleet.CoilConnection;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Item;
import coilbook.fleet.ItemStatus;
import coilbook.fleet.Line;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;

/**
 * Invents stations one after another. Each depends on the seed and its own number alone, so that the first hundred are the same in a fleet of two
 * hundred. Values come in few steps, as real fleets repeat themselves.
 */
public final class FleetInventor {

    private static final int STATIONS_A_LINE = 8;
    private static final int LINES_A_SITE = 5;
    private static final int FAULT_EVERY = 9;
    private static final int FAULT_AT = 4;
    private static final int GAP_EVERY = 23;
    private static final int GAP_AT = 7;
    private static final double COPPER = 234.5;
    private static final String[] GROUPS = { "Quillmere Foods", "Tannbrook Packaging", "Ostrel Bindery", "Vexholm Hygiene",
            "Pellandine Labels" };
    private static final String[] PLACES = { "Alderwick", "Brannoch", "Corviston", "Dunmarrow", "Eskerfold", "Farnholt", "Glimmeray",
            "Harrowend" };
    private static final String[] MACHINES = { "Case sealer", "Carton erector", "Labeller", "Tray former", "Spine gluer" };
    private static final double[] RATES = { 3, 4, 5, 6, 8 };
    private static final double[] ON_TIMES = { 0.020, 0.025, 0.030, 0.040 };
    private static final double[] LENGTHS = { 4, 6, 8, 12, 15 };
    /** Line-operated drivers stand on slow machines of few patterns. */
    private static final double[] LINE_OPERATED_RATES = { 3, 4 };
    private static final double[] LINE_OPERATED_LENGTHS = { 6, 8 };
    private static final double LINE_OPERATED_ON_TIME = 0.030;
    private static final double[] SPREAD = { 0.98, 1.0, 1.015 };
    private static final LocalDate FIRST_FITTED = LocalDate.of(2023, 1, 9);

    private final long seed;
    private final Set<String> known = new HashSet<>();

    public FleetInventor(long seed) {
        this.seed = seed;
    }

    /** The serial of the coil at a station, by the station's number; a planted double takes its neighbour's. */
    static String coilSerial(int index) {
        return String.format(Locale.ROOT, "K%07d", index);
    }

    /** The rows of a station, with those of its line, site and customer where they are the first to need them; referenced ones first. */
    public List<Row> station(int index) {
        List<Row> rows = new ArrayList<>(16);
        int lineNumber = index / STATIONS_A_LINE;
        Market market = Market.ALL.get(lineNumber % Market.ALL.size());
        int lineOfMarket = lineNumber / Market.ALL.size();
        int siteNumber = lineOfMarket / LINES_A_SITE;
        String site = market.region() + (siteNumber + 1);
        String line = "L" + (lineOfMarket % LINES_A_SITE + 1);
        StationPlan plan = plan(market, index);
        if (known.add(site)) {
            site(rows, market, site, siteNumber);
        }
        if (known.add(site + "/" + plan.circuit)) {
            rows.add(circuit(market, site, plan.circuit));
        }
        if (known.add(site + "//" + line)) {
            SplittableRandom random = random(-1 - lineNumber);
            rows.add(new Line(site, line, pick(MACHINES, random), Datum.nameplate(0.2 * (1 + random.nextInt(6))), null));
        }
        String tag = "DE".equals(market.country()) ? "=G" + (index % STATIONS_A_LINE + 1) + "-K1" : "G" + (index % STATIONS_A_LINE + 1);
        parts(rows, plan, site, line, tag);
        return rows;
    }

    private SplittableRandom random(long number) {
        return new SplittableRandom(seed * 0x9E3779B97F4A7C15L + number * 0xD1B54A32D192ED03L);
    }

    private StationPlan plan(Market market, int index) {
        SplittableRandom random = random(index);
        StationPlan plan = new StationPlan(market, index);
        List<Combination> combinations = Combination.of(market);
        plan.use(combinations.get(random.nextInt(3) == 0 ? random.nextInt(combinations.size()) : 0));
        plan.cableLength = pick(LENGTHS, random);
        plan.rate = pick(RATES, random);
        plan.onTime = pick(ON_TIMES, random);
        if (plan.isLineOperated()) {
            plan.cableLength = LINE_OPERATED_LENGTHS[random.nextInt(LINE_OPERATED_LENGTHS.length)];
            plan.rate = LINE_OPERATED_RATES[random.nextInt(LINE_OPERATED_RATES.length)];
            plan.onTime = LINE_OPERATED_ON_TIME;
        }
        plan.coilSerial = coilSerial(index);
        if (random.nextInt(4) == 0) {
            plan.winding = plan.coilOhms * pick(SPREAD, random);
        }
        if (index % FAULT_EVERY == FAULT_AT) {
            List<String> criteria = Faults.criteria();
            Faults.plant(criteria.get(index / FAULT_EVERY % criteria.size()), plan);
        } else if (index % GAP_EVERY == GAP_AT) {
            plan.cableLength = null;
        }
        return plan;
    }

    private void site(List<Row> rows, Market market, String site, int siteNumber) {
        SplittableRandom random = random(Long.MIN_VALUE + Market.ALL.indexOf(market) * 100_003L + siteNumber);
        int group = random.nextInt(GROUPS.length);
        String customer = GROUPS[group].substring(0, GROUPS[group].indexOf(' ')).toUpperCase(Locale.ROOT);
        if (known.add("customer " + customer)) {
            rows.add(new Customer(customer, GROUPS[group], null));
        }
        boolean hot = Set.of("IN", "BR", "MX").contains(market.country());
        rows.add(new Site(site, customer, "Works " + pick(PLACES, random) + " " + (siteNumber + 1), market.country(), market.timeZone(),
                Datum.estimated(hot ? 18 : 12), Datum.estimated(hot ? 30 : 22), Datum.estimated(hot ? 42 : 36), null));
    }

    /** C1 is the ordinary circuit, C2 the other voltage, C3 comes from a frequency converter, C4 is a long feeder with a wide band. */
    private static Circuit circuit(Market market, String site, String code) {
        double volts = "C2".equals(code) ? market.otherVolts() : market.volts();
        double hertz = "C3".equals(code) ? 400 : market.hertz();
        boolean wide = "C4".equals(code);
        Datum below = wide ? Datum.estimated(0.25) : null;
        Datum above = wide ? Datum.estimated(0.20) : null;
        return new Circuit(site, code, market.system(), "C2".equals(code) ? Connection.LINE_TO_LINE : market.connection(),
                Datum.nameplate(volts), Datum.nameplate(hertz), below, above, "C" + (market.isLow() ? 20 : 16),
                Datum.nameplate(market.isLow() ? 20 : 16), null, null, null, null, null, null);
    }

    private void parts(List<Row> rows, StationPlan plan, String site, String line, String tag) {
        SplittableRandom random = random(plan.index + 1_000_000_007L);
        String code = site + "/" + line + "/" + tag;
        LocalDate fitted = FIRST_FITTED.plusDays(random.nextInt(700));
        Datum length = plan.cableLength == null ? null : Datum.estimated(plan.cableLength);
        Datum hottest = plan.coilAmbientHighest == null ? null : Datum.measured(plan.coilAmbientHighest);
        rows.add(new Station(site, line, tag, null, plan.index % STATIONS_A_LINE + 1, null, 1, 1, CoilConnection.SINGLE, length, null, null,
                null,
                hottest, null, null, null, Datum.estimated(160), Datum.estimated(30e5), null, null, null, null, null));
        rows.add(new Supply(code, null, null, site + "/" + plan.circuit));
        if (plan.setting != null) {
            rows.add(new SettingChoice(code, null, null, plan.setting, Provenance.NAMEPLATE));
        }
        rows.add(new Duty(code, null, null, Datum.measured(plan.rate), Datum.measured(plan.onTime), null, null, null, null, null,
                Datum.estimated(4000)));
        if (known.add("item " + plan.coilSerial)) {
            rows.add(new Item(FittedKind.COIL, plan.coilSerial, plan.coil, ItemStatus.IN_SERVICE, null));
        }
        rows.add(fitting(code, FittedKind.VALVE, fitted, plan.valve, null));
        rows.add(fitting(code, FittedKind.COIL, fitted, plan.coil, plan.coilSerial));
        rows.add(fitting(code, FittedKind.DRIVER, fitted, plan.driver, null));
        rows.add(fitting(code, FittedKind.CABLE, fitted, plan.cable, null));
        if (plan.winding != null) {
            double measured = plan.winding * (COPPER + plan.readingTemperature) / (COPPER + 20);
            rows.add(new Reading(SubjectKind.ITEM, FittedKind.COIL.label() + "/" + plan.coilSerial, ReadingQuantity.WINDING_RESISTANCE,
                    // A minute of its own, because a coil that stands at two places by mistake may be measured at both on one day.
                    LocalDateTime.of(2026, 3, 2, 9, plan.index % 60).plusDays(random.nextInt(90)), Math.round(measured * 1000) / 1000.0,
                    Datum.measured(plan.readingTemperature), Datum.estimated(0.01), "Bridge B-2", LocalDate.of(2026, 1, 12), "A. Fictor",
                    null,
                    null));
        }
    }

    private static Fitting fitting(String station, FittedKind kind, LocalDate since, String type, String serial) {
        return new Fitting(station, kind, since, null, type, serial, "first fitting", null, null, null, null, null, null, null, null);
    }

    private static <T> T pick(T[] from, SplittableRandom random) {
        return from[random.nextInt(from.length)];
    }

    private static double pick(double[] from, SplittableRandom random) {
        return from[random.nextInt(from.length)];
    }
}
