package weighhouse.workbook;

import java.util.List;

/**
 * The immutable snapshot of a workbook that everything else works on.
 *
 * @param fileName name of the file without its folder
 * @param sha256 lower-case hexadecimal digest of the file's bytes
 * @param sheets worksheets in tab order (chart and macro sheets are left out)
 * @param names defined names
 * @param date1904 whether day 0 is in 1904
 * @param macros names of the parts that hold macros, empty if none
 * @param externalLinks targets of links to other workbooks
 * @param problems what could not be read, one sentence each
 */
public record Workbook(
    String fileName,
    String sha256,
    List<Sheet> sheets,
    List<DefinedName> names,
    boolean date1904,
    List<String> macros,
    List<String> externalLinks,
    List<String> problems) {

  public Sheet sheet(int index) {
    return sheets.get(index);
  }

  /** Index of the sheet of that name, ignoring case, or -1. */
  public int sheetIndex(String name) {
    for (int i = 0; i < sheets.size(); i++) {
      if (sheets.get(i).name().equalsIgnoreCase(name)) {
        return i;
      }
    }
    return -1;
  }

  /** The address as Excel shows it: {@code Sheet!D5}, quoted where needed. */
  public String show(CellAddress cell) {
    return A1.sheet(sheet(cell.sheet()).name()) + "!" + A1.cell(cell.row(), cell.column());
  }

  /** The range as Excel shows it: {@code Sheet!D5:D484}; one cell without the colon. */
  public String show(CellRange range) {
    String first = show(range.first());
    return range.size() == 1 ? first : first + ":" + A1.cell(range.lastRow(), range.lastColumn());
  }
}
