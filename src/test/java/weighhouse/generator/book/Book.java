package weighhouse.generator.book;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A workbook under way. */
public final class Book {
  /** A defined name; {@code sheet} is null at workbook scope. */
  public record Name(String sheet, String name, String refersTo) {}

  /** A structured table with headings in its first row. */
  public record Table(String name, CellAt first, int rows, List<String> headings) {}

  private final Map<String, SheetDraft> sheets = new LinkedHashMap<>();
  private final List<Name> names = new ArrayList<>();
  private final List<Table> tables = new ArrayList<>();
  private final Symbols symbols = new Symbols();

  /** An empty workbook. */
  public static Book workbook() {
    return new Book();
  }

  /** The sheet of that name, made where it is missing. */
  public SheetDraft sheet(String name) {
    return sheets.computeIfAbsent(name, it -> new SheetDraft(it, symbols));
  }

  /** A name at workbook scope. */
  public Book name(String name, String refersTo) {
    names.add(new Name(null, name, refersTo));
    return this;
  }

  /** A name at the scope of a sheet. */
  public Book nameOn(String sheet, String name, String refersTo) {
    names.add(new Name(sheet, name, refersTo));
    return this;
  }

  /** A structured table over cells already written. */
  public Book table(Table table) {
    tables.add(table);
    return this;
  }

  /** What templates may refer to. */
  public Symbols symbols() {
    return symbols;
  }

  /** Sheets in order. */
  public List<SheetDraft> sheets() {
    return List.copyOf(sheets.values());
  }

  /** Defined names. */
  public List<Name> names() {
    return names;
  }

  /** Structured tables. */
  public List<Table> tables() {
    return tables;
  }

  /** The formula at a cell with its equals sign, or null where there is none. */
  public String formulaAt(CellAt at) {
    SheetDraft sheet = sheets.get(at.sheet());
    Content content = sheet == null ? null : sheet.cells().get(at);
    if (content instanceof Content.Formula formula) {
      return "=" + formula.text();
    }
    return content instanceof Content.ArrayFormula array ? "{=" + array.text() + "}" : null;
  }
}
