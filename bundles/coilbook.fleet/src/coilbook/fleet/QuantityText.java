package coilbook.fleet;

import java.util.EnumSet;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Numbers with and without a unit, as people write them: {@code 24 VDC}, {@code 0.01 kohm}, {@code 1,5 m}, {@code 1 234.5}. A comma
 * before exactly three digits, with no other sign to tell, could mean either a decimal or a thousands separator: such a text is refused, not guessed.
 */
public final class QuantityText {

    private static final Pattern NUMBER_THEN_UNIT = Pattern
            .compile("([+-]?[0-9][0-9.,'\\s\\u00a0\\u202f\\u2009]*(?:[eE][+-]?[0-9]+)?|[+-]?[.,][0-9]+)\\s*(\\D.*)?");
    private static final Pattern AMBIGUOUS = Pattern.compile("[+-]?[1-9][0-9]{0,2},[0-9]{3}");
    private static final Map<String, Scale> EXACT = new HashMap<>();
    private static final Map<String, Scale> FOLDED = new HashMap<>();

    /** A unit text's quantity, by one of our units of it, with the factor (and offset) to SI. */
    private record Scale(Set<Unit> units, double factor, double offset) {
    }

    static {
        Set<Unit> volt = EnumSet.of(Unit.VOLT);
        add(volt, 1, "V", "VAC", "VDC", "V AC", "V DC", "V~", "V=", "volt", "volts", "Vrms", "V rms", "Veff");
        add(volt, 1e-3, "mV");
        add(volt, 1e3, "kV");
        Set<Unit> ampere = EnumSet.of(Unit.AMPERE, Unit.MILLIAMPERE);
        add(ampere, 1, "A", "amp", "amps", "ampere", "amperes", "A DC", "A AC", "ADC", "AAC");
        add(ampere, 1e-3, "mA");
        add(ampere, 1e-6, "µA", "μA", "uA");
        Set<Unit> ohm = EnumSet.of(Unit.OHM, Unit.KILOOHM, Unit.MEGAOHM);
        add(ohm, 1, "Ω", "Ω", "ohm", "ohms", "R");
        add(ohm, 1e3, "kΩ", "kΩ", "kohm", "kohms", "k", "kR");
        exact(ohm, 1e-3, "mΩ", "mΩ", "mohm", "mOhm");
        exact(ohm, 1e6, "MΩ", "MΩ", "Mohm", "MOhm", "M", "Megohm", "megohm");
        Set<Unit> henry = EnumSet.of(Unit.MILLIHENRY);
        exact(henry, 1, "H", "henry");
        exact(henry, 1e-3, "mH", "mh", "MH");
        add(henry, 1e-6, "µH", "μH", "uH");
        Set<Unit> farad = EnumSet.of(Unit.MICROFARAD);
        exact(farad, 1, "F");
        exact(farad, 1e-3, "mF");
        add(farad, 1e-6, "µF", "μF", "uF", "mfd");
        add(farad, 1e-9, "nF");
        Set<Unit> time = EnumSet.of(Unit.MILLISECOND, Unit.SECOND, Unit.MINUTE, Unit.HOUR);
        add(time, 1, "s", "sec", "second", "seconds");
        add(time, 1e-3, "ms", "msec", "millisecond", "milliseconds");
        add(time, 60, "min", "mins", "minute", "minutes");
        add(time, 3600, "h", "hr", "hrs", "hour", "hours");
        Set<Unit> rate = EnumSet.of(Unit.HERTZ, Unit.PER_SECOND);
        add(rate, 1, "Hz", "hertz", "1/s", "/s", "cycles/s", "cps", "per second", "cyc/s", "s-1");
        add(rate, 1.0 / 60, "1/min", "/min", "cycles/min", "cpm", "per minute");
        add(EnumSet.of(Unit.HOURS_PER_YEAR), 1, "h/a", "h/y", "h/year", "hours/year", "hours a year", "h");
        add(EnumSet.of(Unit.WATT), 1, "W", "watt", "watts");
        add(EnumSet.of(Unit.WATT), 1e3, "kW");
        exact(EnumSet.of(Unit.WATT), 1e-3, "mW");
        add(EnumSet.of(Unit.VOLT_AMPERE), 1, "VA");
        add(EnumSet.of(Unit.VOLT_AMPERE), 1e3, "kVA");
        add(EnumSet.of(Unit.JOULE), 1, "J");
        add(EnumSet.of(Unit.CELSIUS), 1, "°C", "C", "degC", "deg C", "ºC", "℃");
        put(FOLDED, EnumSet.of(Unit.CELSIUS), 5.0 / 9, -160.0 / 9, "°f", "f", "degf", "deg f");
        add(EnumSet.of(Unit.KELVIN), 1, "K");
        add(EnumSet.of(Unit.KELVIN_PER_WATT), 1, "K/W", "°C/W", "C/W");
        add(EnumSet.of(Unit.WATT_PER_KELVIN), 1, "W/K", "W/°C");
        add(EnumSet.of(Unit.PERCENT), 0.01, "%", "percent", "pct");
        Set<Unit> length = EnumSet.of(Unit.METRE, Unit.MILLIMETRE);
        add(length, 1, "m", "metre", "metres", "meter", "meters");
        add(length, 1e-3, "mm");
        add(length, 1e-2, "cm");
        add(length, 0.3048, "ft", "feet", "foot", "'");
        add(length, 0.0254, "in", "inch", "inches", "\"");
        Set<Unit> speed = EnumSet.of(Unit.METRE_PER_SECOND);
        add(speed, 1, "m/s");
        add(speed, 1.0 / 60, "m/min");
        add(speed, 0.3048 / 60, "ft/min", "fpm");
        add(EnumSet.of(Unit.SQUARE_MILLIMETRE), 1e-6, "mm²", "mm2", "mm^2", "sq mm", "qmm");
        add(EnumSet.of(Unit.OHM_PER_KILOMETRE), 1e-3, "Ω/km", "Ω/km", "ohm/km");
        add(EnumSet.of(Unit.OHM_PER_KILOMETRE), 1, "Ω/m", "ohm/m");
        Set<Unit> pressure = EnumSet.of(Unit.BAR);
        add(pressure, 1e5, "bar");
        exact(pressure, 1e6, "MPa");
        add(pressure, 1e3, "kPa");
        exact(pressure, 1, "Pa");
        add(pressure, 6894.757293168, "psi");
        add(EnumSet.of(Unit.YEAR), 1, "a", "y", "year", "years");
    }

    private QuantityText() {
    }

    private static void add(Set<Unit> units, double factor, String... names) {
        for (String name : names) {
            put(FOLDED, units, factor, 0, name.toLowerCase(Locale.ROOT).replace(" ", ""));
        }
        exact(units, factor, names);
    }

    private static void exact(Set<Unit> units, double factor, String... names) {
        put(EXACT, units, factor, 0, names);
    }

    private static void put(Map<String, Scale> map, Set<Unit> units, double factor, double offset, String... names) {
        for (String name : names) {
            String key = name.replace(" ", "");
            Scale before = map.get(key);
            if (before != null && before.factor == factor) {
                EnumSet<Unit> both = EnumSet.copyOf(before.units);
                both.addAll(units);
                map.put(key, new Scale(both, factor, offset));
            } else if (before == null || units.contains(Unit.HOURS_PER_YEAR)) {
                map.putIfAbsent(key, new Scale(units, factor, offset));
            }
        }
    }

    /** Whether a text, as found in a heading's brackets, is a unit in which the expected quantity can be written. */
    public static boolean isUnit(String unitText, Unit expected) {
        return scale(unitText, expected) != null;
    }

    /**
     * The SI value of a text.
     *
     * @param heading for the message
     * @param text number, perhaps a unit
     * @param expected the unit meant where the text has none
     * @throws InvalidValue if it is no number, is ambiguous, or has another quantity's unit
     */
    public static double parse(String heading, String text, Unit expected) throws InvalidValue {
        return parse(heading, text, expected, expected.symbol());
    }

    /** As {@link #parse(String, String, Unit)}, where a heading said another unit than the field's own. */
    public static double parse(String heading, String text, Unit expected, String unitWhenNone) throws InvalidValue {
        Matcher matcher = NUMBER_THEN_UNIT.matcher(text.strip());
        if (!matcher.matches()) {
            throw new InvalidValue(heading, text, "a number" + (expected == Unit.NONE ? "" : " in " + expected.symbol()));
        }
        double number = number(heading, text, matcher.group(1).strip());
        String unit = matcher.group(2) == null || matcher.group(2).isBlank() ? unitWhenNone : matcher.group(2).strip();
        return toSi(heading, text, number, unit, expected);
    }

    /**
     * The SI value of a number whose unit is written elsewhere, as in a heading.
     *
     * @throws InvalidValue if the unit is not one of the expected quantity
     */
    public static double toSi(String heading, Object shown, double number, String unit, Unit expected) throws InvalidValue {
        if (unit == null || unit.isBlank() || unit.equals(expected.symbol())) {
            return expected.toSi(number);
        }
        Scale scale = scale(unit, expected);
        if (scale == null) {
            throw new InvalidValue(heading, shown, "a number" + (expected == Unit.NONE ? " without unit" : " in " + expected.symbol()));
        }
        return tidy(number * scale.factor + scale.offset, scale);
    }

    private static double tidy(double si, Scale scale) {
        return scale.factor == 1 && scale.offset == 0 ? si
                : new java.math.BigDecimal(si).round(new java.math.MathContext(15)).doubleValue();
    }

    private static Scale scale(String unit, Unit expected) {
        String packed = unit.strip().replaceAll("[\\s\\u00a0]+", "");
        if (packed.endsWith(".") && packed.length() > 1) {
            packed = packed.substring(0, packed.length() - 1);
        }
        Scale scale = EXACT.get(packed);
        if (scale == null || !scale.units.contains(expected)) {
            scale = FOLDED.get(packed.toLowerCase(Locale.ROOT));
        }
        return scale != null && scale.units.contains(expected) ? scale : null;
    }

    private static double number(String heading, String text, String number) throws InvalidValue {
        String digits = number.replaceAll("['\\s\\u00a0\\u202f\\u2009]", "");
        int comma = digits.lastIndexOf(',');
        int point = digits.lastIndexOf('.');
        if (AMBIGUOUS.matcher(digits).matches()) {
            throw new InvalidValue(heading, text, "a number that can be read one way only: write " + digits.replace(',', '.') + " or "
                    + digits.replace(",", ""));
        }
        if (comma >= 0 && point >= 0) {
            digits = comma > point ? digits.replace(".", "").replace(',', '.') : digits.replace(",", "");
        } else if (comma >= 0) {
            digits = digits.indexOf(',') == comma ? digits.replace(',', '.') : digits.replace(",", "");
        } else if (digits.indexOf('.') != point) {
            digits = digits.replace(".", "");
        }
        try {
            double value = Double.parseDouble(digits);
            if (!Double.isInfinite(value)) {
                return value;
            }
        } catch (NumberFormatException e) {
            // falls through to the message, which names the value as it was written
        }
        throw new InvalidValue(heading, text, "a number");
    }
}
