package coilbook.electrics;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Remembers the electrics of the circuits asked for last, by their exact inputs: a fleet of many stations has few different circuits. Safe for use
 * by several threads; two that ask for the same new circuit at once both compute it.
 */
public final class ElectricsCache {

    private final Map<StationCircuit, StationElectrics> known;

    /**
     * @param capacity circuits remembered, at least one
     */
    public ElectricsCache(int capacity) {
        if (capacity < 1) {
            throw new IllegalArgumentException("capacity " + capacity);
        }
        known = new LinkedHashMap<>(16, 0.75f, true) {
            private static final long serialVersionUID = 1L;

            @Override
            protected boolean removeEldestEntry(Map.Entry<StationCircuit, StationElectrics> eldest) {
                return super.size() > capacity;
            }
        };
    }

    /**
     * The electrics of a circuit.
     *
     * @throws IllegalCaseException as {@link StationDerivation#derive}
     */
    public StationElectrics of(StationCircuit circuit) throws IllegalCaseException {
        synchronized (known) {
            StationElectrics electrics = known.get(circuit);
            if (electrics != null) {
                return electrics;
            }
        }
        StationElectrics electrics = StationDerivation.derive(circuit);
        synchronized (known) {
            known.put(circuit, electrics);
        }
        return electrics;
    }

    /** Circuits remembered. */
    public int size() {
        synchronized (known) {
            return known.size();
        }
    }
}
