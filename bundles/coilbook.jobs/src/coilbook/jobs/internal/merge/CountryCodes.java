package coilbook.jobs.internal.merge;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.MissingResourceException;
import java.util.TreeMap;

import coilbook.jobs.internal.NearestWord;

/**
 * Countries by their ISO 3166-1 codes of two or three letters, or their English names; some everyday names are added. Source of codes and names: the
 * Java runtime's own tables.
 */
final class CountryCodes {

    private static final Map<String, String> EVERYDAY = Map.ofEntries(Map.entry("uk", "GB"), Map.entry("great britain", "GB"),
            Map.entry("england", "GB"), Map.entry("usa", "US"), Map.entry("united states of america", "US"), Map.entry("america", "US"),
            Map.entry("korea", "KR"), Map.entry("republic of korea", "KR"), Map.entry("czech republic", "CZ"), Map.entry("holland", "NL"),
            Map.entry("the netherlands", "NL"), Map.entry("turkey", "TR"), Map.entry("uae", "AE"), Map.entry("russian federation", "RU"),
            Map.entry("viet nam", "VN"), Map.entry("ivory coast", "CI"), Map.entry("hong kong", "HK"), Map.entry("macau", "MO"));

    private final Map<String, String> byWord = new HashMap<>();
    private final Map<String, String> byName = new TreeMap<>();

    CountryCodes() {
        for (String code : Locale.getISOCountries()) {
            Locale country = new Locale("", code);
            String name = country.getDisplayCountry(Locale.ENGLISH);
            byName.put(name, code);
            byWord.put(name.toLowerCase(Locale.ROOT), code);
            byWord.put(code.toLowerCase(Locale.ROOT), code);
            try {
                byWord.put(country.getISO3Country().toLowerCase(Locale.ROOT), code);
            } catch (MissingResourceException e) {
                // a country may lack a code of three letters; its other names still count
            }
        }
        byWord.putAll(EVERYDAY);
    }

    /** The code of two letters, or {@code null} for a country that is not known. */
    String code(String text) {
        return byWord.get(text.strip().toLowerCase(Locale.ROOT));
    }

    /** What was expected instead of an unknown country, naming the nearest one there is. */
    String expected(String text) {
        String nearest = text.strip().length() <= 3 ? null : NearestWord.of(text.strip(), byName.keySet());
        return "a country by its ISO code of two letters or its English name"
                + (nearest == null ? "" : "; the nearest is " + nearest + " (" + byName.get(nearest) + ")");
    }
}
