package weighhouse.recalculate.program;

import java.util.List;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.recalculate.functions.Grid;
import weighhouse.recalculate.functions.Reference;
import weighhouse.recalculate.functions.Surroundings;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** What functions may ask of the frame that they run in. */
record HostSurroundings(Frame frame, Names names) implements Surroundings {
  @Override
  public CellAddress host() {
    return frame.host();
  }

  @Override
  public Workbook workbook() {
    return names.workbook();
  }

  @Override
  public Grid cells(Reference reference) {
    return frame.cells(reference);
  }

  @Override
  public Reference referenceOf(String text) {
    try {
      Expr tree = FormulaParser.parse(text, 0, 0).tree();
      boolean named = tree instanceof Expr.NameRef || tree instanceof Expr.TableRef;
      CellAddress host = named ? frame.host() : new CellAddress(frame.sheet(), 0, 0);
      List<Footprint> footprints = new References(names, host).of(tree);
      if (footprints == null) {
        return null;
      }
      return new Reference(footprints.stream().map(f -> f.at(host.row(), host.column())).toList());
    } catch (FormulaSyntaxException | UnsupportedFormulaException e) {
      return null;
    }
  }

  @Override
  public double random() {
    return frame.random();
  }
}
