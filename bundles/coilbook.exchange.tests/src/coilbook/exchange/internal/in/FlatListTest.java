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
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;

import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.util.CellRangeAddress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.exchange.Incoming;
import coilbook.exchange.RowPatch;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilKind;
import coilbook.fleet.CoilType;
import coilbook.fleet.Connection;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.Item;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.TypeStatus;
import coilbook.fleet.WiringSystem;

/** One sheet, one row a station, as branches keep it. */
class FlatListTest {

    @TempDir
    Path folder;

    @Test
    void aLineBecomesEverythingThatStandsAtTheStation() throws Exception {
        Path file = xlsx(folder, "list.xlsx",
                book -> rows(book, "Stations of the branch",
                        row("Customer", "Site", "Site name", "Country", "Line", "Station", "Circuit", "Mains voltage [V]",
                                "Mains frequency [Hz]", "Wiring",
                                "Valve type", "Coil type", "Coil serial", "Coil voltage", "Driver type", "Driver serial", "Input setting",
                                "Cable type",
                                "Cable length [m]", "Coil resistance [Ω]", "Reading temperature [°C]", "Measured on", "Cycle rate [1/s]",
                                "On-time [ms]",
                                "Coil fitted since"),
                        row("ACO", "NORD", "North works", "Germany", "L1", "G1", "M1", 230, 50, "star, L-N", "VX1", "CX24", "S001",
                                "24 VDC", "DX1", 4711,
                                "A", "K1", 8.5, 12.25, 21, LocalDate.of(2026, 3, 4), 9, 30, LocalDate.of(2024, 2, 29))));
        Incoming incoming = read(file);

        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of(), incoming.notices());
        assertEquals(1, incoming.read());
        assertEquals("ACO", only(incoming, Customer.class, "code"));
        assertEquals("DE", only(incoming, Site.class, "country"));
        assertEquals("North works", only(incoming, Site.class, "name"));
        assertEquals("ACO", only(incoming, Site.class, "customer"));
        assertEquals("L1", only(incoming, Line.class, "code"));
        assertEquals("M1", only(incoming, Circuit.class, "code"));
        assertEquals(230.0, only(incoming, Circuit.class, "nominal_voltage"));
        assertEquals(WiringSystem.STAR, only(incoming, Circuit.class, "system"));
        assertEquals(Connection.LINE_TO_NEUTRAL, only(incoming, Circuit.class, "connection"));
        assertEquals("NORD/M1", only(incoming, Supply.class, "circuit"));
        assertEquals("NORD/L1/G1", only(incoming, Supply.class, "station"));
        assertEquals("A", only(incoming, SettingChoice.class, "setting"));
        assertEquals(8.5, only(incoming, Station.class, "cable_length"));
        assertEquals(9.0, only(incoming, Duty.class, "cycle_rate"));
        assertEquals(0.03, only(incoming, Duty.class, "on_time"));
        assertEquals(CoilKind.DC, only(incoming, CoilType.class, "rated_kind"));
        assertEquals(24.0, only(incoming, CoilType.class, "rated_voltage"));
        assertEquals(TypeStatus.INCOMPLETE, only(incoming, CoilType.class, "status"));
        assertTrue(of(incoming, CoilType.class).get(0).onlyIfMissing());
        assertEquals(12.25, only(incoming, Reading.class, "value"));
        assertEquals(SubjectKind.ITEM, only(incoming, Reading.class, "subject_kind"));
        assertEquals("coil/S001", only(incoming, Reading.class, "subject"));
        assertEquals(LocalDateTime.of(2026, 3, 4, 0, 0), only(incoming, Reading.class, "taken_at"));
        assertEquals(21.0, only(incoming, Reading.class, "temperature"));
        assertEquals(4, of(incoming, Fitting.class).size());
        RowPatch coil = fitting(incoming, FittedKind.COIL);
        assertEquals(LocalDate.of(2024, 2, 29), value(coil, "valid_from"));
        assertEquals("4711", value(fitting(incoming, FittedKind.DRIVER), "serial"));
        assertNull(value(fitting(incoming, FittedKind.DRIVER), "valid_from"));
        assertEquals(2, of(incoming, Item.class).size());
    }

    private static RowPatch fitting(Incoming incoming, FittedKind kind) {
        return of(incoming, Fitting.class).stream().filter(patch -> value(patch, "kind") == kind).findFirst().orElseThrow();
    }

    @Test
    void rowsComeAfterThoseTheyReferTo() throws Exception {
        Path file = text(folder, "list.csv", "Customer,Site,Line,Station,Coil,Coil serial", "A,S,L,1,C1,9", "B,T,L,1,C1,8");
        List<Integer> order = read(file).patches().stream().map(patch -> coilbook.fleet.Kind.ALL.indexOf(patch.kind())).toList();
        assertEquals(order.stream().sorted().toList(), order);
        assertEquals(13, order.size());
    }

    @Test
    void headingsAreFoundUnderTitlesAndPassedOverWhereRepeated() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "Blatt1", row("Stations of the branch"), row("as of autumn", null, "kept by the office"), row(),
                    row("Plant", "Line", "Station", "Cable length"), row("S", "L", "1", 5), row("S", "L", "2", 6),
                    row("Total", null, 2, 11), row(),
                    row("PLANT", "line", "Station ", "Cable  length"), row("T", "L", "1", 7), row("Grand total", null, 3, 18));
            sheet.addMergedRegion(new CellRangeAddress(0, 0, 0, 3));
        });
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(3, incoming.read());
        assertEquals(List.of(5.0, 6.0, 7.0), of(incoming, Station.class).stream().map(patch -> value(patch, "cable_length")).toList());
        assertEquals(10, of(incoming, Station.class).get(2).source().row());
    }

    @Test
    void columnsInAnotherOrderUnderARepeatedHeadingAreReadInThatOrder() throws Exception {
        Path file = text(folder, "list.csv", "Site,Line,Station,Cable length", "S,L,1,5", "Cable length,Station,Line,Site", "6,2,L,S");
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of(5.0, 6.0), of(incoming, Station.class).stream().map(patch -> value(patch, "cable_length")).toList());
    }

    @Test
    void twoLineHeadingsUnderMergedOnesAreRead() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Coil", null, "Driver", null),
                    row(null, null, null, "Type", "Serial", "Type", "Serial"),
                    row("S", "L", "1", "C1", "100", "D1", "200"));
            sheet.addMergedRegion(new CellRangeAddress(0, 0, 3, 4));
            sheet.addMergedRegion(new CellRangeAddress(0, 0, 5, 6));
            sheet.addMergedRegion(new CellRangeAddress(0, 1, 0, 0));
        });
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals("100", value(fitting(incoming, FittedKind.COIL), "serial"));
        assertEquals("D1", value(fitting(incoming, FittedKind.DRIVER), "type"));
    }

    @Test
    void aRowOfUnitsUnderTheHeadingsCounts() throws Exception {
        Path file = text(folder, "list.csv", "Site,Line,Station,Cable length,On-time", ",,,[cm],(s)", "S,L,1,550,0.03");
        Incoming incoming = read(file);
        assertEquals(5.5, only(incoming, Station.class, "cable_length"));
        assertEquals(0.03, only(incoming, Duty.class, "on_time"));
    }

    @Test
    void mergedCellsCountForAllTheyCover() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Driver"), row("S", "L", "1", "D1"), row(null, null, "2", null),
                    row(null, null, "3", "D2"));
            sheet.addMergedRegion(new CellRangeAddress(1, 3, 0, 0));
            sheet.addMergedRegion(new CellRangeAddress(1, 3, 1, 1));
            sheet.addMergedRegion(new CellRangeAddress(1, 2, 3, 3));
        });
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of("D1", "D1", "D2"), of(incoming, Fitting.class).stream().map(patch -> value(patch, "type")).toList());
        assertEquals(List.of("S", "S", "S"), of(incoming, Station.class).stream().map(patch -> value(patch, "site")).toList());
    }

    @Test
    void hiddenRowsAndColumnsAreRead() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            Sheet sheet = rows(book, "A", row("Site", "Line", "Station", "Coil"), row("S", "L", "1", "C1"), row("S", "L", "2", "C2"));
            sheet.getRow(2).setZeroHeight(true);
            sheet.setColumnHidden(3, true);
        });
        assertEquals(List.of("C1", "C2"), of(read(file), Fitting.class).stream().map(patch -> value(patch, "type")).toList());
    }

    @Test
    void severalSheetsOfOneLayoutAreOneList() throws Exception {
        Path file = xlsx(folder, "list.xlsx", book -> {
            rows(book, "North", row("Site", "Line", "Station"), row("N", "L", "1"));
            rows(book, "South", row("Station", "Line", "Site"), row("1", "L", "S"));
            rows(book, "Telephone numbers", row("Who", "Number"), row("Desk", "100"));
        });
        Incoming incoming = read(file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of("N", "S"), of(incoming, Site.class).stream().map(patch -> value(patch, "code")).toList());
        assertEquals(List.of("Telephone numbers"), incoming.notices().stream().map(notice -> notice.sheet()).toList());
    }

    @Test
    void aTextAloneInItsRowNeverCountsForTheRowsBelow() throws Exception {
        Path file = text(folder, "list.csv", "Site,Line,Station,Coil", "North works,,,", ",L,1,C1", "S,L,2,C2");
        Incoming incoming = read(file);
        assertEquals(1, of(incoming, Station.class).size());
        assertEquals(1, incoming.rejected().size());
        assertEquals(3, incoming.rejected().get(0).row());
        assertEquals("Site", incoming.rejected().get(0).column());
        assertEquals(1, incoming.notices().size());
    }

    @Test
    void germanFrenchAndSpanishHeadingsAreKnown() throws Exception {
        assertEquals(6.5,
                only(read(text(folder, "a.csv", "Werk;Linie;Station;Spule;Kabellänge [m]", "S;L;1;C;6,5")), Station.class, "cable_length"));
        assertEquals(6.5, only(read(text(folder, "b.csv", "Usine;Ligne;Poste;Bobine;Longueur de câble (m)", "S;L;1;C;6,5")), Station.class,
                "cable_length"));
        assertEquals(6.5,
                only(read(text(folder, "c.csv", "Planta;Línea;Estación;Bobina;Longitud de cable, m", "S;L;1;C;6,5")), Station.class,
                        "cable_length"));
    }

    @Test
    void aWholeStationCodeNeedsNoSiteAndLine() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Station,Coil", "S/L/=A1,C1", "S/L/-A2/b,C1"));
        assertEquals(List.of("=A1", "-A2/b"), of(incoming, Station.class).stream().map(patch -> value(patch, "tag")).toList());
    }

    @Test
    void tagsThatLookLikeFormulasSurvive() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Tag", "S,L,'=A1", "S,L,'-Q2", "S,L,+B3", "S,L,'@C", "S,L,'tis"));
        assertEquals(List.of("=A1", "-Q2", "+B3", "@C", "'tis"),
                of(incoming, Station.class).stream().map(patch -> value(patch, "tag")).toList());
        Path book = xlsx(folder, "list.xlsx", b -> rows(b, "A", row("Site", "Line", "Tag"), row("S", "L", "=A1"), row("S", "L", "'+B")));
        assertEquals(List.of("=A1", "'+B"), of(read(book), Station.class).stream().map(patch -> value(patch, "tag")).toList());
    }

    @Test
    void aCircuitWithoutACodeIsNamedAfterItsMains() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Mains", "S,L,1,230 V 50 Hz", "S,L,2,\"230VAC, 50Hz\"",
                "S,L,3,230/50", "S,L,4,400 V",
                "S,L,5,1~ 120V/60Hz"));
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of("230V50HZ", "400V", "120V60HZ"),
                of(incoming, Circuit.class).stream().map(patch -> value(patch, "code")).toList());
        assertEquals(WiringSystem.SINGLE_PHASE, value(of(incoming, Circuit.class).get(2), "system"));
        assertEquals("S/230V50HZ", value(of(incoming, Supply.class).get(1), "circuit"));
    }

    @Test
    void linesThatDisagreeAboutACircuitAreRejected() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Circuit,Mains voltage", "S,L,1,M1,230", "S,L,2,M1,400"));
        assertEquals(List.of("list.csv, row 3, column Mains voltage, value \"400\": expected the same for S/M1 as in list.csv, row 2, 230"),
                rejected(incoming));
        assertEquals(1, of(incoming, Station.class).size());
    }

    @Test
    void whatLinesSayOfOneTypeInContradictionIsNotTaken() throws Exception {
        Incoming incoming = read(
                text(folder, "list.csv", "Site,Line,Station,Coil,Coil voltage", "S,L,1,C1,24", "S,L,2,C1,230", "S,L,3,C1,24"));
        assertEquals(List.of(), rejected(incoming));
        assertNull(only(incoming, CoilType.class, "rated_voltage"));
        assertEquals(1, incoming.notices().size());
    }

    @Test
    void aTypeGivenInFullWinsOverItsBareName() throws Exception {
        Path list = text(folder, "list.csv", "Site,Line,Station,Coil", "S,L,1,C1");
        Path types = text(folder, "Coil types.csv", "Type,Maker,Rated voltage [V],Resistance at 20 °C [Ω]", "C1,Invented,24,12.5");
        Incoming incoming = read(list, types);
        assertEquals(12.5, only(incoming, CoilType.class, "resistance20"));
        assertFalse(of(incoming, CoilType.class).get(0).onlyIfMissing());
    }

    @Test
    void theSameStationTwiceIsRejected() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station", "S,L,1", "S,L,1"));
        assertEquals(1, incoming.rejected().size());
        assertEquals("expected each row once; it stands in list.csv, row 2 already", incoming.rejected().get(0).problem());
    }

    @Test
    void oneSerialAtTwoStationsIsKeptForTheCriteriaToFind() throws Exception {
        Incoming incoming = read(
                text(folder, "list.csv", "Site,Line,Station,Coil,Coil serial,Coil resistance,Measured on", "S,L,1,C1,9,10,2026-01-31",
                        "S,L,2,C2,9,11,2026-01-31"));
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of("9", "9"), of(incoming, Fitting.class).stream().map(patch -> value(patch, "serial")).toList());
        assertEquals("C1", only(incoming, Item.class, "type"));
        assertEquals(List.of(SubjectKind.ITEM, SubjectKind.STATION),
                of(incoming, Reading.class).stream().map(patch -> value(patch, "subject_kind")).toList());
        assertEquals(1, incoming.notices().size());
    }

    @Test
    void dashesAndBlanksSayNothing() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Coil,Coil serial,Cable length,Driver", "S,L,1,C1,-,n/a,"));
        assertEquals(List.of(), rejected(incoming));
        assertEquals(1, of(incoming, Fitting.class).size());
        assertFalse(of(incoming, Station.class).get(0).values().keySet().stream().anyMatch(field -> field.id().equals("cable_length")));
    }

    @Test
    void aLineWithOneBadValueIsNotTakenAtAll() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Coil resistance,Measured on,Country", "S,L,1,-5,2026-01-31,DE",
                "T,L,1,5,2026-01-31,Atlantis"));
        assertEquals(2, incoming.read());
        assertEquals(0, incoming.patches().size());
        assertEquals(List.of("list.csv, row 2, column Coil resistance, value \"-5\": expected a winding resistance above 0 Ω",
                "list.csv, row 3, column Country, value \"Atlantis\": expected a country by its two-letter code (ISO 3166) or its name"),
                rejected(incoming));
    }

    @Test
    void aSerialWithoutATypeIsRejected() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Coil,Coil serial", "S,L,1,,9"));
        assertEquals(List.of("list.csv, row 2, column Coil: expected a type; the serial 9 alone does not say what it is"),
                rejected(incoming));
    }

    @Test
    void readingsWithoutAnyDateAreNotTaken() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Coil resistance", "S,L,1,5"));
        assertEquals(1, incoming.rejected().size());
        assertEquals("Coil resistance", incoming.rejected().get(0).column());
        assertEquals(1, of(incoming, Station.class).size());
        Incoming dated = read(text(folder, "dated.csv", "Site,Line,Station,Coil resistance,Measured on", "S,L,1,5,"));
        assertEquals("Measured on", dated.rejected().get(0).column());
        assertEquals(0, of(dated, Station.class).size());
    }

    @Test
    void aPersonsColumnMapDecides() throws Exception {
        Path file = text(folder, "list.csv", "Werk X,Band,Nr,Ohm-Wert,Datum,Farbe", "S,L,1,12.5,2026-05-31,rot");
        Map<String, String> map = Map.of("Werk X", "site.code", "Band", "line.code", "nr", "station.tag", "Ohm-Wert",
                "reading.winding_resistance", "Datum",
                "reading.date", "Farbe", "");
        Incoming incoming = read(map, file);
        assertEquals(List.of(), rejected(incoming));
        assertEquals(List.of(), incoming.notices());
        assertEquals(ReadingQuantity.WINDING_RESISTANCE, only(incoming, Reading.class, "quantity"));
        assertEquals("1", only(incoming, Station.class, "tag"));
    }

    @Test
    void aColumnMapForAnotherFileIsSaid() throws Exception {
        Incoming incoming = read(Map.of("Ohm-Wert", "reading.winding_resistance"), text(folder, "list.csv", "Site,Line,Station", "S,L,1"));
        assertEquals(List.of("column map, column Ohm-Wert: no file has this heading"),
                incoming.notices().stream().map(notice -> notice.sentence()).toList());
    }

    @Test
    void headingsThatAreNearlyKnownAreNotPassedOverInSilence() throws Exception {
        Incoming incoming = read(
                text(folder, "list.csv", "Site,Line,Station,Coil resistnce,Colour,Cable length [furlong]", "S,L,1,5,red,3"));
        assertEquals(List.of("Coil resistnce", "Cable length [furlong]"),
                incoming.rejected().stream().map(problem -> problem.column()).toList());
        assertTrue(incoming.rejected().get(0).problem().contains("Winding resistance [Ω]"), incoming.rejected().get(0).problem());
        assertEquals(List.of("Colour"), incoming.notices().stream().map(notice -> notice.column()).toList());
    }

    @Test
    void twoColumnsOfOneMeaningAreAskedAbout() throws Exception {
        Incoming incoming = read(text(folder, "list.csv", "Site,Line,Station,Coil,Coil type", "S,L,1,C1,C2"));
        assertEquals("Coil type", incoming.rejected().get(0).column());
    }

    @Test
    void whatALineSaysOfATypeIsKept() throws Exception {
        Incoming incoming = read(
                text(folder, "list.csv", "Site,Line,Station,Driver,Driver kind,Driver maker", "S,L,1,D1,fixed-dc,Invented"));
        assertEquals(DriverKind.FIXED_DC, only(incoming, DriverType.class, "kind"));
        assertEquals("Invented", only(incoming, DriverType.class, "maker"));
    }
}
