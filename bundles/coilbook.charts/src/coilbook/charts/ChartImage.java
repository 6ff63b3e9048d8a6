package coilbook.charts;

import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;

import javax.imageio.ImageIO;

/**
 * A drawn chart and where its curves lie in it, so that a screen can draw a cursor over it.
 *
 * @param image pixels
 * @param curves the part of the chart between the axes, in points
 * @param firstTime s, at the left edge of {@code curves}
 * @param lastTime s, at its right edge
 */
public record ChartImage(BufferedImage image, Rectangle2D curves, double firstTime, double lastTime) {

    /** The time under a point, s; NaN outside the curves. */
    public double timeAt(double x) {
        if (x < curves.getMinX() || x > curves.getMaxX()) {
            return Double.NaN;
        }
        return firstTime + (x - curves.getMinX()) / curves.getWidth() * (lastTime - firstTime);
    }

    /** The picture as a PNG file; the same picture gives the same bytes. */
    public byte[] png() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            if (!ImageIO.write(image, "png", bytes)) {
                throw new IllegalStateException("this Java writes no PNG");
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }
}
