package weighhouse.quantity.inference;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import weighhouse.formula.Expr;
import weighhouse.formula.ReferenceResolver;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.quantity.algebra.Operands;
import weighhouse.quantity.algebra.Spans;
import weighhouse.quantity.vocabulary.Reading;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/** What references mean, as far as the units tell at the moment. */
final class UnitOperands implements Operands {
  /** Areas of more units have nothing in common that would count. */
  private static final int MOST_UNITS = 64;

  private final Units units;
  private final ReferenceResolver resolver;
  private final Lookups lookups;
  private final Vocabulary vocabulary;
  private final ToDoubleFunction<CellAddress> numbers;

  UnitOperands(
      Workbook workbook,
      Units units,
      Vocabulary vocabulary,
      ToDoubleFunction<CellAddress> numbers) {
    this.units = units;
    this.resolver = new ReferenceResolver(workbook);
    this.lookups = new Lookups(workbook, resolver);
    this.vocabulary = vocabulary;
    this.numbers = numbers;
  }

  ReferenceResolver resolver() {
    return resolver;
  }

  @Override
  public Optional<CellRange> cells(Expr reference, CellAddress host) {
    Expr node = Trees.inside(reference);
    if (node instanceof Expr.Call call) {
      return lookups.cells(call, host);
    }
    boolean line =
        node instanceof Expr.NameRef
            || node instanceof Expr.ColumnsRef
            || node instanceof Expr.TableRef
            || (node instanceof Expr.Unary unary && unary.op() == UnaryOp.AT);
    if (line) {
      Optional<CellRange> one = resolver.cell(node, host).map(CellRange::of);
      return one.isPresent() ? one : resolver.range(node, host);
    }
    return resolver.range(node, host);
  }

  @Override
  public Quantity quantity(CellRange range) {
    List<Unit> found = units.in(range, MOST_UNITS);
    if (found.size() == 1) {
      return found.get(0).quantity();
    }
    Quantity common = Quantity.UNKNOWN;
    for (Unit unit : found) {
      Quantity next = unit.quantity();
      if (next.kind() != Kind.UNKNOWN) {
        if (common.kind() != Kind.UNKNOWN && common.kind() != next.kind()) {
          return Quantity.UNKNOWN;
        }
        common = common.kind() == Kind.UNKNOWN ? next : meet(common, next);
      }
    }
    return common;
  }

  private static Quantity meet(Quantity a, Quantity b) {
    Span span = Spans.same(a.span(), b.span()) ? a.span() : null;
    Role role = a.role() == b.role() ? a.role() : Role.ESTIMATE;
    return new Quantity(a.kind(), role, span);
  }

  @Override
  public double number(CellAddress cell) {
    return numbers.applyAsDouble(cell);
  }

  @Override
  public Quantity named(Expr.NameRef name, CellAddress host) {
    Reading reading = vocabulary.read(name.name());
    return reading.senses().isEmpty()
        ? Quantity.UNKNOWN
        : new Quantity(reading.kind(), Role.ESTIMATE, reading.span());
  }
}
