package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.Region;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** Formulas that stand where a formula beside them would have been filled. */
final class Siblings {
  private final Survey survey;

  Siblings(Survey survey) {
    this.survey = survey;
  }

  /**
   * What follows on a region in one direction over its full width.
   *
   * @param regular the region
   * @param odd the cells after it
   * @param between whether the region's formula goes on behind them
   * @param forward whether they lie below or to the right
   * @param lengthwise whether they lie in the direction of the region's longer side
   */
  record Pair(
      Region regular, CellRange odd, boolean between, boolean forward, boolean lengthwise) {}

  private enum Side {
    BELOW(true, true),
    ABOVE(true, false),
    RIGHT(false, true),
    LEFT(false, false);

    private final boolean vertical;
    private final boolean forward;

    Side(boolean vertical, boolean forward) {
      this.vertical = vertical;
      this.forward = forward;
    }

    /** The cell of the next row or column in line with the range's first cell. */
    CellAddress next(CellRange range) {
      int step = forward ? 1 : -1;
      int row = forward ? range.lastRow() : range.firstRow();
      int column = forward ? range.lastColumn() : range.firstColumn();
      return vertical
          ? new CellAddress(range.sheet(), row + step, range.firstColumn())
          : new CellAddress(range.sheet(), range.firstRow(), column + step);
    }

    boolean sameWidth(CellRange a, CellRange b) {
      return vertical
          ? a.firstColumn() == b.firstColumn() && a.lastColumn() == b.lastColumn()
          : a.firstRow() == b.firstRow() && a.lastRow() == b.lastRow();
    }
  }

  /** What adjoins a region on its four sides. */
  List<Pair> of(Region region) {
    List<Pair> pairs = new ArrayList<>();
    for (Side side : Side.values()) {
      CellRange odd = following(region.range(), side);
      if (odd != null) {
        boolean between = continues(region, odd, side);
        if (!between || side.forward) {
          boolean lengthwise = side.vertical == region.range().rows() >= region.range().columns();
          pairs.add(new Pair(region, odd, between, side.forward, lengthwise));
        }
      }
    }
    return pairs;
  }

  /** A region of the same width, or one typed number, next to the range. */
  private CellRange following(CellRange range, Side side) {
    CellAddress next = side.next(range);
    if (next.row() < 0 || next.column() < 0) {
      return null;
    }
    Region region = survey.subject().shapes().regionAt(next);
    CellRange odd =
        region != null ? region.range() : survey.isTyped(next) ? CellRange.of(next) : null;
    return odd != null && side.sameWidth(range, odd) ? odd : null;
  }

  private boolean continues(Region region, CellRange odd, Side side) {
    CellAddress beyond = side.next(odd);
    if (beyond.row() < 0 || beyond.column() < 0) {
      return false;
    }
    Region other = survey.subject().shapes().regionAt(beyond);
    return other != null && other.shape() == region.shape() && side.sameWidth(odd, other.range());
  }
}
