package weighhouse.report.copy.biff;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.apache.poi.common.usermodel.HyperlinkType;
import org.apache.poi.hssf.usermodel.HSSFCell;
import org.apache.poi.hssf.usermodel.HSSFCreationHelper;
import org.apache.poi.hssf.usermodel.HSSFHyperlink;
import org.apache.poi.hssf.usermodel.HSSFPatriarch;
import org.apache.poi.hssf.usermodel.HSSFRichTextString;
import org.apache.poi.hssf.usermodel.HSSFRow;
import org.apache.poi.hssf.usermodel.HSSFSheet;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import org.apache.poi.ss.usermodel.Comment;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.CellAddress;

/** Writes an .xls with some cells changed. Excel calculates it anew when it opens it. */
public final class XlsCopy {
  private static final int CONTENT_LIMIT = 32_767;

  private final HSSFWorkbook workbook;
  private final Edits edits;
  private final Set<CellAddress> written = new HashSet<>();

  private XlsCopy(HSSFWorkbook workbook, Edits edits) {
    this.workbook = workbook;
    this.edits = edits;
  }

  /**
   * Writes the copy.
   *
   * @return cells whose formula was replaced; members of an array formula are not
   */
  public static Set<CellAddress> write(byte[] file, Edits edits, OutputStream out)
      throws IOException {
    try (POIFSFileSystem files = new POIFSFileSystem(new ByteArrayInputStream(file));
        HSSFWorkbook workbook = new HSSFWorkbook(files, true)) {
      XlsCopy copy = new XlsCopy(workbook, edits);
      edits.formulas().forEach(copy::formula);
      edits.comments().forEach(copy::comment);
      copy.review();
      workbook.setForceFormulaRecalculation(true);
      workbook.write(out);
      return copy.written;
    }
  }

  private void formula(CellAddress address, String formula) {
    HSSFCell cell = cell(address);
    if (cell != null && !cell.isPartOfArrayFormulaGroup()) {
      cell.setCellFormula(Signs.guarded(formula, address));
      written.add(address);
    }
  }

  private void comment(CellAddress address, String text) {
    HSSFCell cell = cell(address);
    if (cell == null) {
      return;
    }
    Comment present = cell.getCellComment();
    if (present != null) {
      present.setString(new HSSFRichTextString(present.getString().getString() + "\n\n" + text));
      return;
    }
    HSSFPatriarch drawing = cell.getSheet().createDrawingPatriarch();
    HSSFCreationHelper helper = workbook.getCreationHelper();
    var anchor = helper.createClientAnchor();
    anchor.setCol1(address.column() + 1);
    anchor.setCol2(address.column() + 6);
    anchor.setRow1(address.row());
    anchor.setRow2(address.row() + 7);
    Comment comment = drawing.createCellComment(anchor);
    comment.setString(new HSSFRichTextString(text));
    comment.setAuthor(Edits.AUTHOR);
    cell.setCellComment(comment);
  }

  private HSSFCell cell(CellAddress address) {
    HSSFRow row = workbook.getSheet(edits.sheets().get(address.sheet())).getRow(address.row());
    return row == null ? null : row.getCell(address.column());
  }

  private void review() {
    HSSFSheet sheet = workbook.createSheet(freeName());
    for (int i = 0; i < edits.review().size(); i++) {
      Edits.ReviewRow content = edits.review().get(i);
      HSSFRow row = sheet.createRow(i);
      List<Object> cells = content.cells();
      for (int column = 0; column < cells.size(); column++) {
        fill(row.createCell(column), cells.get(column));
      }
      if (content.link() != null) {
        HSSFHyperlink link = workbook.getCreationHelper().createHyperlink(HyperlinkType.DOCUMENT);
        link.setAddress(content.link());
        row.getCell(1).setHyperlink(link);
      }
    }
  }

  private static void fill(HSSFCell cell, Object content) {
    if (content instanceof Double number && Double.isFinite(number)) {
      cell.setCellValue(number);
    } else {
      String text = content.toString();
      cell.setCellValue(text.substring(0, Math.min(text.length(), CONTENT_LIMIT)));
    }
  }

  private String freeName() {
    String name = Edits.REVIEW_SHEET;
    for (int i = 2; workbook.getSheet(name) != null; i++) {
      name = Edits.REVIEW_SHEET + " " + i;
    }
    return name;
  }
}
