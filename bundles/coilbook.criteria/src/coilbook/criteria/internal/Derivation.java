package coilbook.criteria.internal;

import java.util.function.Function;

import coilbook.electrics.CoilFigures;
import coilbook.electrics.DriverFigures;
import coilbook.electrics.ElectricsCache;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.LevelChange;

/**
 * Derives electrics and remembers those of the circuits asked for last. A circuit whose data contradict one another is answered as one of which the driver is
 * not known: everything that needs a current is then missing.
 */
public final class Derivation implements Function<StationCircuit, StationElectrics> {

    private static final double NONE = Double.NaN;

    private final ElectricsCache cache;

    public Derivation(int capacity) {
        this.cache = new ElectricsCache(capacity);
    }

    @Override
    public StationElectrics apply(StationCircuit circuit) {
        try {
            return cache.of(circuit);
        } catch (IllegalCaseException contradictory) {
            return withoutDriver(circuit);
        }
    }

    private StationElectrics withoutDriver(StationCircuit circuit) {
        DriverFigures unknown = new DriverFigures(null, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE,
                LevelChange.SOURCE, NONE,
                NONE, NONE, NONE, NONE, NONE, NONE, NONE);
        CoilFigures coil = circuit.coil();
        try {
            return cache.of(new StationCircuit(circuit.supply(), unknown, coil, circuit.cableResistance(), circuit.lowestAmbient(),
                    circuit.nominalAmbient(), circuit.highestAmbient(), circuit.meanRate(), circuit.burstRate(), circuit.onTime(),
                    circuit.openingDelay(), circuit.closingDelay(), circuit.valveHighestRate()));
        } catch (IllegalCaseException impossible) {
            throw new IllegalStateException("no circuit without a driver can be refused", impossible);
        }
    }
}
