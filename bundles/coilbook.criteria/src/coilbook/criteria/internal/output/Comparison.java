package coilbook.criteria.internal.output;

import java.util.Comparator;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.ChosenSetting;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.Copper;
import coilbook.electrics.Data;
import coilbook.fleet.CoilType;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * What still decides where a coil's inductance or a current it needs is not known: its maker approves the driver's type, so the current that the two give at
 * the lowest input voltage, without a cable, is enough. The current here is at least ρ of that, whatever the inductance: the ratio of the sources, times
 * R/(R + R_cable) for a cold winding, which is where a cable takes most.
 */
final class Comparison {

    /** Down to here a smaller current is met with a small margin (as the margin between 0.9 and 1 of the approved pair is called). */
    private static final double LEAST = 0.9;

    private Comparison() {
    }

    /** ρ, estimated by rule; missing where the maker does not approve the type or too little is known to compare. */
    static Fact ratio(StationView station, StationData data) {
        CoilType coil = station.coil();
        DriverType driver = station.driver();
        if (coil == null || driver == null || coil.approvedDrivers() == null || !coil.approvedDrivers().contains(driver.code())
                || !data.fact(Data.DRIVER_KIND).isKnown() || !lastsThroughPullIn(driver, data)) {
            return Fact.missing("an approved driver type");
        }
        Fact coolest = data.ambient().lowest().from();
        double resistance20 = data.circuit().coil().lowestResistance20();
        Fact resistance = data.fact(Data.COIL_RESISTANCE).with(coolest, (r, t) -> Copper.resistanceAt(resistance20, t));
        Fact cable = resistance.with(data.cable(), (r, c) -> r / (r + c));
        return cable.with(sources(station, data), (share, source) -> share * source).noStrongerThan(Provenance.ESTIMATED);
    }

    /** The approved pair has the whole pull-in time; here the on-time must not cut it short. */
    private static boolean lastsThroughPullIn(DriverType driver, StationData data) {
        Fact onTime = data.fact(Data.DUTY_ON_TIME);
        Datum phase = driver.kind() == DriverKind.TWO_LEVEL ? driver.pullInTime() : driver.peakTime();
        boolean timed = driver.kind() == DriverKind.TWO_LEVEL || driver.kind() == DriverKind.CURRENT_REGULATED;
        return timed && onTime.isKnown() && phase != null && Compare.atLeast(onTime.value(), phase.value())
                || driver.kind() == DriverKind.LINE_CAPACITOR && onTime.isKnown();
    }

    /** Regulated outputs are the same everywhere; a capacitor's voltage follows the mains, there the lowest that the input setting allows. */
    private static Fact sources(StationView station, StationData data) {
        if (station.driver().kind() != DriverKind.LINE_CAPACITOR) {
            return Fact.known(1, null);
        }
        Fact there = ChosenSetting.of(station).candidates().stream().map(InputSetting::lowestVoltage)
                .map(v -> Fact.of(v, () -> "Lowest voltage"))
                .max(Comparator.comparingDouble(f -> f.isKnown() ? f.value() : Double.POSITIVE_INFINITY))
                .orElse(Fact.missing("Input setting"));
        double drop = Datum.or(station.driver().rectifierDrop(), 0);
        return data.fact(Data.MAINS_LOWEST_VOLTAGE).with(there,
                (here, least) -> (Math.sqrt(2) * here - drop) / (Math.sqrt(2) * least - drop));
    }

    /** The finding that a known ratio comes to. */
    static Finding judge(Fact ratio, StationView station, Judgement judgement, String what) {
        Verdict verdict = Compare.atLeast(ratio.value(), 1) ? Verdict.CONFORMITY
                : Compare.atLeast(ratio.value(), LEAST) ? Verdict.OBSERVATION : Verdict.NONCONFORMITY;
        return judgement.compared(ratio.value(), 1, Unit.NONE).restsOn(ratio.provenance())
                .number("Ratio to the approved pair", ratio.value(), Unit.NONE)
                .is(verdict, "The maker of coil type " + station.coil().code() + " approves driver type " + station.driver().code()
                        + " (catalogue); whatever the inductance, the " + what + " here is at least "
                        + Shown.beside(ratio.value(), 1, Unit.NONE)
                        + " of theirs at their lowest input voltage");
    }
}
