package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.List;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/**
 * The texts that a reader of a cell has before the eyes: beside it and at the head of its column.
 */
public final class NearbyTexts {
  private static final int ACROSS = 10;
  private static final int UP = 60;
  private static final int HEADING_ROWS = 3;

  private final Workbook workbook;

  public NearbyTexts(Workbook workbook) {
    this.workbook = workbook;
  }

  /** Left, right, then upwards. */
  public List<String> of(CellAddress cell) {
    List<String> texts = new ArrayList<>();
    beside(cell, texts);
    above(cell, texts);
    return texts;
  }

  /** The nearest text on either side. */
  public void beside(CellAddress cell, List<String> texts) {
    for (int sign : new int[] {-1, 1}) {
      for (int step = 1; step <= ACROSS; step++) {
        if (add(cell.sheet(), cell.row(), cell.column() + sign * step, texts)) {
          break;
        }
      }
    }
  }

  /** The nearest text upwards, with those that stand right over it. */
  public void above(CellAddress cell, List<String> texts) {
    int first = -1;
    for (int row = cell.row() - 1; row >= Math.max(0, cell.row() - UP); row--) {
      boolean told = add(cell.sheet(), row, cell.column(), texts);
      if (told && first < 0) {
        first = row;
      }
      if (first >= 0 && (!told || first - row >= HEADING_ROWS - 1)) {
        return;
      }
    }
  }

  private boolean add(int sheet, int row, int column, List<String> texts) {
    if (row < 0 || column < 0) {
      return false;
    }
    CellStore cells = workbook.sheet(sheet).cells();
    int index = cells.find(row, column);
    boolean text = index >= 0 && cells.kind(index) == CellKind.TEXT && !cells.text(index).isBlank();
    if (text) {
      texts.add(cells.text(index));
    }
    return text;
  }
}
