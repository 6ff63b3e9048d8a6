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
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/** The circuit's frequency, nominal and as read, lies in the range of the input setting. */
public final class InputFrequency extends SettingCriterion {

    public InputFrequency() {
        super(new Description("input-frequency", "Does the circuit’s frequency lie in the range of the input setting?", "mains to driver",
                Scope.STATION, List.of("Nominal frequency of the circuit", "Input setting", "Lowest frequency", "Highest frequency"),
                "Lowest and highest frequency of the input setting (catalogue entry of the driver type)", "",
                "lowest frequency ≤ f ≤ highest frequency, for the nominal frequency and every reading",
                List.of("another input setting", "another driver")));
    }

    @Override
    Finding judge(StationView station, InputVoltage input, InputSetting setting, ChosenSetting chosen) {
        Fact lowest = Fact.of(setting.lowestFrequency(), () -> of("Lowest frequency", setting));
        Fact highest = Fact.of(setting.highestFrequency(), () -> of("Highest frequency", setting));
        Judgement judgement = judgement().restsOn(Fact.weakest(input.frequency(), lowest, highest)).restsOn(chosen.provenance())
                .number("Nominal frequency", input.frequency().value(), Unit.HERTZ).number("Lowest frequency", lowest.value(), Unit.HERTZ)
                .number("Highest frequency", highest.value(), Unit.HERTZ);
        for (int i = 0; i < input.frequencies().size(); i++) {
            double frequency = input.frequencies().get(i);
            boolean read = i > 0 || !input.frequency().isKnown();
            String subject = (read ? "A reading of " : "Nominal ") + Shown.of(frequency, Unit.HERTZ);
            if (highest.isKnown() && !Compare.atMost(frequency, highest.value())) {
                return judgement.compared(frequency, highest.value(), Unit.HERTZ).restsOn(read ? Provenance.MEASURED : null)
                        .is(Verdict.NONCONFORMITY,
                                subject + " is above the highest frequency " + Shown.beside(highest.value(), frequency, Unit.HERTZ)
                                        + " of setting "
                                        + setting.code());
            } else if (lowest.isKnown() && !Compare.atLeast(frequency, lowest.value())) {
                return judgement.compared(frequency, lowest.value(), Unit.HERTZ).restsOn(read ? Provenance.MEASURED : null)
                        .is(Verdict.NONCONFORMITY,
                                subject + " is below the lowest frequency " + Shown.beside(lowest.value(), frequency, Unit.HERTZ)
                                        + " of setting "
                                        + setting.code());
            }
        }
        List<String> missing = Fact.allMissing(input.frequency(), lowest, highest);
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        double nominal = input.frequency().value();
        double nearer = nominal - lowest.value() < highest.value() - nominal ? lowest.value() : highest.value();
        return judgement.compared(nominal, nearer, Unit.HERTZ).is(Verdict.CONFORMITY,
                "Nominal " + Shown.of(nominal, Unit.HERTZ) + " lies in "
                        + Shown.of(lowest.value(), Unit.HERTZ) + " to " + Shown.of(highest.value(), Unit.HERTZ) + " of setting "
                        + setting.code());
    }

    @Override
    List<String> inputsMissing(InputVoltage input) {
        return input.frequency().missing();
    }
}
