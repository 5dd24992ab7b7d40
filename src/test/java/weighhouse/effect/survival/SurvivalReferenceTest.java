package weighhouse.effect.survival;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import weighhouse.effect.estimate.RatioEstimate;
import weighhouse.support.Reference;

/** Six public data sets against R survival 3.5.3 (expected-survival.csv, expected-km-*.csv). */
class SurvivalReferenceTest {
  private static final double EXACT = 1e-8;
  private static final double Z = 1.959963984540054;

  static Stream<String> sets() {
    return Stream.of("veteran", "ovarian", "lung", "gehan", "colon_death", "karno");
  }

  @ParameterizedTest
  @MethodSource("sets")
  void cox(String set) {
    DataSet data = DataSet.read(set);
    cox(set, "efron", data.cox(Ties.EFRON));
    cox(set, "breslow", data.cox(Ties.BRESLOW));
  }

  private static void cox(String set, String ties, CoxFit fit) {
    String prefix = "cox_" + ties + "_";
    RatioEstimate estimate = fit.hazardRatios().get(0);
    check(set, prefix + "log_hr", estimate.log(), EXACT);
    check(set, prefix + "se", estimate.standardError(), EXACT);
    check(set, prefix + "hr", estimate.ratio(), EXACT);
    check(set, prefix + "hr_lower95", estimate.lower(Z), EXACT);
    check(set, prefix + "hr_upper95", estimate.upper(Z), EXACT);
    check(set, prefix + "loglik0", fit.logLikelihoodNull(), EXACT);
    check(set, prefix + "loglik1", fit.logLikelihood(), EXACT);
  }

  @ParameterizedTest
  @MethodSource("sets")
  void proportionalHazards(String set) {
    zph(set, "km", TimeTransform.KAPLAN_MEIER);
    zph(set, "rank", TimeTransform.RANK);
    zph(set, "identity", TimeTransform.IDENTITY);
    zph(set, "log", TimeTransform.LOG);
  }

  private static void zph(String set, String name, TimeTransform transform) {
    DataSet data = DataSet.read(set);
    ProportionalHazardsTest test =
        ProportionalHazardsTest.of(data.coxData(), data.cox(Ties.EFRON), transform);
    check(set, "zph_" + name + "_chisq", test.covariates().get(0), 1e-6);
    check(set, "zph_" + name + "_p", test.p(0), 1e-6);
    assertEquals(test.covariates().get(0), test.global(), 1e-9);
  }

  @ParameterizedTest
  @MethodSource("sets")
  void arms(String set) {
    DataSet data = DataSet.read(set);
    check(set, "logrank_chisq", LogRank.of(data.control(), data.treated()).chiSquare(), EXACT);
    check(set, "km_median_arm0", KaplanMeier.of(data.control()).median(), EXACT);
    check(set, "km_median_arm1", KaplanMeier.of(data.treated()).median(), EXACT);
    double rateRatio = data.treated().against(data.control()).rateRatio().log();
    check(set, "exponential_log_hr", rateRatio, EXACT);
    check(set, "events_arm0", data.control().events(), 0);
    check(set, "events_arm1", data.treated().events(), 0);
    check(set, "persontime_arm0", data.control().personTime(), 0);
    check(set, "persontime_arm1", data.treated().personTime(), 0);
  }

  @ParameterizedTest
  @MethodSource("sets")
  void weibull(String set) {
    DataSet data = DataSet.read(set);
    WeibullFit fit = WeibullFit.of(data.control(), data.treated()).orElseThrow();
    double relative = 1e-7;
    check(set, "weibull_shape", fit.shape(), relative);
    check(set, "weibull_scale_b_arm0", fit.control().scale(), relative);
    check(set, "weibull_acceleration_factor", fit.timeRatio(), relative);
    check(set, "weibull_ph_log_hr", Math.log(fit.hazardRatio()), relative);
    check(set, "weibull_loglik", fit.logLikelihood(), relative);
  }

  @ParameterizedTest
  @MethodSource("sets")
  void kaplanMeierAndNelsonAalen(String set) {
    DataSet data = DataSet.read(set);
    List<Reference.Row> rows = Reference.rows("expected-km-" + set + ".csv");
    for (int arm = 0; arm <= 1; arm++) {
      int number = arm;
      List<Reference.Row> ofArm = rows.stream().filter(r -> r.integer("arm") == number).toList();
      List<SurvivalStep> steps = KaplanMeier.of(data.arm(arm)).steps();
      assertEquals(ofArm.size(), steps.size());
      for (int i = 0; i < steps.size(); i++) {
        Reference.Row row = ofArm.get(i);
        assertEquals(row.number("time"), steps.get(i).time());
        assertEquals(row.integer("n_risk"), steps.get(i).atRisk());
        assertEquals(row.integer("n_event"), steps.get(i).events());
        assertEquals(row.number("surv"), steps.get(i).survival(), 1e-12);
        assertEquals(row.number("cumhaz"), steps.get(i).cumulativeHazard(), 1e-12);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"veteran_full", "ovarian_full"})
  void severalCovariates(String set) {
    List<String> names =
        set.startsWith("veteran")
            ? List.of("trt", "prior", "karno")
            : List.of("age", "rx", "ecog_ps");
    CoxData data = DataSet.covariates(set, names);
    CoxFit fit = CoxRegression.fit(data, Ties.EFRON).orElseThrow();
    ProportionalHazardsTest test =
        ProportionalHazardsTest.of(data, fit, TimeTransform.KAPLAN_MEIER);
    Consumer<Integer> covariate =
        j -> {
          check(set, "cox_efron_log_hr_" + names.get(j), fit.hazardRatios().get(j).log(), EXACT);
          double error = fit.hazardRatios().get(j).standardError();
          check(set, "cox_efron_se_" + names.get(j), error, EXACT);
          check(set, "zph_km_chisq_" + names.get(j), test.covariates().get(j), 1e-6);
        };
    List.of(0, 1, 2).forEach(covariate);
    check(set, "zph_km_chisq_global", test.global(), 1e-6);
  }

  /** Relative to the expected value where that is above 1. */
  private static void check(String set, String quantity, double ours, double tolerance) {
    double expected =
        Reference.rows("expected-survival.csv").stream()
            .filter(r -> r.text("dataset").equals(set) && r.text("quantity").equals(quantity))
            .mapToDouble(r -> "NA".equals(r.text("value")) ? Double.NaN : r.number("value"))
            .findFirst()
            .orElseThrow();
    if (Double.isNaN(expected)) {
      assertTrue(Double.isNaN(ours), set + " " + quantity + " has no value, not " + ours);
    } else {
      double allowed = tolerance * Math.max(1, Math.abs(expected));
      assertEquals(expected, ours, allowed, set + " " + quantity);
    }
  }
}
