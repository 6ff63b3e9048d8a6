package coilbook.criteria.internal.records;

import static coilbook.criteria.FindingAssert.assertThat;
import static coilbook.criteria.StationFixture.twoLevelStation;

import org.junit.jupiter.api.Test;

import coilbook.criteria.FindingAssert;
import coilbook.criteria.StationFixture;
import coilbook.criteria.Verdict;
import coilbook.fleet.FittedKind;

class SerialUniqueTest {

    private static FindingAssert judge(StationFixture fixture) {
        return assertThat(new SerialUnique().judge(fixture.view(), null));
    }

    @Test
    void everyItemIsAtOnePlace() {
        judge(twoLevelStation()).is(Verdict.CONFORMITY).says("All 3 items");
    }

    @Test
    void anItemAtTwoPlaces() {
        judge(twoLevelStation().itemAlsoAt("coil/c-1", "WERK/L2/+B4")).is(Verdict.NONCONFORMITY).isHazard(false)
                .says("Coil c-1 is also recorded at WERK/L2/+B4");
        judge(twoLevelStation().itemAlsoAt("coil/c-1", "WERK/L2/+B4").itemAlsoAt("driver/d-1", "WERK/L2/+B5")).is(Verdict.NONCONFORMITY)
                .says("Coil c-1", "driver d-1 is also recorded at WERK/L2/+B5");
    }

    @Test
    void withoutSerialsItDoesNotArise() {
        judge(twoLevelStation().fit(FittedKind.VALVE, "V1", null).fit(FittedKind.COIL, "C10", null).fit(FittedKind.DRIVER, "D1", null))
                .is(Verdict.NOT_APPLICABLE);
        judge(twoLevelStation().fit(FittedKind.VALVE, "V1", null).fit(FittedKind.COIL, "C10", null)).is(Verdict.CONFORMITY)
                .says("The one item");
    }
}
