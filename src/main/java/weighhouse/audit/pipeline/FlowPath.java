package weighhouse.audit.pipeline;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.audit.probe.CellsOf;
import weighhouse.formula.Region;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** The shortest way by which one cell feeds another, region by region. */
final class FlowPath {
  /** A way longer than what a reader follows is not looked for. */
  private static final int MOST_STEPS = 4000;

  /** Cells of one range that are followed; those of one region lead the same way. */
  private static final int FOLLOWED = 3;

  private final Subject subject;

  FlowPath(Subject subject) {
    this.subject = subject;
  }

  /** Cells in order of flow, both ends included; empty where no way was found. */
  List<CellAddress> between(CellAddress from, CellAddress to) {
    Map<CellAddress, CellAddress> next = new HashMap<>();
    Deque<CellAddress> queue = new ArrayDeque<>(List.of(to));
    next.put(to, to);
    for (int step = 0; step < MOST_STEPS && !queue.isEmpty(); step++) {
      CellAddress cell = queue.removeFirst();
      if (cell.equals(from)) {
        return way(next, from);
      }
      for (CellAddress read : readBy(cell, from)) {
        if (next.putIfAbsent(read, cell) == null) {
          queue.addLast(read);
        }
      }
    }
    return List.of();
  }

  private List<CellAddress> readBy(CellAddress cell, CellAddress wanted) {
    List<CellAddress> read = new ArrayList<>();
    for (CellRange range : subject.recalculation().precedents(cell)) {
      if (range.contains(wanted)) {
        return List.of(wanted);
      }
      CellsOf.spread(range, FOLLOWED).forEach(c -> read.add(entrance(c).orElse(c)));
    }
    return read;
  }

  /** The first cell of the region instead of the cell itself: a running column is one step. */
  private Optional<CellAddress> entrance(CellAddress cell) {
    Region region = subject.shapes().regionAt(cell);
    return region == null || region.range().size() < 2
        ? Optional.empty()
        : Optional.of(region.range().first());
  }

  private static List<CellAddress> way(Map<CellAddress, CellAddress> next, CellAddress from) {
    List<CellAddress> way = new ArrayList<>();
    CellAddress cell = from;
    way.add(cell);
    while (!next.get(cell).equals(cell)) {
      cell = next.get(cell);
      way.add(cell);
    }
    return Collections.unmodifiableList(way);
  }
}
