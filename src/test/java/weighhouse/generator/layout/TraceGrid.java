package weighhouse.generator.layout;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;

/** Lines written beside each other with the cycles down, or below each other with cycles across. */
final class TraceGrid {
  private static final Pattern PLACE = Pattern.compile("\\{([@<])([^{}]+)}");

  private final ModelDraft draft;
  private final SheetDraft sheet;
  private final int row;
  private final int column;
  private final boolean across;
  private final Map<String, Integer> position = new HashMap<>();
  private final Map<String, String> names = new HashMap<>();

  /** A grid whose headings begin at a cell. */
  TraceGrid(ModelDraft draft, SheetDraft sheet, int row, int column, boolean across) {
    this.draft = draft;
    this.sheet = sheet;
    this.row = row;
    this.column = column;
    this.across = across;
  }

  /** Lines that formulas call by a name in place of the cell of the same cycle. */
  TraceGrid named(Map<String, String> namesOfLines) {
    names.putAll(namesOfLines);
    return this;
  }

  /** Writes all lines; registers <code>line.KEY.ARM</code> as the text of each line's range. */
  void write(List<Line> lines, int cycles, int arm) {
    for (Line line : lines) {
      position.put(line.key(), position.size());
    }
    for (Line line : lines) {
      int at = position.get(line.key());
      cell(at, -1).label(line.label());
      for (int cycle = 0; cycle <= cycles; cycle++) {
        write(line, cycle);
      }
      draft.book().symbols().text("line." + line.key() + "." + arm, range(line.key(), 0, cycles));
    }
  }

  private void write(Line line, int cycle) {
    String text = cycle == 0 ? line.first() : line.next();
    if (text == null) {
      return;
    }
    SheetDraft at = cell(position.get(line.key()), cycle);
    if (text.matches("[0-9.]+")) {
      at.value(Double.parseDouble(text));
    } else if (text.startsWith("array:")) {
      int colon = text.indexOf(':', 6);
      at.array(
          resolve(text.substring(colon + 1), cycle), 1, Integer.parseInt(text.substring(6, colon)));
    } else {
      at.formula(resolve(text, cycle));
    }
    if (line.root() != null) {
      draft.root(line.root(), sheet.last());
    }
  }

  /** Range of a line over some cycles, as seen from other sheets. */
  String range(String key, int from, int to) {
    int at = position.get(key);
    return CellAt.quoted(sheet.name())
        + "!"
        + CellAt.fixed(rowOf(at, from), columnOf(at, from))
        + ":"
        + CellAt.fixed(rowOf(at, to), columnOf(at, to));
  }

  /** Column letters or row number of a line. */
  CellAt first(String key) {
    int at = position.get(key);
    return new CellAt(sheet.name(), rowOf(at, 0), columnOf(at, 0));
  }

  private String resolve(String template, int cycle) {
    Matcher place = PLACE.matcher(template);
    StringBuilder text = new StringBuilder();
    while (place.find()) {
      boolean same = place.group(1).equals("@");
      String key = place.group(2);
      String name = same ? names.get(key) : null;
      String reference = name != null ? name : reference(key, same ? cycle : cycle - 1);
      place.appendReplacement(text, Matcher.quoteReplacement(reference));
    }
    return place.appendTail(text).toString();
  }

  private String reference(String key, int cycle) {
    Integer at = position.get(key);
    if (at == null) {
      throw new IllegalArgumentException("no line " + key);
    }
    return CellAt.a1(rowOf(at, cycle), columnOf(at, cycle));
  }

  private SheetDraft cell(int line, int cycle) {
    return sheet.at(rowOf(line, cycle), columnOf(line, cycle));
  }

  private int rowOf(int line, int cycle) {
    return across ? row + line : row + 1 + cycle;
  }

  private int columnOf(int line, int cycle) {
    return across ? column + 1 + cycle : column + line;
  }
}
