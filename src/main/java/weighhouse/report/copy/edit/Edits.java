package weighhouse.report.copy.edit;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import weighhouse.audit.Figure;
import weighhouse.workbook.CellAddress;

/**
 * All that a corrected copy changes.
 *
 * @param sheets names of the sheets that addresses count
 * @param formulas corrected formula by cell, without the equals sign
 * @param comments what is said at a cell
 * @param values stored values to put in place of the present ones; may be empty
 * @param review the sheet of findings, rows first
 */
public record Edits(
    List<String> sheets,
    SortedMap<CellAddress, String> formulas,
    SortedMap<CellAddress, String> comments,
    Map<CellAddress, Figure> values,
    List<ReviewRow> review) {

  /** Name of the sheet that lists the findings. */
  public static final String REVIEW_SHEET = "Weighhouse review";

  /** Author of the comments. */
  public static final String AUTHOR = "Weighhouse";

  /**
   * A row of the review sheet.
   *
   * @param link where its second cell leads, such as {@code Model!D5}; null for none
   * @param cells texts and figures, one a column
   */
  public record ReviewRow(String link, List<Object> cells) {}
}
