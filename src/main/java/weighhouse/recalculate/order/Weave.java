package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import weighhouse.recalculate.program.Footprint;
import weighhouse.recalculate.program.Strip;
import weighhouse.workbook.CellRange;

/**
 * The cells of units that read each other, numbered strip by strip, and their order: each after all
 * that it reads. Depth-first with its own stack; a range is passed by its cells not yet done only,
 * so long ranges cost little.
 */
final class Weave {
  /** A read of one unit of the weave by another. */
  private record Edge(Footprint read, int source) {}

  private final Plan plan;
  private final List<Unit> units = new ArrayList<>();
  private final int step;

  private final List<Strip> strips = new ArrayList<>();
  private final List<Unit> unitOfStrip = new ArrayList<>();
  private final int[] firstStrip;
  private final int[] firstCell;
  private final List<List<Edge>> edges = new ArrayList<>();

  /** Of each cell, itself if it is not yet done, else one further on. */
  private final int[] next;

  private final boolean[] open;
  private final int[] ordered;
  private int done;
  private boolean circular;
  private int[] stack = new int[64];
  private int[] progress = new int[64];

  private Weave(Plan plan, int[] component) {
    this.plan = plan;
    this.step = plan.stepOf(component[0]);
    this.firstStrip = new int[component.length + 1];
    for (int u = 0; u < component.length; u++) {
      units.add(plan.units().get(component[u]));
      for (Strip strip : units.get(u).strips()) {
        strips.add(strip);
        unitOfStrip.add(units.get(u));
      }
      firstStrip[u + 1] = strips.size();
    }
    this.firstCell = new int[strips.size() + 1];
    for (int s = 0; s < strips.size(); s++) {
      firstCell[s + 1] = firstCell[s] + strips.get(s).length();
    }
    this.next = new int[firstCell[strips.size()] + 1];
    this.open = new boolean[next.length];
    this.ordered = new int[next.length - 1];
    units.forEach(unit -> edges.add(edgesOf(unit)));
  }

  /** Orders the cells of some of a plan's units. */
  static Step.Woven of(Plan plan, int[] component) {
    return new Weave(plan, component).order();
  }

  private List<Edge> edgesOf(Unit unit) {
    List<Edge> found = new ArrayList<>();
    for (Footprint read : unit.reads()) {
      for (int source : sources(read.hull(unit.seenFrom()))) {
        found.add(new Edge(read, source));
      }
    }
    return found;
  }

  private int[] sources(CellRange range) {
    IntList sources = new IntList();
    plan.unitsIn(
        range,
        unit -> {
          if (plan.stepOf(unit) == step) {
            sources.add(plan.placeOf(unit));
          }
        });
    return sources.toArray();
  }

  private Step.Woven order() {
    Arrays.setAll(next, i -> i);
    for (int cell = 0; cell < ordered.length; cell++) {
      if (next[cell] == cell) {
        visit(cell);
      }
    }
    int[] stripOf = new int[ordered.length];
    int[] positions = new int[ordered.length];
    for (int i = 0; i < ordered.length; i++) {
      stripOf[i] = strip(ordered[i]);
      positions[i] = ordered[i] - firstCell[stripOf[i]];
    }
    return new Step.Woven(
        List.copyOf(units),
        List.copyOf(strips),
        List.copyOf(unitOfStrip),
        stripOf,
        positions,
        circular);
  }

  private int strip(int cell) {
    int at = Arrays.binarySearch(firstCell, cell);
    return at >= 0 ? at : -at - 2;
  }

  private void visit(int start) {
    int depth = 0;
    push(depth, start);
    while (depth >= 0) {
      int needed = needed(stack[depth], depth);
      if (needed >= 0) {
        push(++depth, needed);
      } else {
        int cell = stack[depth--];
        open[cell] = false;
        next[cell] = cell + 1;
        ordered[done++] = cell;
      }
    }
  }

  private void push(int depth, int cell) {
    if (depth == stack.length) {
      stack = Arrays.copyOf(stack, depth * 2);
      progress = Arrays.copyOf(progress, depth * 2);
    }
    stack[depth] = cell;
    progress[depth] = 0;
    open[cell] = true;
  }

  /** A cell that the given one reads and that is not done, or -1. */
  private int needed(int cell, int depth) {
    int strip = strip(cell);
    Unit unit = unitOfStrip.get(strip);
    int u = unitIndex(strip);
    CellRange host = host(strip, cell - firstCell[strip]);
    List<Edge> own = edges.get(u);
    for (; progress[depth] < own.size(); progress[depth]++) {
      Edge edge = own.get(progress[depth]);
      int needed = undone(edge.read().at(host.firstRow(), host.firstColumn()), edge.source());
      if (needed >= 0) {
        return needed;
      }
    }
    for (CellRange read : plan.pointedAt(unit, cell - firstCell[firstStrip[u]])) {
      for (int source : sources(read)) {
        int needed = undone(read, source);
        if (needed >= 0) {
          return needed;
        }
      }
    }
    return -1;
  }

  private int unitIndex(int strip) {
    int at = Arrays.binarySearch(firstStrip, strip);
    return at >= 0 ? at : -at - 2;
  }

  private CellRange host(int strip, int position) {
    CellRange hosts = strips.get(strip).hosts();
    int row = hosts.columns() == 1 ? hosts.firstRow() + position : hosts.firstRow();
    int column = hosts.columns() == 1 ? hosts.firstColumn() : hosts.firstColumn() + position;
    return new CellRange(hosts.sheet(), row, column, row, column);
  }

  /** A cell of a unit within a rectangle that is neither done nor open, or -1. */
  private int undone(CellRange read, int source) {
    Unit unit = units.get(source);
    if (!Plan.meet(read, unit.hosts())) {
      return -1;
    }
    for (int s = firstStrip[source]; s < firstStrip[source + 1]; s++) {
      CellRange hosts = unit.whole() ? unit.hosts() : strips.get(s).hosts();
      if (Plan.meet(read, hosts)) {
        int needed = undone(read, hosts, s, unit.whole());
        if (needed >= 0) {
          return needed;
        }
      }
    }
    return -1;
  }

  private int undone(CellRange read, CellRange hosts, int strip, boolean whole) {
    int from = firstCell[strip];
    int to = from;
    if (!whole) {
      boolean down = hosts.columns() == 1;
      int first = down ? hosts.firstRow() : hosts.firstColumn();
      from += Math.max(0, (down ? read.firstRow() : read.firstColumn()) - first);
      int last = (down ? read.lastRow() : read.lastColumn()) - first;
      to = firstCell[strip] + Math.min(last, firstCell[strip + 1] - firstCell[strip] - 1);
    }
    int cell = find(from);
    while (cell <= to && open[cell]) {
      circular = true;
      cell = find(cell + 1);
    }
    return cell <= to ? cell : -1;
  }

  private int find(int cell) {
    int root = cell;
    while (next[root] != root) {
      root = next[root];
    }
    int at = cell;
    while (next[at] != root && at != root) {
      int after = next[at];
      next[at] = root;
      at = after;
    }
    return root;
  }
}
