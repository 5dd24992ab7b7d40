package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import weighhouse.formula.ShapeIndex;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Quantity;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.CellsBuilder;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/**
 * A small workbook: rows of cells between bars, {@code "Hazard ratio | 0.7"}. A cell is a formula
 * after an equals sign (with its value after {@code ->}), a number, a text, or blank.
 */
final class Sheets {
  private final List<String> titles = new ArrayList<>();
  private final List<TreeMap<CellAddress, String>> cells = new ArrayList<>();
  private final List<DefinedName> names = new ArrayList<>();
  private final Map<CellAddress, String> comments = new HashMap<>();
  private final List<CellRange> merged = new ArrayList<>();

  /** A workbook of one sheet whose words say that it is a health-economic model. */
  static Sheets model(String... rows) {
    return new Sheets()
        .sheet("About", "Markov model of patients with stable disease; QALYs")
        .sheet("S", rows);
  }

  Sheets sheet(String title, String... rows) {
    titles.add(title);
    cells.add(new TreeMap<>());
    for (int row = 0; row < rows.length; row++) {
      String[] columns = rows[row].split("\\|", -1);
      for (int column = 0; column < columns.length; column++) {
        if (!columns[column].isBlank()) {
          here().put(new CellAddress(titles.size() - 1, row, column), columns[column].strip());
        }
      }
    }
    return this;
  }

  private Map<CellAddress, String> here() {
    return cells.get(cells.size() - 1);
  }

  Sheets name(String name, String refersTo) {
    names.add(new DefinedName(name, DefinedName.WORKBOOK_SCOPE, refersTo, false, ""));
    return this;
  }

  Sheets comment(String a1, String text) {
    comments.put(cell(titles.size() - 1, a1), text);
    return this;
  }

  Sheets merge(String first, String last) {
    CellAddress from = cell(titles.size() - 1, first);
    CellAddress to = cell(titles.size() - 1, last);
    merged.add(new CellRange(from.sheet(), from.row(), from.column(), to.row(), to.column()));
    return this;
  }

  static CellAddress cell(int sheet, String a1) {
    String letters = a1.replaceAll("[0-9]", "");
    int row = Integer.parseInt(a1.substring(letters.length())) - 1;
    return new CellAddress(sheet, row, A1.column(letters));
  }

  Workbook build() {
    List<Sheet> sheets = new ArrayList<>();
    for (int i = 0; i < titles.size(); i++) {
      int sheet = i;
      Map<CellAddress, String> own = new HashMap<>(comments);
      own.keySet().removeIf(cell -> cell.sheet() != sheet);
      sheets.add(
          new Sheet(
              titles.get(i),
              Visibility.VISIBLE,
              store(cells.get(i)),
              List.of(),
              merged.stream().filter(range -> range.sheet() == sheet).toList(),
              own,
              new BitSet(),
              new BitSet(),
              List.of()));
    }
    return new Workbook("test.xlsx", "", sheets, names, false, List.of(), List.of(), List.of());
  }

  private static CellStore store(Map<CellAddress, String> cells) {
    CellsBuilder builder = new CellsBuilder();
    cells.forEach(
        (cell, content) -> {
          builder.begin(cell.row(), cell.column(), 0);
          put(builder, content);
          builder.end();
        });
    return builder.build();
  }

  private static void put(CellsBuilder builder, String content) {
    if (content.startsWith("=")) {
      String[] parts = content.substring(1).split("->", 2);
      builder.formula(parts[0].strip());
      if (parts.length > 1) {
        builder.number(Double.parseDouble(parts[1].strip()));
      }
    } else if (content.matches("-?[0-9.]+([eE]-?[0-9]+)?")) {
      builder.number(Double.parseDouble(content));
    } else {
      builder.text(content);
    }
  }

  /** The quantities inferred from it. */
  Quantities infer() {
    return infer(Declarations.NONE);
  }

  Quantities infer(Declarations declarations) {
    Workbook workbook = build();
    return Inference.infer(
        workbook, ShapeIndex.of(workbook), cell -> number(workbook, cell), declarations);
  }

  private static double number(Workbook workbook, CellAddress cell) {
    CellStore cells = workbook.sheet(cell.sheet()).cells();
    int index = cells.find(cell.row(), cell.column());
    return index < 0 ? Double.NaN : cells.number(index);
  }

  /** The quantity of a cell on the last sheet. */
  Quantity at(String a1) {
    return infer().at(cell(titles.size() - 1, a1));
  }
}
