/**
 * The vocabulary of a fleet of solenoid-operated adhesive applicators: immutable records with units and provenance, and the Change that alters them.
 */
package coilbook.fleet;
