package weighhouse.formula.normal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaPrinter;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.ReferenceResolver;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;

/** Names, helper cells and switches on the way in; what was written on the way out. */
class OriginsTest {
  private static final CellAddress HOST = new CellAddress(0, 9, 4);
  private static final Workbook WORKBOOK =
      new Workbook(
          "test.xlsx",
          "",
          List.of(sheet("Trace"), sheet("Inputs")),
          List.of(name("hr", "Inputs!$B$2"), name("step", "1-EXP(-Inputs!$B$9)"), name("k", "0.5")),
          false,
          List.of(),
          List.of(),
          List.of());

  @Test
  void helperCellsAreLookedThrough() throws FormulaSyntaxException {
    Map<CellAddress, String> formulas =
        Map.of(
            cell("C10"), "B10*D10", cell("D10"), "ROUND(hr,2)", cell("F1"), "F2", cell("F2"), "F1");
    Normaliser normaliser = normaliser(formulas);
    NormalForm form = normaliser.normalise(parse("MIN(1,C10)", HOST), HOST);
    assertEquals(normaliser.normalise(parse("Inputs!B2*B10", HOST), HOST).poly(), form.poly());
    assertEquals("MIN(1,C10)", text(form, form.poly()));
    assertEquals(Poly.of(new Atom.Cell(cell("F1"))), normal(normaliser, "F1"));
  }

  @Test
  void factorsComeBackAsWritten() throws FormulaSyntaxException {
    NormalForm form = form("$B10*IF($A$1=1,hr,1)+Inputs!$C$4");
    Atom hr = new Atom.Cell(new CellAddress(1, 1, 1));
    assertEquals("IF($A$1=1,hr,1)", text(form, Poly.of(hr)));
    assertEquals(2, form.origins().of(hr).size());
    Atom p = new Atom.Cell(cell("B10"));
    Arithmetic by = new Arithmetic(Level.EXPANDED);
    Poly right = by.subtract(Poly.ONE, by.power(by.subtract(Poly.ONE, Poly.of(p)), Poly.of(hr)));
    assertEquals("1-(1-$B10)^IF($A$1=1,hr,1)", text(form, right));
    assertTrue(form.origins().of(new Atom.Name("ELSEWHERE")).isEmpty());
  }

  @Test
  void whatWasNotWrittenIsMadeUp() throws FormulaSyntaxException {
    NormalForm form = form("1+1");
    Arithmetic by = new Arithmetic(Level.EXPANDED);
    Poly input = Poly.of(new Atom.Cell(new CellAddress(1, 1, 1)));
    Poly own = Poly.of(new Atom.Cell(cell("D9")));
    assertEquals(
        "1-EXP(-D9*Inputs!$B$2)",
        text(form, by.subtract(Poly.ONE, by.exp(by.negate(by.multiply(own, input))))));
    assertEquals("D9/(2*Inputs!$B$2)", text(form, by.divide(own, by.add(input, input))));
  }

  @Test
  void namesForFormulasAreInlinedAndForConstantsKept() throws FormulaSyntaxException {
    Normaliser normaliser = normaliser(Map.of());
    assertEquals(normal(normaliser, "1-EXP(-Inputs!B9)"), normal(normaliser, "step"));
    assertEquals(Poly.of(new Atom.Name("K")), normal(normaliser, "k"));
  }

  @Test
  void thousandsOfTermsAreNoTrouble() throws FormulaSyntaxException {
    Poly sum = normal(normaliser(Map.of()), "A1" + "+A1".repeat(3000));
    assertEquals(normal(normaliser(Map.of()), "3001*A1"), sum);
  }

  private static Poly normal(Normaliser normaliser, String text) throws FormulaSyntaxException {
    return normaliser.normalise(parse(text, HOST), HOST).poly();
  }

  private static NormalForm form(String text) throws FormulaSyntaxException {
    return normaliser(Map.of()).normalise(parse(text, HOST), HOST);
  }

  private static Normaliser normaliser(Map<CellAddress, String> formulas) {
    return new Normaliser(
        new ReferenceResolver(WORKBOOK),
        Level.EXPANDED,
        Transparency.USUAL,
        cell -> Optional.ofNullable(formulas.get(cell)).map(text -> hosted(text, cell)));
  }

  private static Hosted hosted(String text, CellAddress cell) {
    try {
      return new Hosted(parse(text, cell), cell);
    } catch (FormulaSyntaxException e) {
      throw new IllegalArgumentException(e);
    }
  }

  private static Expr parse(String text, CellAddress host) throws FormulaSyntaxException {
    return FormulaParser.parse(text, host.row(), host.column()).tree();
  }

  private static String text(NormalForm form, Poly poly) {
    Expr tree = new Rebuilder(WORKBOOK, HOST, form.origins()).expr(poly);
    return FormulaPrinter.print(tree, HOST.row(), HOST.column());
  }

  private static CellAddress cell(String a1) {
    return new CellAddress(0, Integer.parseInt(a1.substring(1)) - 1, a1.charAt(0) - 'A');
  }

  private static DefinedName name(String name, String formula) {
    return new DefinedName(name, DefinedName.WORKBOOK_SCOPE, formula, false, "");
  }

  private static Sheet sheet(String name) {
    return new Sheet(
        name,
        Visibility.VISIBLE,
        null,
        List.of(),
        List.of(),
        Map.of(),
        new BitSet(),
        new BitSet(),
        List.of());
  }
}
