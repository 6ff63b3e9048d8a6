/** Workbooks going out: the audit workbook and the plain exchange workbook, streamed row by row. */
package coilbook.exchange.internal.out;
