package weighhouse.formula;

/**
 * The sheet part of a reference.
 *
 * @param workbook external workbook as written between brackets ({@code 1} or a file name), or null
 * @param first sheet name without quotes
 * @param last last sheet of a 3-D reference, or null
 */
public record SheetRef(String workbook, String first, String last) {}
