package coilbook.register;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.Change;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputSetting;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Item;
import coilbook.fleet.Line;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.fleet.ValveType;
import coilbook.register.Status.Counts;
import coilbook.register.internal.H2Registers;
import coilbook.register.internal.status.Judged;
import coilbook.register.internal.status.Judging;

/** A small invented fleet of any size, and a judge whose verdicts can be foretold. */
final class FleetFixture {

    static final LocalDate SINCE = LocalDate.of(2025, 1, 1);
    static final LocalDate TODAY = LocalDate.of(2026, 3, 31);
    private static final int STATIONS_A_LINE = 50;

    private FleetFixture() {
    }

    /** The coil's resistance against the valve's delay is a stand-in for the electrics: these tests are of the register alone. */
    static final class StandInJudging implements Judging {

        @Override
        public String version() {
            return "stand-in 1";
        }

        @Override
        public Judged judge(StationView station) {
            double ohms = station.coil() == null ? Double.NaN : Datum.orNaN(station.coil().resistance20());
            Verdict verdict = Double.isNaN(ohms) ? Verdict.UNDETERMINED : ohms < 50 ? Verdict.NONCONFORMITY : Verdict.CONFORMITY;
            Evidence evidence = new Evidence(ohms, 50, coilbook.fleet.Unit.OHM, "", "Coil has " + ohms + " ohm.", null,
                    java.util.Map.of("R", ohms));
            List<Finding> findings = verdict.isReported()
                    ? List.of(new Finding("coil-resistance", verdict, false, evidence,
                            verdict == Verdict.UNDETERMINED ? List.of("Resistance") : List.of(), false))
                    : List.of();
            Counts counts = new Counts(1, 0, verdict == Verdict.NONCONFORMITY ? 1 : 0, 0, verdict == Verdict.UNDETERMINED ? 1 : 0, 0);
            return new Judged(findings, verdict, counts, java.util.Map.of(StatusColumn.PEAK_CURRENT, 120 / ohms), null);
        }
    }

    static H2Registers registers() {
        return registers(List::of);
    }

    static H2Registers registers(Supplier<List<Row>> firstRows) {
        return new H2Registers(new StandInJudging(), firstRows);
    }

    static Change change(String why, List<RowChange> rows) {
        return new Change("tester", Instant.now(), why, rows);
    }

    static Change inserting(List<? extends Row> rows) {
        return change("Insert", rows.stream().map(RowChange::insert).toList());
    }

    /** Customer, two sites, circuits, a catalogue. */
    static List<Row> shared(int sites) throws InvalidValue {
        List<Row> rows = new ArrayList<>();
        rows.add(SampleRows.bare(Customer.class, "code", "ACME"));
        rows.add(SampleRows.bare(ValveType.class, "code", "V1"));
        rows.add(SampleRows.bare(CoilType.class, "code", "C90", "resistance20", Datum.catalogue(90)));
        rows.add(SampleRows.bare(CoilType.class, "code", "C40", "resistance20", Datum.catalogue(40)));
        rows.add(SampleRows.bare(DriverType.class, "code", "D1"));
        rows.add(SampleRows.bare(InputSetting.class, "driver_type", "D1", "code", "230"));
        for (int site = 0; site < sites; site++) {
            rows.add(SampleRows.bare(Site.class, "code", site(site), "customer", "ACME", "country", "DE"));
            rows.add(SampleRows.bare(Circuit.class, "site", site(site), "code", "C1", "nominal_voltage", Datum.nameplate(230)));
        }
        return rows;
    }

    static String site(int number) {
        return String.format("S%03d", number);
    }

    /** Stations with all their rows, a thousand a site. */
    static List<Row> stations(int from, int to) throws InvalidValue {
        List<Row> rows = new ArrayList<>();
        for (int i = from; i < to; i++) {
            String site = site(i / 1000);
            String line = String.format("L%02d", i % 1000 / STATIONS_A_LINE);
            if (i % STATIONS_A_LINE == 0) {
                rows.add(SampleRows.bare(Line.class, "site", site, "code", line));
            }
            String tag = String.format("=K%06d", i);
            String code = site + "/" + line + "/" + tag;
            rows.add(SampleRows.bare(Station.class, "site", site, "line", line, "tag", tag, "cable_length", Datum.measured(1 + i % 30)));
            rows.add(SampleRows.bare(Supply.class, "station", code, "valid_from", SINCE, "circuit", "C1"));
            rows.add(SampleRows.bare(SettingChoice.class, "station", code, "valid_from", SINCE, "setting", "230"));
            rows.add(SampleRows.bare(Duty.class, "station", code, "valid_from", SINCE, "cycle_rate", Datum.measured(5)));
            rows.add(fitting(code, FittedKind.VALVE, "V1", null));
            rows.add(fitting(code, FittedKind.COIL, i % 10 == 0 ? "C40" : "C90", "SN" + i));
            rows.add(fitting(code, FittedKind.DRIVER, "D1", null));
            rows.add(SampleRows.bare(Item.class, "kind", FittedKind.COIL, "serial", "SN" + i, "type", i % 10 == 0 ? "C40" : "C90"));
        }
        return rows;
    }

    private static Fitting fitting(String station, FittedKind kind, String type, String serial) throws InvalidValue {
        return SampleRows.bare(Fitting.class, "station", station, "kind", kind, "valid_from", SINCE, "type", type, "serial", serial);
    }
}
