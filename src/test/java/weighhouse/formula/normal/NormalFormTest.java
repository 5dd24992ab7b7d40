package weighhouse.formula.normal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.workbook.CellAddress;

class NormalFormTest {
  private static final CellAddress HOST = new CellAddress(0, 0, 0);

  @ParameterizedTest(name = "{0} is {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "p*hr                    | hr*p",
        "p*hr*x                  | x*(p*hr)",
        "a+b+c                   | c+(b+a)",
        "a-(b-c)                 | a-b+c",
        "PRODUCT(p,hr)           | p*hr",
        "SUM(a,b)                | a+b",
        "SUMPRODUCT(p,hr)        | p*hr",
        "POWER(a,b)              | a^b",
        "SQRT(a)                 | a^0.5",
        "a%                      | a/100",
        "50%*a                   | a/2",
        "a/b                     | a*b^-1",
        "a/(b*c)                 | a/b/c",
        "a/(b/c)                 | a*c/b",
        "EXP(LN(x))              | x",
        "LN(EXP(x))              | x",
        "EXP(a)*EXP(b)           | EXP(a+b)",
        "EXP(a)/EXP(b)           | EXP(a-b)",
        "EXP(a*LN(x))            | x^a",
        "EXP(hr*LN(1-p))         | (1-p)^hr",
        "EXP(-(-LN(1-p)*hr))     | (1-p)^hr",
        "1-EXP(LN(1-p)/12)       | 1-(1-p)^(1/12)",
        "EXP(LN(a)-LN(b))        | a/b",
        "EXP(EXP(z)*LN(x))       | x^EXP(z)",
        "EXP((a+b)*LN(x))        | x^(a+b)",
        "(x^a)^b                 | x^(a*b)",
        "LN(x^a)                 | a*LN(x)",
        "LN(u/l)                 | LN(u)-LN(l)",
        "LN((1-p)^t)             | t*LN(1-p)",
        "1/12*12*p               | p",
        "0.1*3*p                 | 0.3*p",
        "-p                      | -1*p",
        "+p                      | p",
        "(p)                     | p",
        "p-1                     | -(1-p)",
        "(p-1)^2                 | (1-p)^2",
        "a>b                     | b<a",
        "a=b                     | b=a",
        "LET(x,p*hr,1-x)         | 1-p*hr",
        "LOG(a,EXP(1))           | LN(a)",
        "2^3                     | 8",
        "x^0                     | 1",
        "EXP(0)+LN(1)            | 1",
        "EXP(LN(0.01)*a)         | 0.01^a",
        "EXP(0.5)*EXP(a)         | EXP(0.5+a)",
        "2^0.5^2                 | 2",
        "1-(p+q)                 | 1-q-p",
        "1-EXP(-r*t)             | 1-1/EXP(t*r)",
        "IF(a>b,p*q,1)           | IF(b<a,q*p,1)",
        "p*(1-(1-hr))            | hr*p",
        "(1-p)*(1-p)             | (1-p)^2",
      })
  void alikeAtBothLevels(String a, String b) throws FormulaSyntaxException {
    assertEquals(normal(a, Level.AS_WRITTEN), normal(b, Level.AS_WRITTEN));
    assertEquals(normal(a, Level.EXPANDED), normal(b, Level.EXPANDED));
  }

  @ParameterizedTest(name = "{0} is {1} when expanded")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "p-p*(1-hr)              | p*hr",
        "hr-hr*EXP(-r*t)         | hr*(1-EXP(-r*t))",
        "a*(b+c)                 | a*b+c*a",
        "(a+b)*(c+d)             | a*c+a*d+b*c+b*d",
        "(hr*rate-rate)*dt       | rate*dt*(hr-1)",
        "1-(1-p)*(1-q)           | p+q-p*q",
        "(a*b+a*c)/(b+c)         | a",
        "a/x+b/x                 | (a+b)/x",
        "p*(1+hr)-p              | p*hr",
        "100*a-100*b             | 100*(a-b)",
        "(hr-hr*x)^y             | hr^y*(1-x)^y",
        "(1-p)^2                 | 1-2*p+p^2",
        "LN(a*b-a*c)             | LN(a)+LN(b-c)",
        "EXP(a*(b+c))            | EXP(a*b+a*c)"
      })
  void alikeWhenExpandedOnly(String a, String b) throws FormulaSyntaxException {
    assertEquals(normal(a, Level.EXPANDED), normal(b, Level.EXPANDED));
    assertNotEquals(normal(a, Level.AS_WRITTEN), normal(b, Level.AS_WRITTEN));
  }

  @ParameterizedTest(name = "{0} is not {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "1-EXP(-r*t)    | 1-EXP(r*t)",
        "LOG10(x)       | LN(x)",
        "a-b            | b-a",
        "p^hr           | p*hr",
        "(1-p)^hr       | 1-p^hr",
        "RAND()*RAND()  | RAND()^2",
        "SUM(a,1)       | SUM(a,TRUE)",
        "-2^2*a         | -4*a",
        "a/b            | b/a",
        "IF(a,p,q)      | IF(a,q,p)"
      })
  void differs(String a, String b) throws FormulaSyntaxException {
    assertNotEquals(normal(a, Level.AS_WRITTEN), normal(b, Level.AS_WRITTEN));
    assertNotEquals(normal(a, Level.EXPANDED), normal(b, Level.EXPANDED));
  }

  @ParameterizedTest(name = "{0} counts as {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "p*ROUND(hr,2)              | p*hr",
        "p*IF(on=1,hr,1)            | p*hr",
        "MIN(1,p*hr)                | p*hr",
        "MAX(0,MIN(p*hr,1))         | p*hr",
        "IFERROR(p*hr,\"\")         | p*hr",
        "IFERROR(p*hr,-1)           | p*hr",
        "ROUND(p*N(hr),4)           | p*hr",
        "CHOOSE(s,hr,1)*VALUE(p)    | p*hr",
        "@p*+(hr)                   | p*hr"
      })
  void wrappersAreSeenThrough(String a, String b) throws FormulaSyntaxException {
    Normaliser through = new Normaliser(null, Level.EXPANDED, Transparency.USUAL, Helpers.NONE);
    Poly poly = through.normalise(FormulaParser.parse(a, 0, 0).tree(), HOST).poly();
    assertEquals(normal(b, Level.EXPANDED), poly);
  }

  static Poly normal(String text, Level level) throws FormulaSyntaxException {
    Expr tree = FormulaParser.parse(text, 0, 0).tree();
    return Normaliser.ofPatterns(level).normalise(tree, HOST).poly();
  }
}
