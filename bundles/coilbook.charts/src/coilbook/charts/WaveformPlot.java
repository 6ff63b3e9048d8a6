package coilbook.charts;

import java.util.Objects;

import coilbook.electrics.Trace;

/**
 * What a waveform chart shows.
 *
 * @param title one line over the chart; may be empty
 * @param trace voltage in V and current in A against time in s
 * @param pullInCurrent A, drawn as a line; NaN for none
 * @param dropOutCurrent A, drawn as a line; NaN for none
 */
public record WaveformPlot(String title, Trace trace, double pullInCurrent, double dropOutCurrent) {

    public WaveformPlot {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(trace, "trace");
    }
}
