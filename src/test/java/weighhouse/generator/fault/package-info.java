/**
 * Forms of events, right and wrong: tables of formula templates, one family of faults a file. A
 * form says both what the faulty workbook holds and what its twin holds in the same cell.
 */
package weighhouse.generator.fault;
