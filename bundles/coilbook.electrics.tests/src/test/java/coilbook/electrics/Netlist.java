package coilbook.electrics;

import coilbook.fleet.LevelChange;
import java.util.Locale;

/**
 * Writes a case as an ngspice netlist, two cycles of it, with behavioural sources for rectifier, switch and clamp; written apart from the engine,
 * from the same words of the case file's description.
 */
final class Netlist {

    private Netlist() {
    }

    static String of(CircuitCase circuit) {
        StringBuilder text = new StringBuilder("* a case, two cycles\n");
        double period = circuit.period();
        double on = circuit.onTime();
        line(text, "Vg g 0 PULSE(0 1 0 10n 10n %.12g %.12g)", on, period);
        if (circuit.driver() instanceof DriverCircuit.LineCapacitor line) {
            lineCapacitor(text, circuit, line);
        } else {
            regulated(text, circuit);
        }
        line(text, "Rc k x %.12g", circuit.coil().resistance() + circuit.loopResistance());
        line(text, "Lc x y %.12g IC=0", circuit.coil().inductanceOpen());
        text.append("Vi y 0 0\n");
        line(text, "Bw w 0 V=%.12g*i(Vi)*i(Vi)", circuit.coil().resistance());
        text.append(".options reltol=1e-5 abstol=1e-9 vntol=1e-6 method=gear\n");
        double step = circuit.driver() instanceof DriverCircuit.LineCapacitor ? 2e-6 : 0.5e-6;
        line(text, ".tran %.3g %.12g 0 %.3g uic", step, 2 * period, step);
        line(text, ".meas tran peak1 max i(Vi) from=0 to=%.12g", on);
        line(text, ".meas tran mean1 avg i(Vi) from=%.12g to=%.12g", on / 2, on);
        line(text, ".meas tran least1 min i(Vi) from=%.12g to=%.12g", on / 2, on - 1e-6);
        line(text, ".meas tran heat1 integ v(w) from=0 to=%.12g", period);
        line(text, ".meas tran off1 find i(Vi) at=%.12g", on);
        line(text, ".meas tran release1 when i(Vi)=%.12g td=%.12g fall=1", circuit.coil().dropOutCurrent(), on);
        line(text, ".meas tran peak2 max i(Vi) from=%.12g to=%.12g", period, period + on);
        line(text, ".meas tran mean2 avg i(Vi) from=%.12g to=%.12g", period + on / 2, period + on);
        line(text, ".meas tran least2 min i(Vi) from=%.12g to=%.12g", period + on / 2, period + on - 1e-6);
        line(text, ".meas tran heat2 integ v(w) from=%.12g to=%.12g", period, 2 * period);
        if (circuit.driver() instanceof DriverCircuit.LineCapacitor) {
            line(text, ".meas tran bus2 find v(c) at=%.12g", period);
        }
        return text.append(".end\n").toString();
    }

    private static void lineCapacitor(StringBuilder text, CircuitCase circuit, DriverCircuit.LineCapacitor line) {
        double drop = line.rectifierDrop();
        String mains = String.format(Locale.ROOT, "abs(%.15g*sin(%.15g*time+%.15g))", circuit.mains().peak(),
                circuit.mains().angularFrequency(), circuit.mains().phase());
        line(text, "Brect 0 c I=max(0,(%s-%.12g-v(c))/%.12g)", mains, drop, line.seriesResistance());
        line(text, "Bbridge 0 c I=max(0,(-%.12g-v(c))*50)", drop);
        line(text, "Cs c 0 %.12g IC=%.15g", line.capacitance(), circuit.mains().peak() - drop);
        line(text, "Bcoil k 0 V=v(g)*(v(c)-%.12g)-(1-v(g))*%.12g*tanh(i(Vi)/20u)+(i(Vi)<0 ? -1e5*i(Vi) : 0)", line.switchDrop(),
                line.clampVoltage());
        text.append("Bload c 0 I=v(g)*i(Vi)\n");
    }

    private static void regulated(StringBuilder text, CircuitCase circuit) {
        double clamp = circuit.driver().clampVoltage();
        double drop = circuit.driver().switchDrop();
        if (circuit.driver() instanceof DriverCircuit.TwoLevel twoLevel) {
            line(text, "Vp p 0 PULSE(0 1 0 10n 10n %.12g %.12g)", twoLevel.pullInTime(), circuit.period());
            double hold = twoLevel.holdVoltage() / circuit.totalResistance();
            if (twoLevel.levelChange() == LevelChange.FREEWHEEL) {
                line(text, "Bcoil k 0 V=v(g)*(v(p)*%.12g+(1-v(p))*(i(Vi)>%.12g ? -%.12g : %.12g))-(1-v(g))*%.12g*tanh(i(Vi)/20u)",
                        twoLevel.pullInVoltage() - drop, hold, clamp, twoLevel.holdVoltage() - drop, clamp);
            } else {
                line(text, "Bcoil k 0 V=v(g)*(v(p)*%.12g+(1-v(p))*%.12g)-(1-v(g))*%.12g*tanh(i(Vi)/20u)", twoLevel.pullInVoltage() - drop,
                        twoLevel.holdVoltage() - drop, clamp);
            }
        } else if (circuit.driver() instanceof DriverCircuit.FixedDc fixed) {
            line(text, "Bcoil k 0 V=v(g)*%.12g-(1-v(g))*%.12g*tanh(i(Vi)/20u)", fixed.outputVoltage() - drop, clamp);
        }
    }

    private static void line(StringBuilder text, String format, Object... values) {
        text.append(String.format(Locale.ROOT, format, values)).append('\n');
    }
}
