package coilbook.workbench.internal.waveform;

import java.util.Locale;

import coilbook.charts.ChartImage;
import coilbook.charts.ChartSize;
import coilbook.charts.ChartTheme;
import coilbook.charts.ChartWords;
import coilbook.charts.WaveformChart;
import coilbook.electrics.Trace;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.model.WaveformReport;
import coilbook.workbench.internal.text.Texts;

/** Follows the selected station, and draws its waveform at the chosen corner away from the window's thread. */
public final class WaveformPresenter implements Session.Listener {

    /** What shows the chart. */
    public interface View {
        /** The size the chart should have; {@code null} while there is no room for one. */
        ChartSize size();

        /** Shows a chart and its conditions in words. */
        void show(ChartPicture picture, String note);

        /** Shows words where there is no chart. */
        void showWords(String words);
    }

    private final Session session;
    private final Background background;
    private final Texts texts = Texts.of(WaveformPresenter.class);
    private final ChartWords words = ChartWords.of(Locale.getDefault());
    private View view;
    private Corner corner = Corner.NOMINAL;
    private WaveformReport report;
    private Background.Handle work = () -> {
    };

    public WaveformPresenter(Session session, Background background) {
        this.session = session;
        this.background = background;
    }

    /** Starts telling the view. */
    public void attach(View told) {
        view = told;
        session.add(this);
        read();
    }

    /** Stops. */
    public void detach() {
        session.remove(this);
        work.cancel();
    }

    public Corner corner() {
        return corner;
    }

    /** Shows another corner. */
    public void choose(Corner chosen) {
        corner = chosen;
        read();
    }

    @Override
    public void fleetChanged() {
        read();
    }

    @Override
    public void stationChanged() {
        read();
    }

    @Override
    public void dataChanged() {
        read();
    }

    @Override
    public void lookChanged() {
        draw();
    }

    /** Draws what is known again, in the size the view has now. */
    public void draw() {
        WaveformReport known = report;
        ChartSize size = view.size();
        if (known == null || known.plot() == null || size == null) {
            return;
        }
        work.cancel();
        ChartTheme theme = session.isDark() ? ChartTheme.DARK : ChartTheme.LIGHT;
        work = background.start(texts.get("drawing"), Background.Lane.READ,
                progress -> {
                    ChartImage chart = WaveformChart.draw(known.plot(), theme, size, words);
                    ChartSize plain = new ChartSize(size.width(), size.height(), 1);
                    return ChartPicture.of(chart, size.zoom() == 1 ? chart : WaveformChart.draw(known.plot(), theme, plain, words));
                }, picture -> view.show(picture, known.note()),
                error -> view.showWords(error.getMessage()));
    }

    /** Voltage and current at a time, in words; empty outside the waveform. */
    public String readout(double time) {
        if (report == null || report.plot() == null || Double.isNaN(time)) {
            return "";
        }
        Trace trace = report.plot().trace();
        int at = nearest(trace.time(), time);
        return at < 0 ? ""
                : texts.get("readout", digits(trace.time()[at] * 1e3, 1), digits(trace.sourceVoltage()[at], 1),
                        digits(trace.coilCurrent()[at], 3));
    }

    private static String digits(double value, int decimals) {
        return java.math.BigDecimal.valueOf(value).setScale(decimals, java.math.RoundingMode.HALF_UP).toPlainString();
    }

    private static int nearest(double[] times, double time) {
        int at = java.util.Arrays.binarySearch(times, time);
        if (at >= 0 || times.length == 0) {
            return at;
        }
        int after = -at - 1;
        if (after == 0) {
            return 0;
        } else if (after == times.length) {
            return times.length - 1;
        }
        return time - times[after - 1] < times[after] - time ? after - 1 : after;
    }

    private void read() {
        work.cancel();
        FleetModel fleet = session.fleet();
        String station = session.station();
        if (fleet == null || station == null) {
            report = null;
            view.showWords(texts.get("nothing"));
            return;
        }
        if (report == null) {
            view.showWords(texts.get("computing"));
        }
        work = background.start(texts.get("computing"), Background.Lane.READ, progress -> fleet.waveform(station, corner), found -> {
            report = found;
            if (found == null || found.plot() == null) {
                view.showWords(found == null ? texts.get("nothing") : found.note());
            } else {
                draw();
            }
        }, error -> {
            report = null;
            view.showWords(error.getMessage());
        });
    }
}
