package coilbook.charts.internal;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.math.BigDecimal;
import java.math.MathContext;

import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

import coilbook.charts.ChartTheme;
import coilbook.charts.ChartWords;
import coilbook.charts.WaveformPlot;
import coilbook.electrics.Trace;

/** Two plots over one time axis, put together for one drawing: nothing is shared, so that charts can be drawn on several threads at once. */
public final class WaveformPlots {

    private static final double MILLISECONDS = 1e3;
    /** Below this height of the chart, in points, an axis is too short for its name: its unit alone stands there, the legend has the names. */
    private static final int LOW = 260;
    private static final int VOLTAGE_SHARE = 2;
    private static final int CURRENT_SHARE = 3;

    private final WaveformPlot what;
    private final Palette palette;
    private final ChartWords words;
    private final int slots;
    private final boolean low;
    private final ChartFont font = new ChartFont();

    /**
     * @param slots across how many pixels the time axis can run
     * @param height points
     */
    public WaveformPlots(WaveformPlot what, ChartTheme theme, ChartWords words, int slots, int height) {
        this.what = what;
        this.palette = Palette.of(theme);
        this.words = words;
        this.slots = slots;
        this.low = height < LOW;
    }

    /** The chart, ready to be drawn. */
    public JFreeChart chart() {
        NumberAxis time = axis(words.time());
        time.setRange(firstTime() * MILLISECONDS, lastTime() * MILLISECONDS);
        CombinedDomainXYPlot both = new CombinedDomainXYPlot(time);
        both.setGap(8);
        both.setBackgroundPaint(palette.background());
        both.add(voltagePlot(), VOLTAGE_SHARE);
        both.add(currentPlot(), CURRENT_SHARE);
        JFreeChart chart = new JFreeChart(null, font.size(11), both, false);
        chart.setBackgroundPaint(palette.background());
        chart.setPadding(new RectangleInsets(6, 6, 4, 12));
        if (!what.title().isEmpty()) {
            TextTitle title = new TextTitle(what.title(), font.bold(12));
            title.setPaint(palette.text());
            title.setPadding(2, 2, 6, 2);
            chart.setTitle(title);
        }
        chart.addLegend(legend(both));
        return chart;
    }

    /** s */
    public double firstTime() {
        return what.trace().size() == 0 ? 0 : what.trace().time()[0];
    }

    /** s; later than the first even where there is but one sample, since an axis needs a length */
    public double lastTime() {
        Trace trace = what.trace();
        double last = trace.size() == 0 ? 0 : trace.time()[trace.size() - 1];
        return last > firstTime() ? last : firstTime() + 1e-3;
    }

    /** Where the curves were drawn, in points. */
    public Rectangle2D curves(ChartRenderingInfo drawn) {
        PlotRenderingInfo plots = drawn.getPlotInfo();
        Rectangle2D area = plots.getSubplotInfo(0).getDataArea();
        return area.createUnion(plots.getSubplotInfo(plots.getSubplotCount() - 1).getDataArea());
    }

    private XYPlot voltagePlot() {
        XYSeriesCollection data = new XYSeriesCollection(series(words.sourceVoltage(), what.trace().sourceVoltage()));
        XYLineAndShapeRenderer lines = new XYLineAndShapeRenderer(true, false);
        style(lines, 0, palette.voltage(), solid());
        return plot(data, axis(named(words.voltage())), lines);
    }

    private XYPlot currentPlot() {
        XYSeriesCollection data = new XYSeriesCollection(series(words.coilCurrent(), what.trace().coilCurrent()));
        XYLineAndShapeRenderer lines = new XYLineAndShapeRenderer(true, false);
        style(lines, 0, palette.current(), solid());
        level(data, lines, words.pullIn(), what.pullInCurrent(), palette.pullIn(), dashed(8, 4));
        level(data, lines, words.dropOut(), what.dropOutCurrent(), palette.dropOut(), dashed(2, 3));
        return plot(data, axis(named(words.current())), lines);
    }

    private String named(String label) {
        int unit = label.indexOf('[');
        return low && unit > 0 ? label.substring(unit) : label;
    }

    private void level(XYSeriesCollection data, XYLineAndShapeRenderer lines, String name, double value, Color color, BasicStroke stroke) {
        if (Double.isNaN(value)) {
            return;
        }
        String shown = new BigDecimal(value).round(new MathContext(3)).stripTrailingZeros().toPlainString();
        XYSeries line = new XYSeries(name.replace("{0}", shown), false);
        line.add(firstTime() * MILLISECONDS, value);
        line.add(lastTime() * MILLISECONDS, value);
        style(lines, data.getSeriesCount(), color, stroke);
        data.addSeries(line);
    }

    private XYSeries series(String name, double[] values) {
        XYSeries series = new XYSeries(name, false);
        Thinning points = Thinning.of(what.trace().time(), values, slots);
        for (int i = 0; i < points.size(); i++) {
            series.add(points.x(i) * MILLISECONDS, points.y(i), false);
        }
        return series;
    }

    private XYPlot plot(XYSeriesCollection data, NumberAxis axis, XYLineAndShapeRenderer lines) {
        lines.setDrawSeriesLineAsPath(true);
        XYPlot plot = new XYPlot(data, null, axis, lines);
        plot.setBackgroundPaint(palette.plot());
        plot.setDomainGridlinePaint(palette.grid());
        plot.setRangeGridlinePaint(palette.grid());
        plot.setDomainGridlineStroke(new BasicStroke(0.75f));
        plot.setRangeGridlineStroke(new BasicStroke(0.75f));
        plot.setOutlinePaint(palette.grid());
        return plot;
    }

    private NumberAxis axis(String label) {
        NumberAxis axis = new NumberAxis(label);
        axis.setLabelFont(font.size(10.5f));
        axis.setTickLabelFont(font.size(10));
        axis.setLabelPaint(palette.text());
        axis.setTickLabelPaint(palette.text());
        axis.setAxisLinePaint(palette.grid());
        axis.setTickMarkPaint(palette.grid());
        axis.setAutoRangeIncludesZero(true);
        return axis;
    }

    private LegendTitle legend(CombinedDomainXYPlot both) {
        LegendTitle legend = new LegendTitle(both);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setItemFont(font.size(10.5f));
        legend.setItemPaint(palette.text());
        legend.setBackgroundPaint(palette.background());
        legend.setFrame(BlockBorder.NONE);
        legend.setItemLabelPadding(new RectangleInsets(2, 2, 2, 10));
        return legend;
    }

    private static void style(XYLineAndShapeRenderer lines, int series, Color color, BasicStroke stroke) {
        lines.setSeriesPaint(series, color);
        lines.setSeriesStroke(series, stroke);
        lines.setLegendLine(new java.awt.geom.Line2D.Double(-12, 0, 12, 0));
    }

    private static BasicStroke solid() {
        return new BasicStroke(1.6f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }

    private static BasicStroke dashed(float on, float off) {
        return new BasicStroke(1.3f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, new float[] { on, off }, 0);
    }
}
