package weighhouse.report.compare;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import weighhouse.audit.Figure;

/** Pairs the figures of two workbooks. */
final class Moves {
  private static final double SAME = 1e-12;

  private Moves() {}

  /** A figure of one workbook; the remark is compared too. */
  record Item(String label, String cell, Figure figure, String remark) {}

  /** Figures that differ, are new or are gone. */
  static List<Comparison.Moved> of(Map<String, Item> before, Map<String, Item> after) {
    return all(before, after).stream().filter(Moves::differs).toList();
  }

  /** All figures, those of the later workbook first. */
  static List<Comparison.Moved> all(Map<String, Item> before, Map<String, Item> after) {
    List<Comparison.Moved> moves = new ArrayList<>();
    after.forEach((key, now) -> moves.add(moved(before.get(key), now)));
    before.forEach(
        (key, then) -> {
          if (!after.containsKey(key)) {
            moves.add(new Comparison.Moved(then.label(), then.cell(), then.figure(), null, null));
          }
        });
    return moves;
  }

  private static Comparison.Moved moved(Item then, Item now) {
    boolean differs = then != null && !then.remark().equals(now.remark());
    String remark = differs ? then.remark() + " before, " + now.remark() + " now" : null;
    Figure before = then == null ? null : then.figure();
    return new Comparison.Moved(now.label(), now.cell(), before, now.figure(), remark);
  }

  private static boolean differs(Comparison.Moved moved) {
    if (moved.before() == null || moved.after() == null || moved.remark() != null) {
      return true;
    }
    if (moved.before().error() != null || moved.after().error() != null) {
      return !moved.before().equals(moved.after());
    }
    double before = moved.before().number();
    double difference = Math.abs(moved.after().number() - before);
    return difference > SAME * Math.abs(before);
  }
}
