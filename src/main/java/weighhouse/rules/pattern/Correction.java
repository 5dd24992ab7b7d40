package weighhouse.rules.pattern;

import java.util.ArrayList;
import java.util.List;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.formula.Trees;
import weighhouse.formula.UnaryOp;
import weighhouse.rules.term.Term;

/** The formula with the part that is wrong replaced, and all else kept as written. */
final class Correction {
  private final TypedPattern typed;
  private final Reading reading;

  Correction(TypedPattern typed, Reading reading) {
    this.typed = typed;
    this.reading = reading;
  }

  /** The whole product or sum around the place, with the factors that stay. */
  Site site(Expr place) {
    Expr inside = Trees.inside(place);
    if (Chains.isSum(inside)) {
      Expr sum = Chains.sum(inside, reading.view());
      return new Site(sum, typed.pattern().isSum() ? List.of() : commonFactors(sum), false);
    }
    if (typed.pattern().isSum()) {
      return new Site(inside, List.of(), true);
    }
    Expr product = Chains.product(inside, reading.view());
    return new Site(product, keptOf(product), true);
  }

  private List<Factor> keptOf(Expr product) {
    return Chains.factors(product).stream()
        .filter(f -> !reading.depends(f.node()) && !reading.isTaken(f.node()))
        .toList();
  }

  /** The factors that the first addend that counts shares with the others, as is checked later. */
  private List<Factor> commonFactors(Expr sum) {
    return Chains.addends(sum).stream()
        .filter(addend -> reading.depends(addend.node()))
        .findFirst()
        .map(addend -> keptOf(addend.node()))
        .orElse(List.of());
  }

  /** The corrected formula; null where the rule has none or the place cannot be taken apart. */
  Expr apply(Site site) {
    if (typed.correction() == null) {
      return null;
    }
    Expr filled = Filling.fill(typed.correction(), reading);
    Expr corrected = isPatternTimes(site.node(), List.of(), List.of(), false) ? filled : null;
    if (corrected == null) {
      corrected = site.dropped() ? inProduct(site, filled) : inSum(site, filled);
    }
    return corrected == null ? null : Trees.replace(reading.view().tree(), site.node(), corrected);
  }

  private Expr inProduct(Site site, Expr filled) {
    if (!isPatternTimes(site.node(), List.of(), site.kept(), false)) {
      return null;
    }
    List<Factor> factors = new ArrayList<>();
    boolean placed = false;
    for (Factor factor : Chains.factors(site.node())) {
      if (site.kept().contains(factor)) {
        factors.add(factor);
      } else if (!placed) {
        factors.addAll(Chains.factors(filled));
        placed = true;
      }
    }
    return Products.of(factors);
  }

  @SuppressWarnings("ReferenceEquality") // equal addends may stand in several places
  private Expr inSum(Site site, Expr filled) {
    List<Chains.Addend> addends = Chains.addends(site.node());
    List<Chains.Addend> kept = addends.stream().filter(this::stays).toList();
    Chains.Addend first = addends.stream().filter(a -> !stays(a)).findFirst().orElse(null);
    if (first == null) {
      return null;
    }
    boolean negative = !typed.pattern().isSum() && first.negative();
    if (!isPatternTimes(site.node(), kept, site.kept(), negative)) {
      return null;
    }
    List<Factor> factors = new ArrayList<>(site.kept());
    factors.addAll(Chains.factors(filled));
    Chains.Addend corrected = new Chains.Addend(Products.of(factors), negative);
    List<Chains.Addend> result = new ArrayList<>();
    for (Chains.Addend addend : addends) {
      if (stays(addend)) {
        result.add(addend);
      } else if (addend == first) {
        result.add(corrected);
      }
    }
    return sum(result);
  }

  /** Numbers belong to a pattern that is a sum; to any other they are none of its business. */
  private boolean stays(Chains.Addend addend) {
    boolean number = reading.term(addend.node()).isNumber();
    return !reading.depends(addend.node()) && !(number && typed.pattern().isSum());
  }

  private boolean isPatternTimes(
      Expr node, List<Chains.Addend> less, List<Factor> times, boolean negative) {
    List<Term> subtracted = new ArrayList<>();
    for (Chains.Addend addend : less) {
      Term term = reading.term(addend.node());
      subtracted.add(addend.negative() ? reading.view().terms().negative(term) : term);
    }
    List<Term> factors = new ArrayList<>();
    times.forEach(factor -> factors.add(reading.factor(factor)));
    if (negative) {
      factors.add(reading.view().terms().number(-1));
    }
    double[] pattern = reading.points().pattern(typed.pattern());
    return reading.points().equal(reading.term(node), subtracted, factors, pattern);
  }

  private static Expr sum(List<Chains.Addend> addends) {
    Expr sum = null;
    for (Chains.Addend addend : addends) {
      if (sum == null) {
        sum = addend.negative() ? new Expr.Unary(UnaryOp.MINUS, addend.node()) : addend.node();
      } else {
        BinaryOp op = addend.negative() ? BinaryOp.SUBTRACT : BinaryOp.ADD;
        sum = new Expr.Binary(op, sum, addend.node());
      }
    }
    return sum;
  }
}
