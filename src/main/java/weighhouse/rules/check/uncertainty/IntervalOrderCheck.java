package weighhouse.rules.check.uncertainty;

import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.synthesis.Reciprocal;

/** A ratio outside its own limits, or limits that have changed places. */
public final class IntervalOrderCheck extends IntervalCheck {
  @Override
  public String name() {
    return "interval-order";
  }

  @Override
  String fault(Estimate estimate, Printed printed, ModelView model) {
    if (Reciprocal.of(estimate.lower(), model).isPresent()
        && Reciprocal.of(estimate.upper(), model).isPresent()) {
      return null; // their order is another rule's concern
    }
    if (printed.lower() > printed.upper()) {
      return "The lower limit "
          + printed.show(printed.lower())
          + " is above the upper limit "
          + printed.show(printed.upper())
          + ".";
    }
    boolean below = printed.ratio() + printed.half() < printed.lower() - printed.half();
    boolean above = printed.ratio() - printed.half() > printed.upper() + printed.half();
    return below || above
        ? "The ratio "
            + printed.show(printed.ratio())
            + " is "
            + (below ? "below its lower limit " : "above its upper limit ")
            + printed.show(below ? printed.lower() : printed.upper())
            + "."
        : null;
  }
}
