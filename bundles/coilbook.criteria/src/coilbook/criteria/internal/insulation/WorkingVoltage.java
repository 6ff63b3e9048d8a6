package coilbook.criteria.internal.insulation;

import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.InputVoltage;
import coilbook.criteria.internal.station.Names;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.StationView;

/**
 * The voltage of a coil's circuit to earth: of a driver that is not isolated, that of the mains, and their peak with the clamp on top; of an isolated
 * one, that of its output, and the clamp on top.
 *
 * @param rms highest rms voltage, V
 * @param peak highest recurring peak, V
 * @param customarySum nominal mains rms and bus peak together, V (common practice, no source); missing where the driver is isolated
 * @param mainsReferenced whether the driver is not isolated from the mains
 */
public record WorkingVoltage(Fact rms, Fact peak, Fact customarySum, boolean mainsReferenced) {

    /** Whether a driver is isolated: {@code null} where nothing says so. A line-capacitor driver, or mains put straight on a coil, never is. */
    public static Boolean isolated(DriverType driver) {
        boolean straight = driver.kind() == DriverKind.LINE_CAPACITOR || driver.kind() == DriverKind.RECTIFIED_AC
                || driver.kind() == DriverKind.DIRECT_AC;
        return straight ? Boolean.FALSE : driver.isolatedFromMains();
    }

    public static WorkingVoltage mainsReferenced(StationView view) {
        InputVoltage input = InputVoltage.of(view);
        Fact clamp = clamp(view);
        Fact peak = input.high().map(v -> v * Math.sqrt(2)).with(clamp, Double::sum);
        double drop = Datum.or(view.driver().rectifierDrop(), 0);
        Fact sum = input.nominal().map(v -> v + Math.sqrt(2) * v - drop);
        return new WorkingVoltage(input.high(), peak, sum, true);
    }

    /** The output is direct voltage; its rms is at most its highest level. */
    public static WorkingVoltage isolatedOutput(StationView view) {
        DriverType driver = view.driver();
        Fact output = switch (driver.kind()) {
            case TWO_LEVEL -> Fact.of(driver.pullInVoltage(), () -> Names.ofDriver("Pull-in voltage", view));
            case CURRENT_REGULATED -> Fact.of(driver.busVoltage(), () -> Names.ofDriver("Bus voltage", view));
            case FIXED_DC -> Fact.of(driver.outputVoltage(), () -> Names.ofDriver("Output voltage", view));
            default -> throw new IllegalArgumentException(driver.kind() + " is never isolated");
        };
        return new WorkingVoltage(output, output.with(clamp(view), Double::sum), Fact.missing("Mains"), false);
    }

    private static Fact clamp(StationView view) {
        if (view.driver().kind() == DriverKind.DIRECT_AC) {
            return Fact.known(0, null);
        }
        return Fact.of(view.driver().clampVoltage(), () -> Names.ofDriver("Clamp voltage", view));
    }
}
