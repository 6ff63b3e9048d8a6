/**
 * The electrical arithmetic: waveforms, winding temperatures, mains and cables, as pure functions in SI units.
 */
package coilbook.electrics;
