package weighhouse.recalculate.engine;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Shape;
import weighhouse.recalculate.order.Plan;
import weighhouse.recalculate.order.Unit;
import weighhouse.recalculate.program.Compiler;
import weighhouse.recalculate.program.Program;
import weighhouse.recalculate.program.UnsupportedFormulaException;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * The base plan, and those in which some formulas are replaced: units are cut where a formula ends
 * and another begins. The last few are kept, since draws and probes ask for one again and again.
 */
final class Plans {
  private static final String NAME_ERROR = "#NAME?";

  private static final int KEPT = 16;
  private static final int REPLACEMENT = -1;

  /**
   * What a plan differs in.
   *
   * @param formulas ranges with another formula
   * @param constants formula cells that hold a constant instead
   */
  record Difference(Map<CellRange, Expr> formulas, Set<CellAddress> constants) {}

  /**
   * A plan with what it does not run.
   *
   * @param replaced positions of the units that were put in
   * @param pointers what computed references were seen to read
   */
  record Planned(Plan plan, Set<Unit> kept, List<Integer> replaced, Plan.Pointers pointers) {
    /** The same with other units kept. */
    Planned keeping(Set<Unit> others) {
      return new Planned(plan, others, replaced, pointers);
    }
  }

  private final Model model;
  private final Planned base;
  private final Plan.Pointers pointers;
  private final Map<Difference, Planned> others =
      new LinkedHashMap<>(KEPT, 0.75f, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Difference, Planned> eldest) {
          return size() > KEPT;
        }
      };

  Plans(Model model, Plan plan, Set<Unit> kept, Plan.Pointers pointers) {
    this.model = model;
    this.base = new Planned(plan, kept, List.of(), pointers);
    this.pointers = pointers;
  }

  Planned base() {
    return base;
  }

  Planned with(Difference difference) {
    if (difference.formulas().isEmpty() && difference.constants().isEmpty()) {
      return base;
    }
    synchronized (others) {
      Planned known = others.get(difference);
      if (known != null) {
        return known;
      }
    }
    Planned planned = plan(difference);
    synchronized (others) {
      others.put(difference, planned);
    }
    return planned;
  }

  private Planned plan(Difference difference) {
    List<CellRange> cuts = new ArrayList<>(difference.formulas().keySet());
    difference.constants().forEach(cell -> cuts.add(CellRange.of(cell)));
    Map<Unit, List<CellRange>> rests = new HashMap<>();
    for (CellRange cut : cuts) {
      base.plan().unitsIn(cut, unit -> cut(base.plan().units().get(unit), cut, rests));
    }
    List<Unit> units = new ArrayList<>();
    Set<Unit> kept = new HashSet<>(base.kept());
    for (Unit unit : base.plan().units()) {
      List<CellRange> rest = rests.get(unit);
      if (rest == null) {
        units.add(unit);
      } else {
        rest.forEach(range -> units.add(part(unit, range, kept)));
      }
    }
    int before = units.size();
    difference.formulas().forEach((range, tree) -> units.add(replacement(range, tree)));
    List<Integer> replaced = new ArrayList<>();
    for (int i = before; i < units.size(); i++) {
      replaced.add(i);
    }
    Plan plan = new Plan(units, model.workbook().sheets().size(), pointers);
    return new Planned(plan, kept, replaced, pointers);
  }

  /** The same units in the order that computed references now ask for. */
  Planned repointed(Planned planned, Plan.Pointers now) {
    Plan plan = new Plan(planned.plan().units(), model.workbook().sheets().size(), now);
    return new Planned(plan, planned.kept(), planned.replaced(), now);
  }

  private static void cut(Unit unit, CellRange cut, Map<Unit, List<CellRange>> rests) {
    List<CellRange> before = rests.getOrDefault(unit, List.of(unit.hosts()));
    List<CellRange> after = new ArrayList<>();
    if (!unit.whole()) {
      before.forEach(range -> after.addAll(Cuts.without(range, cut)));
    }
    rests.put(unit, after);
  }

  private Unit part(Unit unit, CellRange range, Set<Unit> kept) {
    Unit part = new Unit(unit.shape(), unit.program(), range, false, model.layout());
    if (base.kept().contains(unit)) {
      kept.add(part);
    }
    return part;
  }

  private Unit replacement(CellRange range, Expr tree) {
    Shape shape = model.shapes().at(range.first());
    boolean array = shape != null && shape.array();
    boolean across = model.layout().across(range.sheet());
    Program program = program(tree, range.first(), array, across);
    boolean whole =
        range.size() > 1 && model.workbook().sheet(range.sheet()).arrays().contains(range);
    return new Unit(REPLACEMENT, program, range, whole, model.layout());
  }

  /** A formula that cannot be run shows as one with an unknown name. */
  private Program program(Expr tree, CellAddress host, boolean array, boolean across) {
    try {
      return Compiler.compile(tree, host, array, across, model.names());
    } catch (UnsupportedFormulaException e) {
      Expr unknown = new Expr.ErrorLiteral(NAME_ERROR);
      return Compiler.compile(unknown, host, array, across, model.names());
    }
  }
}
