package weighhouse.recalculate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.recalculate.functions.NumberText;

/**
 * Excel's semantics, one formula a line. Expected values follow Microsoft's documentation of each
 * function and operator, from memory unless the line names a source; arithmetic was done by hand.
 */
class SemanticsTest {
  private static final Book BOOK =
      new Book()
          .set("A1", 1)
          .set("A2", 2)
          .set("A3", 3)
          .set("A4", 4)
          .set("A5", 5)
          .set("B1", 10)
          .set("B2", 20)
          .set("B3", 30)
          .set("B4", 40)
          .set("B5", 50)
          .set("C1", "apple")
          .set("C2", "Banana")
          .set("C3", "cherry")
          .set("C4", "apple pie")
          .set("D1", true)
          .set("D2", "3")
          .set("D4", "#DIV/0!");

  @TestFactory
  Stream<DynamicTest> formulas() throws IOException {
    return lines("semantics.tsv")
        .map(line -> line.split("\t", -1))
        .map(parts -> DynamicTest.dynamicTest(parts[0], () -> check(parts[0], parts[1])));
  }

  private static Stream<String> lines(String resource) throws IOException {
    try (InputStream in = SemanticsTest.class.getResourceAsStream("/recalculate/" + resource)) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines().filter(line -> !line.startsWith("#")).toList().stream();
    }
  }

  private static void check(String formula, String expected) {
    Value value = BOOK.formula(formula, "E20");
    if (value instanceof Value.Num n) {
      double number = NumberText.parse(expected);
      assertTrue(
          Math.abs(n.value() - number) <= 1e-12 * Math.max(1, Math.abs(number)),
          () -> "expected " + expected + " but was " + n.value());
    } else {
      assertEquals(expected, shown(value));
    }
  }

  private static String shown(Value value) {
    if (value instanceof Value.Text text) {
      return text.value();
    } else if (value instanceof Value.Logical truth) {
      return truth.value() ? "TRUE" : "FALSE";
    }
    return value instanceof Value.Fault fault ? fault.code() : value.toString();
  }
}
