package coilbook.criteria;

import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.StationCircuit;
import coilbook.fleet.StationView;

/**
 * What the electrics of a station are derived from: the register's rows in SI units, a coil's own reading in place of its catalogue's resistance, the mains
 * with their band and readings through the transformer, the coil's surroundings, the duty from rate or pattern. NaN: not known.
 */
public final class StationCircuits {

    private StationCircuits() {
    }

    public static StationCircuit of(StationView view) {
        return new StationData(view).circuit();
    }
}
