package coilbook.charts;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;

import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;

import coilbook.charts.internal.WaveformPlots;

/**
 * Draws voltage and current against time, one above the other over one time axis, with the pull-in and drop-out currents as lines. Needs no
 * display.
 */
public final class WaveformChart {

    private WaveformChart() {
    }

    /** Draws a waveform. */
    public static ChartImage draw(WaveformPlot plot, ChartTheme theme, ChartSize size, ChartWords words) {
        WaveformPlots plots = new WaveformPlots(plot, theme, words, (int) Math.ceil(size.width() * size.zoom()),
                size.height());
        JFreeChart chart = plots.chart();
        BufferedImage image = new BufferedImage(size.pixelWidth(), size.pixelHeight(), BufferedImage.TYPE_INT_RGB);
        ChartRenderingInfo drawn = new ChartRenderingInfo();
        Graphics2D graphics = image.createGraphics();
        try {
            graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            graphics.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            graphics.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            graphics.scale(size.zoom(), size.zoom());
            chart.draw(graphics, new Rectangle2D.Double(0, 0, size.width(), size.height()), drawn);
        } finally {
            graphics.dispose();
        }
        return new ChartImage(image, plots.curves(drawn), plots.firstTime(), plots.lastTime());
    }
}
