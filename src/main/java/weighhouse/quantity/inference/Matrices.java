package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import weighhouse.quantity.Kind;
import weighhouse.workbook.A1;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/**
 * Recognises matrices of transition probabilities: squares of numbers from 0 to 1 whose rows and
 * columns carry the same names of states, and most of whose rows sum to 1.
 */
final class Matrices {
  private static final int MOST_STATES = 16;
  private static final double ROUNDING = 1e-3;

  private final Workbook workbook;
  private final Units units;
  private final ToDoubleFunction<CellAddress> numbers;

  Matrices(Workbook workbook, Units units, ToDoubleFunction<CellAddress> numbers) {
    this.workbook = workbook;
    this.units = units;
    this.numbers = numbers;
  }

  void mark() {
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      CellStore cells = workbook.sheet(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        if (cells.kind(i) == CellKind.TEXT) {
          corner(new CellAddress(sheet, cells.row(i), cells.column(i)));
        }
      }
    }
  }

  /** Looks for a matrix whose first row is labelled by the text in this cell. */
  private void corner(CellAddress label) {
    List<String> down = texts(label, 1, 0);
    if (label.row() == 0 || down.size() < 2 || text(label.offset(-1, 1)) == null) {
      return;
    }
    List<String> across = texts(label.offset(-1, 1), 0, 1);
    int states = 0;
    while (states < Math.min(down.size(), across.size())
        && down.get(states).equalsIgnoreCase(across.get(states))) {
      states++;
    }
    CellAddress first = label.offset(0, 1);
    if (states > 1 && isStochastic(first, states)) {
      settle(first, states);
    }
  }

  private List<String> texts(CellAddress from, int down, int across) {
    List<String> texts = new ArrayList<>();
    String text = text(from);
    while (text != null && texts.size() < MOST_STATES) {
      texts.add(text.strip());
      text = text(from.offset(down * texts.size(), across * texts.size()));
    }
    return texts;
  }

  private String text(CellAddress cell) {
    CellStore cells = workbook.sheet(cell.sheet()).cells();
    int index = cells.find(cell.row(), cell.column());
    return index >= 0 && cells.kind(index) == CellKind.TEXT ? cells.text(index) : null;
  }

  private boolean isStochastic(CellAddress first, int states) {
    int whole = 0;
    for (int row = 0; row < states; row++) {
      double sum = 0;
      for (int column = 0; column < states; column++) {
        double number = numbers.applyAsDouble(first.offset(row, column));
        if (number < 0 || number > 1 + ROUNDING) {
          return false;
        }
        sum += Double.isNaN(number) ? 0 : number;
      }
      whole += Math.abs(sum - 1) < ROUNDING ? 1 : 0;
    }
    return 2 * whole >= states;
  }

  private void settle(CellAddress first, int states) {
    CellAddress last = first.offset(states - 1, states - 1);
    CellRange matrix =
        new CellRange(first.sheet(), first.row(), first.column(), last.row(), last.column());
    String where = A1.cell(first.row(), first.column()) + ":" + A1.cell(last.row(), last.column());
    for (Unit unit : units.in(matrix, states * states)) {
      if (unit.structural == Kind.UNKNOWN && matrix.contains(unit.range.last())) {
        unit.structural = Kind.PROBABILITY;
        unit.structure = where + " is a matrix from states to states whose rows sum to 1";
      }
    }
  }
}
