/**
 * Spreadsheets in and out: the exchange workbook, the flat list and the audit workbook.
 */
package coilbook.exchange;
