package coilbook.charts;

import java.util.Locale;
import java.util.ResourceBundle;

/**
 * The words on a chart, in one language.
 *
 * @param time the time axis, with unit
 * @param voltage the voltage axis, with unit
 * @param current the current axis, with unit
 * @param sourceVoltage the voltage curve in the legend
 * @param coilCurrent the current curve in the legend
 * @param pullIn the pull-in line in the legend; {@code {0}} is the value in A
 * @param dropOut the drop-out line in the legend; {@code {0}} is the value in A
 */
public record ChartWords(String time, String voltage, String current, String sourceVoltage, String coilCurrent, String pullIn,
        String dropOut) {

    /** The words for a locale; English where there is no translation. */
    public static ChartWords of(Locale locale) {
        ResourceBundle bundle = ResourceBundle.getBundle("coilbook.charts.internal.words", locale, ChartWords.class.getClassLoader(),
                ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
        return new ChartWords(bundle.getString("time"), bundle.getString("voltage"), bundle.getString("current"),
                bundle.getString("sourceVoltage"), bundle.getString("coilCurrent"), bundle.getString("pullIn"),
                bundle.getString("dropOut"));
    }
}
