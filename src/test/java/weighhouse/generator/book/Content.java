package weighhouse.generator.book;

/** What a drafted cell holds. */
public sealed interface Content {
  /** A number with its Excel number format, or null for General. */
  record Numeric(double value, String format) implements Content {}

  /** Text. */
  record Label(String text) implements Content {}

  /** A formula without its leading equals sign. */
  record Formula(String text) implements Content {}

  /** The top left cell of an array formula over {@code rows} by {@code columns} cells. */
  record ArrayFormula(String text, int rows, int columns) implements Content {}
}
