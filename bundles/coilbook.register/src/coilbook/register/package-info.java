/**
 * Storage of a fleet: Changes and their journal, reading of now and of any past, and the status rows that grids show. Knows the criteria,
 * no file format and no screen.
 */
package coilbook.register;
