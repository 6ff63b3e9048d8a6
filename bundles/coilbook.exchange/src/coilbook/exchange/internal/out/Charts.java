package coilbook.exchange.internal.out;

import java.util.List;

import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xddf.usermodel.XDDFColor;
import org.apache.poi.xddf.usermodel.XDDFLineProperties;
import org.apache.poi.xddf.usermodel.XDDFSolidFillProperties;
import org.apache.poi.xddf.usermodel.chart.AxisCrosses;
import org.apache.poi.xddf.usermodel.chart.AxisOrientation;
import org.apache.poi.xddf.usermodel.chart.AxisPosition;
import org.apache.poi.xddf.usermodel.chart.BarDirection;
import org.apache.poi.xddf.usermodel.chart.BarGrouping;
import org.apache.poi.xddf.usermodel.chart.ChartTypes;
import org.apache.poi.xddf.usermodel.chart.LegendPosition;
import org.apache.poi.xddf.usermodel.chart.XDDFBarChartData;
import org.apache.poi.xddf.usermodel.chart.XDDFCategoryAxis;
import org.apache.poi.xddf.usermodel.chart.XDDFChartData;
import org.apache.poi.xddf.usermodel.chart.XDDFDataSourcesFactory;
import org.apache.poi.xddf.usermodel.chart.XDDFValueAxis;
import org.apache.poi.xssf.usermodel.XSSFChart;
import org.apache.poi.xssf.usermodel.XSSFDrawing;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.xmlbeans.XmlCursor;

import coilbook.exchange.internal.out.Tally.Count;

/** Stacked bars over the tables of the summary, drawn by the spreadsheet program itself from the cells. */
final class Charts {

    private static final String NAMESPACE = "http://schemas.openxmlformats.org/drawingml/2006/chart";
    /** The height of a chart in rows. */
    static final int ROWS = 20;

    private final XSSFSheet sheet;
    private final int top;
    private final int left;
    private final int right;

    /**
     * Room for one chart.
     *
     * @param top the first row
     * @param left the first column
     * @param right the column behind the last
     */
    Charts(XSSFSheet sheet, int top, int left, int right) {
        this.sheet = sheet;
        this.top = top;
        this.left = left;
        this.right = right;
    }

    /**
     * Draws the chart over a table.
     *
     * @param firstRow of the table's groups, counted from 0, their names in the first column
     * @param groups those to draw, in the order of the table
     * @param firstCount the column of the first count
     */
    void add(String title, int firstRow, List<String> groups, Tally tally, int firstCount) {
        if (groups.isEmpty()) {
            return;
        }
        XSSFDrawing drawing = sheet.createDrawingPatriarch();
        XSSFChart chart = drawing.createChart(drawing.createAnchor(0, 0, 0, 0, left, top, right, top + ROWS));
        chart.setTitleText(title);
        chart.setTitleOverlay(false);
        chart.getOrAddLegend().setPosition(LegendPosition.BOTTOM);
        XDDFCategoryAxis names = chart.createCategoryAxis(AxisPosition.LEFT);
        names.setOrientation(AxisOrientation.MAX_MIN);
        XDDFValueAxis counts = chart.createValueAxis(AxisPosition.BOTTOM);
        counts.setCrosses(AxisCrosses.MAX);
        counts.setTitle("findings");
        counts.setNumberFormat("#,##0");
        XDDFBarChartData bars = (XDDFBarChartData) chart.createData(ChartTypes.BAR, names, counts);
        bars.setBarDirection(BarDirection.BAR);
        bars.setBarGrouping(BarGrouping.STACKED);
        bars.setGapWidth(40);
        int last = firstRow + groups.size() - 1;
        String[] shown = groups.toArray(String[]::new);
        for (Count count : Count.values()) {
            int at = firstCount + count.ordinal();
            Double[] values = groups.stream().map(group -> (double) tally.get(group, count)).toArray(Double[]::new);
            XDDFChartData.Series series = bars.addSeries(XDDFDataSourcesFactory.fromArray(shown, range(firstRow, last, 0)),
                    XDDFDataSourcesFactory.fromArray(values, range(firstRow, last, at)));
            series.setTitle(count.heading(), null);
            series.setFillProperties(fill(count));
            series.setLineProperties(new XDDFLineProperties(rgb(0x404040)));
        }
        chart.plot(bars);
        overlap(chart);
    }

    /** The cells, named for the chart; the values are handed over beside them, because the formulas there count rows that are already out of memory. */
    private String range(int firstRow, int last, int at) {
        return new CellRangeAddress(firstRow, last, at, at).formatAsString(sheet.getSheetName(), true);
    }

    /** Lets the bars of a stack lie in one line. By hand, because the schema that ships with the library leaves out the type of this attribute. */
    private static void overlap(XSSFChart chart) {
        try (XmlCursor cursor = chart.getCTChart().getPlotArea().getBarChartArray(0).newCursor()) {
            cursor.toChild(NAMESPACE, "axId");
            cursor.beginElement("overlap", NAMESPACE);
            cursor.insertAttributeWithValue("val", "100");
        }
    }

    /** The colours of the sheets' marks; they differ in lightness too, and stand in the order of the legend. */
    private static XDDFSolidFillProperties fill(Count count) {
        return switch (count) {
            case HAZARDS -> rgb(0xC00000);
            case NONCONFORMITIES -> rgb(0xFFC000);
            case OBSERVATIONS -> rgb(0xD9D9D9);
            case UNDETERMINED -> rgb(0x2F75B5);
            case CONCEDED -> rgb(0xFFFFFF);
        };
    }

    private static XDDFSolidFillProperties rgb(int colour) {
        return new XDDFSolidFillProperties(XDDFColor.from(new byte[] { (byte) (colour >> 16), (byte) (colour >> 8), (byte) colour }));
    }
}
