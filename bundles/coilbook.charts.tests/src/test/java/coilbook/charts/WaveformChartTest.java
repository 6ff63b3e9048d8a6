package coilbook.charts;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.util.Arrays;
import java.util.Locale;

import javax.imageio.ImageIO;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

import coilbook.electrics.Trace;

class WaveformChartTest {

    private static final ChartWords WORDS = ChartWords.of(Locale.ENGLISH);
    private static final ChartSize SIZE = new ChartSize(640, 360, 1);
    private static final int LIGHT_CURRENT = 0x86217a;

    /** A coil of 24 Ω and 60 mH at 24 V, 40 ms on: the exponential of every textbook on RL circuits, i = V/R·(1 − exp(−t·R/L)). */
    private static Trace closing(int samples) {
        double[] time = new double[samples];
        double[] voltage = new double[samples];
        double[] current = new double[samples];
        for (int i = 0; i < samples; i++) {
            time[i] = 0.040 * i / (samples - 1);
            voltage[i] = 24;
            current[i] = 1 - Math.exp(-time[i] * 24 / 0.060);
        }
        return new Trace(time, voltage, current);
    }

    private static ChartImage draw(Trace trace, ChartTheme theme, ChartSize size) {
        return WaveformChart.draw(new WaveformPlot("Station", trace, 0.8, 0.3), theme, size, WORDS);
    }

    @ParameterizedTest
    @EnumSource(ChartTheme.class)
    void pngIsOfTheSizeAskedForAndAlwaysTheSame(ChartTheme theme) throws Exception {
        byte[] png = draw(closing(500), theme, new ChartSize(400, 300, 1.5)).png();
        BufferedImage read = ImageIO.read(new ByteArrayInputStream(png));
        assertEquals(600, read.getWidth());
        assertEquals(450, read.getHeight());
        assertArrayEquals(png, draw(closing(500), theme, new ChartSize(400, 300, 1.5)).png());
    }

    @Test
    void curveRunsWhereTheFormulaSaysIt() {
        ChartImage chart = draw(closing(500), ChartTheme.LIGHT, SIZE);
        // At one time constant, 2.5 ms, 63.2 % of the end value; the end value at the right edge gives the scale, the left edge the zero.
        int zero = curveY(chart, 0.0001);
        int end = curveY(chart, 0.0395);
        int oneTimeConstant = curveY(chart, 0.0025);
        assertTrue(zero - end > 80, "the curve rises by more than 80 pixels, not " + (zero - end));
        assertEquals(0.632, (zero - oneTimeConstant) / (double) (zero - end), 0.06);
    }

    /** The middle row of the current curve's pixels at a time. */
    private static int curveY(ChartImage chart, double time) {
        int x = (int) Math.round(chart.curves().getMinX()
                + chart.curves().getWidth() * (time - chart.firstTime()) / (chart.lastTime() - chart.firstTime()));
        int[] rows = java.util.stream.IntStream.range((int) chart.curves().getMinY(), (int) chart.curves().getMaxY())
                .filter(y -> near(chart.image().getRGB(x, y), LIGHT_CURRENT)).toArray();
        assertTrue(rows.length > 0, "the current curve is drawn at " + time + " s");
        return rows[rows.length / 2];
    }

    private static boolean near(int rgb, int other) {
        int distance = 0;
        for (int shift = 0; shift <= 16; shift += 8) {
            distance += Math.abs((rgb >> shift & 255) - (other >> shift & 255));
        }
        return distance < 130;
    }

    @Test
    void aSpikeOfOneSampleInAHundredThousandIsStillSeen() {
        Trace trace = closing(100_000);
        Arrays.fill(trace.coilCurrent(), 0.2);
        trace.coilCurrent()[54_321] = 2;
        ChartImage chart = draw(trace, ChartTheme.LIGHT, SIZE);
        int lowest = (int) chart.curves().getMaxY();
        int highest = lowest;
        int x = (int) Math.round(chart.curves().getMinX() + chart.curves().getWidth() * 0.54321);
        for (int column = x - 2; column <= x + 2; column++) {
            for (int y = (int) chart.curves().getMinY(); y < lowest; y++) {
                if (near(chart.image().getRGB(column, y), LIGHT_CURRENT)) {
                    highest = Math.min(highest, y);
                }
            }
        }
        assertTrue(lowest - highest > 120, "the spike reaches to the top of the plot, not " + (lowest - highest) + " pixels");
    }

    @Test
    void linesForPullInAndDropOutAreLeftOutWhereNotGiven() {
        BufferedImage with = draw(closing(500), ChartTheme.LIGHT, SIZE).image();
        BufferedImage without = WaveformChart
                .draw(new WaveformPlot("Station", closing(500), Double.NaN, Double.NaN), ChartTheme.LIGHT, SIZE, WORDS).image();
        assertTrue(count(with, 0x3c4650) > count(without, 0x3c4650) + 100, "two dashed lines");
    }

    private static long count(BufferedImage image, int rgb) {
        return Arrays.stream(image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth())).filter(p -> near(p, rgb))
                .count();
    }

    @Test
    void darkIsDarkAndLightIsLight() {
        assertEquals(0xff1e2329, draw(closing(50), ChartTheme.DARK, SIZE).image().getRGB(1, 1));
        assertEquals(0xffffffff, draw(closing(50), ChartTheme.LIGHT, SIZE).image().getRGB(1, 1));
    }

    @Test
    void timeUnderACursor() {
        ChartImage chart = draw(closing(500), ChartTheme.LIGHT, SIZE);
        assertEquals(0.020, chart.timeAt(chart.curves().getCenterX()), 1e-9);
        assertTrue(Double.isNaN(chart.timeAt(1)));
    }

    @Test
    void emptyAndSingleSamplesAreDrawnWithoutCurve() {
        for (int samples : new int[] { 0, 1 }) {
            Trace trace = new Trace(new double[samples], new double[samples], new double[samples]);
            assertEquals(640, draw(trace, ChartTheme.LIGHT, SIZE).image().getWidth());
        }
    }

    @Test
    void sizesThatLeaveNoRoomAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new ChartSize(100, 300, 1));
        assertThrows(IllegalArgumentException.class, () -> new ChartSize(400, 300, Double.NaN));
    }

    @Test
    void everyWordIsThereInEveryLocale() {
        for (Locale locale : new Locale[] { Locale.ROOT, Locale.GERMAN, Locale.JAPAN }) {
            ChartWords words = ChartWords.of(locale);
            assertFalse(words.time().isBlank());
            assertTrue(words.pullIn().contains("{0}"));
            assertTrue(words.dropOut().contains("{0}"));
        }
    }
}
