package coilbook.exchange.internal.in;

import static coilbook.exchange.internal.in.Books.of;
import static coilbook.exchange.internal.in.Books.only;
import static coilbook.exchange.internal.in.Books.read;
import static coilbook.exchange.internal.in.Books.rejected;
import static coilbook.exchange.internal.in.Books.row;
import static coilbook.exchange.internal.in.Books.rows;
import static coilbook.exchange.internal.in.Books.text;
import static coilbook.exchange.internal.in.Books.value;
import static coilbook.exchange.internal.in.Books.xlsx;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.FleetFiles;
import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Customer;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.Fitting;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Provenance;
import coilbook.fleet.Reading;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.Unit;

/** The sheets of an exchange workbook. */
class ExchangeSheetsReadTest {

    @TempDir
    Path folder;

    private static void sheet(XSSFWorkbook book, Class<? extends coilbook.fleet.Row> type, Map<String, Object> values) {
        Kind<?> kind = Kind.of(type);
        List<String> headings = ExchangeSheets.columns(kind).stream().map(column -> column.heading()).toList();
        Object[] line = headings.stream().map(heading -> values.get(heading)).toArray();
        values.keySet().forEach(heading -> assertTrue(headings.contains(heading), heading));
        rows(book, kind.sheet(), headings.toArray(), line);
    }

    @Test
    void headingsOfEverySheetAreDistinct() {
        for (Kind<?> kind : ExchangeSheets.KINDS) {
            Set<String> seen = new HashSet<>();
            ExchangeSheets.columns(kind)
                    .forEach(column -> assertTrue(seen.add(column.heading().toLowerCase(Locale.ROOT)), kind + ": " + column.heading()));
        }
    }

    @Test
    void everyKindIsToldByItsHeadingsAlone() throws Exception {
        for (Kind<?> kind : ExchangeSheets.KINDS) {
            String headings = String.join("\t", ExchangeSheets.columns(kind).stream().map(column -> column.heading()).toList());
            Path file = text(folder, "unnamed.tsv", headings);
            Incoming incoming = read(file);
            assertEquals(List.of(), rejected(incoming), kind.id());
            assertEquals(List.of(), incoming.notices(), kind.id());
        }
    }

    @Test
    void theStationsSheetCarriesWhatIsTrueToday() throws Exception {
        Path file = xlsx(folder, "fleet.xlsx",
                book -> sheet(book, Station.class,
                        Map.ofEntries(Map.entry("Site", "S"), Map.entry("Line", "L"), Map.entry("Tag", "=A-1"),
                                Map.entry("Controller", "PLC1"),
                                Map.entry("Cable length [m]", 5.5), Map.entry("Circuit", "M1"),
                                Map.entry("Supply since", LocalDate.of(2025, 1, 2)),
                                Map.entry("Input setting", "A"), Map.entry("Setting provenance", "measured"),
                                Map.entry("Cycle rate [1/s]", 9),
                                Map.entry("On-time [ms]", "30"), Map.entry("Provenance", "measured; Fluid pressure = assumed"),
                                Map.entry("Fluid pressure [bar]", 4), Map.entry("Duty provenance", "estimated by rule"))));
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        RowPatch station = of(incoming, Station.class).get(0);
        assertEquals(new Datum(5.5, Provenance.MEASURED), station.values().get(Kind.of(Station.class).field("cable_length")));
        assertEquals(new Datum(4e5, Provenance.ASSUMED), station.values().get(Kind.of(Station.class).field("fluid_pressure")));
        assertTrue(station.values().containsKey(Kind.of(Station.class).field("note")), "a blank cell is a present key");
        assertNull(value(station, "note"));
        assertEquals("S/PLC1", value(station, "controller"));
        assertEquals("S/L/=A-1", only(incoming, Supply.class, "station"));
        assertEquals("S/M1", only(incoming, Supply.class, "circuit"));
        assertEquals(LocalDate.of(2025, 1, 2), only(incoming, Supply.class, "valid_from"));
        assertEquals("A", only(incoming, SettingChoice.class, "setting"));
        assertEquals(Provenance.MEASURED, only(incoming, SettingChoice.class, "provenance"));
        assertEquals(new Datum(0.03, Provenance.ESTIMATED),
                of(incoming, Duty.class).get(0).values().get(Kind.of(Duty.class).field("on_time")));
    }

    @Test
    void aStationWithoutCircuitSettingOrDutyHasNoneOfThem() throws Exception {
        Path file = xlsx(folder, "fleet.xlsx", book -> sheet(book, Station.class, Map.of("Site", "S", "Line", "L", "Tag", "1")));
        Incoming incoming = read(file);
        assertEquals(1, incoming.patches().size());
        Path dated = xlsx(folder, "dated.xlsx",
                book -> sheet(book, Station.class, Map.of("Site", "S", "Line", "L", "Tag", "1", "Duty since", LocalDate.of(2026, 1, 1))));
        assertEquals("Duty since", read(dated).rejected().get(0).column());
    }

    @Test
    void readingsAreInTheUnitOfTheirQuantity() throws Exception {
        Path file = xlsx(folder, "fleet.xlsx",
                book -> rows(book, "Readings", row("Subject kind", "Subject", "Quantity", "Taken at", "Value", "Temperature [°C]"),
                        row("item", "coil/1", "winding resistance", "2026-03-31 14:05", 12.5, 24),
                        row("item", "coil/1", "insulation resistance", "2026-03-31T14:06", 220, null),
                        row("station", "S/L/1", "on-time", LocalDate.of(2026, 3, 31), 30, null),
                        row("item", "coil/1", "winding resistance", "2026-03-31", -12.5, 24),
                        row("item", "coil/1", "winding resistance", "2026-03-30", "0.0125 kohm", 24)));
        Incoming incoming = read(file);
        List<RowPatch> readings = of(incoming, Reading.class);
        assertEquals(List.of(12.5, 2.2e8, 0.03, 12.5), readings.stream().map(patch -> value(patch, "value")).toList());
        assertEquals(LocalDateTime.of(2026, 3, 31, 14, 5), value(readings.get(0), "taken_at"));
        assertEquals(List.of("fleet.xlsx, sheet Readings, row 5, column Value, value \"-12.5\": expected a winding resistance above 0 Ω"),
                rejected(incoming));
    }

    @Test
    void computedColumnsAreIgnored() throws Exception {
        Path file = xlsx(folder, "fleet.xlsx",
                book -> rows(book, "Customers", row("Customer", "Name", "Stations (computed)", "Cable length [m] (computed)"),
                        row("C", "N", 5, "#")));
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of(), incoming.notices());
        assertEquals("N", only(incoming, Customer.class, "name"));
    }

    @Test
    void theSummarySaysWhatTheWorkbookCovers() throws Exception {
        Path file = xlsx(folder, "audit.xlsx", book -> {
            rows(book, "Summary", row("Audit of a fleet"), row(ExchangeSheets.PART_OF_FLEET, null, "yes"),
                    row(ExchangeSheets.PAST_DATE, "no"));
            rows(book, "Findings", row("Site", "Line", "Station", "Criterion"), row("S", "L", "1", "input-nominal"));
            rows(book, "Customers", row("Customer", "Name"), row("C", "N"));
        });
        Incoming incoming = read(file);
        assertTrue(incoming.partial());
        assertFalse(incoming.pastDate());
        assertEquals(1, incoming.patches().size());
        assertEquals(List.of(), incoming.notices());
    }

    @Test
    void badRowsAreRejectedWholeAndTheRestIsTaken() throws Exception {
        Path file = xlsx(folder, "fleet.xlsx", book -> {
            rows(book, "Sites", row("Site", "Country", "Time zone"), row("A", "DE", "Europe/Berlin"), row("B", "XX", null),
                    row("C", null, null),
                    row("D/E", "DE", null), row("F", "FR", "Mars/Olympus"), row("A", "DE", null));
            rows(book, "Coil types", row("Type", "Rated voltage [V]", "Resistance at 20 °C [Ω]"), row("C1", 24, 12.5),
                    row("C2", 24, -12.5));
        });
        Incoming incoming = read(file);
        assertEquals(List.of("A"), of(incoming, Site.class).stream().map(patch -> value(patch, "code")).toList());
        assertEquals(List.of(3, 4, 5, 6, 7, 3), incoming.rejected().stream().map(problem -> problem.row()).toList());
        assertEquals("expected a number above 0 Ω up to 10000000 Ω", incoming.rejected().get(5).problem());
        assertEquals(1, of(incoming, CoilType.class).size());
    }

    @Test
    void anExchangeSheetMayBeADelimitedFile() throws Exception {
        Path file = text(folder, "anything.csv", "Station,Kind,Fitted since,Type,Serial", "S/L/1,coil,2024-03-01,C1,9",
                "S/L/1,driver,,D1,");
        List<RowPatch> fittings = of(read(file), Fitting.class);
        assertEquals(LocalDate.of(2024, 3, 1), value(fittings.get(0), "valid_from"));
        assertNull(value(fittings.get(1), "valid_from"));
    }

    @Test
    void shownValuesReadBackTheSame() {
        for (Unit unit : Unit.values()) {
            for (double si : new double[] { 413685.43759008, 420580.194883248, 1 / 3.0, 3.3e-5, 0.07, 12.6, 1e-9, 0 }) {
                double rounded = new java.math.BigDecimal(si).round(new java.math.MathContext(15)).doubleValue();
                assertEquals(rounded, unit.toSi(ExchangeSheets.shown(unit, rounded)), unit + " " + rounded);
            }
        }
    }

    @Test
    void cancellingEndsTheReading() {
        Progress cancelled = new Progress() {
            @Override
            public void report(String step, long done, long total) {
                // nobody watches
            }

            @Override
            public boolean isCancelled() {
                return true;
            }
        };
        StringBuilder list = new StringBuilder("Site,Line,Station");
        for (int i = 0; i < 600; i++) {
            list.append("\r\nS,L,").append(i);
        }
        Path file = text(folder, "list.csv", list.toString());
        FleetFiles files = new FleetFilesReader();
        CoilbookException end = assertThrows(CoilbookException.class, () -> files.read(List.of(file), Map.of(), cancelled));
        assertEquals(CoilbookException.Reason.CANCELLED, end.reason());
    }

    @Test
    void aColumnMapToNoFieldIsRefused() {
        Path file = text(folder, "list.csv", "Site,Line,Station", "S,L,1");
        CoilbookException refusal = assertThrows(CoilbookException.class, () -> read(Map.of("Site", "site.colour"), file));
        assertTrue(refusal.getMessage().contains("\"site.colour\", which is no field"), refusal.getMessage());
    }

    @Test
    void everyFieldOfEveryKindHasAColumnOrIsPartOfTheStation() {
        for (Kind<?> kind : ExchangeSheets.KINDS) {
            for (Field field : kind.fields()) {
                assertTrue(ExchangeSheets.columns(kind).stream().anyMatch(column -> column.field() == field), kind + " " + field);
            }
        }
    }
}
