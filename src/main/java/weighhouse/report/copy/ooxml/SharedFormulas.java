package weighhouse.report.copy.ooxml;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;

/**
 * Formulas that several cells share. Where the cell that holds the text is rewritten, the first
 * cell of the rest must take it over.
 */
final class SharedFormulas {
  private static final class Group {
    private SheetCells.Cell master;
    private final List<SheetCells.Cell> members = new ArrayList<>();
  }

  private final int sheet;
  private final Map<String, Group> groups = new HashMap<>();

  SharedFormulas(int sheet) {
    this.sheet = sheet;
  }

  void see(SheetCells.Cell cell) {
    if (!cell.is("shared")) {
      return;
    }
    Group group = groups.computeIfAbsent(cell.formula().attribute("si"), si -> new Group());
    if (!cell.formulaText().isEmpty() && group.master == null) {
      group.master = cell;
    } else {
      group.members.add(cell);
    }
  }

  /** Formula elements of the cells that take a text over, by cell. */
  Map<CellAddress, String> heirs(Set<CellAddress> rewritten) {
    Map<CellAddress, String> heirs = new HashMap<>();
    groups.forEach(
        (si, group) -> {
          if (group.master != null && rewritten.contains(address(group.master))) {
            List<SheetCells.Cell> left =
                group.members.stream().filter(cell -> !rewritten.contains(address(cell))).toList();
            if (!left.isEmpty()) {
              heirs.put(address(left.get(0)), element(si, group.master, left));
            }
          }
        });
    return heirs;
  }

  private static String element(String si, SheetCells.Cell master, List<SheetCells.Cell> left) {
    SheetCells.Cell heir = left.get(0);
    String range =
        A1.cell(
                left.stream().mapToInt(SheetCells.Cell::row).min().orElseThrow(),
                left.stream().mapToInt(SheetCells.Cell::column).min().orElseThrow())
            + ":"
            + A1.cell(
                left.stream().mapToInt(SheetCells.Cell::row).max().orElseThrow(),
                left.stream().mapToInt(SheetCells.Cell::column).max().orElseThrow());
    String name = heir.formula().name();
    return "<%s t=\"shared\" ref=\"%s\" si=\"%s\">%s</%s>"
        .formatted(name, range, si, XmlText.escape(moved(master, heir)), name);
  }

  private static String moved(SheetCells.Cell master, SheetCells.Cell heir) {
    String text = XmlText.unescape(master.formulaText());
    try {
      var parsed = FormulaParser.parse(text, master.row(), master.column());
      return FormulaPrinter.print(parsed.tree(), heir.row(), heir.column());
    } catch (FormulaSyntaxException e) {
      // a formula that was corrected has been parsed before
      throw new IllegalStateException(text, e);
    }
  }

  private CellAddress address(SheetCells.Cell cell) {
    return new CellAddress(sheet, cell.row(), cell.column());
  }
}
