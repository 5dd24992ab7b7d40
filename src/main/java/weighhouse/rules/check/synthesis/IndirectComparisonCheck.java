package weighhouse.rules.check.synthesis;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import weighhouse.formula.BinaryOp;
import weighhouse.formula.Expr;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Parts;
import weighhouse.rules.check.ratio.Place;
import weighhouse.rules.check.ratio.Ratios;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.Workbook;

/** An indirect comparison by difference of ratios, quotient of limits or difference of errors. */
public final class IndirectComparisonCheck implements Check {
  @Override
  public String name() {
    return "indirect-comparison";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    return new Search(new ModelView(subject), rule).all();
  }

  private static final class Search {
    private final ModelView model;
    private final Rule rule;
    private final Estimates estimates;
    private final List<Match> matches = new ArrayList<>();

    Search(ModelView model, Rule rule) {
      this.model = model;
      this.rule = rule;
      this.estimates = new Estimates(model);
    }

    List<Match> all() {
      for (Place place : model.placesOf(Ratios::isRatio)) {
        for (Expr result : Parts.results(place.tree())) {
          difference(place, result);
        }
      }
      Set<Place> limits = new LinkedHashSet<>();
      estimates.limits().forEach(cell -> model.place(cell).ifPresent(limits::add));
      for (Place place : limits) {
        Parts.results(place.tree()).forEach(result -> limits(place, result));
      }
      for (Place place : model.placesOf(Ratios::isStandardError)) {
        Parts.results(place.tree()).forEach(result -> errors(place, result));
      }
      return matches;
    }

    /** {@code R1 - R2} in a cell that is a ratio. */
    private void difference(Place place, Expr node) {
      List<Parts.Addend> ratios = new ArrayList<>();
      for (Parts.Addend addend : Parts.addends(node)) {
        if (!Parts.isConstant(addend.node())) {
          ratios.add(addend);
        }
      }
      boolean two =
          ratios.size() == 2
              && ratios.get(0).negative() != ratios.get(1).negative()
              && ratios.stream().allMatch(a -> isOneRatio(a.node(), place.host()));
      if (two) {
        Expr over = ratios.get(ratios.get(0).negative() ? 1 : 0).node();
        Expr under = ratios.get(ratios.get(0).negative() ? 0 : 1).node();
        Expr logs = Refs.minus(Refs.ln(over), Refs.ln(under));
        matches.add(
            Found.at(rule, place)
                .replacing(place.tree(), node, Refs.call("EXP", logs))
                .with("a", over)
                .with("b", under)
                .match());
      }
    }

    private boolean isOneRatio(Expr node, CellAddress host) {
      return model.cell(node, host) != null && Ratios.isRatio(model.quantity(node, host));
    }

    /** A limit of one ratio divided by a limit of another, in the cell of a limit. */
    private void limits(Place place, Expr node) {
      if (!Parts.is(node, BinaryOp.DIVIDE)) {
        return;
      }
      Optional<Estimate> over = ofLimit(Parts.left(node), place.host());
      Optional<Estimate> under = ofLimit(Parts.right(node), place.host());
      boolean two = over.isPresent() && under.isPresent() && !over.equals(under);
      if (two) {
        matches.add(
            Found.at(rule, place)
                .replacing(place.tree(), node, limit(over.get(), under.get(), place))
                .with("a", Parts.left(node))
                .with("b", Parts.right(node))
                .saying("Both intervals are taken to have the same level.")
                .match());
      }
    }

    private Optional<Estimate> ofLimit(Expr node, CellAddress host) {
      CellAddress cell = model.cell(node, host);
      return cell == null ? Optional.empty() : estimates.ofLimit(cell);
    }

    /** {@code EXP(LN(a/b) -+ SQRT(half width of a ^2 + half width of b ^2))}. */
    private Expr limit(Estimate over, Estimate under, Place place) {
      CellAddress host = place.host();
      Workbook book = model.subject().workbook();
      Expr quotient =
          Refs.over(Refs.to(over.cell(), host, book), Refs.to(under.cell(), host, book));
      Expr half =
          Refs.over(
              Refs.call(
                  "SQRT",
                  Refs.plus(
                      Refs.square(width(over, host, book)), Refs.square(width(under, host, book)))),
              Refs.number("2"));
      boolean lower = estimates.limit(host).equals(Optional.of(Role.LOWER_LIMIT));
      Expr middle = Refs.call("LN", quotient);
      return Refs.call("EXP", lower ? Refs.minus(middle, half) : Refs.plus(middle, half));
    }

    private static Expr width(Estimate estimate, CellAddress host, Workbook book) {
      return Refs.call(
          "LN",
          Refs.over(Refs.to(estimate.upper(), host, book), Refs.to(estimate.lower(), host, book)));
    }

    /** {@code se1 - se2} in the cell of a standard error. */
    private void errors(Place place, Expr node) {
      List<Parts.Addend> addends = Parts.addends(node);
      boolean two =
          addends.size() == 2
              && Parts.is(node, BinaryOp.SUBTRACT)
              && addends.stream().allMatch(a -> isErrorOfRatio(a.node(), place.host()));
      if (two) {
        Expr sum =
            Refs.plus(Refs.square(addends.get(0).node()), Refs.square(addends.get(1).node()));
        matches.add(
            Found.at(rule, place)
                .replacing(place.tree(), node, Refs.call("SQRT", sum))
                .with("a", addends.get(0).node())
                .with("b", addends.get(1).node())
                .saying("Variances of independent estimates add.")
                .match());
      }
    }

    private boolean isErrorOfRatio(Expr node, CellAddress host) {
      CellAddress cell = model.cell(node, host);
      return cell != null
          && Ratios.isStandardError(model.quantity(cell))
          && (isOfRatioKind(model.quantity(cell)) || stands(cell));
    }

    private static boolean isOfRatioKind(Quantity error) {
      Quantity estimate = new Quantity(error.kind(), Role.ESTIMATE, null);
      return Ratios.isEstimate(estimate) || Ratios.isLog(estimate);
    }

    /** Whether a ratio or its logarithm stands in the same row to the left, or right above. */
    private boolean stands(CellAddress error) {
      for (int step = 1; step <= 6 && step <= error.column(); step++) {
        Quantity left = model.quantity(error.offset(0, -step));
        if (Ratios.isEstimate(left) || Ratios.isLog(left)) {
          return true;
        }
      }
      Quantity above = error.row() == 0 ? Quantity.UNKNOWN : model.quantity(error.offset(-1, 0));
      return Ratios.isEstimate(above) || Ratios.isLog(above);
    }
  }
}
