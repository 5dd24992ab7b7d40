package weighhouse.workbook.biff;

import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.hssf.usermodel.HSSFComment;
import org.apache.poi.hssf.usermodel.HSSFRow;
import org.apache.poi.hssf.usermodel.HSSFSheet;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellRangeAddressBase;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;

/** Reads one worksheet of a binary workbook. */
final class BiffSheet {
  private final HSSFSheet source;
  private final int index;
  private final List<String> problems;

  /**
   * @param index of the sheet in the snapshot
   * @param problems takes what could not be read
   */
  BiffSheet(HSSFSheet source, int index, List<String> problems) {
    this.source = source;
    this.index = index;
    this.problems = problems;
  }

  Sheet read(Visibility visibility, List<String> formats, List<CellRange> dataTables) {
    BiffCells cells = new BiffCells(formats, index, dataTables);
    BitSet hiddenRows = new BitSet();
    for (Row row : source) {
      if (((HSSFRow) row).getZeroHeight()) {
        hiddenRows.set(row.getRowNum());
      }
      row.forEach(cells::add);
    }
    if (cells.unreadable() > 0) {
      problems.add(
          "Sheet "
              + source.getSheetName()
              + ": "
              + cells.unreadable()
              + " formulas cannot be read; their stored values stand for them.");
    }
    List<CellRange> merged = source.getMergedRegions().stream().map(r -> range(r, index)).toList();
    return new Sheet(
        source.getSheetName(),
        visibility,
        cells.build(),
        cells.arrays(),
        merged,
        comments(),
        hiddenRows,
        hiddenColumns(),
        List.of());
  }

  static CellRange range(CellRangeAddressBase range, int sheet) {
    return new CellRange(
        sheet,
        range.getFirstRow(),
        range.getFirstColumn(),
        range.getLastRow(),
        range.getLastColumn());
  }

  private BitSet hiddenColumns() {
    BitSet hidden = new BitSet();
    for (int column = 0; column <= SpreadsheetVersion.EXCEL97.getLastColumnIndex(); column++) {
      if (source.isColumnHidden(column)) {
        hidden.set(column);
      }
    }
    return hidden;
  }

  private Map<CellAddress, String> comments() {
    Map<CellAddress, String> comments = new HashMap<>();
    try {
      for (HSSFComment comment : List.copyOf(source.getCellComments().values())) {
        String text = comment.getString() == null ? "" : comment.getString().getString();
        if (!text.isEmpty()) {
          comments.put(new CellAddress(index, comment.getRow(), comment.getColumn()), text);
        }
      }
    } catch (RuntimeException e) {
      problems.add("Sheet " + source.getSheetName() + ": its comments cannot be read.");
    }
    return comments;
  }
}
