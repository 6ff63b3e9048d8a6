package coilbook.charts;

/**
 * How large a chart is drawn.
 *
 * @param width points; at least {@value #LEAST_WIDTH}
 * @param height points; at least {@value #LEAST_HEIGHT}
 * @param zoom pixels a point: 1 on an ordinary display, 2 at 200 %
 */
public record ChartSize(int width, int height, double zoom) {

    /** Below this width the axes leave no room for a curve. */
    public static final int LEAST_WIDTH = 160;
    /** Below this height the axes leave no room for a curve. */
    public static final int LEAST_HEIGHT = 120;
    private static final int MOST = 10_000;

    public ChartSize {
        if (width < LEAST_WIDTH || height < LEAST_HEIGHT || width > MOST || height > MOST) {
            throw new IllegalArgumentException("a chart of " + width + " by " + height + " points cannot be drawn");
        }
        if (!(zoom >= 0.5 && zoom <= 8)) {
            throw new IllegalArgumentException("a chart is drawn at a zoom of 0.5 to 8, not " + zoom);
        }
    }

    int pixelWidth() {
        return (int) Math.round(width * zoom);
    }

    int pixelHeight() {
        return (int) Math.round(height * zoom);
    }
}
