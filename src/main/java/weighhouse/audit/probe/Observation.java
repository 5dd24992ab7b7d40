package weighhouse.audit.probe;

import java.util.List;
import weighhouse.audit.ActsOn;
import weighhouse.audit.Measure;
import weighhouse.formula.Region;
import weighhouse.workbook.CellRange;

/**
 * What the probe saw of one measure.
 *
 * @param entry the measure
 * @param actsOn the scale on which it acts where it enters
 * @param exponent the power to which it acts there: 1 as it is, 2 applied twice, -1 inverted
 * @param effective the ratio the model delivers on the measure's own scale, or null
 * @param series that ratio along the first region of probabilities, for the plot
 * @param reaches probabilities and survival that it moves
 * @param entries what was seen at each region where it enters
 */
public record Observation(
    Ledger.Entry entry,
    ActsOn actsOn,
    double exponent,
    Measure.Effective effective,
    List<Double> series,
    List<CellRange> reaches,
    List<Entering> entries) {

  /** The reading at one region where the measure enters the risk kinds. */
  public record Entering(Region region, ActsOn actsOn, double exponent) {}
}
