package coilbook.exchange.internal.in;

/**
 * A column of the table at hand.
 *
 * @param index from 0
 * @param heading as the file writes it
 * @param unit the unit of numbers that carry none; empty for the field's own. For dates the order of day, month and year, for example {@code dmy}
 */
record MappedColumn(int index, String heading, String unit, Target target) {
}
