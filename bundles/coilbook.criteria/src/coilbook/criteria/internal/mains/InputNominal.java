package coilbook.criteria.internal.mains;

import java.util.List;

import coilbook.criteria.Finding;
import coilbook.criteria.Scope;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.Compare;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.Judgement;
import coilbook.criteria.internal.Shown;
import coilbook.criteria.internal.station.ChosenSetting;
import coilbook.criteria.internal.station.Fact;
import coilbook.criteria.internal.station.InputVoltage;
import coilbook.fleet.InputSetting;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The circuit's nominal voltage lies in the window of the input setting. */
public final class InputNominal extends SettingCriterion {

    public InputNominal() {
        super(new Description("input-nominal", "Does the circuit’s nominal voltage lie in the window of the input setting?",
                "mains to driver",
                Scope.STATION, List.of("Nominal voltage of the circuit", "Input setting", "Lowest voltage", "Highest voltage"),
                "Lowest and highest voltage of the input setting (catalogue entry of the driver type)",
                "Yes where the voltage is above the window",
                "lowest voltage ≤ V_nominal ≤ highest voltage, V_nominal through the circuit’s transformer where there is one",
                List.of("another input setting", "another driver", "a transformer")));
    }

    @Override
    Finding judge(StationView station, InputVoltage input, InputSetting setting, ChosenSetting chosen) {
        Fact lowest = Fact.of(setting.lowestVoltage(), () -> of("Lowest voltage", setting));
        Fact highest = Fact.of(setting.highestVoltage(), () -> of("Highest voltage", setting));
        Fact nominal = input.nominal();
        Judgement judgement = judgement().at("nominal").restsOn(Fact.weakest(nominal, lowest, highest)).restsOn(chosen.provenance())
                .number("Nominal voltage", nominal.value(), Unit.VOLT).number("Lowest voltage", lowest.value(), Unit.VOLT)
                .number("Highest voltage", highest.value(), Unit.VOLT);
        String subject = "Nominal " + Shown.of(nominal.value(), Unit.VOLT);
        if (nominal.isKnown() && highest.isKnown() && !Compare.atMost(nominal.value(), highest.value())) {
            return judgement.compared(nominal.value(), highest.value(), Unit.VOLT).hazard(true).is(Verdict.NONCONFORMITY, subject
                    + " is above the highest voltage " + Shown.beside(highest.value(), nominal.value(), Unit.VOLT) + " of setting "
                    + setting.code());
        } else if (nominal.isKnown() && lowest.isKnown() && !Compare.atLeast(nominal.value(), lowest.value())) {
            return judgement.compared(nominal.value(), lowest.value(), Unit.VOLT).is(Verdict.NONCONFORMITY,
                    subject + " is below the lowest voltage "
                            + Shown.beside(lowest.value(), nominal.value(), Unit.VOLT) + " of setting " + setting.code());
        }
        List<String> missing = Fact.allMissing(nominal, lowest, highest);
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        double nearer = nominal.value() - lowest.value() < highest.value() - nominal.value() ? lowest.value() : highest.value();
        return judgement.compared(nominal.value(), nearer, Unit.VOLT).is(Verdict.CONFORMITY,
                subject + " lies in " + Shown.of(lowest.value(), Unit.VOLT)
                        + " to " + Shown.of(highest.value(), Unit.VOLT) + " of setting " + setting.code());
    }

    @Override
    List<String> inputsMissing(InputVoltage input) {
        return input.nominal().missing();
    }
}
