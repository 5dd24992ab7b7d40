package weighhouse.effect;

import java.util.Optional;

/**
 * Effect measures and their laws: the scale on which each is a plain factor, and the form in which
 * the figure is printed.
 *
 * <p>Figures are as printed (0.7, a reduction of 0.3, or ln 0.7); {@link Form#toRatio} reads them.
 * Hazard, rate and mortality ratios hold over any span. Risk and odds ratios belong to the horizon
 * over which they were observed; for a probability over another span use {@link
 * #applyToProbability(double, double, double, double)}. A time ratio stretches time and therefore
 * needs the whole curve: on a lone probability it gives NaN (see {@code effect.curve}).
 *
 * <p>Sources: tsd-2, tsd-5 (link scale of each measure), gidwani-russell-2020.
 */
public enum EffectMeasure {
  HAZARD_RATIO(Scale.HAZARD, Form.RATIO),
  RATE_RATIO(Scale.HAZARD, Form.RATIO),
  MORTALITY_RATIO(Scale.HAZARD, Form.RATIO),
  RISK_RATIO(Scale.RISK, Form.RATIO),
  ODDS_RATIO(Scale.ODDS, Form.RATIO),
  /** Acceleration factor: survival with it is {@code S(t / ratio)}. */
  TIME_RATIO(null, Form.RATIO),
  HAZARD_REDUCTION(Scale.HAZARD, Form.REDUCTION),
  RISK_REDUCTION(Scale.RISK, Form.REDUCTION),
  ODDS_REDUCTION(Scale.ODDS, Form.REDUCTION),
  LOG_HAZARD_RATIO(Scale.HAZARD, Form.LOG),
  LOG_RATE_RATIO(Scale.HAZARD, Form.LOG),
  LOG_RISK_RATIO(Scale.RISK, Form.LOG),
  LOG_ODDS_RATIO(Scale.ODDS, Form.LOG),
  LOG_TIME_RATIO(null, Form.LOG);

  private final Scale scale;
  private final Form form;

  EffectMeasure(Scale scale, Form form) {
    this.scale = scale;
    this.form = form;
  }

  /** The scale on which it is a factor; empty for a time ratio. */
  public Optional<Scale> scale() {
    return Optional.ofNullable(scale);
  }

  public Form form() {
    return form;
  }

  /**
   * The effect on a probability over the measure's own horizon (any span for hazard-scale
   * measures).
   *
   * @param p probability without the effect, in [0, 1]
   * @param figure as printed
   * @return the probability with it; above 1 where a risk ratio exceeds 1/p; NaN for a time ratio
   */
  public double applyToProbability(double p, double figure) {
    return scale == null ? Double.NaN : scale.apply(p, form.toRatio(figure));
  }

  /**
   * The effect on a probability over a span that need not be the measure's horizon: p is carried to
   * the horizon at a constant hazard, the measure applied there, the result carried back.
   *
   * @param p probability over {@code span}, in [0, 1]
   * @param span span of p and of the result, above 0
   * @param figure as printed
   * @param horizon span over which the measure was observed, above 0
   * @return NaN where a risk ratio makes the risk over the horizon exceed 1
   */
  public double applyToProbability(double p, double span, double figure, double horizon) {
    if (scale == Scale.HAZARD) {
      return applyToProbability(p, figure);
    }
    double there = applyToProbability(Probability.rescale(p, span, horizon), figure);
    return Probability.rescale(there, horizon, span);
  }

  /**
   * The effect on survival over the measure's own horizon.
   *
   * @param survival in [0, 1]
   */
  public double applyToSurvival(double survival, double figure) {
    if (scale == Scale.HAZARD) {
      double ratio = form.toRatio(figure);
      return Domain.isProbability(survival) && ratio >= 0 ? Math.pow(survival, ratio) : Double.NaN;
    }
    return 1 - applyToProbability(1 - survival, figure);
  }

  /**
   * The effect on a cumulative hazard over the measure's own horizon.
   *
   * @param cumulativeHazard at least 0
   */
  public double applyToCumulativeHazard(double cumulativeHazard, double figure) {
    if (scale == Scale.HAZARD) {
      double ratio = form.toRatio(figure);
      return cumulativeHazard >= 0 && ratio >= 0 ? cumulativeHazard * ratio : Double.NaN;
    }
    double p = Probability.ofCumulativeHazard(cumulativeHazard);
    return Probability.toCumulativeHazard(applyToProbability(p, figure));
  }

  /**
   * The effect on a constant rate, for a risk or odds ratio through the risk over its horizon: for
   * a risk ratio {@code r * ln(1 - RR*p0) / ln(1 - p0)}, p0 the risk over the horizon at rate r.
   *
   * @param rate per unit of time, at least 0
   * @param horizon over which the measure was observed, above 0; any for hazard-scale measures
   */
  public double applyToRate(double rate, double figure, double horizon) {
    return applyToCumulativeHazard(rate * horizon, figure) / horizon;
  }

  /**
   * The effect on odds over the measure's own horizon.
   *
   * @param odds at least 0
   */
  public double applyToOdds(double odds, double figure) {
    if (scale == Scale.ODDS) {
      double ratio = form.toRatio(figure);
      return odds >= 0 && ratio >= 0 ? odds * ratio : Double.NaN;
    }
    return Probability.toOdds(applyToProbability(Probability.ofOdds(odds), figure));
  }
}
