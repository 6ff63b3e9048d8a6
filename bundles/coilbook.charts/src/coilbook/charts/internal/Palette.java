package coilbook.charts.internal;

import java.awt.Color;

import coilbook.charts.ChartTheme;

/**
 * The colours of a theme. Blue and purple stay apart for the common kinds of colour blindness, and neither is a warning colour of IEC 60073
 * (red, yellow, green), which a curve must not borrow.
 */
record Palette(Color background, Color plot, Color text, Color grid, Color voltage, Color current, Color pullIn, Color dropOut) {

    static Palette of(ChartTheme theme) {
        return switch (theme) {
            case LIGHT ->
                new Palette(new Color(0xffffff), new Color(0xfafbfc), new Color(0x1f2933), new Color(0xd5dae0), new Color(0x0060a8),
                        new Color(0x86217a), new Color(0x3c4650), new Color(0x3c4650));
            case DARK ->
                new Palette(new Color(0x1e2329), new Color(0x232a31), new Color(0xe3e8ed), new Color(0x3d4751), new Color(0x63b3f0),
                        new Color(0xdb8fd6), new Color(0xc5ced6), new Color(0xc5ced6));
        };
    }
}
