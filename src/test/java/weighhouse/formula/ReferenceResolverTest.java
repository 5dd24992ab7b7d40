package weighhouse.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

class ReferenceResolverTest {
  private static final Workbook WORKBOOK =
      new FormulaGrid()
          .sheet("Inputs")
          .number("A1", 1)
          .sheet("My trace")
          .number("A1", 1)
          .sheet("Last")
          .number("A1", 1)
          .name("hr", -1, "Inputs!$B$2")
          .name("hr", 1, "'My trace'!$C$3")
          .name("Prev", -1, "'My trace'!$E:$E")
          .name("head", -1, "'My trace'!$2:$2")
          .name("above", -1, "'My trace'!D1048576")
          .name("alias", -1, "hr")
          .name("lost", -1, "Inputs!#REF!")
          .name("nonsense", -1, "1+")
          .name("loop", -1, "pool")
          .name("pool", -1, "loop")
          .build();
  private static final ReferenceResolver RESOLVER = new ReferenceResolver(WORKBOOK);

  @ParameterizedTest(name = "{0} in the trace''s E7 is {1}")
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '~',
      value = {
        "D6              | 'My trace'!D6",
        "(D6)            | 'My trace'!D6",
        "D6:D6           | 'My trace'!D6",
        "Inputs!$B$2     | Inputs!B2",
        "inputs!b2       | Inputs!B2",
        "hr              | 'My trace'!C3",
        "HR              | 'My trace'!C3",
        "Last!hr         | Inputs!B2",
        "Prev            | 'My trace'!E7",
        "head            | 'My trace'!E2",
        "above           | 'My trace'!H6",
        "@A1:A20         | 'My trace'!A7",
        "A1:A20          | 'My trace'!A7",
        "A1:A3           | none",
        "A1:B20          | none",
        "lost            | none",
        "loop            | none",
        "unknown         | none",
        "[1]Inputs!A1    | none",
        "Gone!A1         | none",
        "1+A1            | none"
      })
  void meansOneCell(String text, String cell) throws FormulaSyntaxException {
    CellAddress host = FormulaGrid.cell(1, "E7");
    Expr tree = FormulaParser.parse(text, host.row(), host.column()).tree();
    assertEquals(cell, RESOLVER.cell(tree, host).map(WORKBOOK::show).orElse("none"));
  }

  @Test
  void findsEveryRectangleThatAFormulaReads() throws FormulaSyntaxException {
    CellAddress host = FormulaGrid.cell(0, "B2");
    Expr tree =
        FormulaParser.parse("SUM(B9:A8,hr)+Inputs:Last!C4*alias-A1:INDEX(C1:C5,2)", 1, 1).tree();
    List<String> ranges = RESOLVER.ranges(tree, host).stream().map(WORKBOOK::show).toList();
    assertEquals(
        List.of(
            "Inputs!A8:B9",
            "Inputs!B2",
            "Inputs!C4",
            "'My trace'!C4",
            "Last!C4",
            "Inputs!B2",
            "Inputs!A1",
            "Inputs!C1:C5"),
        ranges);
  }

  @Test
  void brokenNamesAreTold() {
    assertEquals(
        List.of("lost", "nonsense"),
        RESOLVER.names().broken().stream().map(name -> name.name()).toList());
  }

  @Test
  void treesAreRebuiltByIdentity() throws FormulaSyntaxException {
    Expr.Binary tree = (Expr.Binary) FormulaParser.parse("A1*A1", 0, 0).tree();
    Expr replaced = Trees.replace(tree, tree.right(), new Expr.Num(2, "2"));
    assertEquals("A1*2", FormulaPrinter.print(replaced, 0, 0));
    assertEquals(2, Trees.count(tree, Expr.CellRef.class::isInstance));
    Expr bare = Trees.withoutParens(FormulaParser.parse("((A1))*(B1+1)", 0, 0).tree());
    assertEquals("A1*(B1+1)", FormulaPrinter.print(bare, 0, 0));
  }
}
