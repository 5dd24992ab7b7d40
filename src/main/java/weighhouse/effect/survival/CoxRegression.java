package weighhouse.effect.survival;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularMatrixException;
import weighhouse.effect.estimate.RatioEstimate;

/**
 * Cox's proportional-hazards regression by Newton's method, halving steps that do not help.
 *
 * <p>Source: therneau-grambsch-2000. Coefficients are exact to about 1e-9 of their standard error.
 */
public final class CoxRegression {
  private static final int MOST_STEPS = 50;
  private static final int MOST_HALVINGS = 30;
  private static final double SETTLED = 1e-10;

  /** A coefficient this many standard units away means that one group has no events. */
  private static final double RUNAWAY = 20;

  private CoxRegression() {}

  /**
   * Fits the regression.
   *
   * @return empty where no finite estimate exists: no events, a covariate that does not vary among
   *     people at risk, covariates that determine each other, all events on one side
   */
  public static Optional<CoxFit> fit(CoxData data, Ties ties) {
    RealVector start = new ArrayRealVector(data.covariates());
    PartialLikelihood none = PartialLikelihood.at(data, ties, start);
    if (none.terms().isEmpty()) {
      return Optional.empty();
    }
    try {
      return climb(data, ties, start, none);
    } catch (SingularMatrixException noInformation) {
      return Optional.empty();
    }
  }

  private static Optional<CoxFit> climb(
      CoxData data, Ties ties, RealVector start, PartialLikelihood none) {
    RealVector units = standardUnits(none);
    RealVector coefficients = start;
    PartialLikelihood here = none;
    for (int step = 0; step < MOST_STEPS; step++) {
      RealVector move =
          new LUDecomposition(here.information(here.ones()))
              .getSolver()
              .solve(here.score(here.ones()));
      RealVector next = coefficients.add(move);
      PartialLikelihood there = PartialLikelihood.at(data, ties, next);
      for (int i = 0; i < MOST_HALVINGS && !(there.value() >= here.value() - 1e-12); i++) {
        move = move.mapMultiply(0.5);
        next = coefficients.add(move);
        there = PartialLikelihood.at(data, ties, next);
      }
      coefficients = next;
      here = there;
      if (coefficients.ebeDivide(units).getLInfNorm() > RUNAWAY * Math.sqrt(data.times().size())) {
        return Optional.empty();
      }
      if (move.ebeDivide(units).getLInfNorm() < SETTLED) {
        return Optional.of(result(ties, coefficients, here, none));
      }
    }
    return Optional.empty();
  }

  /** Standard errors where nothing has an effect, to measure steps by. */
  private static RealVector standardUnits(PartialLikelihood none) {
    RealMatrix information = none.information(none.ones());
    RealVector units = new ArrayRealVector(information.getRowDimension());
    for (int j = 0; j < units.getDimension(); j++) {
      units.setEntry(j, 1 / Math.sqrt(information.getEntry(j, j)));
    }
    return units;
  }

  private static CoxFit result(
      Ties ties, RealVector coefficients, PartialLikelihood here, PartialLikelihood none) {
    RealMatrix covariance =
        new LUDecomposition(here.information(here.ones())).getSolver().getInverse();
    List<RatioEstimate> ratios =
        IntStream.range(0, coefficients.getDimension())
            .mapToObj(
                j ->
                    new RatioEstimate(
                        coefficients.getEntry(j), Math.sqrt(covariance.getEntry(j, j))))
            .toList();
    return new CoxFit(ties, ratios, none.value(), here.value());
  }
}
