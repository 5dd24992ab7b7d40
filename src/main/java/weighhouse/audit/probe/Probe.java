package weighhouse.audit.probe;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleUnaryOperator;
import weighhouse.quantity.Kind;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.rules.Subject;
import weighhouse.workbook.CellAddress;

/**
 * Moves one measure of the running model and looks at how every cell that depends on it answers:
 * the scale on which the measure acts shows, whatever the formulas look like.
 */
final class Probe {
  /**
   * Ratios tried beside the measure's own; away from 1, and with logarithms of no common multiple.
   */
  private static final List<Double> RATIOS = List.of(0.83, 0.61);

  private final Subject subject;
  private final Map<CellAddress, Value> held;

  Probe(Subject subject) {
    this(subject, Map.of());
  }

  /**
   * @param held cells kept at other values throughout, such as a switch at another setting
   */
  Probe(Subject subject, Map<CellAddress, Value> held) {
    this.subject = subject;
    this.held = held;
  }

  /** The model run with a measure at 1 and at several ratios. */
  record Runs(Values neutral, List<Double> ratios, List<Values> values) {

    Response response(CellAddress cell, DoubleUnaryOperator view) {
      List<Double> seen = new ArrayList<>(values.size());
      for (Values run : values) {
        seen.add(view.applyAsDouble(run.number(cell)));
      }
      return new Response(view.applyAsDouble(neutral.number(cell)), ratios, seen);
    }

    boolean moves(CellAddress cell) {
      return response(cell, v -> v).moves();
    }
  }

  /** Runs the model; the measure's own value comes first unless it is (nearly) 1. */
  Runs run(Ledger.Entry entry) {
    RatioLaw law = RatioLaw.of(entry.kind()).orElseThrow();
    double own = law.toRatio().applyAsDouble(entry.value());
    List<Double> ratios = new ArrayList<>();
    if (own > 0 && Math.abs(Math.log(own)) > 1e-3) {
      ratios.add(own);
    }
    ratios.addAll(RATIOS);
    List<Values> values = new ArrayList<>();
    ratios.forEach(ratio -> values.add(at(entry.cell(), law, ratio)));
    return new Runs(at(entry.cell(), law, 1), ratios, values);
  }

  private Values at(CellAddress cell, RatioLaw law, double ratio) {
    Map<CellAddress, Value> values = new LinkedHashMap<>(held);
    values.put(cell, new Value.Num(law.fromRatio().applyAsDouble(ratio)));
    return subject.recalculation().whatIf(new Change(values, Map.of()));
  }

  /** How a cell of that kind is seen as a probability; null where the kind is none to look at. */
  static DoubleUnaryOperator asProbability(Kind kind) {
    return switch (kind) {
      case PROBABILITY -> v -> v;
      case SURVIVAL -> v -> 1 - v;
      // a hazard shows as the probability it gives, so that all answers are read on one set of
      // scales
      case RATE, CUMULATIVE_HAZARD -> v -> -Math.expm1(-v);
      case ODDS -> v -> v / (1 + v);
      default -> null;
    };
  }

  /** Kinds that tell a probability of the model outright. */
  static final Set<Kind> TRANSITIONS = Set.of(Kind.PROBABILITY, Kind.SURVIVAL);
}
