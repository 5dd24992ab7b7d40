package weighhouse.audit;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import weighhouse.quantity.Quantity;

/**
 * What the reviewer says about a workbook.
 *
 * @param quantities A1 range (with its sheet) to the quantity it holds
 * @param cycleYears cycle length in years, NaN if not declared
 * @param outcomes A1 cells of outcomes, empty to infer them
 * @param threshold willingness to pay, NaN to infer it
 * @param tolerance relative difference below which a finding is minor
 * @param accepted findings that need not hold the gate
 * @param demands what the gate asks for
 */
public record Brief(
    Map<String, Quantity> quantities,
    double cycleYears,
    List<String> outcomes,
    double threshold,
    double tolerance,
    List<Accepted> accepted,
    Demands demands) {
  /** A tenth of a percent of the probability and of every outcome. */
  public static final double DEFAULT_TOLERANCE = 0.001;

  /** Nothing declared, nothing accepted. */
  public static final Brief NONE =
      new Brief(
          Map.of(),
          Double.NaN,
          List.of(),
          Double.NaN,
          DEFAULT_TOLERANCE,
          List.of(),
          new Demands(Severity.MAJOR, 0, 0));

  /** A finding the reviewer accepts; {@code until} null for ever. */
  public record Accepted(String finding, String reason, String by, LocalDate until) {}

  /**
   * What the gate demands.
   *
   * @param holdAt findings this grave or graver hold the workbook
   * @param leastCoverage share of formula cells that must be recalculated, 0 to 1
   * @param leastReproduction share of recalculated cells that must reproduce, 0 to 1
   */
  public record Demands(Severity holdAt, double leastCoverage, double leastReproduction) {}
}
