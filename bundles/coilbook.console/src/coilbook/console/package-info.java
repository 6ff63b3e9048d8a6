/**
 * The command line.
 */
package coilbook.console;
