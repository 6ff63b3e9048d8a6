/**
 * The use cases both faces offer: bring in, check, audit and the like, with progress, cancelling and messages.
 */
package coilbook.jobs;
