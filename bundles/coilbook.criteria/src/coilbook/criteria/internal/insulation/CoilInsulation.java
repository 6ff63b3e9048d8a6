package coilbook.criteria.internal.insulation;

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
import coilbook.criteria.internal.station.Names;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.CoilType;
import coilbook.fleet.FittedKind;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The coil's insulation is rated for the voltage its circuit has to earth: rms against the rms rating, recurring peak against the peak rating. */
public final class CoilInsulation extends DescribedCriterion {

    public CoilInsulation() {
        super(new Description("coil-insulation", "Is the coil’s insulation rated for the working voltage to earth?", "insulation and shock",
                Scope.STATION,
                List.of("Insulation voltage", "Insulation peak voltage", "Isolated from mains", "Clamp voltage",
                        "Nominal voltage of the circuit",
                        "Tolerance above", "Pull-in, bus or output voltage of the driver"),
                "Insulation voltage of the coil type (catalogue entry); its peak rating, else √2 · the rms rating. The sum of nominal mains rms and bus"
                        + " peak is common practice, no source",
                "Yes: the frame can become live",
                "not isolated: V_high ≤ rms rating and √2 · V_high + clamp voltage ≤ peak rating; isolated: output voltage ≤ rms rating and output"
                        + " voltage + clamp voltage ≤ peak rating; observation where V_nominal + √2 · V_nominal − rectifier drop > rms rating",
                List.of("another coil", "an isolated driver", "a transformer")));
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        if (station.coil() == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.COIL, station)));
        } else if (station.driver() == null) {
            return judgement().undetermined(List.of(Names.noType(FittedKind.DRIVER, station)));
        } else if (station.driver().kind() == null) {
            return judgement().undetermined(List.of(Names.ofDriver("Kind", station)));
        }
        Boolean isolated = WorkingVoltage.isolated(station.driver());
        if (isolated == null) {
            return isolationUnknown(station);
        }
        return judge(station, isolated ? WorkingVoltage.isolatedOutput(station) : WorkingVoltage.mainsReferenced(station));
    }

    /** Decided only where isolation makes no difference. */
    private Finding isolationUnknown(StationView station) {
        Finding one = judge(station, WorkingVoltage.isolatedOutput(station));
        Finding other = judge(station, WorkingVoltage.mainsReferenced(station));
        boolean agreed = one.verdict() == other.verdict() && one.verdict() != Verdict.UNDETERMINED;
        return agreed ? other : judgement().undetermined(List.of(Names.ofDriver("Isolated from mains", station)));
    }

    private Finding judge(StationView station, WorkingVoltage working) {
        CoilType coil = station.coil();
        Fact rmsRating = Fact.of(coil.insulationVoltage(), () -> Names.ofCoil("Insulation voltage", station));
        Fact peakRating = coil.insulationPeakVoltage() == null ? rmsRating.map(v -> v * Math.sqrt(2))
                : Fact.of(coil.insulationPeakVoltage(), () -> "");
        Judgement judgement = judgement().at("high").restsOn(Fact.weakest(working.rms(), working.peak(), rmsRating, peakRating))
                .number("Working voltage, rms", working.rms().value(), Unit.VOLT).number("Insulation voltage", rmsRating.value(), Unit.VOLT)
                .number("Working voltage, peak", working.peak().value(), Unit.VOLT)
                .number("Insulation peak voltage", peakRating.value(), Unit.VOLT).hazard(true);
        String where = working.mainsReferenced() ? "The driver is not isolated: the coil sees " : "The coil sees ";
        // The peak without its clamp is a lower bound of the peak.
        Fact leastPeak = working.peak().isKnown() ? working.peak()
                : working.mainsReferenced() ? working.rms().map(v -> v * Math.sqrt(2)) : working.rms();
        if (isAbove(working.rms(), rmsRating)) {
            return judgement.compared(working.rms().value(), rmsRating.value(), Unit.VOLT).is(Verdict.NONCONFORMITY,
                    where + Shown.of(working.rms().value(), Unit.VOLT) + " rms to earth; it is rated "
                            + Shown.beside(rmsRating.value(), working.rms().value(), Unit.VOLT) + " rms (catalogue)");
        } else if (isAbove(leastPeak, peakRating)) {
            return judgement.compared(leastPeak.value(), peakRating.value(), Unit.VOLT).is(Verdict.NONCONFORMITY,
                    where + Shown.of(leastPeak.value(), Unit.VOLT) + " peak to earth; it is rated "
                            + Shown.beside(peakRating.value(), leastPeak.value(), Unit.VOLT) + " peak" + peakSource(coil));
        }
        List<String> missing = Fact.allMissing(working.rms(), working.peak(), rmsRating);
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        return met(station, working, rmsRating, peakRating, judgement, where);
    }

    private static Finding met(StationView station, WorkingVoltage working, Fact rmsRating, Fact peakRating, Judgement judgement,
            String where) {
        Fact sum = working.customarySum();
        if (isAbove(sum, rmsRating)) {
            return judgement.at("nominal").compared(sum.value(), rmsRating.value(), Unit.VOLT)
                    .number("Nominal rms and bus peak", sum.value(), Unit.VOLT)
                    .is(Verdict.OBSERVATION,
                            "Rated " + Shown.of(rmsRating.value(), Unit.VOLT) + " rms, enough for "
                                    + Shown.of(working.rms().value(), Unit.VOLT)
                                    + " rms and " + Shown.of(working.peak().value(), Unit.VOLT)
                                    + " peak, but less than the customary sum of nominal rms and bus peak, "
                                    + Shown.beside(sum.value(), rmsRating.value(), Unit.VOLT) + " (common practice, no source)");
        }
        boolean peakNearer = working.peak().value() / peakRating.value() > working.rms().value() / rmsRating.value();
        judgement.compared(peakNearer ? working.peak().value() : working.rms().value(), peakNearer ? peakRating.value() : rmsRating.value(),
                Unit.VOLT);
        return judgement.is(Verdict.CONFORMITY,
                where + Shown.of(working.rms().value(), Unit.VOLT) + " rms and " + Shown.of(working.peak().value(), Unit.VOLT)
                        + " peak to earth; it is rated " + Shown.beside(rmsRating.value(), working.rms().value(), Unit.VOLT) + " rms and "
                        + Shown.beside(peakRating.value(), working.peak().value(), Unit.VOLT) + " peak" + peakSource(station.coil()));
    }

    private static boolean isAbove(Fact value, Fact limit) {
        return value.isKnown() && limit.isKnown() && !Compare.atMost(value.value(), limit.value());
    }

    private static String peakSource(CoilType coil) {
        return coil.insulationPeakVoltage() == null ? " (√2 · the rms rating)" : " (catalogue)";
    }
}
