package weighhouse.generator.model;

/**
 * One calculated cell (or line of cells) of an event.
 *
 * @param name which quantity, see {@link StepWords}; templates refer to it as <code>{:name}</code>
 * @param right the right formula
 * @param wrong the formula with the fault, or null where this step is not the root of one
 */
public record Step(String name, String right, String wrong) {
  /** A step without fault. */
  public static Step of(String name, String right) {
    return new Step(name, right, null);
  }

  /** A step that is the root of a fault. */
  public static Step of(String name, String right, String wrong) {
    return new Step(name, right, wrong);
  }

  /** Whether it is one cell even where the event runs along the cycles: an adjusted parameter. */
  public boolean isScalar() {
    return name.endsWith("Adj");
  }

  /** The formula of the faulty workbook or of its twin. */
  public String formula(boolean faulty) {
    return faulty && wrong != null ? wrong : right;
  }
}
