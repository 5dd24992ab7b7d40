package weighhouse.recalculate.engine;

import java.util.Arrays;
import java.util.Map;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.recalculate.cells.CellState;
import weighhouse.recalculate.cells.Layout;
import weighhouse.workbook.CellAddress;

/**
 * Values after a calculation: those of the workbook as it is, and over them the stretches of slots
 * that came out otherwise.
 */
final class CalculatedValues implements Values {
  private final Layout layout;
  private final CellState base;
  private final int[] from;
  private final CellState[] pieces;

  /** Cells that have no slot. */
  private final Map<CellAddress, Value> beside;

  CalculatedValues(
      Layout layout,
      CellState base,
      int[] from,
      CellState[] pieces,
      Map<CellAddress, Value> beside) {
    this.layout = layout;
    this.base = base;
    this.from = from;
    this.pieces = pieces;
    this.beside = Map.copyOf(beside);
  }

  @Override
  public Value at(CellAddress cell) {
    int slot = slot(cell);
    if (slot == Layout.NOWHERE) {
      return beside.getOrDefault(cell, new Value.Blank());
    }
    int piece = piece(slot);
    return piece < 0 ? base.get(slot) : pieces[piece].get(slot - from[piece]);
  }

  @Override
  public double number(CellAddress cell) {
    int slot = slot(cell);
    if (slot == Layout.NOWHERE) {
      return at(cell).number();
    }
    int piece = piece(slot);
    return piece < 0 ? base.numbers[slot] : pieces[piece].numbers[slot - from[piece]];
  }

  private int slot(CellAddress cell) {
    return layout.slot(cell.sheet(), cell.row(), cell.column());
  }

  private int piece(int slot) {
    int at = Arrays.binarySearch(from, slot);
    int piece = at >= 0 ? at : -at - 2;
    return piece >= 0 && slot < from[piece] + pieces[piece].size() ? piece : -1;
  }

  /** Puts these values into a state that holds the base. */
  void putInto(CellState state, Runner.Touched touched) {
    for (int i = 0; i < pieces.length; i++) {
      touched.slots(from[i], from[i] + pieces[i].size());
      state.take(pieces[i], 0, from[i], pieces[i].size());
    }
  }
}
