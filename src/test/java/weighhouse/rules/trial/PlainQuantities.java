package weighhouse.rules.trial;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Shape;
import weighhouse.formula.Shapes;
import weighhouse.formula.Trees;
import weighhouse.quantity.Basis;
import weighhouse.quantity.Cycle;
import weighhouse.quantity.Declarations;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Outcome;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Quantity;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.Workbook;

/**
 * What examples declare and the plainest algebra, so that rules are tested apart from inference.
 */
final class PlainQuantities implements Quantities {
  private final Declarations declarations;
  private final Shapes shapes;
  private final ModelScope cells;
  private int depth;

  PlainQuantities(Workbook workbook, Shapes shapes, Declarations declarations) {
    this.declarations = declarations;
    this.shapes = shapes;
    this.cells = new ModelScope(workbook, shapes, this);
  }

  @Override
  public Quantity at(CellAddress cell) {
    for (Map.Entry<CellRange, Quantity> entry : declarations.quantities().entrySet()) {
      if (entry.getKey().contains(cell)) {
        return entry.getValue();
      }
    }
    Shape shape = shapes.at(cell);
    if (shape == null || depth > 20) {
      return Quantity.UNKNOWN;
    }
    depth++;
    Quantity told = of(shape.tree(), cell);
    depth--;
    return told;
  }

  @Override
  public Quantity of(Expr expression, CellAddress host) {
    Expr node = Trees.inside(expression);
    CellAddress cell = cells.cell(node, host);
    if (cell != null) {
      return at(cell);
    } else if (node instanceof Expr.Call call) {
      return call(call, host);
    } else if (node instanceof Expr.Binary binary) {
      return Quantity.of(binary(binary, host));
    }
    return Quantity.UNKNOWN;
  }

  private Quantity call(Expr.Call call, CellAddress host) {
    List<Quantity> known =
        call.arguments().stream()
            .map(argument -> of(argument, host))
            .filter(quantity -> quantity.kind() != Kind.UNKNOWN)
            .toList();
    Quantity first = known.isEmpty() ? Quantity.UNKNOWN : known.get(0);
    return switch (call.function()) {
      case "IF", "CHOOSE", "IFERROR", "ROUND", "MIN", "MAX", "SUM" -> first;
      case "EXP" -> Quantity.of(exponential(call, host));
      default -> Quantity.UNKNOWN;
    };
  }

  private Kind exponential(Expr.Call call, CellAddress host) {
    Kind inner = of(call.arguments().get(0), host).kind();
    if (inner == Kind.LOG_HAZARD_RATIO) {
      return Kind.HAZARD_RATIO;
    }
    boolean rate =
        Trees.contains(
            call, node -> node instanceof Expr.CellRef && of(node, host).kind() == Kind.RATE);
    return rate ? Kind.SURVIVAL : Kind.UNKNOWN;
  }

  private Kind binary(Expr.Binary binary, CellAddress host) {
    Kind left = of(binary.left(), host).kind();
    Kind right = of(binary.right(), host).kind();
    return switch (binary.op()) {
      case SUBTRACT -> isOne(binary.left()) ? complement(right) : sum(left, right);
      case ADD -> sum(left, right);
      case MULTIPLY -> product(left, right);
      case DIVIDE -> quotient(binary, left, right);
      case POWER -> left == Kind.PROBABILITY || left == Kind.SURVIVAL ? left : Kind.UNKNOWN;
      default -> Kind.UNKNOWN;
    };
  }

  private static boolean isOne(Expr node) {
    return node instanceof Expr.Num number && number.value() == 1;
  }

  private static Kind complement(Kind kind) {
    return switch (kind) {
      case PROBABILITY, SURVIVAL -> Kind.PROBABILITY;
      case HAZARD_RATIO -> Kind.HAZARD_REDUCTION;
      case HAZARD_REDUCTION -> Kind.HAZARD_RATIO;
      case RISK_RATIO -> Kind.RISK_REDUCTION;
      case RISK_REDUCTION -> Kind.RISK_RATIO;
      default -> Kind.UNKNOWN;
    };
  }

  private static Kind sum(Kind left, Kind right) {
    return left == right ? left : Kind.UNKNOWN;
  }

  private static Kind product(Kind left, Kind right) {
    List<Kind> both = List.of(left, right);
    if (both.contains(Kind.OCCUPANCY)) {
      return Kind.OCCUPANCY;
    }
    for (Kind carried : List.of(Kind.RATE, Kind.PROBABILITY, Kind.HAZARD_RATIO)) {
      boolean known = both.stream().noneMatch(kind -> kind == Kind.UNKNOWN);
      if (both.contains(carried) && known) {
        return carried;
      }
    }
    return Kind.UNKNOWN;
  }

  private static Kind quotient(Expr.Binary binary, Kind left, Kind right) {
    Expr below = Trees.inside(binary.right());
    boolean odds =
        below instanceof Expr.Binary complement
            && complement.op() == BinaryOp.SUBTRACT
            && isOne(complement.left())
            && Trees.inside(complement.right()).equals(Trees.inside(binary.left()));
    if (left == Kind.PROBABILITY && odds) {
      return Kind.ODDS;
    }
    return left == Kind.RATE && right != Kind.UNKNOWN ? Kind.RATE : Kind.UNKNOWN;
  }

  @Override
  public Inferred inferred(CellAddress cell) {
    return new Inferred(at(cell), Basis.DECLARED, List.of(), List.of());
  }

  @Override
  public String label(CellAddress cell) {
    return "";
  }

  @Override
  public List<CellRange> ranges() {
    return List.copyOf(declarations.quantities().keySet());
  }

  @Override
  public Cycle cycle() {
    return new Cycle(declarations.cycleYears(), List.of(), List.of());
  }

  @Override
  public List<Outcome> outcomes() {
    return List.of();
  }

  @Override
  public Optional<CellAddress> threshold() {
    return Optional.empty();
  }

  @Override
  public boolean healthEconomic() {
    return true;
  }
}
