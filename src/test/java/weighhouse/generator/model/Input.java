package weighhouse.generator.model;

/**
 * One input of a workbook.
 *
 * @param symbol what formula templates call it; also the seed of names and lookup keys
 * @param formula a template that stands in place of the value, or null
 * @param ratio figures of an effect measure, or null
 */
public record Input(
    String symbol,
    String label,
    Section section,
    double value,
    String formula,
    String unit,
    Ratio ratio,
    String format) {

  /** Parts of an input sheet. */
  public enum Section {
    GENERAL,
    CLINICAL,
    EFFECTS,
    COSTS,
    UTILITIES
  }

  /** A number. */
  public static Input number(String symbol, String label, Section section, double value) {
    return new Input(symbol, label, section, value, null, "", null, null);
  }

  /** A number with a unit. */
  public Input in(String newUnit) {
    return new Input(symbol, label, section, value, formula, newUnit, ratio, format);
  }

  /** The same, typed as a formula. */
  public Input typedAs(String newFormula) {
    return new Input(symbol, label, section, value, newFormula, unit, ratio, format);
  }

  /** The same, shown with a number format. */
  public Input shownAs(String newFormat) {
    return new Input(symbol, label, section, value, formula, unit, ratio, newFormat);
  }

  /** An effect measure. */
  public static Input effect(String symbol, String label, Ratio ratio) {
    return new Input(symbol, label, Section.EFFECTS, ratio.value(), null, "ratio", ratio, "0.00");
  }

  /** A name that Excel accepts for it. */
  public String name() {
    return symbol.replace('.', '_');
  }
}
