package weighhouse.formula;

import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.FormulaRole;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/**
 * Measures how long it takes to find the shapes of many formulas: {@code ShapeSpeed [formulas]
 * [distinct shapes per 100 formulas]}. Prints figures, asserts nothing.
 */
public final class ShapeSpeed {
  private static final int COLUMNS = 100;

  private ShapeSpeed() {}

  public static void main(String[] args) {
    int formulas = args.length > 0 ? Integer.parseInt(args[0]) : 1_000_000;
    boolean filled = args.length < 2 || Integer.parseInt(args[1]) == 0;
    long start = System.nanoTime();
    time("first parse, start-up included", () -> parseOne());
    String[] texts = new String[formulas];
    for (int i = 0; i < formulas; i++) {
      texts[i] = text(i / COLUMNS + 1, i % COLUMNS, filled);
    }
    Workbook workbook = workbook(texts);
    System.out.printf(Locale.ROOT, "prepared in %.2f s%n", (System.nanoTime() - start) / 1e9);
    for (int round = 0; round < 4; round++) {
      time(
          formulas + " formulas, " + (filled ? "filled" : "all different"),
          () -> ShapeIndex.of(workbook).all().size() + " shapes");
    }
  }

  private static String parseOne() {
    try {
      return FormulaParser.parse("1-EXP(-Rates!$C$7*cycle)", 0, 0).text();
    } catch (FormulaSyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  private static void time(String what, java.util.function.Supplier<String> work) {
    long start = System.nanoTime();
    String result = work.get();
    System.out.printf(
        Locale.ROOT, "%s: %.3f s (%s)%n", what, (System.nanoTime() - start) / 1e9, result);
  }

  private static String text(int row, int column, boolean filled) {
    String left = A1.cell(row - 1, column + 1);
    String above = A1.cell(row, column);
    String other = filled ? "$C$7" : A1.cell((row * 7919 + column * 31) % 99991, column + 3);
    return switch (column % 4) {
      case 0 -> left + "*(1-Inputs!" + other + ")+" + above + "*'Rates 2'!$D$" + (column + 9);
      case 1 -> "1-EXP(-" + left + "*" + other + "/12)";
      case 2 -> "IF($A" + row + ">" + other + ",SUM(" + left + ":" + above + "),0)";
      default -> left + "*" + other;
    };
  }

  private static Workbook workbook(String[] texts) {
    Sheet sheet =
        new Sheet(
            "S",
            Visibility.VISIBLE,
            new Rows(texts),
            List.of(),
            List.of(),
            Map.of(),
            new BitSet(),
            new BitSet(),
            List.of());
    return new Workbook(
        "speed.xlsx", "", List.of(sheet), List.of(), false, List.of(), List.of(), List.of());
  }

  /** Formulas in full rows. */
  private record Rows(List<String> texts) implements CellStore {
    Rows(String[] texts) {
      this(List.of(texts));
    }

    @Override
    public int size() {
      return texts.size();
    }

    @Override
    public int find(int row, int column) {
      int index = row * COLUMNS + column;
      return column < COLUMNS && index < size() ? index : -1;
    }

    @Override
    public int row(int index) {
      return index / COLUMNS;
    }

    @Override
    public int column(int index) {
      return index % COLUMNS;
    }

    @Override
    public CellKind kind(int index) {
      return CellKind.NUMBER;
    }

    @Override
    public double number(int index) {
      return 0;
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
      return FormulaRole.PLAIN;
    }

    @Override
    public String formula(int index) {
      return texts.get(index);
    }

    @Override
    public int anchorRow(int index) {
      return row(index);
    }

    @Override
    public int anchorColumn(int index) {
      return column(index);
    }

    @Override
    public int firstOfRow(int row) {
      return Math.min(size(), row * COLUMNS);
    }

    @Override
    public int rows() {
      return (size() + COLUMNS - 1) / COLUMNS;
    }

    @Override
    public int columns() {
      return COLUMNS;
    }
  }
}
