package coilbook.exchange.internal.out;

import coilbook.electrics.Corner;
import coilbook.electrics.DriverCircuit;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.FleetSettings;

/**
 * Closed forms of key figures over the cells of the same row, from ordinary circuit theory: the coil as resistance and inductance in series with cable and switch.
 * They hold for one inductance and a current that has died away before switch-on.
 */
final class FigureForms {

    /** The voltage to which a capacitor must have fallen (IEC 60204-1, 6.2.4). */
    private static final int TOUCHABLE_VOLTS = 60;

    private FigureForms() {
    }

    /** The highest current: V/R · (1 − e^(−t·R/L)) at the end of the full voltage; of a current-regulated driver at most its peak setting. */
    static Expr peak(FigureCase c, KeyFigure loop) {
        Expr settled = c.cell(KeyFigure.SOURCE).minus(c.cell(KeyFigure.SWITCH_DROP)).over(c.cell(loop));
        Expr timeConstant = c.cell(KeyFigure.INDUCTANCE).over(c.cell(loop));
        Expr reached = settled.times(Expr.number(1).minus(c.cell(KeyFigure.FULL_SOURCE_TIME).over(timeConstant).negated().exp()));
        return c.is(DriverKind.CURRENT_REGULATED) ? reached.least(c.driver("peak_current")) : reached;
    }

    /** When V/R · (1 − e^(−t·R/L)) reaches the pull-in current. */
    static Expr timeToPullIn(FigureCase c) {
        Expr share = c.cell(KeyFigure.PULL_IN_CURRENT).times(c.cell(KeyFigure.LOOP_HOT))
                .over(c.cell(KeyFigure.SOURCE).minus(c.cell(KeyFigure.SWITCH_DROP)));
        return c.cell(KeyFigure.TIME_CONSTANT).times(Expr.number(1).minus(share).ln()).negated();
    }

    static double holdSettledValue(FigureCase c) {
        double source = FigureInputs.holdSource(c);
        return c.at(Corner.LOW_HOT, x -> (source - x.driver().switchDrop()) / x.totalResistance());
    }

    /** The mean over the second half of the on-time of a current that goes from its peak to its settled hold value. */
    static Expr holdMean(FigureCase c) {
        if (!c.is(DriverKind.TWO_LEVEL)) {
            return Expr.none();
        }
        Expr settled = c.cell(KeyFigure.HOLD_SETTLED);
        Expr half = c.cell(KeyFigure.ON_TIME).over(Expr.number(2));
        Expr tau = c.cell(KeyFigure.TIME_CONSTANT);
        Expr since = half.minus(c.cell(KeyFigure.FULL_SOURCE_TIME));
        Expr fall = since.over(tau).negated().exp().minus(since.plus(half).over(tau).negated().exp());
        return settled.plus(c.cell(KeyFigure.PEAK_CURRENT).minus(settled).times(tau).times(fall).over(half));
    }

    /** The current at switch-off, the least of a current that falls from its peak. */
    static Expr holdMinimum(FigureCase c) {
        if (!c.is(DriverKind.TWO_LEVEL)) {
            return Expr.none();
        }
        return FigureCase.approach(c.cell(KeyFigure.PEAK_CURRENT), c.cell(KeyFigure.HOLD_SETTLED),
                c.cell(KeyFigure.ON_TIME).minus(c.cell(KeyFigure.FULL_SOURCE_TIME)), c.cell(KeyFigure.TIME_CONSTANT));
    }

    /** The capacitor charges to the peak of the mains less the rectifier's drop; a regulated source is its own bus. */
    static Expr bus(FigureCase c) {
        return c.is(DriverKind.LINE_CAPACITOR) ? c.cell(KeyFigure.HIGHEST_MAINS).peak().minus(c.driver("rectifier_drop"))
                : c.cell(KeyFigure.SOURCE);
    }

    static double rectifiedMeanValue(FigureCase c) {
        return c.is(DriverKind.LINE_CAPACITOR)
                ? c.cell(KeyFigure.LOWEST_MAINS).rectifiedMean().value() - Datum.orNaN(c.view().driver().rectifierDrop())
                : Double.NaN;
    }

    static Expr rectifiedMean(FigureCase c) {
        return c.cell(KeyFigure.LOWEST_MAINS).rectifiedMean().minus(c.driver("rectifier_drop"));
    }

    /** While the switch is off the coil's far end rises to the clamp, referred to the pole the coil hangs on. */
    static Expr workingPeak(FigureCase c) {
        return c.cell(KeyFigure.BUS_VOLTAGE).most(c.driver("clamp_voltage"));
    }

    /** The largest capacitor that its tolerance allows; the fleet's habit where the type states none. */
    private static Expr capacitance(FigureCase c) {
        Expr stated = c.driver("capacitance_tolerance");
        Expr tolerance = stated.isPresent() ? stated : Expr.number(c.view().fleetSettings().get(FleetSettings.CAPACITANCE_TOLERANCE));
        return c.driver("capacitance").times(Expr.number(1).plus(tolerance));
    }

    static Expr storedEnergy(FigureCase c) {
        Expr bus = c.cell(KeyFigure.BUS_VOLTAGE);
        return Expr.number(0.5).times(capacitance(c)).times(bus).times(bus);
    }

    static Expr decayTime(FigureCase c) {
        return c.driver("bleed_resistance").times(capacitance(c))
                .times(c.cell(KeyFigure.BUS_VOLTAGE).over(Expr.number(TOUCHABLE_VOLTS)).ln());
    }

    /** The heat of one cycle if the coil had no inductance: no current is ever greater, so no heat is. */
    static double energyBoundValue(FigureCase c) {
        return c.at(Corner.HIGH_COLD, x -> {
            double full = Double.isNaN(c.cell(KeyFigure.FULL_SOURCE_TIME).value()) ? x.onTime()
                    : c.cell(KeyFigure.FULL_SOURCE_TIME).value();
            double winding = x.coil().resistance();
            double drop = x.driver().switchDrop();
            double total = x.totalResistance();
            if (x.driver() instanceof DriverCircuit.TwoLevel two) {
                return winding * (square((two.pullInVoltage() - drop) / total) * full
                        + square((two.holdVoltage() - drop) / total) * (x.onTime() - full));
            }
            return x.driver() instanceof DriverCircuit.FixedDc fixed ? winding * square((fixed.outputVoltage() - drop) / total) * x.onTime()
                    : Double.NaN;
        });
    }

    static Expr energyBound(FigureCase c) {
        Expr full = c.cell(KeyFigure.SOURCE).minus(c.cell(KeyFigure.SWITCH_DROP)).over(c.cell(KeyFigure.LOOP_COLD));
        Expr hold = c.cell(KeyFigure.HOLD_SOURCE).minus(c.cell(KeyFigure.SWITCH_DROP)).over(c.cell(KeyFigure.LOOP_COLD));
        Expr time = c.cell(KeyFigure.FULL_SOURCE_TIME);
        Expr heat = full.times(full).times(time).plus(hold.times(hold).times(c.cell(KeyFigure.ON_TIME).minus(time)));
        return c.cell(KeyFigure.RESISTANCE_COLD).times(heat);
    }

    private static double square(double value) {
        return value * value;
    }
}
