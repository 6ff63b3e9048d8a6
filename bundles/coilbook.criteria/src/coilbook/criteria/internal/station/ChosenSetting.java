package coilbook.criteria.internal.station;

import java.util.List;

import coilbook.fleet.FittedKind;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;

/**
 * Which input setting a driver is strapped to: the recorded one, or the only one its type has, or else any of them.
 *
 * @param candidates the settings it may be at; one where that is known, empty where the catalogue has none
 * @param recorded whether a person recorded it
 * @param provenance of the choice; {@code null} for an only setting
 * @param missing what would tell; empty where it is known
 */
public record ChosenSetting(List<InputSetting> candidates, boolean recorded, Provenance provenance, List<String> missing) {

    public ChosenSetting {
        candidates = List.copyOf(candidates);
        missing = List.copyOf(missing);
    }

    public static ChosenSetting of(StationView view) {
        if (view.driver() == null) {
            return unknown(List.of(), Names.noType(FittedKind.DRIVER, view));
        } else if (view.setting() != null) {
            Provenance provenance = view.settingChoice() == null ? null : view.settingChoice().provenance();
            return new ChosenSetting(List.of(view.setting()), true, provenance, List.of());
        } else if (view.settings().isEmpty()) {
            return unknown(List.of(), Names.ofDriver("Input settings", view));
        } else if (view.settingChoice() != null) {
            return unknown(view.settings(),
                    "Input setting of station " + view.code() + ", for the recorded “" + view.settingChoice().setting()
                            + "” is none of driver type " + view.driver().code());
        } else if (view.settings().size() == 1) {
            return new ChosenSetting(view.settings(), false, null, List.of());
        }
        return unknown(view.settings(), Names.ofStation("Input setting", view));
    }

    private static ChosenSetting unknown(List<InputSetting> candidates, String missing) {
        return new ChosenSetting(candidates, false, null, List.of(missing));
    }

    public boolean isKnown() {
        return missing.isEmpty();
    }

    /** The setting where it is known. */
    public InputSetting only() {
        return candidates.get(0);
    }
}
