package coilbook.workbench.internal.grid.style;

import org.eclipse.swt.graphics.Color;

/**
 * The grid's colours of one look. Hazard and caution are the red and the yellow of IEC 60073, shaded so that text in them stands out by at least 4.5 to 1
 * against its row (WCAG 2.1, 1.4.3).
 */
public record GridColours(Color background, Color stripe, Color heading, Color headingSelected, Color filter, Color text, Color muted,
        Color selection, Color anchor, Color line, Color separator, Color hazard, Color caution) {

    private static final GridColours LIGHT = new GridColours(of(0xffffff), of(0xf6f8fa), of(0xe9edf1), of(0xd3dde7), of(0xfdfdf6),
            of(0x1f2933),
            of(0x5b6873), of(0xd6e8f8), of(0xb4d5f1), of(0xdfe4e9), of(0x8fa1b3), of(0xb00020), of(0x7a5200));
    private static final GridColours DARK = new GridColours(of(0x1e2329), of(0x22282f), of(0x2c343c), of(0x3a4752), of(0x262b2a),
            of(0xe3e8ed),
            of(0xa3afba), of(0x234a68), of(0x2f6590), of(0x343d46), of(0x6b7d8e), of(0xff8a80), of(0xf2c14e));

    /** The colours of a look. */
    public static GridColours of(boolean dark) {
        return dark ? DARK : LIGHT;
    }

    private static Color of(int rgb) {
        return new Color(rgb >> 16 & 255, rgb >> 8 & 255, rgb & 255);
    }
}
