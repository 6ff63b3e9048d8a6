/** The criteria: what is asked of a station, judged from its data and its derived electrics; the market tables; findings with their evidence. */
package coilbook.criteria;
