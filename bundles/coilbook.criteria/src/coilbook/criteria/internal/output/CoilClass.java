package coilbook.criteria.internal.output;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.Criterion;
import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.DescribedCriterion;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.Names;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.CoilKind;
import coilbook.fleet.CoilType;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * The coil is of the rated kind and voltage that the driver's output is made for. Where the driver's type does not say, an approval by the coil's maker
 * decides.
 */
public final class CoilClass extends DescribedCriterion {

    private final List<Criterion> overstress;

    /** @param overstress criteria that tell, when broken, that the coil's insulation or the driver's output is overstressed */
    public CoilClass(List<Criterion> overstress) {
        super(new Description("coil-class", "Is the coil of the rated kind and voltage that the driver’s output is made for?",
                "driver to coil",
                Scope.STATION,
                List.of("Rated kind", "Rated voltage", "Coils rated kind", "Coils rated voltage from", "Coils rated voltage to"),
                "Coils rated kind and voltage (catalogue entry of the driver type), else the approved driver types (catalogue entry of the coil type)",
                "Yes where coil-insulation or output-current is broken too",
                "rated kind of the coil fits that of the output, and voltage from ≤ rated voltage ≤ voltage to",
                List.of("another coil", "another driver")));
        this.overstress = List.copyOf(overstress);
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        if (station.coil() == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.COIL, station)));
        } else if (station.driver() == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.DRIVER, station)));
        }
        CoilType coil = station.coil();
        DriverType driver = station.driver();
        Fact rated = Fact.of(coil.ratedVoltage(), () -> Names.ofCoil("Rated voltage", station));
        Fact from = Fact.of(driver.coilVoltageFrom(), () -> Names.ofDriver("Coils rated voltage from", station));
        Fact to = Fact.of(driver.coilVoltageTo(), () -> Names.ofDriver("Coils rated voltage to", station));
        Judgement judgement = judgement().restsOn(Fact.weakest(rated, from, to)).number("Rated voltage", rated.value(), Unit.VOLT)
                .number("Coils rated voltage from", from.value(), Unit.VOLT).number("Coils rated voltage to", to.value(), Unit.VOLT);
        if (driver.coilKind() == null && driver.kind() != null) {
            judgement.restsOn(Provenance.ESTIMATED);
        }
        boolean tooHigh = rated.isKnown() && to.isKnown() && !Compare.atMost(rated.value(), to.value());
        boolean tooLow = rated.isKnown() && from.isKnown() && !Compare.atLeast(rated.value(), from.value());
        if (tooHigh || tooLow || kindDiffers(coil, driver)) {
            return broken(station, electrics, judgement, tooHigh || tooLow);
        }
        List<String> missing = new ArrayList<>();
        if (coil.ratedKind() == null) {
            missing.add(Names.ofCoil("Rated kind", station));
        }
        if (outputKind(driver) == null) {
            missing.add(Names.ofDriver("Coils rated kind", station));
        }
        missing.addAll(Fact.allMissing(rated, from, to));
        if (missing.isEmpty()) {
            return judgement
                    .compared(rated.value(), rated.value() - from.value() < to.value() - rated.value() ? from.value() : to.value(),
                            Unit.VOLT)
                    .is(Verdict.CONFORMITY, "Coil type " + coil.code() + " is rated " + coil.ratedKind().label() + " "
                            + Shown.of(rated.value(), Unit.VOLT) + "; " + output(driver));
        } else if (coil.approvedDrivers() != null && coil.approvedDrivers().contains(driver.code())) {
            return judgement.is(Verdict.CONFORMITY,
                    "The maker of coil type " + coil.code() + " approves driver type " + driver.code() + " (catalogue)");
        }
        return judgement.undetermined(missing);
    }

    /** What the output is made for; where the type does not say, by its kind: only mains put straight on a coil are AC. */
    private static CoilKind outputKind(DriverType driver) {
        if (driver.coilKind() != null || driver.kind() == null) {
            return driver.coilKind();
        }
        return driver.kind() == DriverKind.DIRECT_AC ? CoilKind.AC : CoilKind.DC;
    }

    private static boolean kindDiffers(CoilType coil, DriverType driver) {
        CoilKind output = outputKind(driver);
        return coil.ratedKind() != null && output != null && coil.ratedKind() != output && coil.ratedKind() != CoilKind.AC_OR_DC
                && output != CoilKind.AC_OR_DC;
    }

    private Finding broken(StationView station, StationElectrics electrics, Judgement judgement, boolean byVoltage) {
        CoilType coil = station.coil();
        DriverType driver = station.driver();
        if (byVoltage) {
            double rated = coil.ratedVoltage().value();
            boolean tooHigh = driver.coilVoltageTo() != null && rated > driver.coilVoltageTo().value();
            judgement.compared(rated, tooHigh ? driver.coilVoltageTo().value() : driver.coilVoltageFrom().value(), Unit.VOLT);
        }
        List<String> stressed = overstress.stream().filter(c -> c.judge(station, electrics).verdict() == Verdict.NONCONFORMITY)
                .map(Criterion::id)
                .toList();
        String rated = (coil.ratedKind() == null ? "" : " " + coil.ratedKind().label())
                + (coil.ratedVoltage() == null ? "" : " " + Shown.of(coil.ratedVoltage().value(), Unit.VOLT));
        return judgement.hazard(!stressed.isEmpty()).is(Verdict.NONCONFORMITY,
                "Coil type " + coil.code() + " is rated" + rated + "; " + output(driver)
                        + (stressed.isEmpty() ? "" : "; overstressed: see " + String.join(", ", stressed)));
    }

    private static String output(DriverType driver) {
        StringBuilder words = new StringBuilder("driver type " + driver.code() + " is made for");
        if (outputKind(driver) != null) {
            words.append(' ').append(outputKind(driver).label());
        }
        words.append(" coils");
        boolean range = driver.coilVoltageFrom() != null && driver.coilVoltageTo() != null;
        if (range && driver.coilVoltageFrom().value() == driver.coilVoltageTo().value()) {
            words.append(" of ").append(Shown.of(driver.coilVoltageFrom().value(), Unit.VOLT));
        } else {
            if (driver.coilVoltageFrom() != null) {
                words.append(" from ").append(Shown.of(driver.coilVoltageFrom().value(), Unit.VOLT));
            }
            if (driver.coilVoltageTo() != null) {
                words.append(" to ").append(Shown.of(driver.coilVoltageTo().value(), Unit.VOLT));
            }
        }
        return words.toString();
    }
}
