package coilbook.workbench.internal.model;

import coilbook.charts.WaveformPlot;

/**
 * The waveform of a station, or why there is none.
 *
 * @param plot what to draw; {@code null} where it cannot be computed
 * @param note the conditions of the corner in words, or what is missing
 */
public record WaveformReport(String station, Corner corner, WaveformPlot plot, String note) {
}
