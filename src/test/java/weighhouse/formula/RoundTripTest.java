package weighhouse.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.stream.Stream;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class RoundTripTest {

  @ParameterizedTest
  @MethodSource("uglyFormulas")
  void textToTreeToTextToTree(String text) throws FormulaSyntaxException {
    Expr tree = FormulaParser.parse(text, 6, 3).tree();
    String printed = FormulaPrinter.print(tree, 6, 3);
    assertEquals(tree, FormulaParser.parse(printed, 6, 3).tree(), printed);
  }

  /** The printer may have to add parentheses; a tree that already has them comes back the same. */
  @Property(tries = 3000)
  void treeToTextToTree(
      @ForAll("trees") Expr tree,
      @ForAll @IntRange(max = 1_048_575) int row,
      @ForAll @IntRange(max = 16_383) int column)
      throws FormulaSyntaxException {
    String text = FormulaPrinter.print(tree, row, column);
    Expr parsed = FormulaParser.parse(text, row, column).tree();
    assertEquals(
        RandomTrees.canonical(tree, row, column), RandomTrees.canonical(parsed, row, column), text);
    assertEquals(text, FormulaPrinter.print(parsed, row, column));
    assertEquals(parsed, FormulaParser.parse(text, row, column).tree());
  }

  /** A cell further down that holds the same tree mostly has the same key, and never another's. */
  @ParameterizedTest
  @MethodSource("uglyFormulas")
  void movedFormulasHaveEqualTreesWhereKeysAreEqual(String text) throws FormulaSyntaxException {
    String body = text.substring(text.indexOf('=') + 1);
    for (int move = 1; move < 4; move++) {
      String key = ShapeIndexTest.key(body, 6, 3);
      Expr tree = FormulaParser.parse(body, 6, 3).tree();
      boolean sameTree = tree.equals(FormulaParser.parse(body, 6 + move, 3 + move).tree());
      assertTrue(sameTree || !key.equals(ShapeIndexTest.key(body, 6 + move, 3 + move)), body);
      String moved = FormulaPrinter.print(tree, 6 + move, 3 + move);
      String printed = FormulaPrinter.print(tree, 6, 3);
      assertEquals(
          text.contains("XFD") ? "at the edge" : ShapeIndexTest.key(printed, 6, 3),
          text.contains("XFD") ? "at the edge" : ShapeIndexTest.key(moved, 6 + move, 3 + move),
          moved);
    }
  }

  @Provide
  Arbitrary<Expr> trees() {
    return RandomTrees.any();
  }

  static Stream<String> uglyFormulas() throws IOException {
    try (var in = RoundTripTest.class.getResourceAsStream("ugly-formulas.txt");
        var reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      return reader
          .lines()
          .filter(line -> !line.isBlank() && !line.startsWith("//"))
          .map(line -> line.replace("\\n", "\n").replace("\\t", "\t"))
          .toList()
          .stream();
    }
  }
}
