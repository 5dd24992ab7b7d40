package weighhouse.audit;

import java.util.List;
import weighhouse.quantity.Kind;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * An effect measure of the workbook's ledger.
 *
 * @param cell where it stands
 * @param label for people
 * @param kind what it is
 * @param value its value; entered by the author or calculated
 * @param lower lower limit, NaN if none
 * @param upper upper limit, NaN if none
 * @param effective the ratio that the model really delivers on the measure's own scale, or null
 * @param actsOn the scale it acts on
 * @param reaches the transition probabilities or survival it moves
 * @param series effective ratio by cycle for the plot, may be empty
 */
public record Measure(
    CellAddress cell,
    String label,
    Kind kind,
    double value,
    double lower,
    double upper,
    Effective effective,
    ActsOn actsOn,
    List<CellRange> reaches,
    List<Double> series) {

  /** Smallest, median and largest effective ratio over the cycles. */
  public record Effective(double min, double median, double max) {}
}
