package coilbook.criteria;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

/** What tests say of a finding; every failure shows its sentence. */
public final class FindingAssert {

    private final Finding finding;

    private FindingAssert(Finding finding) {
        this.finding = finding;
    }

    public static FindingAssert assertThat(Finding finding) {
        return new FindingAssert(finding);
    }

    public FindingAssert is(Verdict verdict) {
        assertEquals(verdict, finding.verdict(), this::text);
        return this;
    }

    public FindingAssert isHazard(boolean hazard) {
        assertEquals(hazard, finding.hazard(), this::text);
        return this;
    }

    public FindingAssert compares(double value, double limit, double relative) {
        assertEquals(value, finding.evidence().value(), relative * Math.abs(value), this::text);
        assertEquals(limit, finding.evidence().limit(), relative * Math.abs(limit), this::text);
        return this;
    }

    public FindingAssert at(String corner) {
        assertEquals(corner, finding.evidence().corner(), this::text);
        return this;
    }

    public FindingAssert says(String... parts) {
        for (String part : parts) {
            assertTrue(finding.evidence().sentence().contains(part), () -> "“" + part + "” is not in: " + text());
        }
        return this;
    }

    public FindingAssert misses(String... names) {
        assertEquals(List.of(names), finding.missing(), this::text);
        return this;
    }

    private String text() {
        return finding.verdict() + ": " + finding.evidence().sentence() + " " + finding.missing();
    }
}
