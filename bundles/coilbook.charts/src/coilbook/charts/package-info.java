/**
 * Waveforms and temperatures drawn as images, without a screen.
 */
package coilbook.charts;
