package weighhouse.effect.survival;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import weighhouse.effect.ChiSquare;

/**
 * Grambsch-Therneau test of proportional hazards in its score form: the score test of adding each
 * covariate times a function of time to the fitted model, as R's survival package does from version
 * 3.0 on.
 *
 * <p>Source: grambsch-therneau-1994.
 *
 * @param covariates chi-square statistic of each covariate, one degree of freedom each
 * @param global chi-square statistic of all together, as many degrees of freedom as covariates
 */
public record ProportionalHazardsTest(List<Double> covariates, double global) {

  /**
   * Tests a fit.
   *
   * @param data that was fitted
   * @param fit of that data
   * @param transform the function of time
   */
  public static ProportionalHazardsTest of(CoxData data, CoxFit fit, TimeTransform transform) {
    RealVector coefficients = new ArrayRealVector(fit.coefficients());
    PartialLikelihood at = PartialLikelihood.at(data, fit.ties(), coefficients);
    double[] g = centred(transform, at, data.times());
    double[] squares = Arrays.stream(g).map(v -> v * v).toArray();
    RealVector score = at.score(g);
    RealMatrix cross = at.information(g);
    RealMatrix explained =
        cross.multiply(
            new LUDecomposition(at.information(at.ones())).getSolver().solve(cross.transpose()));
    RealMatrix variance = at.information(squares).subtract(explained);
    List<Double> each =
        IntStream.range(0, score.getDimension())
            .mapToObj(j -> score.getEntry(j) * score.getEntry(j) / variance.getEntry(j, j))
            .toList();
    double global = score.dotProduct(new LUDecomposition(variance).getSolver().solve(score));
    return new ProportionalHazardsTest(each, global);
  }

  /** P value of one covariate. */
  public double p(int covariate) {
    return ChiSquare.upperTail(covariates.get(covariate), 1);
  }

  /** P value of all covariates together. */
  public double globalP() {
    return ChiSquare.upperTail(global, covariates.size());
  }

  /** Centring changes no statistic; it keeps digits. */
  private static double[] centred(
      TimeTransform transform, PartialLikelihood at, SurvivalTimes people) {
    double[] times = at.terms().stream().mapToDouble(EventTerm::time).toArray();
    double[] g = transform.of(times, people);
    double mean = Arrays.stream(g).average().orElse(0);
    return Arrays.stream(g).map(v -> v - mean).toArray();
  }
}
