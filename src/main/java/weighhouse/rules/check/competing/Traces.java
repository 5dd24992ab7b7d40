package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Axis;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Trees;
import weighhouse.recalculate.Values;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Traces of a cohort: neighbouring lines of occupancies, each calculated from the cycle before, one
 * of which only gains. Cycles may run down or across.
 */
final class Traces {
  private static final int FEWEST_CYCLES = 3;
  private static final int MOST_STATES = 60;

  private Traces() {}

  /**
   * One state along the cycles that have a formula.
   *
   * @param region the region it belongs to
   * @param cells its cells
   * @param down whether cycles run down
   * @param absorbing whether all who are there stay
   */
  record State(Region region, CellRange cells, boolean down, boolean absorbing) {
    CellAddress at(int cycle) {
      return down ? cells.first().offset(cycle, 0) : cells.first().offset(0, cycle);
    }

    int cycles() {
      return down ? cells.rows() : cells.columns();
    }

    private int line() {
      return down ? cells.firstColumn() : cells.firstRow();
    }

    private int start() {
      return down ? cells.firstRow() : cells.firstColumn();
    }
  }

  /** The states of one cohort. */
  record Trace(List<State> states) {
    /** The largest change of the cohort's size over all cycles, relative to its start. */
    double leak(Values values) {
      double start = total(values, -1);
      double worst = 0;
      for (int cycle = 0; cycle < states.get(0).cycles(); cycle++) {
        worst = Math.max(worst, Math.abs(total(values, cycle) / start - 1));
      }
      return worst;
    }

    private double total(Values values, int cycle) {
      return states.stream().mapToDouble(state -> values.number(state.at(cycle))).sum();
    }
  }

  private record Span(int sheet, boolean down, int start, int cycles) {}

  static List<Trace> of(Survey survey) {
    Map<Span, List<State>> bySpan = new LinkedHashMap<>();
    for (Region region : survey.regions()) {
      for (State state : states(region, survey)) {
        Span span = new Span(state.cells().sheet(), state.down(), state.start(), state.cycles());
        bySpan.computeIfAbsent(span, s -> new ArrayList<>()).add(state);
      }
    }
    List<Trace> traces = new ArrayList<>();
    bySpan.values().forEach(states -> neighbours(states, traces));
    traces.removeIf(trace -> !(trace.total(survey.base(), -1) > 0));
    return traces;
  }

  private static void neighbours(List<State> states, List<Trace> traces) {
    states.sort(Comparator.comparingInt(State::line));
    int from = 0;
    for (int i = 1; i <= states.size(); i++) {
      if (i == states.size() || states.get(i).line() != states.get(i - 1).line() + 1) {
        List<State> block = List.copyOf(states.subList(from, i));
        if (block.size() > 1 && block.stream().anyMatch(State::absorbing)) {
          traces.add(new Trace(block));
        }
        from = i;
      }
    }
  }

  private static List<State> states(Region region, Survey survey) {
    List<State> states = new ArrayList<>();
    CellRange range = region.range();
    boolean down = range.rows() >= range.columns();
    int lines = down ? range.columns() : range.rows();
    boolean tooShort = Math.max(range.rows(), range.columns()) < FEWEST_CYCLES;
    Expr tree = survey.tree(region);
    if (tooShort
        || lines > MOST_STATES
        || survey.shape(region).array()
        || !readsBefore(tree, down)) {
      return states;
    }
    Flow flow = Flow.of(tree, down);
    for (int line = 0; line < lines && flow != Flow.COUNTER; line++) {
      CellRange cells =
          down
              ? new CellRange(
                  range.sheet(),
                  range.firstRow(),
                  range.firstColumn() + line,
                  range.lastRow(),
                  range.firstColumn() + line)
              : new CellRange(
                  range.sheet(),
                  range.firstRow() + line,
                  range.firstColumn(),
                  range.firstRow() + line,
                  range.lastColumn());
      boolean begins = down ? range.firstRow() > 0 : range.firstColumn() > 0;
      if (begins) {
        states.add(new State(region, cells, down, flow == Flow.ABSORBING));
      }
    }
    return states;
  }

  private static boolean readsBefore(Expr tree, boolean down) {
    return Trees.contains(tree, node -> isBefore(node, down));
  }

  /** Whether a node is the host's own cell of the cycle before. */
  static boolean isBefore(Expr node, boolean down) {
    Axis back = new Axis(-1, false);
    Axis here = new Axis(0, false);
    return node instanceof Expr.CellRef cell
        && cell.sheet() == null
        && cell.row().equals(down ? back : here)
        && cell.column().equals(down ? here : back);
  }

  /** What becomes of those who were there before. */
  private enum Flow {
    LEFT,
    ABSORBING,
    /** A number that goes up by steps: a counter of cycles or years. */
    COUNTER;

    static Flow of(Expr tree, boolean down) {
      List<Chains.Addend> addends = Chains.addends(tree);
      boolean kept =
          addends.stream().anyMatch(addend -> isBefore(addend.node(), down) && !addend.negative());
      if (!kept) {
        return LEFT;
      }
      boolean fed =
          addends.stream()
              .filter(addend -> !isBefore(addend.node(), down))
              .anyMatch(addend -> Trees.contains(addend.node(), node -> isEarlier(node, down)));
      return fed ? ABSORBING : COUNTER;
    }

    /** A relative reference to the cycle before, of any line. */
    private static boolean isEarlier(Expr node, boolean down) {
      if (node instanceof Expr.AreaRef area) {
        Axis axis = down ? area.row1() : area.column1();
        return axis.equals(new Axis(-1, false));
      }
      return node instanceof Expr.CellRef cell
          && (down ? cell.row() : cell.column()).equals(new Axis(-1, false));
    }
  }
}
