package weighhouse.formula.normal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.util.List;
import java.util.Map;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.UnaryOp;
import weighhouse.workbook.CellAddress;

/** The normal form, and the tree built back from it, have the value of the tree they came from. */
class NormalFormValueTest {
  private static final CellAddress HOST = new CellAddress(0, 0, 0);

  @Property(tries = 1000)
  void normalFormHasTheTreesValue(
      @ForAll("positive") Expr tree,
      @ForAll Level level,
      @ForAll @DoubleRange(min = 0.05, max = 0.95) double a,
      @ForAll @DoubleRange(min = 0.05, max = 0.95) double b,
      @ForAll @DoubleRange(min = 0.05, max = 0.95) double c)
      throws FormulaSyntaxException {
    Map<String, Double> values = Map.of("A_", a, "B_", b, "C_", c);
    double expected = Evaluation.of(tree, values);
    assumeTrue(Math.abs(expected) > 1e-6 && Math.abs(expected) < 1e6);
    NormalForm form = Normaliser.ofPatterns(level).normalise(tree, HOST);
    double tolerance = 1e-7 * Math.abs(expected) + 1e-9;
    assertEquals(expected, Evaluation.of(form.poly(), values), tolerance);
    Expr rebuilt = new Rebuilder(null, HOST, new Origins()).expr(form.poly());
    assertEquals(expected, Evaluation.of(rebuilt, values), tolerance);
    String text = FormulaPrinter.print(rebuilt, 0, 0);
    assertEquals(
        expected, Evaluation.of(FormulaParser.parse(text, 0, 0).tree(), values), tolerance);
    boolean exact = !form.poly().key().matches(".*[0-9.]{12}.*");
    // Whole powers of sums below a line are not factored again once multiplied out.
    assumeTrue(exact && level == Level.AS_WRITTEN);
    assertEquals(form.poly(), Normaliser.ofPatterns(level).normalise(rebuilt, HOST).poly(), text);
  }

  @Provide
  Arbitrary<Expr> positive() {
    return positive(4);
  }

  /** Expressions of positive value, as rates, probabilities and ratios are. */
  private static Arbitrary<Expr> positive(int depth) {
    Arbitrary<Expr> leaf =
        Arbitraries.oneOf(
            Arbitraries.of("A_", "B_", "C_").map(name -> new Expr.NameRef(null, name)),
            Arbitraries.of("2", "0.5", "0.1", "3", "12")
                .map(text -> new Expr.Num(Double.parseDouble(text), text)));
    if (depth == 0) {
      return leaf;
    }
    Arbitrary<Expr> inner = Arbitraries.lazy(() -> positive(depth - 1));
    return Arbitraries.oneOf(
        leaf,
        operation(BinaryOp.ADD, inner),
        operation(BinaryOp.MULTIPLY, inner),
        operation(BinaryOp.DIVIDE, inner),
        operation(BinaryOp.POWER, inner),
        inner.map(NormalFormValueTest::complement),
        Combinators.combine(inner, inner).as(NormalFormValueTest::decay),
        inner.map(x -> new Expr.Call("EXP", List.of(new Expr.Call("LN", List.of(x))))),
        inner.map(x -> new Expr.Call("SQRT", List.of(x))),
        inner.map(x -> new Expr.Unary(UnaryOp.PERCENT, x)));
  }

  private static Arbitrary<Expr> operation(BinaryOp op, Arbitrary<Expr> inner) {
    return Combinators.combine(inner, inner).as((x, y) -> new Expr.Binary(op, x, y));
  }

  /** 1 - 1/(1+x). */
  private static Expr complement(Expr x) {
    Expr one = new Expr.Num(1, "1");
    return new Expr.Binary(
        BinaryOp.SUBTRACT,
        one,
        new Expr.Binary(BinaryOp.DIVIDE, one, new Expr.Binary(BinaryOp.ADD, one, x)));
  }

  /** x*(1-EXP(-y)), spelled out as x-x*EXP(-y). */
  private static Expr decay(Expr x, Expr y) {
    Expr exp = new Expr.Call("EXP", List.of(new Expr.Unary(UnaryOp.MINUS, y)));
    return new Expr.Binary(BinaryOp.SUBTRACT, x, new Expr.Binary(BinaryOp.MULTIPLY, x, exp));
  }
}
