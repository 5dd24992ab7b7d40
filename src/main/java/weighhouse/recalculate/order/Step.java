package weighhouse.recalculate.order;

import java.util.List;
import weighhouse.recalculate.program.Strip;

/** One step of a plan. */
public sealed interface Step {
  List<Unit> units();

  /**
   * A unit whose cells are calculated strip by strip.
   *
   * @param running whether cells read others of the same unit before them
   */
  record Sweep(Unit unit, boolean running) implements Step {
    @Override
    public List<Unit> units() {
      return List.of(unit);
    }
  }

  /**
   * Units that read each other, cell by cell.
   *
   * @param strips the units' strips
   * @param unitOfStrip for each strip, its unit
   * @param stripOf for each cell in order, its strip's position
   * @param positions for each cell in order, its position on the strip
   * @param circular whether some cell may read itself through others
   */
  @SuppressWarnings("ArrayRecordComponent") // compared nowhere
  record Woven(
      List<Unit> units,
      List<Strip> strips,
      List<Unit> unitOfStrip,
      int[] stripOf,
      int[] positions,
      boolean circular)
      implements Step {}
}
