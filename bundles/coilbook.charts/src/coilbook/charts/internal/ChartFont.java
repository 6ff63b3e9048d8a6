package coilbook.charts.internal;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The font that ships with the charts: a chart then looks the same on every machine, also on one that has no fonts. */
final class ChartFont {

    private final Font plain;

    ChartFont() {
        try (InputStream in = ChartFont.class.getResourceAsStream("font/DejaVuSans.ttf")) {
            plain = Font.createFont(Font.TRUETYPE_FONT, in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (FontFormatException e) {
            throw new IllegalStateException("the font of the charts is damaged", e);
        }
    }

    Font size(float points) {
        return plain.deriveFont(points);
    }

    Font bold(float points) {
        return plain.deriveFont(Font.BOLD, points);
    }
}
