/**
 * The window: its parts, handlers and grid.
 */
package coilbook.workbench;
