package coilbook.workbench.internal.waveform;

import java.awt.image.BufferedImage;
import java.awt.image.DataBufferInt;

import coilbook.charts.ChartImage;

/**
 * A drawn chart as the bytes a screen takes, three a pixel, made where it was drawn: turning a million pixels takes longer than the window's thread may be
 * held up.
 *
 * @param chart at the display's zoom
 * @param pixels of it
 * @param plain the same at a zoom of 1, which a screen asks for too; the same picture where that is the display's zoom
 */
public record ChartPicture(ChartImage chart, byte[] pixels, ChartImage plain, byte[] plainPixels) {

    /** From drawings as {@link coilbook.charts.WaveformChart} makes them. */
    static ChartPicture of(ChartImage chart, ChartImage plain) {
        byte[] pixels = bytes(chart.image());
        return new ChartPicture(chart, pixels, plain, plain == chart ? pixels : bytes(plain.image()));
    }

    private static byte[] bytes(BufferedImage image) {
        int[] rgb = ((DataBufferInt) image.getRaster().getDataBuffer()).getData();
        byte[] bytes = new byte[3 * rgb.length];
        for (int i = 0, at = 0; i < rgb.length; i++) {
            bytes[at++] = (byte) (rgb[i] >> 16);
            bytes[at++] = (byte) (rgb[i] >> 8);
            bytes[at++] = (byte) rgb[i];
        }
        return bytes;
    }
}
