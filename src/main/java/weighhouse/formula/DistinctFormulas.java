package weighhouse.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** The distinct formulas of all sheets, each parsed once. */
final class DistinctFormulas {
  /** A formula as written in one cell. */
  private record Written(String text, CellAddress host, boolean array) {}

  /** What came of it: either is null. */
  private record Outcome(ParsedFormula parsed, String reason) {}

  private final KeyTable table = new KeyTable();
  private final List<Written> written = new ArrayList<>();
  private final int[][] numbers;
  private List<Outcome> outcomes = List.of();
  private int[] shapes = {};

  DistinctFormulas(Workbook workbook, List<SheetKeys> sheets) {
    numbers = new int[sheets.size()][];
    for (int sheet = 0; sheet < numbers.length; sheet++) {
      SheetKeys keys = sheets.get(sheet);
      CellStore cells = workbook.sheet(sheet).cells();
      numbers[sheet] = new int[keys.table.size()];
      for (int i = 0; i < numbers[sheet].length; i++) {
        char[] key = keys.table.key(i);
        int number = table.add(key, key.length);
        numbers[sheet][i] = number;
        if (number == written.size()) {
          written.add(written(sheet, cells, keys.firstCells.get(i)));
        }
      }
    }
  }

  private static Written written(int sheet, CellStore cells, int cell) {
    CellAddress host = new CellAddress(sheet, cells.anchorRow(cell), cells.anchorColumn(cell));
    return new Written(cells.formula(cell), host, SheetKeys.isArray(cells.role(cell)));
  }

  /** Parses all and adds those that are formulas to {@code into}. */
  void parse(int parallelFrom, List<Shape> into) {
    IntStream all = IntStream.range(0, written.size());
    outcomes =
        (written.size() >= parallelFrom ? all.parallel() : all)
            .mapToObj(i -> parse(written.get(i)))
            .toList();
    shapes = new int[written.size()];
    for (int i = 0; i < shapes.length; i++) {
      ParsedFormula parsed = outcomes.get(i).parsed();
      shapes[i] = parsed == null ? SheetKeys.NONE : into.size();
      if (parsed != null) {
        into.add(new Shape(into.size(), parsed, written.get(i).host(), written.get(i).array()));
      }
    }
  }

  private static Outcome parse(Written formula) {
    try {
      CellAddress host = formula.host();
      return new Outcome(FormulaParser.parse(formula.text(), host.row(), host.column()), null);
    } catch (FormulaSyntaxException e) {
      return new Outcome(null, e.getMessage() + " at character " + (e.position() + 1));
    }
  }

  /** The formula's number over all sheets. */
  int number(int sheet, int key) {
    return numbers[sheet][key];
  }

  /** Its shape, or -1 if it could not be parsed. */
  int shape(int number) {
    return shapes[number];
  }

  String reason(int number) {
    return outcomes.get(number).reason();
  }
}
