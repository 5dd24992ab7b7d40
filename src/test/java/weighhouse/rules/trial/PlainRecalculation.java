package weighhouse.rules.trial;

import java.util.List;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Shapes;
import weighhouse.recalculate.Change;
import weighhouse.recalculate.Recalculation;
import weighhouse.recalculate.Replay;
import weighhouse.recalculate.Value;
import weighhouse.recalculate.Values;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.rules.term.Sample;
import weighhouse.rules.term.Scope;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Terms;
import weighhouse.rules.term.Translator;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** Values of arithmetic over typed-in numbers, by the same algebra as patterns. */
record PlainRecalculation(Workbook workbook, Shapes shapes, ModelScope cells)
    implements Recalculation {

  private final class Numbers implements Scope {
    @Override
    public Term term(Expr reference, CellAddress host, Translator translator) {
      CellAddress cell = cells.cell(reference, host);
      if (cell == null) {
        return translator.terms().symbol(reference);
      }
      var shape = shapes.at(cell);
      return shape == null
          ? translator.terms().number(typed(cell))
          : translator.elsewhere(shape.tree(), cell);
    }

    @Override
    public List<Expr> cells(Expr area, CellAddress host) {
      return cells.cells(area, host);
    }
  }

  private double typed(CellAddress cell) {
    CellStore store = workbook.sheet(cell.sheet()).cells();
    int index = store.find(cell.row(), cell.column());
    return index < 0 ? 0 : store.number(index);
  }

  @Override
  public Values base() {
    return cell -> evaluate(new Expr.Missing(), cell, null);
  }

  @Override
  public Value evaluate(Expr expression, CellAddress host, Values values) {
    Term term = new Translator(new Terms(), new Numbers()).translate(expression, host);
    return new Value.Num(new Sample(0, term.id() + 1).of(term));
  }

  @Override
  public Values whatIf(Change change) {
    throw new UnsupportedOperationException();
  }

  @Override
  public Values draw(long seed, Change change) {
    throw new UnsupportedOperationException();
  }

  @Override
  public List<CellRange> dependents(Set<CellAddress> cells) {
    return List.of();
  }

  @Override
  public List<CellRange> precedents(CellAddress cell) {
    return List.of();
  }

  @Override
  public Replay replay() {
    throw new UnsupportedOperationException();
  }
}
