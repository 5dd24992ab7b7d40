package weighhouse.rules.check.competing;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.Chains;
import weighhouse.rules.pattern.Factor;
import weighhouse.rules.pattern.Moving;
import weighhouse.workbook.CellAddress;

/** A disease's hazard ratio on a death rate that has background mortality in it. */
public final class ScaledBackground implements Check {
  private static final Set<Kind> RATIOS = EnumSet.of(Kind.HAZARD_RATIO, Kind.RATE_RATIO);

  @Override
  public String name() {
    return "scaled-background";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Search search = new Search(new Survey(subject), rule);
    search.survey.regions().forEach(search::look);
    return search.found;
  }

  private static final class Search {
    private final Survey survey;
    private final Captions captions;
    private final Rule rule;
    private final List<Match> found = new ArrayList<>();

    Search(Survey survey, Rule rule) {
      this.survey = survey;
      this.captions = new Captions(survey);
      this.rule = rule;
    }

    void look(Region region) {
      CellAddress host = region.range().first();
      Expr tree = survey.tree(region);
      for (Expr node : Trees.walk(tree)) {
        Optional<Expr> mended = Chains.isProduct(node) ? mended(node, host) : Optional.empty();
        if (mended.isPresent()) {
          Expr whole = Trees.replace(tree, node, mended.get());
          found.add(Survey.match(rule, region.range(), node, whole));
          return;
        }
      }
    }

    /** The product with the ratio on what is left of the sum without its background. */
    private Optional<Expr> mended(Expr product, CellAddress host) {
      List<Factor> factors = Chains.factors(product);
      Factor ratio = factors.stream().filter(f -> isOfDisease(f, host)).findFirst().orElse(null);
      for (Factor factor : ratio == null ? List.<Factor>of() : factors) {
        List<Chains.Addend> addends = addends(factor.node(), host);
        List<Chains.Addend> background =
            addends.stream().filter(addend -> isBackground(addend.node(), host)).toList();
        if (background.size() == 1 && addends.size() > 1) {
          return Optional.of(apart(factors, ratio, factor, addends, background.get(0)));
        }
      }
      return Optional.empty();
    }

    private boolean isOfDisease(Factor factor, CellAddress host) {
      Optional<CellAddress> cell = survey.cell(factor.node(), host);
      return RATIOS.contains(survey.kind(factor.node(), host))
          && !factor.inverse()
          && cell.map(c -> !BackgroundWords.nameAllCauses(captions.of(c))).orElse(true);
    }

    /** The addends of a sum of rates, also of one in a cell of its own. */
    private List<Chains.Addend> addends(Expr factor, CellAddress host) {
      Optional<CellAddress> cell = survey.cell(factor, host);
      Shape shape = cell.map(survey.subject().shapes()::at).orElse(null);
      Expr sum =
          shape == null
              ? factor
              : Moving.move(shape.tree(), cell.get(), host, survey.subject().workbook());
      List<Chains.Addend> addends = Chains.addends(sum);
      boolean rates =
          addends.stream().allMatch(a -> !a.negative() && survey.kind(a.node(), host) == Kind.RATE);
      return rates ? addends : List.of();
    }

    private boolean isBackground(Expr addend, CellAddress host) {
      return survey.cell(addend, host).map(captions::of).filter(BackgroundWords::areIn).isPresent();
    }

    @SuppressWarnings("ReferenceEquality") // one very factor
    private static Expr apart(
        List<Factor> factors,
        Factor ratio,
        Factor sum,
        List<Chains.Addend> addends,
        Chains.Addend background) {
      Expr excess = null;
      for (Chains.Addend addend : addends) {
        if (addend != background) {
          excess =
              excess == null ? addend.node() : new Expr.Binary(BinaryOp.ADD, excess, addend.node());
        }
      }
      Expr scaled = new Expr.Binary(BinaryOp.MULTIPLY, excess, ratio.node());
      Expr product = new Expr.Binary(BinaryOp.ADD, background.node(), scaled);
      for (Factor factor : factors) {
        if (factor.isSign()) {
          product = new Expr.Unary(UnaryOp.MINUS, product);
        } else if (factor != ratio && factor != sum) {
          BinaryOp op = factor.inverse() ? BinaryOp.DIVIDE : BinaryOp.MULTIPLY;
          product = new Expr.Binary(op, product, factor.node());
        }
      }
      return product;
    }
  }
}
