package weighhouse.rules.check;

import java.util.ArrayList;
import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Numbers of one kind along time, in a column or a row.
 *
 * @param cells the cells
 * @param down whether it is a column
 */
public record Line(CellRange cells, boolean down) {
  private static final int SHORTEST = 4;
  private static final int LONGEST = 20_000;
  private static final int MOST_BESIDE = 200;

  /** All lines of a kind, those side by side one by one. */
  public static List<Line> of(Kind kind, Survey survey) {
    List<Line> lines = new ArrayList<>();
    for (CellRange range : survey.subject().quantities().ranges()) {
      var quantity = survey.subject().quantities().at(range.first());
      if (quantity.kind() == kind && quantity.role() == Role.ESTIMATE) {
        addLines(range, lines);
      }
    }
    return lines;
  }

  private static void addLines(CellRange range, List<Line> lines) {
    boolean down = range.rows() >= range.columns();
    int length = down ? range.rows() : range.columns();
    int beside = down ? range.columns() : range.rows();
    if (length < SHORTEST || length > LONGEST || beside > MOST_BESIDE) {
      return;
    }
    for (int i = 0; i < beside; i++) {
      CellAddress first = down ? range.first().offset(0, i) : range.first().offset(i, 0);
      CellAddress last = first.offset(down ? length - 1 : 0, down ? 0 : length - 1);
      CellRange cells =
          new CellRange(range.sheet(), first.row(), first.column(), last.row(), last.column());
      lines.add(new Line(cells, down));
    }
  }

  public int length() {
    return (int) cells.size();
  }

  public CellAddress at(int index) {
    return down ? cells.first().offset(index, 0) : cells.first().offset(0, index);
  }

  /** The present values. */
  public double[] values(Survey survey) {
    double[] values = new double[length()];
    for (int i = 0; i < values.length; i++) {
      values[i] = survey.base().number(at(i));
    }
    return values;
  }

  /** Whether the other covers the same times on the same sheet. */
  public boolean isBeside(Line other) {
    return !equals(other)
        && cells.sheet() == other.cells.sheet()
        && down == other.down
        && length() == other.length()
        && (down
            ? cells.firstRow() == other.cells.firstRow()
            : cells.firstColumn() == other.cells.firstColumn());
  }

  /** What the workbook calls it, in small letters. */
  public String caption(Captions captions) {
    return captions.ofLine(cells.first(), down);
  }
}
