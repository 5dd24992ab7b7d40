package weighhouse.generator.model;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The generator's tables of words: lines of fields between bars, {@code #} begins a comment. */
public final class Tables {
  private static final Map<String, List<List<String>>> READ = new ConcurrentHashMap<>();

  private Tables() {}

  /** Rows of a table. */
  public static List<List<String>> rows(String table) {
    return READ.computeIfAbsent(table, Tables::read);
  }

  private static List<List<String>> read(String table) {
    try (InputStream in = Tables.class.getResourceAsStream("/generator/" + table + ".txt")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.isBlank() && !line.startsWith("#"))
          .map(line -> Arrays.stream(line.split("\\|")).map(String::strip).toList())
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
