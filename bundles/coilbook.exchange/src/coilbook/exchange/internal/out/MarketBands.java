package coilbook.exchange.internal.out;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.MarketView;
import coilbook.fleet.Site;
import coilbook.register.Register;

/** The band that a circuit's voltage must keep by the market tables, for the sheet of circuits. */
final class MarketBands {

    private static final String ANYWHERE = "*";

    private final Map<String, List<MarketTolerance>> byCountry = new HashMap<>();
    private final Map<String, String> countryBySite = new HashMap<>();

    static MarketBands of(Register register) throws CoilbookException {
        MarketBands bands = new MarketBands();
        register.read(Kind.of(MarketTolerance.class),
                row -> bands.byCountry.computeIfAbsent(row.country(), c -> new ArrayList<>()).add(row));
        register.read(Kind.of(Site.class), site -> bands.countryBySite.put(site.code(), site.country()));
        return bands;
    }

    /** The row that counts at a site for a nominal voltage in V, or {@code null}. */
    MarketTolerance band(String site, double nominalVolts) {
        String country = countryBySite.get(site);
        List<MarketTolerance> own = byCountry.getOrDefault(country == null ? ANYWHERE : country, List.of());
        MarketTolerance band = new MarketView(country, null, own, List.of()).tolerance(nominalVolts);
        return band != null ? band
                : new MarketView(country, null, byCountry.getOrDefault(ANYWHERE, List.of()), List.of()).tolerance(nominalVolts);
    }
}
