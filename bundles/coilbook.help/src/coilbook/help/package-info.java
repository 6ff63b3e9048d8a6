/**
 * What a user reads: first steps, how Coilbook computes, measuring procedures, cautions.
 */
package coilbook.help;
