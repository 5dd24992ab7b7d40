package weighhouse.rules.pattern;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import weighhouse.formula.Expr;
import weighhouse.rules.term.Sample;
import weighhouse.rules.term.Scope;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Terms;
import weighhouse.rules.term.Translator;
import weighhouse.workbook.CellAddress;

/** A function of metavariables, written as a formula. */
public final class Pattern {
  private static final CellAddress NOWHERE = new CellAddress(0, 0, 0);

  private final String text;
  private final Expr tree;
  private final Term term;
  private final Map<String, Term> variables = new LinkedHashMap<>();

  public Pattern(String text, Expr tree) {
    this.text = text;
    this.tree = tree;
    Terms terms = new Terms();
    this.term = new Translator(terms, new Letters()).translate(tree, NOWHERE);
  }

  private final class Letters implements Scope {
    @Override
    public Term term(Expr reference, CellAddress host, Translator translator) {
      if (reference instanceof Expr.NameRef name) {
        return variables.computeIfAbsent(name.name(), translator.terms()::symbol);
      }
      return translator.terms().symbol(reference);
    }

    @Override
    public List<Expr> cells(Expr area, CellAddress host) {
      return List.of();
    }
  }

  public String text() {
    return text;
  }

  public Expr tree() {
    return tree;
  }

  /** Names of its metavariables in the order of their first use. */
  public List<String> variables() {
    return List.copyOf(variables.keySet());
  }

  /** Whether it is a sum, which is matched as it is; products leave room for further factors. */
  boolean isSum() {
    return Chains.isSum(tree);
  }

  /** Its value where the metavariables have these values. */
  double value(Map<String, Double> values) {
    Sample sample = new Sample(0, term.id() + 1);
    variables.forEach((name, symbol) -> sample.with(symbol, values.get(name)));
    return sample.of(term);
  }
}
