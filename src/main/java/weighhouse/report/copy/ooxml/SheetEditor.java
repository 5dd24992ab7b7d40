package weighhouse.report.copy.ooxml;

import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import weighhouse.audit.Figure;
import weighhouse.report.copy.edit.Edits;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/**
 * Rewrites formulas and stored values in the text of one sheet; all other cells stay as they are.
 */
final class SheetEditor {
  private final int sheet;
  private final Edits edits;
  private final Set<CellAddress> arrayMembers = new HashSet<>();
  private final Set<CellAddress> written = new HashSet<>();
  private boolean newFormulaCells;

  SheetEditor(int sheet, Edits edits) {
    this.sheet = sheet;
    this.edits = edits;
  }

  /** The sheet's new text. */
  String edit(String text) {
    SharedFormulas shared = new SharedFormulas(sheet);
    Set<CellAddress> rewritten = new HashSet<>();
    SheetCells.visit(
        text,
        cell -> {
          shared.see(cell);
          noteArray(cell);
          if (rewrites(cell)) {
            rewritten.add(address(cell));
          }
        });
    Map<CellAddress, String> heirs = shared.heirs(rewritten);
    StringBuilder out = new StringBuilder(text.length() + 1024);
    int[] copied = {0};
    SheetCells.visit(
        text,
        cell -> {
          String edited = edited(cell, heirs);
          if (edited != null) {
            out.append(text, copied[0], cell.tag().start()).append(edited);
            copied[0] = cell.end();
          }
        });
    return out.append(text, copied[0], text.length()).toString();
  }

  /** Cells whose formula was replaced. */
  Set<CellAddress> written() {
    return written;
  }

  /** Whether a cell that held a constant now holds a formula. */
  boolean madeNewFormulaCells() {
    return newFormulaCells;
  }

  private void noteArray(SheetCells.Cell cell) {
    if (!cell.is("array") || cell.formula().attribute("ref") == null) {
      return;
    }
    String[] ends = cell.formula().attribute("ref").split(":", -1);
    String last = ends[ends.length - 1];
    int letters = last.replaceAll("[0-9]+$", "").length();
    int lastColumn = A1.column(last.substring(0, letters));
    int lastRow = Integer.parseInt(last.substring(letters)) - 1;
    for (int row = cell.row(); row <= lastRow; row++) {
      for (int column = cell.column(); column <= lastColumn; column++) {
        arrayMembers.add(new CellAddress(sheet, row, column));
      }
    }
    arrayMembers.remove(address(cell));
  }

  private boolean rewrites(SheetCells.Cell cell) {
    return edits.formulas().containsKey(address(cell))
        && !arrayMembers.contains(address(cell))
        && !cell.is("dataTable");
  }

  /** The cell's new text, or null where it stays. */
  private String edited(SheetCells.Cell cell, Map<CellAddress, String> heirs) {
    CellAddress address = address(cell);
    Figure value = edits.values().get(address);
    if (rewrites(cell)) {
      written.add(address);
      newFormulaCells |= cell.formula() == null;
      return cell(cell, formula(cell, edits.formulas().get(address)), value, "");
    }
    String own = cell.formula() == null ? "" : ownFormula(cell);
    if (heirs.containsKey(address)) {
      return cell(cell, heirs.get(address), value, cell.rest());
    }
    boolean calculated = cell.formula() != null || arrayMembers.contains(address);
    return value != null && calculated ? cell(cell, own, value, cell.rest()) : null;
  }

  private static String ownFormula(SheetCells.Cell cell) {
    XmlText.Tag tag = cell.formula();
    return tag.empty() ? tag.raw() : tag.raw() + cell.formulaText() + "</" + tag.name() + ">";
  }

  private static String formula(SheetCells.Cell cell, String text) {
    String name = cell.tag().prefix() + "f";
    String opening = cell.is("array") ? cell.formula().raw().replace("/>", ">") : "<" + name + ">";
    return opening + XmlText.escape(text) + "</" + name + ">";
  }

  /** With the value where one is known, else with what followed the formula. */
  private static String cell(SheetCells.Cell cell, String formula, Figure value, String rest) {
    String prefix = cell.tag().prefix();
    String type = value != null && value.error() != null ? "e" : null;
    boolean keepsType = value == null && !rest.isEmpty();
    String tag = keepsType ? cell.tag().raw() : cell.tag().with("t", type);
    String opening = tag.endsWith("/>") ? tag.substring(0, tag.length() - 2) + ">" : tag;
    String tail = value == null ? rest : "<" + prefix + "v>" + shown(value) + "</" + prefix + "v>";
    return opening + formula + tail + "</" + prefix + "c>";
  }

  private static String shown(Figure value) {
    if (value.error() != null) {
      return value.error();
    }
    String number = Double.toString(value.number());
    return number.endsWith(".0") ? number.substring(0, number.length() - 2) : number;
  }

  private CellAddress address(SheetCells.Cell cell) {
    return new CellAddress(sheet, cell.row(), cell.column());
  }
}
