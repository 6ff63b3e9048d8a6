package coilbook.criteria.internal.mains;

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
import coilbook.criteria.internal.station.InputVoltage;
import coilbook.criteria.internal.station.Names;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.FittedKind;
import coilbook.fleet.InputSetting;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** A driver with several input settings has recorded which it is strapped to; a driver with one needs no record. */
public final class InputSettingRecorded extends DescribedCriterion implements Criterion {

    public InputSettingRecorded() {
        super(new Description("input-setting-recorded", "Is it recorded how a driver with several input settings is strapped?",
                "mains to driver",
                Scope.STATION, List.of("Driver type", "Input settings of the driver type", "Input setting"),
                "The input settings of the driver type (catalogue entry)",
                "Yes where a wrong strap would overstress the driver: the highest voltage of"
                        + " some setting is below the high end of the circuit’s band",
                "hazard: least of the highest voltages < V_high", List.of("look at the strap and record it")));
    }

    @Override
    public Finding judge(StationView station, StationElectrics electrics) {
        Judgement judgement = judgement();
        if (station.driver() == null) {
            return judgement.undetermined(List.of(Names.noType(FittedKind.DRIVER, station)));
        } else if (station.settings().isEmpty()) {
            return judgement.undetermined(List.of(Names.ofDriver("Input settings", station)));
        } else if (station.setting() != null) {
            return judgement.restsOn(station.settingChoice() == null ? null : station.settingChoice().provenance()).is(Verdict.CONFORMITY,
                    "Setting " + station.setting().code() + " is recorded, one of " + station.settings().size());
        } else if (station.settings().size() == 1 && station.settingChoice() == null) {
            return judgement.notApplicable("Driver type " + station.driver().code() + " has only one input setting");
        }
        String what = station.settingChoice() == null
                ? "None of the " + station.settings().size() + " settings of driver type " + station.driver().code() + " is recorded"
                : "The recorded setting “" + station.settingChoice().setting() + "” is none of driver type " + station.driver().code();
        return unrecorded(station, judgement, what);
    }

    /** A wrong strap overstresses where some setting takes less than the mains can give. */
    private static Finding unrecorded(StationView station, Judgement judgement, String what) {
        Fact high = InputVoltage.of(station).high();
        InputSetting weakest = null;
        for (InputSetting setting : station.settings()) {
            if (setting.highestVoltage() != null
                    && (weakest == null || setting.highestVoltage().value() < weakest.highestVoltage().value())) {
                weakest = setting;
            }
        }
        if (!high.isKnown() || weakest == null) {
            return judgement.is(Verdict.NONCONFORMITY, what + "; whether a wrong strap would overstress it is not known");
        }
        double takes = weakest.highestVoltage().value();
        boolean overstress = !Compare.atMost(high.value(), takes);
        judgement.compared(high.value(), takes, Unit.VOLT).at("high").restsOn(Fact.weakest(high))
                .restsOn(weakest.highestVoltage().provenance())
                .number("Mains high", high.value(), Unit.VOLT).number("Highest voltage", takes, Unit.VOLT).hazard(overstress);
        return judgement.is(Verdict.NONCONFORMITY,
                what + "; mains reach " + Shown.of(high.value(), Unit.VOLT) + ", setting " + weakest.code() + " takes "
                        + (overstress ? "only " : "") + Shown.beside(takes, high.value(), Unit.VOLT));
    }
}
