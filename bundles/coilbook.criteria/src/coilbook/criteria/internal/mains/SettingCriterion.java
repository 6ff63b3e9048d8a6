package coilbook.criteria.internal.mains;

import java.util.ArrayList;
import java.util.List;

import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.criteria.internal.DescribedCriterion;
import coilbook.criteria.internal.Description;
import coilbook.criteria.internal.station.ChosenSetting;
import coilbook.criteria.internal.station.InputVoltage;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.InputSetting;
import coilbook.fleet.StationView;

/**
 * A criterion on mains against an input setting. Where the setting is not recorded it still decides if every setting the driver's type has comes to the
 * same verdict.
 */
abstract class SettingCriterion extends DescribedCriterion {

    SettingCriterion(Description description) {
        super(description);
    }

    @Override
    public final Finding judge(StationView station, StationElectrics electrics) {
        ChosenSetting chosen = ChosenSetting.of(station);
        InputVoltage input = InputVoltage.of(station);
        if (chosen.isKnown()) {
            return judge(station, input, chosen.only(), chosen);
        }
        List<Finding> findings = new ArrayList<>();
        for (InputSetting setting : chosen.candidates()) {
            findings.add(judge(station, input, setting, chosen));
        }
        Finding first = findings.isEmpty() ? null : findings.get(0);
        boolean agreed = first != null && first.verdict() != Verdict.UNDETERMINED
                && findings.stream().allMatch(f -> f.verdict() == first.verdict());
        if (!agreed) {
            List<String> missing = new ArrayList<>(chosen.missing());
            missing.addAll(inputsMissing(input));
            return judgement().undetermined(missing);
        }
        boolean hazard = findings.stream().allMatch(Finding::hazard);
        return judgement().compared(first.evidence().value(), first.evidence().limit(), first.evidence().unit())
                .at(first.evidence().corner())
                .restsOn(first.evidence().provenance()).hazard(hazard)
                .is(first.verdict(), "Whichever setting it is strapped to: " + first.evidence().sentence());
    }

    abstract Finding judge(StationView station, InputVoltage input, InputSetting setting, ChosenSetting chosen);

    /** What of the mains is missing for the question. */
    abstract List<String> inputsMissing(InputVoltage input);

    static String of(String heading, InputSetting setting) {
        return heading + " of input setting " + setting.key();
    }
}
