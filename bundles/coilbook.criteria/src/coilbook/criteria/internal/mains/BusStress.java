package coilbook.criteria.internal.mains;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.DescribedCriterion;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.InputVoltage;
import coilbook.criteria.internal.station.Names;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.FittedKind;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * A bus that follows the mains stays within what its capacitor and its switch are rated for. While the coil releases the switch carries the clamp voltage
 * on top of the bus.
 */
public final class BusStress extends DescribedCriterion {

    private static final Fact NO_DROP = Fact.known(0, null);

    public BusStress() {
        super(new Description("bus-stress", "Does the peak bus voltage at high line stay within the ratings of capacitor and switch?",
                "mains to driver", Scope.STATION,
                List.of("Nominal voltage of the circuit", "Tolerance above", "Readings of mains voltage", "Rectifier drop", "Clamp voltage",
                        "Capacitor voltage rating", "Switch voltage rating"),
                "Capacitor and switch voltage ratings (catalogue entry of the driver type)",
                "Yes: an overstressed capacitor or switch can burst or"
                        + " burn",
                "√2 · V_high − rectifier drop ≤ capacitor rating; √2 · V_high − rectifier drop + clamp voltage ≤ switch rating (circuit theory)",
                List.of("another driver", "a transformer")));
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        DriverType driver = station.driver();
        if (driver == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.DRIVER, station)));
        } else if (driver.kind() == null) {
            return judgement().undetermined(List.of(Names.ofDriver("Kind", station)));
        } else if (driver.kind() != DriverKind.LINE_CAPACITOR && driver.kind() != DriverKind.RECTIFIED_AC) {
            return judgement().notApplicable("The output of a " + driver.kind().label() + " driver does not follow the mains");
        }
        Fact high = InputVoltage.of(station).high();
        List<Part> parts = new ArrayList<>();
        if (driver.kind() == DriverKind.LINE_CAPACITOR) {
            parts.add(part(station, "capacitor", driver.capacitorRating(), "Capacitor voltage rating", high, NO_DROP));
        }
        Fact clamp = Fact.of(driver.clampVoltage(), () -> Names.ofDriver("Clamp voltage", station));
        parts.add(part(station, "switch", driver.switchRating(), "Switch voltage rating", high, clamp));
        return judge(parts, high);
    }

    /** The rectifier drop only ever helps, the clamp only ever adds: without the one the stress has an upper bound, without the other a lower one. */
    private static Part part(StationView station, String name, Datum rating, String heading, Fact high, Fact added) {
        Fact limit = Fact.of(rating, () -> Names.ofDriver(heading, station));
        Fact drop = Fact.of(station.driver().rectifierDrop(), () -> Names.ofDriver("Rectifier drop", station));
        Fact peak = high.map(v -> v * Math.sqrt(2));
        Fact most = peak.with(drop.isKnown() ? drop : NO_DROP, (p, d) -> p - d).with(added, Double::sum);
        Fact least = peak.with(drop, (p, d) -> p - d).with(added.isKnown() ? added : NO_DROP, Double::sum);
        return new Part(name, most, least, limit, Fact.allMissing(high, drop, added, limit));
    }

    private Finding judge(List<Part> parts, Fact high) {
        Judgement judgement = judgement().at("high").restsOn(high.provenance()).number("Mains high", high.value(), Unit.VOLT);
        Part worst = null;
        List<String> missing = new ArrayList<>();
        for (Part part : parts) {
            judgement.number("Voltage at the " + part.name(), part.most().isKnown() ? part.most().value() : part.least().value(), Unit.VOLT)
                    .number("Rating of the " + part.name(), part.limit().value(), Unit.VOLT);
            if (part.isBroken()) {
                return judgement.compared(part.least().value(), part.limit().value(), Unit.VOLT).hazard(true)
                        .restsOn(Fact.weakest(part.least(), part.limit())).is(Verdict.NONCONFORMITY, part.sentence(part.least(), high));
            } else if (!part.isMet()) {
                missing.addAll(part.missing());
            } else if (worst == null || part.load() > worst.load()) {
                worst = part;
            }
        }
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        return judgement.compared(worst.most().value(), worst.limit().value(), Unit.VOLT).restsOn(Fact.weakest(worst.most(), worst.limit()))
                .is(Verdict.CONFORMITY, worst.sentence(worst.most(), high));
    }

    /** One part with the bounds of its voltage. */
    private record Part(String name, Fact most, Fact least, Fact limit, List<String> missing) {

        boolean isBroken() {
            return least.isKnown() && limit.isKnown() && !Compare.atMost(least.value(), limit.value());
        }

        boolean isMet() {
            return most.isKnown() && limit.isKnown() && Compare.atMost(most.value(), limit.value());
        }

        double load() {
            return most.value() / limit.value();
        }

        String sentence(Fact stress, Fact high) {
            return "At " + Shown.of(high.value(), Unit.VOLT) + " the " + name + " sees " + Shown.of(stress.value(), Unit.VOLT)
                    + "; it is rated "
                    + Shown.beside(limit.value(), stress.value(), Unit.VOLT) + " (catalogue)";
        }
    }
}
