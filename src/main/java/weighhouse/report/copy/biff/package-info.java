/** Changes to an .xls workbook, through the library that wrote the format down for Java. */
package weighhouse.report.copy.biff;
