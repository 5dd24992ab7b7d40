package weighhouse.formula;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.FormulaRole;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/** A small workbook of formulas and numbers, put together cell by cell. */
final class FormulaGrid {
  private record Cell(String formula, double number, FormulaRole role, int row, int column) {}

  private final List<String> sheetNames = new ArrayList<>();
  private final List<TreeMap<CellAddress, Cell>> sheets = new ArrayList<>();
  private final List<List<CellRange>> arrays = new ArrayList<>();
  private final List<DefinedName> names = new ArrayList<>();

  static CellAddress cell(int sheet, String a1) {
    String letters = a1.replaceAll("[0-9]", "");
    return new CellAddress(
        sheet, Integer.parseInt(a1.substring(letters.length())) - 1, A1.column(letters));
  }

  FormulaGrid sheet(String name) {
    sheetNames.add(name);
    sheets.add(new TreeMap<>());
    arrays.add(new ArrayList<>());
    return this;
  }

  FormulaGrid formula(String a1, String text) {
    CellAddress at = here(a1);
    return put(at, new Cell(text, Double.NaN, FormulaRole.PLAIN, at.row(), at.column()));
  }

  FormulaGrid number(String a1, double number) {
    CellAddress at = here(a1);
    return put(at, new Cell(null, number, FormulaRole.NONE, at.row(), at.column()));
  }

  /** A member of the shared formula that is written for the anchor. */
  FormulaGrid shared(String a1, String anchor, String text) {
    CellAddress written = here(anchor);
    return put(
        here(a1), new Cell(text, Double.NaN, FormulaRole.PLAIN, written.row(), written.column()));
  }

  FormulaGrid array(String first, String last, String text) {
    CellAddress from = here(first);
    CellAddress to = here(last);
    for (int row = from.row(); row <= to.row(); row++) {
      for (int column = from.column(); column <= to.column(); column++) {
        CellAddress at = new CellAddress(from.sheet(), row, column);
        FormulaRole role = at.equals(from) ? FormulaRole.ARRAY_ANCHOR : FormulaRole.ARRAY_MEMBER;
        put(at, new Cell(text, Double.NaN, role, from.row(), from.column()));
      }
    }
    arrays
        .get(from.sheet())
        .add(new CellRange(from.sheet(), from.row(), from.column(), to.row(), to.column()));
    return this;
  }

  FormulaGrid name(String name, int scope, String formula) {
    names.add(new DefinedName(name, scope, formula, false, ""));
    return this;
  }

  Workbook build() {
    List<Sheet> built = new ArrayList<>();
    for (int i = 0; i < sheets.size(); i++) {
      built.add(
          new Sheet(
              sheetNames.get(i),
              Visibility.VISIBLE,
              new Cells(sheets.get(i)),
              arrays.get(i),
              List.of(),
              Map.of(),
              new BitSet(),
              new BitSet(),
              List.of()));
    }
    return new Workbook("test.xlsx", "", built, names, false, List.of(), List.of(), List.of());
  }

  private CellAddress here(String a1) {
    return cell(sheets.size() - 1, a1);
  }

  private FormulaGrid put(CellAddress at, Cell cell) {
    sheets.get(at.sheet()).put(at, cell);
    return this;
  }

  private static final class Cells implements CellStore {
    private final List<CellAddress> addresses;
    private final List<Cell> cells;

    Cells(Map<CellAddress, Cell> cells) {
      addresses = List.copyOf(cells.keySet());
      this.cells = List.copyOf(cells.values());
    }

    @Override
    public int size() {
      return cells.size();
    }

    @Override
    public int find(int row, int column) {
      for (int i = 0; i < size(); i++) {
        if (row(i) == row && column(i) == column) {
          return i;
        }
      }
      return -1;
    }

    @Override
    public int row(int index) {
      return addresses.get(index).row();
    }

    @Override
    public int column(int index) {
      return addresses.get(index).column();
    }

    @Override
    public CellKind kind(int index) {
      return hasFormula(index) ? CellKind.BLANK : CellKind.NUMBER;
    }

    @Override
    public double number(int index) {
      return cells.get(index).number();
    }

    @Override
    public String text(int index) {
      return null;
    }

    @Override
    public String numberFormat(int index) {
      return "General";
    }

    @Override
    public FormulaRole role(int index) {
      return cells.get(index).role();
    }

    @Override
    public String formula(int index) {
      return cells.get(index).formula();
    }

    @Override
    public int anchorRow(int index) {
      return cells.get(index).row();
    }

    @Override
    public int anchorColumn(int index) {
      return cells.get(index).column();
    }

    @Override
    public int firstOfRow(int row) {
      int index = 0;
      while (index < size() && row(index) < row) {
        index++;
      }
      return index;
    }

    @Override
    public int rows() {
      return size() == 0 ? 0 : row(size() - 1) + 1;
    }

    @Override
    public int columns() {
      return addresses.stream().mapToInt(CellAddress::column).max().orElse(-1) + 1;
    }
  }
}
