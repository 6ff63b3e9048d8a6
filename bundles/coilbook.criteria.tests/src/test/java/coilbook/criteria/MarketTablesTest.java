package coilbook.criteria;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.fleet.MarketMains;
import coilbook.fleet.MarketMark;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.MarketView;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;

class MarketTablesTest {

    /** Codes under which sources disagree: the site must be asked. */
    private static final List<String> DISAGREE = List.of("BO", "BR", "BZ", "CU", "CW", "GY", "ID", "JP", "KN", "KP", "LR", "LY", "MA", "MF",
            "MG",
            "MS", "SR", "VC");
    private static final String LIBRARY = "python3-fluids 1.0.22 (Expat licence, Copyright Caleb Bell)";

    private final List<Row> rows = MarketTables.rows();

    private <R extends Row> List<R> rows(Class<R> type) {
        return rows.stream().filter(type::isInstance).map(type::cast).toList();
    }

    private Map<String, MarketMains> mains() {
        return rows(MarketMains.class).stream().collect(Collectors.toMap(MarketMains::country, Function.identity()));
    }

    @Test
    void everyCountryIsAnIsoCode() {
        Set<String> codes = new HashSet<>(List.of(Locale.getISOCountries()));
        codes.add("XK"); // user-assigned for Kosovo
        assertEquals(240, mains().size());
        assertAll(mains().keySet().stream().map(code -> () -> assertTrue(codes.contains(code), code)));
        codes.add(MarketTables.ANY_COUNTRY);
        assertAll(rows(MarketTolerance.class).stream().map(row -> () -> assertTrue(codes.contains(row.country()), row.key())));
        assertAll(rows(MarketMark.class).stream().map(row -> () -> assertTrue(codes.contains(row.country()), row.key())));
    }

    @Test
    void everySupplyIsPlausible() {
        for (MarketMains row : mains().values()) {
            assertFalse(row.voltages().isEmpty(), row.country());
            assertFalse(row.frequencies().isEmpty(), row.country());
            row.voltages().forEach(v -> assertTrue(Integer.parseInt(v) >= 100 && Integer.parseInt(v) <= 240, row.country() + " " + v));
            row.frequencies().forEach(f -> assertTrue(f.equals("50") || f.equals("60"), row.country() + " " + f));
            assertNotNull(row.name(), row.country());
        }
    }

    @Test
    void severalSystemsAskTheSite() {
        for (MarketMains row : mains().values()) {
            boolean several = row.voltages().size() > 1 || row.frequencies().size() > 1 || DISAGREE.contains(row.country());
            assertTrue(row.askTheSite() || !several, row.country());
        }
    }

    @Test
    void everyRowNamesItsSource() {
        mains().values().forEach(row -> assertNotNull(row.source(), row.country()));
        rows(MarketTolerance.class).forEach(row -> assertNotNull(row.source(), row.key()));
        rows(MarketMark.class).forEach(row -> assertNotNull(row.source(), row.key()));
        // A value without a source that can be named is never offered without asking.
        mains().values().stream().filter(r -> r.source().startsWith("common reference"))
                .forEach(r -> assertTrue(r.askTheSite(), r.country()));
    }

    /** Fixed samples, from memory and common references; the voltage by law for Japan. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = { "US|120, 240|60", "DE|230|50", "JP|100, 200|50, 60", "CN|220|50", "KR|220|60", "PE|220|60",
            "BR|127, 220|60",
            "BB|115|50", "MX|127|60", "GB|230|50", "AU|230|50", "SA|127, 220, 230|60" })
    void knowsWhatCountriesSupply(String country, String volts, String hertz) {
        MarketMains row = mains().get(country);
        assertEquals(List.of(volts.split(", ")), row.voltages());
        assertEquals(List.of(hertz.split(", ")), row.frequencies());
    }

    /** Every row that names the library as its only source says what the library says; source: the library's own table, beside this test. */
    @Test
    void rowsOfTheLibraryAreItsRows() throws Exception {
        int compared = 0;
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                getClass().getResourceAsStream("default_mains_python3-fluids_1.0.22.csv"), StandardCharsets.UTF_8))) {
            reader.readLine();
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                String[] cells = line.contains("\"") ? line.replaceAll("\"[^\"]*\"", "quoted").split(",") : line.split(",");
                MarketMains row = mains().get(cells[0]);
                if (row.source().startsWith(LIBRARY) && !row.askTheSite()) {
                    assertEquals(List.of(cells[2]), row.voltages(), cells[0]);
                    assertEquals(List.of(cells[3]), row.frequencies(), cells[0]);
                    compared++;
                } else {
                    assertTrue(row.source().contains(cells[2] + " V") || row.voltages().contains(cells[2]), cells[0]);
                }
            }
        }
        assertEquals(175, compared);
    }

    @Test
    void licenceOfTheLibraryShipsBesideItsData() throws Exception {
        try (var notice = coilbook.criteria.internal.market.TableReader.class.getResourceAsStream("COPYRIGHT.python3-fluids")) {
            assertTrue(new String(notice.readAllBytes(), StandardCharsets.UTF_8).contains("Permission is hereby granted, free of charge"));
        }
    }

    /** Limits in V as the standards named in the rows state them (secondary publications, some from memory). */
    @ParameterizedTest
    @CsvSource({ "DE,230,207,253", "GB,230,216.2,253", "AU,230,216.2,253", "NZ,230,216.2,243.8", "JP,100,95,107", "JP,200,182,222",
            "US,120,108,126",
            "US,480,432,504", "CA,120,110,125", "CN,220,198,235.4", "CN,380,353.4,406.6", "KR,220,207,233", "BR,127,117,133",
            "BR,220,202,231",
            "MX,127,114.3,139.7", "IN,230,207,253", "TH,220,198,242" })
    void bandOfAMarket(String country, double nominal, double low, double high) {
        MarketTolerance band = MarketTables.view(country, rows).tolerance(nominal);
        assertEquals(low, nominal * band.lowest().value(), 1e-6 * low);
        assertEquals(high, nominal * band.highest().value(), 1e-6 * high);
    }

    @Test
    void bandOfAnyCountryIsAssumed() {
        assertEquals(Provenance.ASSUMED, MarketTables.view("TH", rows).tolerance(220).lowest().provenance());
        assertEquals(Provenance.CATALOGUE, MarketTables.view("DE", rows).tolerance(230).lowest().provenance());
        assertEquals(Provenance.ASSUMED, MarketTables.view("DE", rows).tolerance(690).lowest().provenance());
        assertEquals(Provenance.ASSUMED, MarketTables.view(null, rows).tolerance(230).lowest().provenance());
    }

    @Test
    void viewOfACountry() {
        MarketView japan = MarketTables.view("jp", rows);
        assertEquals("JP", japan.country());
        assertEquals(List.of("PSE"), japan.marks().stream().map(MarketMark::mark).toList());
        assertEquals("Japan", japan.mains().name());
        MarketView nowhere = MarketTables.view("QQ", rows);
        assertNull(nowhere.mains());
        assertTrue(nowhere.marks().isEmpty());
        assertEquals(0.9, nowhere.tolerance(230).lowest().value());
    }

    /** Each market of the table of marks has a row; what the marks stand for is stated beside them. */
    @ParameterizedTest
    @CsvSource({ "DE,CE", "NO,CE", "GB,UKCA", "US,NRTL", "CA,SCC", "CN,CCC", "KR,KC", "AU,RCM", "NZ,RCM", "RU,EAC", "KZ,EAC", "SA,SABER",
            "IN,BIS",
            "BR,INMETRO", "MX,NOM", "TW,BSMI", "ZA,NRCS", "UA,UA.TR" })
    void marksOfAMarket(String country, String mark) {
        assertEquals(List.of(mark), MarketTables.view(country, rows).marks().stream().map(MarketMark::mark).toList());
    }
}
