package weighhouse.recalculate.cells;

import java.util.List;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.functions.Grid;

/** Several rectangles one below the other, as unions and 3-D references are read. */
public record JoinedGrid(List<Grid> parts) implements Grid {
  @Override
  public int rows() {
    return parts.stream().mapToInt(Grid::usedRows).sum();
  }

  @Override
  public int columns() {
    return parts.stream().mapToInt(Grid::usedColumns).max().orElse(0);
  }

  @Override
  public Value at(int row, int column) {
    int rest = row;
    for (Grid part : parts) {
      if (rest < part.usedRows()) {
        return column < part.usedColumns() ? part.at(rest, column) : new Value.Blank();
      }
      rest -= part.usedRows();
    }
    return new Value.Blank();
  }
}
