package coilbook.criteria.internal.mains;

import java.util.ArrayList;
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

/** The whole band of the mains, every reading included, lies in the window of the input setting; both ends are judged apart. */
public final class InputTolerance extends SettingCriterion {

    public InputTolerance() {
        super(new Description("input-tolerance",
                "Does the band of the mains, every reading included, lie in the window of the input setting?",
                "mains to driver", Scope.STATION,
                List.of("Nominal voltage of the circuit", "Tolerance below", "Tolerance above", "Readings of mains voltage",
                        "Input setting",
                        "Lowest voltage", "Highest voltage"),
                "Lowest and highest voltage of the input setting (catalogue entry of the driver type); the band is the circuit’s own tolerance, else"
                        + " that of the market table, with the standard named there",
                "Yes where the high end is above the window",
                "lowest voltage ≤ V_low and V_high ≤ highest voltage; V_low = least of V_nominal · lowest fraction and the readings, through the"
                        + " transformer · (1 − regulation); V_high = greatest of V_nominal · highest fraction and the readings, through the transformer",
                List.of("another input setting", "another driver", "a transformer")));
    }

    @Override
    Finding judge(StationView station, InputVoltage input, InputSetting setting, ChosenSetting chosen) {
        Fact lowest = Fact.of(setting.lowestVoltage(), () -> of("Lowest voltage", setting));
        Fact highest = Fact.of(setting.highestVoltage(), () -> of("Highest voltage", setting));
        Fact low = input.low();
        Fact high = input.high();
        Judgement judgement = judgement().restsOn(Fact.weakest(low, high, lowest, highest)).restsOn(chosen.provenance())
                .number("Mains low", low.value(), Unit.VOLT).number("Mains high", high.value(), Unit.VOLT)
                .number("Lowest voltage", lowest.value(), Unit.VOLT).number("Highest voltage", highest.value(), Unit.VOLT);
        boolean tooHigh = high.isKnown() && highest.isKnown() && !Compare.atMost(high.value(), highest.value());
        boolean tooLow = low.isKnown() && lowest.isKnown() && !Compare.atLeast(low.value(), lowest.value());
        List<String> broken = new ArrayList<>();
        if (tooHigh) {
            broken.add("The high end " + Shown.of(high.value(), Unit.VOLT) + " (" + input.highBasis() + ") is above the highest voltage "
                    + Shown.beside(highest.value(), high.value(), Unit.VOLT));
        }
        if (tooLow) {
            broken.add((tooHigh ? "the" : "The") + " low end " + Shown.of(low.value(), Unit.VOLT) + " (" + input.lowBasis()
                    + ") is below the lowest voltage "
                    + Shown.beside(lowest.value(), low.value(), Unit.VOLT));
        }
        if (tooHigh) {
            judgement.compared(high.value(), highest.value(), Unit.VOLT).at("high").hazard(true);
        } else if (tooLow) {
            judgement.compared(low.value(), lowest.value(), Unit.VOLT).at("low");
        }
        if (!broken.isEmpty()) {
            return judgement.is(Verdict.NONCONFORMITY, String.join(", and ", broken) + " of setting " + setting.code());
        }
        List<String> missing = Fact.allMissing(low, high, lowest, highest);
        if (!missing.isEmpty()) {
            return judgement.undetermined(missing);
        }
        boolean lowNearer = low.value() / lowest.value() < highest.value() / high.value();
        judgement.compared(lowNearer ? low.value() : high.value(), lowNearer ? lowest.value() : highest.value(), Unit.VOLT)
                .at(lowNearer ? "low" : "high");
        return judgement.is(Verdict.CONFORMITY,
                "Mains " + Shown.of(low.value(), Unit.VOLT) + " (" + input.lowBasis() + ") to " + Shown.of(high.value(), Unit.VOLT) + " ("
                        + input.highBasis() + ") lie in " + Shown.of(lowest.value(), Unit.VOLT) + " to "
                        + Shown.of(highest.value(), Unit.VOLT)
                        + " of setting " + setting.code());
    }

    @Override
    List<String> inputsMissing(InputVoltage input) {
        return Fact.allMissing(input.low(), input.high());
    }
}
