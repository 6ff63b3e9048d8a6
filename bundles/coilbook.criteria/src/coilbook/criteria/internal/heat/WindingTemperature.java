package coilbook.criteria.internal.heat;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.ElectricCriterion;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.StationData;
import coilbook.electrics.Data;
import coilbook.electrics.Derived;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.DriverKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** At its duty and in the hot corner the winding stays below the limit of its insulation class, less the hot-spot allowance. */
public final class WindingTemperature extends ElectricCriterion {

    public WindingTemperature(Function<StationCircuit, StationElectrics> derivation) {
        super(new Description("winding-temperature", "Does the winding at its duty stay below its insulation class’s limit?", "temperature",
                Scope.STATION,
                List.of("Insulation class", "Thermal resistance", "Resistance at 20 °C", "Coil ambient highest", "Cycle rate", "On-time",
                        "Inductance", "the electrical values of the driver type"),
                "Limit of the thermal class (IEC 60085: A 105, E 120, B 130, F 155, H 180 °C), less the hot-spot allowance (fleet setting, 10 K; common"
                        + " practice, no source)",
                "Yes: burn and fire",
                "θ = θ_ambient + R_th · P(θ), P = cycles/s · winding energy per cycle at R(θ) = R₂₀ · (234.5 + θ)/254.5; θ ≤ θ_class − allowance"
                        + " (fixed point)",
                List.of("a lower duty", "another coil", "another driver", "measure the thermal resistance", "measure the coil’s ambient")),
                derivation);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics, StationData data) {
        Derived winding = electrics.windingTemperature();
        Fact classLimit = data.fact(Data.INSULATION_CLASS);
        Judgement judgement = judgement().at("hot").hazard(true).restsOn(data.weakestOfCurrent())
                .restsOn(data.weakest(Data.AMBIENT, Data.DUTY_RATE, Data.DUTY_ON_TIME, Data.THERMAL_RESISTANCE));
        List<String> missing = new ArrayList<>(data.missing(winding));
        missing.addAll(classLimit.missing());
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        boolean lineOperated = station.driver().kind() == DriverKind.LINE_CAPACITOR;
        if (lineOperated) {
            judgement.restsOn(data.weakest(Data.MAINS_HIGHEST_VOLTAGE));
        }
        double allowance = station.fleetSettings().get(FleetSettings.HOT_SPOT_ALLOWANCE);
        double limit = classLimit.value() - allowance;
        conditions(judgement, winding.at(), lineOperated).compared(winding.value(), limit, Unit.CELSIUS)
                .number("Winding power", electrics.averagePower().value(), Unit.WATT)
                .number("Thermal resistance", data.circuit().coil().thermalResistanceOrBound(), Unit.KELVIN_PER_WATT)
                .number("Class limit", classLimit.value(), Unit.CELSIUS).number("Hot-spot allowance", allowance, Unit.KELVIN)
                .number("Cycle rate", data.duty().meanRate().value(), Unit.PER_SECOND)
                .number("On-time", data.duty().onTime().value(), Unit.MILLISECOND);
        String allowed = "; class " + station.coil().insulationClass().label() + " allows " + Shown.of(classLimit.value(), Unit.CELSIUS)
                + " (IEC 60085) less "
                + Shown.of(allowance, Unit.KELVIN) + " for the hot spot";
        double margin = station.fleetSettings().get(FleetSettings.TEMPERATURE_MARGIN);
        Verdict verdict = Compare.temperature(winding.value(), limit, margin);
        boolean decided = verdict == Verdict.NONCONFORMITY && data.cable().isKnown()
                && missedEvenInTheCoolest(data, StationElectrics::windingTemperature, celsius -> !Compare.atMost(celsius, limit));
        List<String> open = decided ? List.of() : unfavourable(data, winding, bounds(data));
        return conclude(judgement, verdict, sentence(electrics, data, winding) + allowed, List.of(), open);
    }

    private static List<String> bounds(StationData data) {
        List<String> names = new ArrayList<>(data.ambient().highest().narrowing());
        names.addAll(data.cable().missing());
        return names;
    }

    private static String sentence(StationElectrics electrics, StationData data, Derived winding) {
        double ambient = winding.at().ambient();
        String duty = Shown.of(data.duty().meanRate().value(), Unit.PER_SECOND) + " of "
                + Shown.of(data.duty().onTime().value(), Unit.MILLISECOND);
        if (Double.isInfinite(winding.value())) {
            Derived saturation = electrics.saturationTemperature();
            String bus = saturation.known() ? " below " + Shown.of(saturation.value(), Unit.CELSIUS) + ", where the bus saturates" : "";
            return "At " + duty + " and " + Shown.of(ambient, Unit.CELSIUS) + " ambient there is no steady temperature" + bus;
        }
        String atMost = winding.isBound() ? " at most" : "";
        return "Winding" + atMost + " " + Shown.of(winding.value(), Unit.CELSIUS) + " at " + duty + ", "
                + Shown.of(electrics.averagePower().value(), Unit.WATT)
                + " and " + Shown.of(ambient, Unit.CELSIUS) + " ambient";
    }
}
