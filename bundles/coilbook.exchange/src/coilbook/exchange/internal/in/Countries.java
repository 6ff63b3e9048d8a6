package coilbook.exchange.internal.in;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.MissingResourceException;
import java.util.TreeMap;

import coilbook.fleet.InvalidValue;
import coilbook.fleet.NearestWord;

/**
 * Countries by their two-letter codes (ISO 3166-1), three-letter codes, and names in English, German, French, Spanish and Portuguese as the Java runtime
 * knows them, with a few everyday names beside.
 */
public final class Countries {

    private static final String[] EVERYDAY = { "GB=uk=u k=great britain=england=scotland=wales=northern ireland",
            "US=usa=u s a=u s=united states of america=america",
            "KR=korea=south korea=republic of korea", "CZ=czech republic", "TR=turkey=turkiye", "NL=holland=the netherlands", "AE=uae",
            "RU=russia", "CN=prc=china",
            "MX=mexiko", "TW=taiwan", "VN=vietnam", "IR=iran" };

    private final Map<String, String> byName = new HashMap<>();

    public Countries() {
        for (Locale language : new Locale[] { Locale.ENGLISH, Locale.GERMAN, Locale.FRENCH, new Locale("es"), new Locale("pt") }) {
            for (String code : Locale.getISOCountries()) {
                byName.putIfAbsent(Texts.fold(new Locale("", code).getDisplayCountry(language)), code);
            }
        }
        for (String line : EVERYDAY) {
            String[] names = line.split("=");
            for (int i = 1; i < names.length; i++) {
                byName.put(names[i], names[0]);
            }
        }
        for (String code : Locale.getISOCountries()) {
            byName.put(code.toLowerCase(Locale.ROOT), code);
            addThreeLetters(code);
        }
        byName.put("xk", "XK");
    }

    private void addThreeLetters(String code) {
        try {
            byName.putIfAbsent(new Locale("", code).getISO3Country().toLowerCase(Locale.ROOT), code);
        } catch (MissingResourceException e) {
            // a code without three letters is known by its name
        }
    }

    /** The two-letter code. */
    public String code(String heading, String text) throws InvalidValue {
        String code = byName.get(Texts.fold(text));
        if (code == null) {
            throw new InvalidValue(heading, text, "a country by its two-letter code (ISO 3166) or its name" + nearest(text));
        }
        return code;
    }

    private static String nearest(String text) {
        Map<String, String> english = new TreeMap<>();
        for (String code : Locale.getISOCountries()) {
            english.put(new Locale("", code).getDisplayCountry(Locale.ENGLISH), code);
        }
        String nearest = text.strip().length() < 4 ? null : NearestWord.of(text.strip(), english.keySet());
        return nearest == null ? "" : "; the nearest is " + nearest + " (" + english.get(nearest) + ")";
    }
}
