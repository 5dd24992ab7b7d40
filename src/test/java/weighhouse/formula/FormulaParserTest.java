package weighhouse.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FormulaParserTest {

  /**
   * The grouping that Microsoft documents under "Calculation operators and precedence in Excel".
   */
  @ParameterizedTest(name = "{0} groups as {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "-2^2         | ((-2)^2)",
        "2^-2^3       | ((2^(-2))^3)",
        "2^3^2        | ((2^3)^2)",
        "-A1%         | ((-A1)%)",
        "A1^50%       | (A1^(50%))",
        "2%%          | ((2%)%)",
        "1-2-3        | ((1-2)-3)",
        "8/4/2        | ((8/4)/2)",
        "8/4*2        | ((8/4)*2)",
        "1+2*3        | (1+(2*3))",
        "1*2+3        | ((1*2)+3)",
        "1&2+3        | (1&(2+3))",
        "1&2=3&4      | ((1&2)=(3&4))",
        "1<2=3>4      | (((1<2)=3)>4)",
        "1<=2<>3      | ((1<=2)<>3)",
        "--A1         | (-(-A1))",
        "1--+2        | (1-(-(+2)))",
        "-A1:B2       | (-A1:B2)",
        "A1:B2%       | (A1:B2%)",
        "@A1:B2+1     | ((@A1:B2)+1)",
        "A1:C3 B2:D4  | (A1:C3 B2:D4)",
        "-A1:C3 B2    | (-(A1:C3 B2))",
        "A1 B1:C1     | (A1 B1:C1)",
        "A1 : B2      | A1:B2",
        "1 - 2 * 3    | (1-(2*3))",
        "5%-3         | ((5%)-3)"
      })
  void bindsAsExcelDoes(String text, String grouped) throws FormulaSyntaxException {
    assertEquals(grouped, Grouping.of(parse(text)));
  }

  @Test
  void unionNeedsParenthesesOnlyInsideCalls() throws FormulaSyntaxException {
    assertEquals("(A1:B1,C1)", Grouping.of(parse("A1:B1 , C1")));
    Expr.Call call = (Expr.Call) parse("SUM((A1,B1),C1)");
    assertEquals(2, call.arguments().size());
  }

  @Test
  void emptyArgumentsAreMissing() throws FormulaSyntaxException {
    assertEquals(
        List.of(new Expr.Missing(), new Expr.Missing()), ((Expr.Call) parse("F(,)")).arguments());
    assertEquals(List.of(), ((Expr.Call) parse("RAND( )")).arguments());
    assertEquals(3, ((Expr.Call) parse("IF(A1,,B1)")).arguments().size());
  }

  @Test
  void referencesAreRelativeToTheHost() throws FormulaSyntaxException {
    Expr tree = FormulaParser.parse("=B$3", 4, 2).tree();
    assertEquals(new Expr.CellRef(null, new Axis(2, true), new Axis(-1, false)), tree);
    assertEquals("C$3", FormulaPrinter.print(tree, 7, 3));
  }

  @Test
  void everyNodeKnowsItsPlace() throws FormulaSyntaxException {
    ParsedFormula parsed = FormulaParser.parse("= 1 - SUM( A1 , -$B2%)", 0, 0);
    assertEquals(" 1 - SUM( A1 , -$B2%)", parsed.text());
    Expr.Binary minus = (Expr.Binary) parsed.tree();
    Expr.Call sum = (Expr.Call) minus.right();
    assertEquals("1 - SUM( A1 , -$B2%)", textOf(parsed, minus));
    assertEquals("SUM( A1 , -$B2%)", textOf(parsed, sum));
    assertEquals("-$B2%", textOf(parsed, sum.arguments().get(1)));
    assertEquals("A1", textOf(parsed, sum.arguments().get(0)));
  }

  private static String textOf(ParsedFormula parsed, Expr node) {
    SourceSpan span = parsed.span(node).orElseThrow();
    return parsed.text().substring(span.start(), span.end());
  }

  @ParameterizedTest(name = "{0}: {1} at {2}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "~~           | empty formula                         | 0",
        "1+           | the formula ends too early            | 2",
        "SUM(A1       | the formula ends too early            | 6",
        "A1)          | unexpected ')'                        | 2",
        "1 2          | unexpected '2'                        | 2",
        "\"abc        | text without its closing quote        | 0",
        "'abc!A1      | sheet name without its closing quote  | 0",
        "$A+1         | a row or column without the other end of its range | 0",
        "A1:5         | a range needs a reference on both sides of ':' | 0",
        "T[[a],[b]]   | structured reference with misplaced brackets | 0",
        "$ZZZ$1       | $ZZZ$1 is outside the sheet           | 0",
        "A1 ~ ~ B1    | unexpected '~'                        | 3"
      })
  void saysWhatIsWrongAndWhere(String text, String message, int position) {
    FormulaSyntaxException e =
        assertThrows(FormulaSyntaxException.class, () -> FormulaParser.parse(text, 0, 0));
    assertEquals(message, e.getMessage());
    assertEquals(position, e.position());
  }

  @Test
  void deepNestingIsRefused() {
    String text = "(".repeat(100_000) + "1" + ")".repeat(100_000);
    FormulaSyntaxException tooLong =
        assertThrows(FormulaSyntaxException.class, () -> FormulaParser.parse(text, 0, 0));
    assertTrue(tooLong.getMessage().contains("the limit is"), tooLong.getMessage());
    FormulaSyntaxException tooDeep =
        assertThrows(
            FormulaSyntaxException.class,
            () -> FormulaParser.parse("(".repeat(3000) + "1" + ")".repeat(3000), 0, 0));
    assertEquals("nested more than 256 levels deep", tooDeep.getMessage());
    assertThrows(FormulaSyntaxException.class, () -> parse("-".repeat(5000) + "1"));
  }

  @Test
  void longChainsAndNestingWithinTheLimitsWork() throws FormulaSyntaxException {
    String chain = "A1" + "+B2".repeat(5000);
    assertEquals(chain, FormulaPrinter.print(parse(chain), 0, 0));
    String nested = "IF(A1,".repeat(255) + "1" + ")".repeat(255);
    assertEquals(nested, FormulaPrinter.print(parse(nested), 0, 0));
  }

  private static Expr parse(String text) throws FormulaSyntaxException {
    return FormulaParser.parse(text, 0, 0).tree();
  }
}
