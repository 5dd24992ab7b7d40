package weighhouse.rules.check.uncertainty;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;

/** A ratio drawn from a beta, gamma, uniform or triangular distribution. */
public final class UnusualDistributionCheck implements Check {
  private static final Set<String> UNUSUAL =
      Set.of("BETA.INV", "BETAINV", "GAMMA.INV", "GAMMAINV", "RANDBETWEEN");

  @Override
  public String name() {
    return "unusual-distribution";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    List<Match> matches = new ArrayList<>();
    for (Place place : model.places(UnusualDistributionCheck::mayDraw)) {
      for (Expr result : Parts.results(place.tree())) {
        if (isDraw(result) && isOfRatio(result, place.host(), model)) {
          matches.add(
              Found.at(rule, place)
                  .marking(result)
                  .with("r", Refs.to(place.host(), place.host(), subject.workbook()))
                  .match());
        }
      }
    }
    return matches;
  }

  private static boolean mayDraw(Expr tree) {
    return Parts.draws(tree)
        || Trees.contains(
            tree, node -> node instanceof Expr.Call c && UNUSUAL.contains(c.function()));
  }

  private static boolean isDraw(Expr node) {
    boolean named =
        node instanceof Expr.Call call
            && UNUSUAL.contains(call.function())
            && !Parts.isConstant(call);
    return named || isUniform(node);
  }

  /** {@code low + RAND() * (high - low)}, and the roots of it that draw from a triangle. */
  private static boolean isUniform(Expr node) {
    boolean sum = Parts.addends(node).size() > 1;
    boolean othersDraw =
        Trees.contains(
            node,
            part ->
                part instanceof Expr.Call call
                    && !Set.of("RAND", "SQRT", "MIN", "MAX").contains(call.function()));
    return sum && !othersDraw && Parts.draws(node);
  }

  /** The cell is labelled as a ratio, or the draw is made from a ratio and its limits alone. */
  private static boolean isOfRatio(Expr node, CellAddress host, ModelView model) {
    List<Expr> references = Trees.walk(node).stream().filter(Parts::refers).toList();
    boolean ratios =
        references.stream().anyMatch(r -> Ratios.isRatio(model.quantity(r, host)))
            && references.stream()
                .allMatch(
                    r ->
                        Ratios.isRatio(model.quantity(r, host))
                            || Ratios.isStandardError(model.quantity(r, host)));
    return Ratios.isRatio(model.quantity(host)) || ratios;
  }
}
