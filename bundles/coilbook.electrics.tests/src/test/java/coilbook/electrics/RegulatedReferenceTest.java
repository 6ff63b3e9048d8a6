package coilbook.electrics;

import static coilbook.electrics.Figures.near;

import coilbook.fleet.LevelChange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The netlists of a coil on a two-level driver and of releases into a clamp (ngspice 39.3), within 1e-5; closed forms to the digits of the table. */
class RegulatedReferenceTest {

    private static final Figures FIGURES = Figures.read("check-values.csv");
    private static final double SPICE = 1e-5;
    /** The table of closed forms has nine digits. */
    private static final double CLOSED = 6e-9;

    private static void both(String name, String quantity, double computed) {
        FIGURES.check(name, quantity, computed, SPICE);
        near(name + " " + quantity + " closed form", FIGURES.closedForm(name, quantity), computed, CLOSED);
    }

    @Test
    void stepThenIdealHoldSource() throws IllegalCaseException {
        Trace trace = Waveforms.trace(Cases.twoLevelB(LevelChange.SOURCE, 0.012, 20, 1), 0.5e-3);
        String[] label = { "0_5ms", "1ms", "2ms", "3ms", "4ms", "5ms", "10ms" };
        int[] sample = { 1, 2, 4, 6, 8, 10, 20 };
        for (int index = 0; index < label.length; index++) {
            both("a1_rl_step", "i_" + label[index], trace.coilCurrent()[sample[index]]);
        }
        CycleResult pulse = Cases.first(new CircuitCase(null, new DriverCircuit.FixedDc(48, 0, 0.7), Cases.coilB(), 0, 20, 3e-3, 1));
        both("a1_rl_step", "e_supply_0_3ms", pulse.energies().source());
        double stored = 0.5 * 8e-3 * pulse.currentAtSwitchOff() * pulse.currentAtSwitchOff();
        both("a1_rl_step", "e_copper_0_3ms", pulse.energies().source() - stored);
        both("a1_rl_step", "irms_0_3ms", Math.sqrt((pulse.energies().source() - stored) / 10 / 3e-3));
        CycleResult cycle = Cases.first(Cases.twoLevelB(LevelChange.SOURCE, 0.012, 20, 1));
        both("a1_rl_step", "e_supply_0_12ms", cycle.energies().source());
        double left = 0.5 * 8e-3 * cycle.currentAtSwitchOff() * cycle.currentAtSwitchOff();
        both("a1_rl_step", "e_copper_0_12ms", cycle.energies().source() - left);
    }

    @Test
    void freewheelThenHold() throws IllegalCaseException {
        Trace trace = Waveforms.trace(Cases.twoLevelB(LevelChange.FREEWHEEL, 0.012, 20, 1), 0.5e-3);
        String[] label = { "3ms", "3_5ms", "4ms", "5ms", "10ms" };
        int[] sample = { 6, 7, 8, 10, 20 };
        for (int index = 0; index < label.length; index++) {
            both("a2_rl_freewheel_then_hold", "i_" + label[index], trace.coilCurrent()[sample[index]]);
        }
    }

    @Test
    void fourthOfTwentyCyclesASecond() throws IllegalCaseException {
        WaveformResult result = Waveforms.solve(Cases.twoLevelB(LevelChange.SOURCE, 0.02, 20, 4));
        for (CycleResult cycle : new CycleResult[] { result.cycles().get(3), result.steady().worst() }) {
            both("a3_cycle_20hz", "i_3ms", cycle.peakCurrent());
            both("a3_cycle_20hz", "i_20ms", cycle.currentAtSwitchOff());
            both("a3_cycle_20hz", "e_supply_cycle", cycle.energies().source());
            both("a3_cycle_20hz", "e_copper_cycle", cycle.windingEnergy());
            both("a3_cycle_20hz", "e_diode_cycle", cycle.energies().clamp());
            both("a3_cycle_20hz", "p_copper_avg", cycle.windingEnergy() * 20);
            both("a3_cycle_20hz", "i_rms", cycle.coilRmsCurrent());
        }
    }

    @ParameterizedTest
    @CsvSource({ "d1_B_hold_diode,10,8e-3,0.6,0.7,0.5e-3,1e-3", "d2_B_hold_zener47,10,8e-3,0.6,47,20e-6,50e-6",
            "d3_B_peak_diode,10,8e-3,4.8,0.7,0.5e-3,1e-3", "d4_B_peak_zener47,10,8e-3,4.8,47,0.1e-3,0.3e-3",
            "d5_A_hold_diode,250,0.2,0.16,0.7,0.5e-3,1e-3", "d6_A_hold_zener200,250,0.2,0.16,200,50e-6,0.1e-3" })
    void releaseIntoAClamp(String name, double resistance, double inductance, double start, double clamp, double first, double second)
            throws IllegalCaseException {
        double onTime = 0.1;
        double[] share = { 0.5, 0.1, 0.01 };
        String[] label = { "t_50pct", "t_10pct", "t_1pct" };
        for (int index = 0; index < share.length; index++) {
            CoilCircuit coil = new CoilCircuit(resistance, inductance, Cases.NONE, Cases.NONE, share[index] * start, 20);
            CircuitCase circuit = new CircuitCase(null, new DriverCircuit.FixedDc(start * resistance, 0, clamp), coil, 0, 5, onTime, 1);
            CycleResult cycle = Cases.first(circuit);
            both(name, label[index], cycle.releaseTime());
            Trace trace = Waveforms.trace(circuit, first / 10);
            int sample = (int) Math.round((onTime + first) / (first / 10));
            near(name, onTime + first, trace.time()[sample], 1e-12);
            both(name, "i_q1", trace.coilCurrent()[sample]);
            both(name, "i_q2", trace.coilCurrent()[(int) Math.round((onTime + second) / (first / 10))]);
        }
    }
}
