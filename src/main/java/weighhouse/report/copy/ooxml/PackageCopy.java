package weighhouse.report.copy.ooxml;

import java.io.IOException;
import java.io.OutputStream;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.CellAddress;

/** Writes an .xlsx or .xlsm with some cells changed; untouched parts keep their bytes. */
public final class PackageCopy {
  private final Parts parts;
  private final WorkbookPart workbook;
  private final Edits edits;
  private final Set<CellAddress> written = new HashSet<>();

  private PackageCopy(byte[] file, Edits edits) throws IOException {
    this.parts = Parts.read(file);
    this.workbook = new WorkbookPart(parts);
    this.edits = edits;
  }

  /**
   * Writes the copy.
   *
   * @return cells whose formula was replaced; members of an array formula and of data tables are
   *     not
   */
  public static Set<CellAddress> write(byte[] file, Edits edits, OutputStream out)
      throws IOException {
    PackageCopy copy = new PackageCopy(file, edits);
    copy.edit();
    copy.parts.write(out);
    return copy.written;
  }

  private void edit() {
    List<String> sheets = edits.sheets();
    boolean newFormulaCells = false;
    for (int sheet = 0; sheet < sheets.size(); sheet++) {
      String part = workbook.sheet(sheets.get(sheet));
      if (touches(sheet)) {
        SheetEditor editor = new SheetEditor(sheet, edits);
        parts.put(part, editor.edit(parts.text(part)));
        written.addAll(editor.written());
        newFormulaCells |= editor.madeNewFormulaCells();
      }
      Map<CellAddress, String> comments = comments(sheet);
      if (!comments.isEmpty()) {
        new SheetComments(parts, part).add(comments, workbook.relations().typeBase());
      }
    }
    String review = parts.free("xl/worksheets/weighhouse", ".xml");
    parts.put(review, ReviewSheet.text(edits.review()));
    new Types(parts).declare(review, "worksheet");
    workbook.addSheet(Edits.REVIEW_SHEET, review);
    if (!edits.formulas().isEmpty()) {
      workbook.recalculateOnLoad();
    }
    if (newFormulaCells) {
      workbook.forgetOrder();
    }
  }

  private boolean touches(int sheet) {
    return edits.formulas().keySet().stream().anyMatch(cell -> cell.sheet() == sheet)
        || edits.values().keySet().stream().anyMatch(cell -> cell.sheet() == sheet);
  }

  private Map<CellAddress, String> comments(int sheet) {
    Map<CellAddress, String> own = new TreeMap<>();
    edits
        .comments()
        .forEach(
            (cell, text) -> {
              if (cell.sheet() == sheet) {
                own.put(cell, text);
              }
            });
    return own;
  }
}
