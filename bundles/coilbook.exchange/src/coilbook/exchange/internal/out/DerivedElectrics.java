package coilbook.exchange.internal.out;

import coilbook.criteria.StationCircuits;
import coilbook.electrics.ElectricsCache;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.StationView;

/** The electrics of stations as the criteria see them; equal circuits are derived once. */
final class DerivedElectrics {

    /** Different circuits kept, about 5 kB each: what stands beside each other in a fleet is mostly alike. */
    private static final int CAPACITY = 4000;

    private final ElectricsCache cache = new ElectricsCache(CAPACITY);

    /** What is derived for a station; {@code null} where its data contradict one another, which its findings say. */
    StationElectrics of(StationView view) {
        try {
            return cache.of(StationCircuits.of(view));
        } catch (IllegalCaseException e) {
            return null;
        }
    }
}
