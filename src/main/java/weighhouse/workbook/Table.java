package weighhouse.workbook;

import java.util.List;

/**
 * A structured table (list object), as structured references name it.
 *
 * @param name the table's display name
 * @param range the whole table, header and totals rows included
 * @param headerRows number of header rows, 0 or 1
 * @param totalsRows number of totals rows, 0 or 1
 * @param columns column names from left to right
 */
public record Table(
    String name, CellRange range, int headerRows, int totalsRows, List<String> columns) {}
