package weighhouse.support;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Reads the reference tables among the test resources (see their README for who made them). */
public final class Reference {
  private Reference() {}

  /** One line of a table, by column name. */
  public record Row(Map<String, String> cells) {
    public String text(String column) {
      String text = cells.get(column);
      if (text == null) {
        throw new IllegalArgumentException("no column " + column + " in " + cells.keySet());
      }
      return text;
    }

    public double number(String column) {
      return Double.parseDouble(text(column));
    }

    public int integer(String column) {
      return Integer.parseInt(text(column));
    }
  }

  /** All lines of {@code reference/file}. */
  public static List<Row> rows(String file) {
    List<String> lines = lines("/reference/" + file);
    List<String> names = split(lines.get(0));
    List<Row> rows = new ArrayList<>();
    for (String line : lines.subList(1, lines.size())) {
      List<String> fields = split(line);
      Map<String, String> cells = new HashMap<>();
      for (int i = 0; i < names.size(); i++) {
        cells.put(names.get(i), fields.get(i));
      }
      rows.add(new Row(cells));
    }
    return rows;
  }

  /** One column of a table as numbers. */
  public static double[] column(List<Row> rows, String column) {
    return rows.stream().mapToDouble(row -> row.number(column)).toArray();
  }

  private static List<String> lines(String resource) {
    try (InputStream in = Reference.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalArgumentException("no resource " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static List<String> split(String line) {
    List<String> fields = new ArrayList<>();
    StringBuilder field = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        fields.add(field.toString());
        field.setLength(0);
      } else {
        field.append(c);
      }
    }
    fields.add(field.toString());
    return fields;
  }
}
