package coilbook.jobs.internal.demo;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

/**
 * For each criterion a way to break it, of the kind that happens in plants: a strap left as delivered, a coil of the neighbouring frame, a cable that
 * grew. A fault may break others too, as it does in life. A test holds this table against the registry of criteria.
 */
public final class Faults {

    private static final Map<String, Consumer<StationPlan>> PLANTERS = new LinkedHashMap<>();

    static {
        PLANTERS.put("input-nominal", Faults::strapLeftAsDelivered);
        PLANTERS.put("input-tolerance", plan -> {
            plan.useTwoLevel();
            plan.circuit = "C4";
        });
        PLANTERS.put("input-frequency", plan -> {
            plan.useTwoLevel();
            plan.circuit = "C3";
        });
        PLANTERS.put("input-setting-recorded", plan -> {
            plan.useTwoLevel();
            plan.setting = null;
        });
        PLANTERS.put("bus-stress", Faults::lineDriverOnHighVoltage);
        PLANTERS.put("coil-class", plan -> {
            plan.useTwoLevel();
            plan.useCoil("KM-48", 46);
        });
        PLANTERS.put("pull-in-current", plan -> {
            plan.useTwoLevel();
            plan.cable = "LC-2x0.5";
            plan.cableLength = 220.0;
        });
        PLANTERS.put("hold-current", plan -> {
            plan.useTwoLevel();
            plan.useCoil("KM-115", 285);
        });
        PLANTERS.put("output-current", plan -> {
            plan.use(Combination.of(plan.market).get(1));
            plan.useCoil("KM-24", 12.4);
        });
        PLANTERS.put("winding-temperature", plan -> {
            plan.useTwoLevel();
            plan.coilAmbientHighest = 168.0;
        });
        PLANTERS.put("cycle-rate", plan -> {
            plan.useTwoLevel();
            plan.valve = "TV-M45";
            plan.rate = 46;
            plan.onTime = 0.008;
        });
        PLANTERS.put("coil-insulation", plan -> {
            lineDriverOnHighVoltage(plan);
            plan.valve = "TV-S16";
            plan.useCoil("KS-115", 430);
        });
        PLANTERS.put("winding-resistance", plan -> {
            plan.useTwoLevel();
            plan.winding = plan.coilOhms * 1.4;
        });
        PLANTERS.put("serial-unique", plan -> plan.coilSerial = FleetInventor.coilSerial(Math.max(0, plan.index - 1)));
    }

    private Faults() {
    }

    /** The criteria that a fault can be planted for, in the order in which faults are dealt out. */
    public static List<String> criteria() {
        return List.copyOf(PLANTERS.keySet());
    }

    static void plant(String criterion, StationPlan plan) {
        PLANTERS.get(criterion).accept(plan);
    }

    private static void strapLeftAsDelivered(StationPlan plan) {
        plan.useTwoLevel();
        if (plan.market.isLow()) {
            plan.circuit = plan.market.highCircuit();
        }
        plan.setting = "P115";
    }

    private static void lineDriverOnHighVoltage(StationPlan plan) {
        plan.valve = "TV-M45";
        plan.useCoil("KM-115", 285);
        plan.driver = "CAP-120";
        plan.setting = "120";
        plan.circuit = plan.market.highCircuit();
        plan.cableLength = 6.0;
        plan.rate = 4;
        plan.onTime = 0.030;
        plan.winding = null;
    }
}
