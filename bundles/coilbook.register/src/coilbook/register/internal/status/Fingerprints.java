package coilbook.register.internal.status;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;

import coilbook.fleet.FleetSettings;
import coilbook.fleet.Kind;
import coilbook.fleet.MarketView;
import coilbook.fleet.Row;
import coilbook.fleet.StationView;
import coilbook.register.internal.store.RowDigest;

/**
 * The fingerprint of everything a station's verdicts rest on, apart from the day: what has the same one need not be computed again. Rows that many
 * stations share are digested once for each object.
 */
final class Fingerprints {

    private final String version;
    private final Map<Object, String> shared = Collections.synchronizedMap(new IdentityHashMap<>());

    /** @param version of the electrics and the criteria */
    Fingerprints(String version) {
        this.version = version;
    }

    String of(StationView view) {
        RowDigest digest = new RowDigest().add(version);
        add(digest, view.station());
        add(digest, view.supply());
        add(digest, view.settingChoice());
        add(digest, view.duty());
        for (List<? extends Row> rows : List.of(view.fittings(), view.pastFittings(), view.readings(), view.concessions())) {
            digest.add(rows.size());
            rows.forEach(row -> add(digest, row));
        }
        for (Row row : new Row[] { view.line(), view.site(), view.customer(), view.circuit(), view.transformer(), view.setting(),
                view.controller(),
                view.valve(), view.coil(), view.driver(), view.cable() }) {
            digest.add(row == null ? null : once(row, d -> add(d, row)));
        }
        digest.add(view.settings().size());
        view.settings().forEach(setting -> digest.add(once(setting, d -> add(d, setting))));
        new TreeMap<>(view.itemPlaces()).forEach((item, places) -> digest.add(item).add(places));
        if (view.market() != null) {
            digest.add(once(view.market(), d -> add(d, view.market())));
        }
        digest.add(once(view.fleetSettings(), d -> add(d, view.fleetSettings())));
        return digest.hex();
    }

    private String once(Object object, Consumer<RowDigest> adding) {
        String known = shared.get(object);
        if (known == null) {
            RowDigest digest = new RowDigest();
            adding.accept(digest);
            known = digest.hex();
            shared.put(object, known);
        }
        return known;
    }

    private static void add(RowDigest digest, Row row) {
        if (row == null) {
            digest.add(null);
        } else {
            Kind<Row> kind = Kind.of(row);
            digest.add(kind.id()).addAll(kind.values(row));
        }
    }

    private static void add(RowDigest digest, MarketView market) {
        digest.add(market.country());
        add(digest, market.mains());
        digest.add(market.tolerances().size());
        market.tolerances().forEach(row -> add(digest, row));
        market.marks().forEach(row -> add(digest, row));
    }

    private static void add(RowDigest digest, FleetSettings settings) {
        settings.all().forEach((name, value) -> digest.add(name).add(value));
    }
}
