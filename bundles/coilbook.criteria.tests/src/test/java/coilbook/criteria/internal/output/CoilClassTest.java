package coilbook.criteria.internal.output;

import static coilbook.criteria.StationFixture.lineCapacitorStation;
import static coilbook.criteria.StationFixture.twoLevelStation;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.Judged;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.CoilKind;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;

class CoilClassTest {

    private static FindingAssert judge(StationFixture fixture) {
        return Judged.judge("coil-class", fixture);
    }

    @Test
    void ofTheClassTheOutputIsMadeFor() {
        judge(twoLevelStation()).is(Verdict.CONFORMITY).compares(24, 24, 0)
                .says("Coil type C10 is rated DC 24 V; driver type D1 is made for DC coils of 24 V");
        judge(lineCapacitorStation()).is(Verdict.CONFORMITY).compares(115, 120, 0).says("DC coils from 110 V to 120 V");
        judge(twoLevelStation().coil("rated_kind", CoilKind.AC_OR_DC)).is(Verdict.CONFORMITY);
        judge(twoLevelStation().driver("coil_kind", CoilKind.AC_OR_DC)).is(Verdict.CONFORMITY);
    }

    @Test
    void limitsMetExactlyAreMet() {
        judge(lineCapacitorStation().coil("rated_voltage", Datum.catalogue(110))).is(Verdict.CONFORMITY);
        judge(lineCapacitorStation().coil("rated_voltage", Datum.catalogue(120))).is(Verdict.CONFORMITY);
        judge(lineCapacitorStation().coil("rated_voltage", Datum.catalogue(120.001))).is(Verdict.NONCONFORMITY);
    }

    @Test
    void ofAnotherClass() {
        judge(twoLevelStation().coil("rated_voltage", Datum.catalogue(48))).is(Verdict.NONCONFORMITY).isHazard(false).compares(48, 24, 0)
                .says("rated DC 48 V", "of 24 V");
        judge(twoLevelStation().coil("rated_kind", CoilKind.AC)).is(Verdict.NONCONFORMITY).isHazard(false).says("rated AC 24 V",
                "DC coils");
        judge(twoLevelStation().coil("rated_kind", CoilKind.AC).driver("coil_kind", null)).is(Verdict.NONCONFORMITY);
        judge(twoLevelStation().driver("kind", DriverKind.DIRECT_AC).driver("coil_kind", null)).is(Verdict.NONCONFORMITY)
                .says("made for AC coils");
    }

    @Test
    void canHurtWhereSomethingIsOverstressed() {
        judge(lineCapacitorStation().coil("rated_voltage", Datum.catalogue(24)).coil("insulation_voltage", Datum.catalogue(60)))
                .is(Verdict.NONCONFORMITY)
                .isHazard(true).says("overstressed: see coil-insulation");
        judge(lineCapacitorStation().coil("rated_voltage", Datum.catalogue(24)).coil("resistance20", Datum.catalogue(10)))
                .is(Verdict.NONCONFORMITY)
                .isHazard(true).says("overstressed: see output-current");
    }

    @Test
    void makersApprovalDecidesWhereTheDriverSaysNothing() {
        StationFixture silent = twoLevelStation().driver("coil_voltage_from", null).driver("coil_voltage_to", null).driver("coil_kind",
                null);
        judge(silent).is(Verdict.UNDETERMINED).misses("Coils rated voltage from of driver type D1",
                "Coils rated voltage to of driver type D1");
        judge(silent.coil("approved_drivers", List.of("D7", "D1"))).is(Verdict.CONFORMITY).says("approves driver type D1");
        judge(silent.coil("approved_drivers", List.of("D7"))).is(Verdict.UNDETERMINED);
    }

    @ParameterizedTest
    @CsvSource({ "coil,rated_kind,Rated kind of coil type C10", "coil,rated_voltage,Rated voltage of coil type C10",
            "driver,coil_voltage_from,Coils rated voltage from of driver type D1",
            "driver,coil_voltage_to,Coils rated voltage to of driver type D1" })
    void namesWhatIsMissing(String kind, String field, String name) {
        judge(PullInCurrentTest.without(twoLevelStation(), kind, field)).is(Verdict.UNDETERMINED).misses(name);
    }

    @Test
    void namesWhatIsNotThere() {
        judge(twoLevelStation().withoutDriver()).is(Verdict.UNDETERMINED).misses("Driver type of station WERK/L1/=A1");
        judge(twoLevelStation().withoutCoil()).is(Verdict.UNDETERMINED).misses("Coil type of station WERK/L1/=A1");
        judge(twoLevelStation().driver("coil_kind", null).driver("kind", null)).is(Verdict.UNDETERMINED)
                .misses("Coils rated kind of driver type D1");
    }
}
