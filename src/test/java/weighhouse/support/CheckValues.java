package weighhouse.support;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.DoubleSupplier;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;

/** Holds our figures against the rows of {@code check-values.csv}; each row names its source. */
public final class CheckValues {
  private CheckValues() {}

  /**
   * One test a row whose id matches the pattern, and one that no such row was left out and no
   * figure given that has no row.
   */
  public static Stream<DynamicTest> rows(String idPattern, Map<String, DoubleSupplier> ours) {
    List<Reference.Row> rows =
        Reference.rows("check-values.csv").stream()
            .filter(row -> row.text("id").matches(idPattern))
            .toList();
    Set<String> wanted =
        rows.stream().map(row -> row.text("id")).collect(Collectors.toCollection(TreeSet::new));
    DynamicTest complete =
        DynamicTest.dynamicTest(
            "every row " + idPattern, () -> assertEquals(wanted, new TreeSet<>(ours.keySet())));
    Stream<DynamicTest> each =
        rows.stream()
            .filter(row -> ours.containsKey(row.text("id")))
            .map(row -> test(row, ours.get(row.text("id"))));
    return Stream.concat(Stream.of(complete), each);
  }

  private static DynamicTest test(Reference.Row row, DoubleSupplier ours) {
    String name = row.text("id") + " " + row.text("quantity") + " [" + row.text("source") + "]";
    double expected = row.number("value");
    return DynamicTest.dynamicTest(
        name, () -> assertEquals(expected, ours.getAsDouble(), row.number("tolerance"), name));
  }
}
