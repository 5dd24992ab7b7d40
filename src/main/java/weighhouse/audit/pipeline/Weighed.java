package weighhouse.audit.pipeline;

import java.util.List;
import weighhouse.audit.CellFigures;
import weighhouse.audit.OutcomeFigures;
import weighhouse.audit.Severity;

/**
 * A suspect with what its correction alone does.
 *
 * @param suspect the mistake
 * @param severity by consequence
 * @param values first, last and worst root cell
 * @param outcomes every outcome now and corrected
 * @param flips whether the decision changes
 * @param silent whether nothing changes at present inputs
 * @param weight largest relative change of an outcome, then of a value; the order of findings
 */
record Weighed(
    Suspect suspect,
    Severity severity,
    List<CellFigures> values,
    List<OutcomeFigures> outcomes,
    boolean flips,
    boolean silent,
    Weight weight) {

  /** Largest relative changes, 0 or more. */
  record Weight(double outcome, double value) implements Comparable<Weight> {
    @Override
    public int compareTo(Weight other) {
      int byOutcome = Double.compare(outcome, other.outcome);
      return byOutcome != 0 ? byOutcome : Double.compare(value, other.value);
    }
  }
}
