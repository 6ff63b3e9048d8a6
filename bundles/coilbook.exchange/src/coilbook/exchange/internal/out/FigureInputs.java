package coilbook.exchange.internal.out;

import coilbook.electrics.Corner;
import coilbook.electrics.DriverCircuit;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Circuit;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.MarketTolerance;

/** What a station's key figures are computed from, as the electrics took it. */
final class FigureInputs {

    private FigureInputs() {
    }

    static double nominalMains(FigureCase c) {
        double volts = c.derived(StationElectrics::nominalPeak).at().mainsVoltage();
        Circuit circuit = c.view().circuit();
        return !Double.isNaN(volts) || circuit == null || c.view().transformer() != null ? volts : Datum.orNaN(circuit.nominalVoltage());
    }

    static double lowestMains(FigureCase c) {
        double volts = c.derived(StationElectrics::peakAtLow).at().mainsVoltage();
        return Double.isNaN(volts) && c.view().transformer() == null ? bandVolts(c, false) : volts;
    }

    static double highestMains(FigureCase c) {
        double volts = c.derived(StationElectrics::peakAtHigh).at().mainsVoltage();
        return Double.isNaN(volts) && c.view().transformer() == null ? bandVolts(c, true) : volts;
    }

    /** An end of the band of the circuit's voltage, before any reading or transformer. */
    static double bandVolts(FigureCase c, boolean highest) {
        Circuit circuit = c.view().circuit();
        if (circuit == null || circuit.nominalVoltage() == null) {
            return Double.NaN;
        }
        double nominal = circuit.nominalVoltage().value();
        Datum own = highest ? circuit.toleranceAbove() : circuit.toleranceBelow();
        if (own != null) {
            return nominal * (highest ? 1 + own.value() : 1 - own.value());
        }
        MarketTolerance band = c.view().market() == null ? null : c.view().market().tolerance(nominal);
        return band == null ? Double.NaN : nominal * (highest ? band.highest() : band.lowest()).value();
    }

    static double resistance20(FigureCase c) {
        double computed = c.at(Corner.NOMINAL, x -> x.coil().resistance20());
        return !Double.isNaN(computed) || c.view().coil() == null ? computed : Datum.orNaN(c.view().coil().resistance20());
    }

    /** How far the resistance of the low corner lies above the nominal one. */
    static double tolerance(FigureCase c) {
        return c.at(Corner.LOW_HOT, x -> x.coil().resistance20()) / c.at(Corner.NOMINAL, x -> x.coil().resistance20()) - 1;
    }

    static double source(FigureCase c) {
        return c.at(Corner.LOW_HOT, x -> {
            DriverCircuit driver = x.driver();
            if (driver instanceof DriverCircuit.TwoLevel two) {
                return two.pullInVoltage();
            } else if (driver instanceof DriverCircuit.FixedDc fixed) {
                return fixed.outputVoltage();
            }
            return driver instanceof DriverCircuit.CurrentRegulated regulated ? regulated.busVoltage() : Double.NaN;
        });
    }

    static Expr sourceCell(FigureCase c) {
        if (c.is(DriverKind.TWO_LEVEL)) {
            return c.driver("pull_in_voltage");
        }
        return c.is(DriverKind.FIXED_DC) ? c.driver("output_voltage") : c.driver("bus_voltage");
    }

    static double holdSource(FigureCase c) {
        return c.at(Corner.LOW_HOT, x -> x.driver() instanceof DriverCircuit.TwoLevel two ? two.holdVoltage()
                : x.driver() instanceof DriverCircuit.FixedDc fixed ? fixed.outputVoltage() : Double.NaN);
    }

    /** How long the full voltage is on: the pull-in or peak time, at most the on-time. */
    static double fullSourceTime(FigureCase c) {
        return c.at(Corner.LOW_HOT, x -> {
            if (x.driver() instanceof DriverCircuit.TwoLevel two) {
                return Math.min(two.pullInTime(), x.onTime());
            } else if (x.driver() instanceof DriverCircuit.CurrentRegulated regulated) {
                return Math.min(regulated.peakTime(), x.onTime());
            }
            return x.driver() instanceof DriverCircuit.FixedDc ? x.onTime() : Double.NaN;
        });
    }

    static Expr fullSourceTimeForm(FigureCase c) {
        Expr onTime = c.cell(KeyFigure.ON_TIME);
        if (c.is(DriverKind.FIXED_DC)) {
            return onTime;
        }
        return c.driver(c.is(DriverKind.TWO_LEVEL) ? "pull_in_time" : "peak_time").least(onTime);
    }

    /** Both conductors at their temperature: that recorded for the cable, else the site's highest. */
    static Expr cableLoop(FigureCase c) {
        Expr own = c.station("cable_temperature");
        Expr celsius = own.isPresent() ? own : c.site("ambient_highest");
        return Expr.number(2).times(c.station("cable_length")).times(c.cable("conductor_resistance")).times(FigureCase.copper(celsius));
    }
}
