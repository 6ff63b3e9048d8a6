package coilbook.exchange.internal.out;

import java.util.function.Function;
import java.util.function.ToDoubleFunction;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.Corner;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Unit;

/**
 * The key figures of a station in the order of their columns: first what they are computed from, then the figures. Each has the value that was computed, in SI,
 * and, where it has a closed form over other cells, that form. A form is written only where it gives the computed value, so a formula on the sheet
 * never says anything else than the verdict beside it rests on; where a reading, a transformer or several coils on a channel come in, the value stands alone.
 */
enum KeyFigure {

    NOMINAL_MAINS("Nominal mains", Unit.VOLT, FigureInputs::nominalMains, c -> c.circuit("nominal_voltage")),
    LOWEST_MAINS("Lowest mains", Unit.VOLT, FigureInputs::lowestMains,
            c -> c.circuitVolts(CircuitsSheet.LOWEST_MAINS, FigureInputs.bandVolts(c, false))),
    HIGHEST_MAINS("Highest mains", Unit.VOLT, FigureInputs::highestMains,
            c -> c.circuitVolts(CircuitsSheet.HIGHEST_MAINS, FigureInputs.bandVolts(c, true))),
    RESISTANCE_20("Winding resistance at 20 °C", Unit.OHM, FigureInputs::resistance20, c -> c.coil("resistance20")),
    RESISTANCE_TOLERANCE("Resistance tolerance", Unit.PERCENT, FigureInputs::tolerance, c -> c.coil("resistance_tolerance")),
    INDUCTANCE("Inductance", Unit.MILLIHENRY, c -> c.at(Corner.NOMINAL, x -> x.coil().inductanceOpen()), c -> c.coil("inductance")),
    PULL_IN_CURRENT("Pull-in current needed", Unit.AMPERE, c -> c.at(Corner.NOMINAL, x -> x.coil().pullInCurrent()),
            c -> c.coil("pull_in_current")),
    DROP_OUT_CURRENT("Drop-out current", Unit.AMPERE, c -> c.at(Corner.NOMINAL, x -> x.coil().dropOutCurrent()),
            c -> c.coil("drop_out_current")),
    THERMAL_RESISTANCE("Thermal resistance", Unit.KELVIN_PER_WATT,
            c -> c.view().coil() == null ? Double.NaN : Datum.orNaN(c.view().coil().thermalResistance()),
            c -> c.coil("thermal_resistance")),
    HIGHEST_WINDING_TEMPERATURE("Highest mean winding temperature", Unit.CELSIUS,
            c -> c.view().coil() == null || c.view().coil().insulationClass() == null ? Double.NaN
                    : c.view().coil().insulationClass().limitCelsius() - c.view().fleetSettings().get(FleetSettings.HOT_SPOT_ALLOWANCE),
            null),
    SOURCE("Source voltage at pull-in", Unit.VOLT, FigureInputs::source, FigureInputs::sourceCell),
    HOLD_SOURCE("Source voltage in hold", Unit.VOLT, FigureInputs::holdSource,
            c -> c.is(DriverKind.TWO_LEVEL) ? c.driver("hold_voltage") : FigureInputs.sourceCell(c)),
    SWITCH_DROP("Switch drop", Unit.VOLT, c -> c.at(Corner.NOMINAL, x -> x.driver().switchDrop()), c -> c.driver("switch_drop")),
    ON_TIME("Shortest on-time", Unit.MILLISECOND, c -> c.at(Corner.LOW_HOT, CircuitCase::onTime),
            c -> c.duty("on_time").isPresent() ? c.duty("on_time") : c.duty("bead_length").over(c.duty("speed"))),
    FULL_SOURCE_TIME("Time at pull-in voltage", Unit.MILLISECOND, FigureInputs::fullSourceTime, FigureInputs::fullSourceTimeForm),
    HIGHEST_AMBIENT("Coil ambient highest", Unit.CELSIUS, c -> c.derived(StationElectrics::peakAtLow).at().ambient(),
            c -> c.station("coil_ambient_highest").isPresent() ? c.station("coil_ambient_highest") : c.site("ambient_highest")),
    WINDING_HOT("Winding temperature, low corner", Unit.CELSIUS, c -> c.at(Corner.LOW_HOT, x -> x.coil().temperature()), null),
    WINDING_COLD("Winding temperature, high corner", Unit.CELSIUS, c -> c.at(Corner.HIGH_COLD, x -> x.coil().temperature()),
            c -> c.station("coil_ambient_lowest").isPresent() ? c.station("coil_ambient_lowest") : c.site("ambient_lowest")),
    CABLE_LOOP("Cable loop resistance", Unit.OHM, c -> c.at(Corner.LOW_HOT, CircuitCase::loopResistance), FigureInputs::cableLoop),
    RESISTANCE_HOT("Winding resistance, low corner", Unit.OHM, c -> c.at(Corner.LOW_HOT, x -> x.coil().resistance()),
            c -> c.cell(RESISTANCE_20).times(Expr.number(1).plus(c.cell(RESISTANCE_TOLERANCE)))
                    .times(FigureCase.copper(c.cell(WINDING_HOT)))),
    RESISTANCE_COLD("Winding resistance, high corner", Unit.OHM, c -> c.at(Corner.HIGH_COLD, x -> x.coil().resistance()),
            c -> c.cell(RESISTANCE_20).times(Expr.number(1).minus(c.cell(RESISTANCE_TOLERANCE)))
                    .times(FigureCase.copper(c.cell(WINDING_COLD)))),
    LOOP_HOT("Loop resistance, low corner", Unit.OHM, c -> c.at(Corner.LOW_HOT, CircuitCase::totalResistance),
            c -> c.cell(RESISTANCE_HOT).plus(c.cell(CABLE_LOOP))),
    LOOP_COLD("Loop resistance, high corner", Unit.OHM, c -> c.at(Corner.HIGH_COLD, CircuitCase::totalResistance),
            c -> c.cell(RESISTANCE_COLD).plus(c.cell(CABLE_LOOP))),
    TIME_CONSTANT("Time constant, low corner", Unit.MILLISECOND,
            c -> c.at(Corner.LOW_HOT, x -> x.coil().inductanceOpen() / x.totalResistance()),
            c -> c.cell(INDUCTANCE).over(c.cell(LOOP_HOT))),
    PEAK_CURRENT("Peak current, low corner", Unit.AMPERE, c -> c.value(StationElectrics::peakAtLow), c -> FigureForms.peak(c, LOOP_HOT)),
    PULL_IN_MARGIN("Pull-in margin", Unit.PERCENT, c -> c.value(StationElectrics::peakAtLow) / c.cell(PULL_IN_CURRENT).value() - 1,
            c -> c.cell(PEAK_CURRENT).over(c.cell(PULL_IN_CURRENT)).minus(1)),
    TIME_TO_PULL_IN("Time to pull in, low corner", Unit.MILLISECOND, c -> c.value(StationElectrics::timeToPullIn),
            FigureForms::timeToPullIn),
    CABLE_DROP("Cable drop at peak", Unit.VOLT,
            c -> c.at(Corner.LOW_HOT, CircuitCase::loopResistance) * c.value(StationElectrics::peakAtLow),
            c -> c.cell(CABLE_LOOP).times(c.cell(PEAK_CURRENT))),
    HOLD_SETTLED("Hold current, settled, low corner", Unit.AMPERE, FigureForms::holdSettledValue,
            c -> c.cell(HOLD_SOURCE).minus(c.cell(SWITCH_DROP)).over(c.cell(LOOP_HOT))),
    HOLD_MEAN("Hold current, mean, low corner", Unit.AMPERE, c -> c.value(StationElectrics::holdMean), FigureForms::holdMean),
    HOLD_MINIMUM("Hold current, least", Unit.AMPERE, c -> c.value(StationElectrics::holdMinimum), FigureForms::holdMinimum),
    HOLD_MARGIN("Hold over drop-out", Unit.PERCENT, c -> c.value(StationElectrics::holdMinimum) / c.cell(DROP_OUT_CURRENT).value() - 1,
            c -> c.cell(HOLD_MINIMUM).over(c.cell(DROP_OUT_CURRENT)).minus(1)),
    RELEASE_TIME("Release time", Unit.MILLISECOND, c -> c.value(StationElectrics::releaseTime), null),
    OUTPUT_CURRENT("Output current, high corner", Unit.AMPERE, c -> c.value(StationElectrics::peakAtHigh),
            c -> FigureForms.peak(c, LOOP_COLD)),
    BUS_VOLTAGE("Bus voltage, high corner", Unit.VOLT, c -> c.value(StationElectrics::busPeak), FigureForms::bus),
    MEAN_SOURCE("Rectified mean, low corner", Unit.VOLT, FigureForms::rectifiedMeanValue, FigureForms::rectifiedMean),
    WORKING_VOLTAGE("Working voltage, peak", Unit.VOLT, c -> c.value(StationElectrics::workingPeak), FigureForms::workingPeak),
    STORED_ENERGY("Energy in the capacitor", Unit.JOULE, c -> c.value(StationElectrics::storedEnergy), FigureForms::storedEnergy),
    DECAY_TIME("Time to 60 V", Unit.SECOND, c -> c.value(StationElectrics::decayTime), FigureForms::decayTime),
    CYCLE_ENERGY_BOUND("Energy a cycle, upper bound", Unit.JOULE, FigureForms::energyBoundValue, FigureForms::energyBound),
    WINDING_POWER("Winding power at duty", Unit.WATT, c -> c.value(StationElectrics::averagePower), null),
    WINDING_TEMPERATURE("Winding temperature at duty", Unit.CELSIUS, c -> c.value(StationElectrics::windingTemperature),
            c -> c.cell(HIGHEST_AMBIENT).plus(c.cell(THERMAL_RESISTANCE).times(c.cell(WINDING_POWER)))),
    TEMPERATURE_MARGIN("Temperature margin", Unit.KELVIN,
            c -> c.cell(HIGHEST_WINDING_TEMPERATURE).value() - c.cell(WINDING_TEMPERATURE).value(),
            c -> c.cell(HIGHEST_WINDING_TEMPERATURE).minus(c.cell(WINDING_TEMPERATURE))),
    STUCK_ON("Winding temperature, held on", Unit.CELSIUS, c -> c.value(StationElectrics::stuckOnTemperature), null),
    HOLD_POWER("Hold power, nominal", Unit.WATT, c -> c.value(StationElectrics::holdPower), null),
    HIGHEST_RATE("Highest cycle rate", Unit.PER_SECOND, c -> c.value(e -> e.cycleRate().highest()), null),
    MAINS_CURRENT("Mains current", Unit.AMPERE, c -> c.value(StationElectrics::mainsRms), null),
    APPARENT_POWER("Apparent power", Unit.VOLT_AMPERE, c -> c.value(StationElectrics::apparentPower),
            c -> c.cell(HIGHEST_MAINS).times(c.cell(MAINS_CURRENT))),
    MAINS_PEAK("Mains peak current", Unit.AMPERE, c -> c.value(StationElectrics::mainsPeak), null),
    SERIES_RESISTOR("Series resistor at duty", Unit.WATT, c -> c.value(StationElectrics::seriesResistorPower), null),
    SERIES_RESISTOR_STUCK("Series resistor, held on", Unit.WATT, c -> c.value(StationElectrics::seriesResistorStuckOn), null),
    SERIES_RESISTOR_SHORTED("Series resistor, output shorted", Unit.WATT, c -> c.value(StationElectrics::seriesResistorShorted), null);

    /** Two ways to the same figure agree to this, relatively; a reader's recalculation does too. */
    private static final double AGREEMENT = 1e-10;

    private final String heading;
    private final Unit unit;
    private final ToDoubleFunction<FigureCase> value;
    private final Function<FigureCase, Expr> form;

    KeyFigure(String heading, Unit unit, ToDoubleFunction<FigureCase> value, Function<FigureCase, Expr> form) {
        this.heading = heading;
        this.unit = unit;
        this.value = value;
        this.form = form;
    }

    /** The heading with its unit. */
    String heading() {
        return heading + " [" + unit.symbol() + "]";
    }

    Unit unit() {
        return unit;
    }

    /** What was computed, in SI; NaN if nothing, infinite if there is no such value. */
    double value(FigureCase of) {
        return value.applyAsDouble(of);
    }

    /**
     * How far a closed form may lie from the computed value, in SI. The winding temperature is computed to a thousandth of a kelvin; its cell then holds the form's own
     * value, so that what follows from it on the sheet does too.
     */
    double tolerance(double value) {
        return this == WINDING_TEMPERATURE ? 2e-3 : AGREEMENT * Math.abs(value);
    }

    /** The closed form, or {@code null}. */
    Expr form(FigureCase of) {
        return form == null ? null : form.apply(of);
    }
}
