package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Concession;
import coilbook.fleet.Controller;
import coilbook.fleet.Customer;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.FleetSetting;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.MarketMains;
import coilbook.fleet.MarketMark;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.Progress;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.SubjectKind;
import coilbook.fleet.Supply;
import coilbook.fleet.TransformerType;
import coilbook.fleet.ValveType;

/** Every field of every kind comes back as it was stored, also after the register was closed. */
class RowRoundTripTest {

    @TempDir
    Path folder;

    /** One full row of each kind, in the order of the kinds, tied to each other; the tag shows what IEC 81346 tags look like. */
    static List<Row> oneOfEach() throws Exception {
        String station = "S/L/=A+B-1/x";
        return List.of(SampleRows.full(Customer.class, "code", "CU"),
                SampleRows.full(Site.class, "code", "S", "customer", "CU", "time_zone", "Europe/Paris"),
                SampleRows.full(TransformerType.class, "code", "T"),
                SampleRows.full(Circuit.class, "site", "S", "code", "C", "transformer_type", "T"),
                SampleRows.full(Line.class, "site", "S", "code", "L"), SampleRows.full(ValveType.class, "code", "V"),
                SampleRows.full(CoilType.class, "code", "CT"), SampleRows.full(DriverType.class, "code", "D"),
                SampleRows.full(InputSetting.class, "driver_type", "D", "code", "I"), SampleRows.full(CableType.class, "code", "CA"),
                SampleRows.full(Controller.class, "site", "S", "code", "PLC"),
                SampleRows.full(Station.class, "site", "S", "line", "L", "tag", "=A+B-1/x", "controller", "PLC"),
                SampleRows.full(Supply.class, "station", station, "circuit", "C"),
                SampleRows.full(SettingChoice.class, "station", station, "setting", "I"),
                SampleRows.full(Duty.class, "station", station),
                SampleRows.full(Item.class, "kind", FittedKind.COIL, "serial", "7/8", "type", "CT"),
                SampleRows.full(Fitting.class, "station", station, "kind", FittedKind.COIL, "type", "CT", "serial", "7/8"),
                SampleRows.full(Reading.class, "subject_kind", SubjectKind.ITEM, "subject", "coil/7/8"),
                SampleRows.full(Concession.class, "station", station), SampleRows.full(MarketMains.class),
                SampleRows.full(MarketTolerance.class),
                SampleRows.full(MarketMark.class), SampleRows.full(FleetSetting.class));
    }

    @Test
    void everyFieldOfEveryKindComesBack() throws Exception {
        List<Row> rows = oneOfEach();
        assertEquals(Kind.ALL.stream().map(Kind::type).toList(), rows.stream().<Class<?>>map(Row::getClass).toList(),
                "one row of each kind");
        try (Register register = FleetFixture.registers().open(folder.resolve("r"), OpenMode.CREATE_NEW)) {
            register.apply(FleetFixture.inserting(rows), Progress.NONE);
            check(register, rows);
        }
        try (Register register = FleetFixture.registers().open(folder.resolve("r"), OpenMode.EXISTING)) {
            check(register, rows);
            assertEquals(rows, register.change(1).rows().stream().map(change -> change.after()).toList());
        }
    }

    private static void check(Register register, List<Row> rows) throws Exception {
        for (Row row : rows) {
            assertEquals(row, register.find(Kind.of(row), row.key()));
            List<Row> all = new ArrayList<>();
            register.read(Kind.of(row), all::add);
            assertEquals(List.of(row), all);
            assertNull(register.find(Kind.of(row), row.key() + "x"));
        }
    }

    @Test
    void missingValuesStayMissing() throws Exception {
        try (Register register = FleetFixture.registers().temporary()) {
            List<Row> rows = new ArrayList<>(FleetFixture.shared(1));
            rows.addAll(FleetFixture.stations(0, 3));
            register.apply(FleetFixture.inserting(rows), Progress.NONE);
            for (Row row : rows) {
                assertEquals(row, register.find(Kind.of(row), row.key()));
            }
        }
    }
}
