package coilbook.fleet;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;

/**
 * Everything the register knows about one station on one day: its own rows, its group's and the catalogue's. Pure data: the electrics and
 * the criteria read nothing else. Whatever is not recorded is {@code null} (or an empty list).
 *
 * @param asOf the day, at the site
 * @param setting the chosen input setting of the driver type; {@code null} where none is recorded
 * @param settings all input settings of the driver type
 * @param fittings what sits there on that day
 * @param pastFittings what sat there before
 * @param readings on the station, its circuit and the items fitted, the newest first
 * @param itemPlaces for each item fitted here (by {@link Fitting#itemKey}), every station where that item sits on that day
 */
public record StationView(LocalDate asOf, Station station, Line line, Site site, Customer customer, Supply supply, Circuit circuit,
        TransformerType transformer, SettingChoice settingChoice, InputSetting setting, List<InputSetting> settings, Duty duty,
        Controller controller, ValveType valve, CoilType coil, DriverType driver, CableType cable, List<Fitting> fittings,
        List<Fitting> pastFittings, List<Reading> readings, List<Concession> concessions, Map<String, List<String>> itemPlaces,
        MarketView market, FleetSettings fleetSettings) {

    public StationView {
        settings = List.copyOf(settings);
        fittings = List.copyOf(fittings);
        pastFittings = List.copyOf(pastFittings);
        readings = List.copyOf(readings);
        concessions = List.copyOf(concessions);
        itemPlaces = Map.copyOf(itemPlaces);
    }

    /** {@code SITE/LINE/TAG}. */
    public String code() {
        return station.key();
    }

    /** The fitting of a kind, or {@code null}. */
    public Fitting fitting(FittedKind kind) {
        for (Fitting fitting : fittings) {
            if (fitting.kind() == kind) {
                return fitting;
            }
        }
        return null;
    }

    /** The newest reading of a quantity on a subject, or {@code null}. */
    public Reading newest(SubjectKind kind, String subject, ReadingQuantity quantity) {
        for (Reading reading : readings) {
            if (reading.quantity() == quantity && reading.subjectKind() == kind && reading.subject().equals(subject)) {
                return reading;
            }
        }
        return null;
    }

    /** The site's zone, or UTC where none is recorded. */
    public ZoneId zone() {
        return site == null || site.timeZone() == null ? ZoneId.of("UTC") : ZoneId.of(site.timeZone());
    }
}
