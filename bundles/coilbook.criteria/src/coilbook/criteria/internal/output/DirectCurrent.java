package coilbook.criteria.internal.output;

import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.Copper;
import coilbook.electrics.Data;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.StationView;

/** The most a driver can put through a coil: no inductance, no cable, the winding as cool as its surroundings and at the low end of its tolerance. */
final class DirectCurrent {

    private DirectCurrent() {
    }

    /** A, at the lowest mains; missing where something else than the inductance is. */
    static Fact most(StationView station, StationData data) {
        Fact coolest = data.ambient().lowest().from();
        double lowestResistance20 = data.circuit().coil().lowestResistance20();
        Fact resistance = data.fact(Data.COIL_RESISTANCE).with(coolest, (r, t) -> Copper.resistanceAt(lowestResistance20, t));
        if (!data.fact(Data.DRIVER_KIND).isKnown()) {
            return Fact.missing(data.fact(Data.DRIVER_KIND).missing());
        }
        DriverType driver = station.driver();
        Fact voltage = switch (driver.kind()) {
            case LINE_CAPACITOR -> data.fact(Data.MAINS_LOWEST_VOLTAGE).map(v -> Math.sqrt(2) * v - Datum.or(driver.rectifierDrop(), 0));
            case TWO_LEVEL -> data.fact(Data.PULL_IN_VOLTAGE);
            case FIXED_DC -> data.fact(Data.OUTPUT_VOLTAGE);
            case CURRENT_REGULATED -> data.fact(Data.BUS_VOLTAGE);
            case RECTIFIED_AC, DIRECT_AC -> data.fact(Data.DRIVER_KIND);
        };
        Fact current = voltage.map(v -> v - Datum.or(driver.switchDrop(), 0)).with(resistance, (v, r) -> v / r);
        return driver.kind() == DriverKind.CURRENT_REGULATED ? current.with(data.fact(Data.PEAK_CURRENT), Math::min) : current;
    }
}
