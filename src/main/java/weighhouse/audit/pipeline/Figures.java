package weighhouse.audit.pipeline;

import weighhouse.audit.Figure;
import weighhouse.recalculate.Value;

/** Values of the engine as figures of a report. */
final class Figures {
  private Figures() {}

  static Figure of(Value value) {
    if (value instanceof Value.Fault fault) {
      return new Figure(Double.NaN, fault.code());
    }
    if (value instanceof Value.Text) {
      return new Figure(Double.NaN, "text");
    }
    double number = value.number();
    return Double.isFinite(number) ? Figure.of(number) : new Figure(Double.NaN, "#NUM!");
  }
}
