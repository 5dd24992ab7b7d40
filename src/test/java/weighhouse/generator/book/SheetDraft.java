package weighhouse.generator.book;

import java.util.Map;
import java.util.TreeMap;

/** A sheet under way: a cursor writes cells to the right, {@link #down} starts the next row. */
public final class SheetDraft {
  private final String name;
  private final Symbols symbols;
  private final Map<CellAt, Content> cells = new TreeMap<>();
  private int row;
  private int column;
  private int home;
  private CellAt last;
  private boolean hidden;

  SheetDraft(String name, Symbols symbols) {
    this.name = name;
    this.symbols = symbols;
  }

  /** Moves the cursor; {@link #down} will come back to this column. */
  public SheetDraft at(int toRow, int toColumn) {
    row = toRow;
    column = toColumn;
    home = toColumn;
    return this;
  }

  /** Next row, back at the home column. */
  public SheetDraft down() {
    return down(1);
  }

  /** Some rows further, back at the home column. */
  public SheetDraft down(int rows) {
    row += rows;
    column = home;
    return this;
  }

  /** Leaves cells empty. */
  public SheetDraft skip(int columns) {
    column += columns;
    return this;
  }

  /** Text, or nothing where it is empty. */
  public SheetDraft label(String text) {
    return text == null || text.isEmpty() ? skip(1) : put(new Content.Label(text));
  }

  /** Several texts side by side. */
  public SheetDraft labels(String... texts) {
    for (String text : texts) {
      label(text);
    }
    return this;
  }

  /** A number. */
  public SheetDraft value(double number) {
    return value(number, null);
  }

  /** A number with its format. */
  public SheetDraft value(double number, String format) {
    return put(new Content.Numeric(number, format));
  }

  /** Several numbers side by side. */
  public SheetDraft values(double... numbers) {
    for (double number : numbers) {
      value(number);
    }
    return this;
  }

  /** A formula template, without its equals sign. */
  public SheetDraft formula(String template) {
    return put(new Content.Formula(symbols.resolve(template, name)));
  }

  /** An array formula that fills the block whose top left cell is here; moves past its columns. */
  public SheetDraft array(String template, int rows, int columns) {
    put(new Content.ArrayFormula(symbols.resolve(template, name), rows, columns));
    return skip(columns - 1);
  }

  /** Registers the cell written last under a symbol. */
  public SheetDraft as(String symbol) {
    symbols.cell(symbol, last);
    return this;
  }

  /** Hides the sheet. */
  public SheetDraft hide() {
    hidden = true;
    return this;
  }

  private SheetDraft put(Content content) {
    last = new CellAt(name, row, column++);
    cells.put(last, content);
    return this;
  }

  /** Where the last cell went. */
  public CellAt last() {
    return last;
  }

  /** Row of the cursor. */
  public int row() {
    return row;
  }

  /** Column of the cursor. */
  public int column() {
    return column;
  }

  /** The sheet's name. */
  public String name() {
    return name;
  }

  /** Whether the sheet is hidden. */
  public boolean hidden() {
    return hidden;
  }

  /** All cells written. */
  public Map<CellAt, Content> cells() {
    return cells;
  }
}
