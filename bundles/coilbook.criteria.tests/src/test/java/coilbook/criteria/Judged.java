package coilbook.criteria;

import coilbook.fleet.Datum;
import coilbook.fleet.StationView;

/** Judges a fixture by one criterion, with its electrics derived as an assessor derives them. */
public final class Judged {

    private Judged() {
    }

    public static Finding finding(String criterion, StationFixture fixture) {
        StationView view = fixture.view();
        return new Assessor(8).assess(view).findings().stream().filter(f -> f.criterion().equals(criterion)).findFirst().orElseThrow();
    }

    public static FindingAssert judge(String criterion, StationFixture fixture) {
        return FindingAssert.assertThat(finding(criterion, fixture));
    }

    /**
     * The conditions of the check values: no tolerances, no cable, all at 20 °C and a winding that does not warm up.
     */
    public static StationFixture atTwentyDegrees(StationFixture fixture) {
        return fixture.coil("resistance_tolerance", Datum.catalogue(0)).coil("thermal_resistance", Datum.catalogue(1e-9))
                .station("cable_length", Datum.nameplate(0)).site("ambient_lowest", Datum.nameplate(20))
                .site("ambient_nominal", Datum.nameplate(20))
                .site("ambient_highest", Datum.nameplate(20));
    }

    /** A line-capacitor station with the parts of the recorded ngspice cases: 430 Ω, 6.8 µF, bridge 1.4 V, coil 250 Ω and 0.2 H, at exactly 120 V. */
    public static StationFixture ngspiceParts() {
        return atTwentyDegrees(StationFixture.lineCapacitorStation()).driver("capacitance", Datum.catalogue(6.8e-6))
                .driver("capacitance_tolerance", Datum.catalogue(0)).driver("series_resistance_tolerance", Datum.catalogue(0))
                .circuit("tolerance_below", Datum.nameplate(0)).circuit("tolerance_above", Datum.nameplate(0))
                .duty("cycle_rate", Datum.nameplate(1))
                .duty("on_time", Datum.nameplate(0.3));
    }
}
