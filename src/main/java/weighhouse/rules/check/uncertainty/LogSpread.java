package weighhouse.rules.check.uncertainty;

import java.util.Optional;
import java.util.regex.Pattern;
import weighhouse.effect.StandardNormal;
import weighhouse.effect.estimate.RatioEstimate;
import weighhouse.formula.Expr;
import weighhouse.rules.check.ratio.Draw;
import weighhouse.rules.check.ratio.Estimate;
import weighhouse.rules.check.ratio.Estimates;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.NearbyTexts;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.rules.check.ratio.Width;
import weighhouse.workbook.CellAddress;

/** The standard error of a log ratio that a draw should use, from what the workbook holds. */
final class LogSpread {
  private static final Pattern LOG = Pattern.compile("(?i)(?<![a-z])(ln|log)(?![a-z])|lnhr|loghr");
  private static final double SAME_WITHIN = 0.05;
  private static final String WIDTH_95 = "3.92";

  private final ModelView model;
  private final Estimates estimates;
  private final NearbyTexts texts;

  LogSpread(ModelView model) {
    this.model = model;
    this.estimates = new Estimates(model);
    this.texts = new NearbyTexts(model.subject().workbook());
  }

  /** A standard error with what it takes for granted. */
  record Spread(Expr expression, String assumption) {}

  Spread of(Draw draw, CellAddress host) {
    Optional<Width> width = Width.of(draw.spread(), host, model, estimates);
    if (width.isPresent()) {
      return new Spread(
          width.get().logs() ? draw.spread() : width.get().onLogScale(),
          "The standard error is taken from the same limits, between their logarithms.");
    }
    if (isLog(draw, host)) {
      return new Spread(draw.spread(), "The standard error is read as that of the logarithm.");
    }
    CellAddress ratio = model.cell(draw.location(), host);
    return Optional.ofNullable(ratio)
        .flatMap(estimates::of)
        .map(estimate -> fromLimits(estimate, draw, host))
        .orElseGet(() -> delta(draw));
  }

  /** Whether the spread is a logarithm's already: its label says so, or the limits do. */
  private boolean isLog(Draw draw, CellAddress host) {
    CellAddress spread = model.cell(draw.spread(), host);
    if (spread != null && saysLog(spread)) {
      return true;
    }
    CellAddress ratio = model.cell(draw.location(), host);
    Optional<Estimate> estimate = Optional.ofNullable(ratio).flatMap(estimates::of);
    return estimate.isPresent() && agrees(estimate.get(), model.value(draw.spread(), host));
  }

  /** Whether the words at a cell speak of a logarithm. */
  boolean saysLog(CellAddress cell) {
    return texts.of(cell).stream().anyMatch(text -> LOG.matcher(text).find())
        || LOG.matcher(model.subject().quantities().label(cell)).find();
  }

  private boolean agrees(Estimate estimate, double spread) {
    double z = StandardNormal.multiplier(0.95);
    double log =
        RatioEstimate.standardError(
            model.value(estimate.lower()), model.value(estimate.upper()), z);
    return Math.abs(spread / log - 1) < SAME_WITHIN;
  }

  private Spread fromLimits(Estimate estimate, Draw draw, CellAddress host) {
    Expr upper = limit(estimate.upper(), draw, host);
    Expr lower = limit(estimate.lower(), draw, host);
    Expr difference = Refs.minus(Refs.ln(upper), Refs.ln(lower));
    return new Spread(
        Refs.over(difference, Refs.number(WIDTH_95)),
        "The limits beside the ratio are taken for those of a 95 % interval.");
  }

  private Expr limit(CellAddress limit, Draw draw, CellAddress host) {
    return Refs.to(limit, host, model.subject().workbook(), draw.location());
  }

  private static Spread delta(Draw draw) {
    return new Spread(
        Refs.over(draw.spread(), draw.location()),
        "The standard error is carried to the log scale by the delta method, se / ratio.");
  }
}
