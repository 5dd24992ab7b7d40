package weighhouse.rules.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.formula.Expr;
import weighhouse.formula.FormulaParser;
import weighhouse.formula.FormulaSyntaxException;
import weighhouse.formula.Trees;
import weighhouse.rules.pattern.CyclesOf;
import weighhouse.rules.pattern.Pattern;

/** Patterns and corrections: formulas over declared metavariables. */
final class Formulas {
  private final Faults faults;
  private final Set<String> declared;

  Formulas(Faults faults, Set<String> declared) {
    this.faults = faults;
    this.declared = declared;
  }

  Optional<Pattern> pattern(String text, Node at) {
    return tree(text, at).map(tree -> new Pattern(text, tree));
  }

  List<Pattern> patterns(Fields fields, String key) {
    List<Pattern> patterns = new ArrayList<>();
    for (Node node : fields.list(key)) {
      pattern(fields.text(node), node).ifPresent(patterns::add);
    }
    return patterns;
  }

  /** The formula's tree; empty where it does not parse or speaks of what is not declared. */
  Optional<Expr> tree(String text, Node at) {
    Expr tree;
    try {
      tree = FormulaParser.parse(text, 0, 0).tree();
    } catch (FormulaSyntaxException e) {
      faults.add(at, "'" + text + "' is no formula: " + e.getMessage());
      return Optional.empty();
    }
    boolean sound = true;
    for (Expr node : Trees.walk(tree)) {
      if (node instanceof Expr.NameRef name
          && !declared.contains(CyclesOf.metavariable(name.name()))) {
        faults.add(at, "metavariable '" + name.name() + "' is not declared under where");
        sound = false;
      } else if (node instanceof Expr.CellRef || node instanceof Expr.AreaRef) {
        faults.add(at, "'" + text + "' speaks of a cell; metavariables have letters only");
        sound = false;
      }
    }
    return sound ? Optional.of(tree) : Optional.empty();
  }
}
