package weighhouse.generator.lookalike;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.generator.book.Book;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.Tables;

/** Drafts look-alikes from their table, each time arranged and scaled a little differently. */
public final class LookAlikes {
  private static final Map<String, List<List<String>>> TABLE = table();
  private static final Pattern RUN = Pattern.compile("\\{([<@])(\\w+)}");

  private final Book book = Book.workbook();
  private final SheetDraft sheet;
  private final boolean labelRight;
  private final double scale;
  private final Map<String, Integer> columns = new HashMap<>();

  private LookAlikes(Dice dice) {
    sheet = book.sheet(dice.pick(List.of("Sheet1", "Model", "Calc", "Inputs and results")));
    labelRight = dice.chance(0.4);
    scale = dice.between(0.9, 1.1, 2);
    sheet.at(0, 0);
  }

  /** Their names. */
  public static List<String> names() {
    return List.copyOf(TABLE.keySet());
  }

  /** A workbook of that name. */
  public static Book draft(String name, long seed) {
    LookAlikes draft = new LookAlikes(new Dice(seed));
    draft.sheet.label(name.replace('-', ' ')).down(2);
    TABLE.get(name).forEach(draft::row);
    return draft.book;
  }

  private static Map<String, List<List<String>>> table() {
    Map<String, List<List<String>>> table = new LinkedHashMap<>();
    List<List<String>> rows = new ArrayList<>();
    for (List<String> row : Tables.rows("lookalikes")) {
      if (row.get(0).startsWith("= ")) {
        rows = new ArrayList<>();
        table.put(row.get(0).substring(2), rows);
      } else {
        rows.add(row);
      }
    }
    return table;
  }

  private void row(List<String> row) {
    if (row.get(0).startsWith("~ ")) {
      run(row);
      return;
    }
    if (!labelRight) {
      sheet.label(row.get(0));
    }
    content(row.get(2), "");
    sheet.as(row.get(1)).label(row.size() > 3 ? row.get(3) : "");
    if (labelRight) {
      sheet.label(row.get(0));
    }
    sheet.down();
  }

  /** A column of its own, to the right of the scalars. */
  private void run(List<String> row) {
    int back = sheet.row();
    int column = 6 + columns.size();
    int count = Integer.parseInt(row.get(4));
    columns.put(row.get(1), column);
    sheet.at(2, column).label(row.get(0).substring(2));
    for (int i = 0; i < count; i++) {
      sheet.at(3 + i, column);
      content(along(row.get(i == 0 ? 2 : 3), 3 + i), row.get(1));
      if (i == 0) {
        sheet.as(row.get(1));
      }
    }
    String all = CellAt.fixed(3, column) + ":" + CellAt.fixed(2 + count, column);
    book.symbols().text(row.get(1) + ".all", all);
    sheet.at(back, 0);
  }

  /** Runs call each other's cells: in the row above after less-than, in the same row after at. */
  private String along(String text, int row) {
    Matcher place = RUN.matcher(text);
    StringBuilder result = new StringBuilder();
    while (place.find()) {
      int at = place.group(1).equals("<") ? row - 1 : row;
      place.appendReplacement(result, CellAt.a1(at, columns.get(place.group(2))));
    }
    return place.appendTail(result).toString();
  }

  private void content(String text, String symbol) {
    if (text.startsWith("=")) {
      sheet.formula(text.substring(1));
    } else {
      double value = Double.parseDouble(text);
      boolean small = Math.abs(value) < 1 && symbol.isEmpty();
      sheet.value(small ? Dice.round(value * scale, 4) : value);
    }
  }
}
