package coilbook.workbench.internal.text;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/**
 * The texts of one area of the window, in one language: the file {@code texts.properties} beside a class of the area. English where there is no
 * translation.
 */
public final class Texts {

    private final ResourceBundle bundle;
    private final Locale locale;

    private Texts(ResourceBundle bundle, Locale locale) {
        this.bundle = bundle;
        this.locale = locale;
    }

    /** The texts of the area that a class belongs to, in the language of this Java. */
    public static Texts of(Class<?> area) {
        return of(area, Locale.getDefault());
    }

    /** The texts of the area that a class belongs to. */
    public static Texts of(Class<?> area, Locale locale) {
        ResourceBundle.Control noDetour = ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES);
        return new Texts(ResourceBundle.getBundle(area.getPackageName() + ".texts", locale, area.getClassLoader(), noDetour), locale);
    }

    /**
     * A text, with its gaps {@code {0}} filled. In the file an apostrophe is written twice.
     *
     * @throws java.util.MissingResourceException if the area has no such text
     */
    public String get(String key, Object... gaps) {
        return new MessageFormat(bundle.getString(key), locale).format(gaps);
    }

    /** Whether the area has such a text. */
    public boolean has(String key) {
        return bundle.containsKey(key);
    }
}
