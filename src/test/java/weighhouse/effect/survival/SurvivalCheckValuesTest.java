package weighhouse.effect.survival;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.effect.estimate.RatioEstimate;
import weighhouse.support.CheckValues;

/** Published Cox regressions, log-rank and proportional-hazards tests, worked again. */
class SurvivalCheckValuesTest {
  private static final double Z = 1.959963984540054;

  @TestFactory
  Stream<DynamicTest> leukaemia() {
    // The published contrast is placebo against 6-MP.
    DataSet set = DataSet.read("gehan");
    SurvivalTimes placebo = set.control();
    SurvivalTimes treated = set.treated();
    CoxFit efron = fit(treated, placebo, Ties.EFRON);
    RatioEstimate ratio = efron.hazardRatios().get(0);
    RatioEstimate breslow = fit(treated, placebo, Ties.BRESLOW).hazardRatios().get(0);
    RatioEstimate discrete = ExactTies.DISCRETE.hazardRatio(treated, placebo);
    RatioEstimate marginal = ExactTies.MARGINAL.hazardRatio(treated, placebo);
    LogRank logRank = LogRank.of(treated, placebo);
    WeibullFit weibull = WeibullFit.of(treated, placebo).orElseThrow();
    KaplanMeier curve = KaplanMeier.of(treated);
    return CheckValues.rows(
        "P(0\\d|1\\d|2[0-2])",
        Map.ofEntries(
            entry("P01", () -> ratio.log()),
            entry("P02", () -> ratio.standardError()),
            entry("P03", () -> ratio.ratio()),
            entry("P04", () -> ratio.lower(Z)),
            entry("P05", () -> ratio.upper(Z)),
            entry("P06", () -> efron.likelihoodRatio()),
            entry("P07", () -> breslow.log()),
            entry("P08", () -> breslow.ratio()),
            entry("P09", () -> breslow.standardError()),
            entry("P10", () -> discrete.log()),
            entry("P11", () -> discrete.standardError()),
            entry("P12", () -> marginal.log()),
            entry("P13", () -> logRank.chiSquare()),
            entry("P14", () -> placebo.events() - logRank.treated().difference()),
            entry("P15", () -> logRank.treated().variance()),
            entry("P16", () -> logRank.treated().estimate().ratio()),
            entry("P17", () -> placebo.against(treated).rateRatio().ratio()),
            entry("P18", () -> Math.log(weibull.timeRatio())),
            entry("P19", () -> weibull.hazardRatio()),
            entry("P20", () -> curve.survival(6)),
            entry("P21", () -> curve.survival(10)),
            entry("P22", () -> curve.survival(23))));
  }

  @TestFactory
  Stream<DynamicTest> closedForms() {
    CoxData data =
        CoxData.of(
            DataSet.times(new double[] {1, 1, 6, 6, 8, 9}, new double[] {1, 0, 1, 1, 0, 1}),
            new double[][] {{1}, {1}, {1}, {0}, {0}, {0}});
    CoxFit breslow = CoxRegression.fit(data, Ties.BRESLOW).orElseThrow();
    CoxFit efron = CoxRegression.fit(data, Ties.EFRON).orElseThrow();
    RatioEstimate ratio = efron.hazardRatios().get(0);
    ProportionalHazardsTest test = ProportionalHazardsTest.of(data, breslow, TimeTransform.RANK);
    return CheckValues.rows(
        "P2[3-8]",
        Map.ofEntries(
            entry("P23", () -> breslow.hazardRatios().get(0).log()),
            entry("P24", () -> ratio.log()),
            entry("P25", () -> 1 / ratio.variance()),
            entry("P26", () -> efron.logLikelihood()),
            entry("P27", () -> efron.logLikelihood()),
            entry("P28", () -> test.global())));
  }

  @TestFactory
  Stream<DynamicTest> lungAndOvarianCancer() {
    CoxData veteran = DataSet.covariates("veteran_full", List.of("trt", "prior", "karno"));
    CoxFit fit = CoxRegression.fit(veteran, Ties.EFRON).orElseThrow();
    ProportionalHazardsTest test =
        ProportionalHazardsTest.of(veteran, fit, TimeTransform.KAPLAN_MEIER);
    CoxData full = DataSet.covariates("ovarian_full", List.of("age", "rx", "ecog_ps"));
    List<RatioEstimate> ovarian = CoxRegression.fit(full, Ties.EFRON).orElseThrow().hazardRatios();
    DataSet arms = DataSet.read("ovarian");
    LogRank logRank = LogRank.of(arms.control(), arms.treated());
    RatioEstimate lung = DataSet.read("lung").cox(Ties.EFRON).hazardRatios().get(0);
    return CheckValues.rows(
        "P(29|3\\d|4[0-2])",
        Map.ofEntries(
            entry("P29", () -> test.covariates().get(0)),
            entry("P30", () -> test.covariates().get(1)),
            entry("P31", () -> test.covariates().get(2)),
            entry("P32", () -> test.global()),
            entry("P33", () -> test.p(2)),
            entry("P34", () -> fit.hazardRatios().get(2).log()),
            entry("P35", () -> ovarian.get(0).log()),
            entry("P36", () -> ovarian.get(1).log()),
            entry("P37", () -> ovarian.get(2).log()),
            entry("P38", () -> arms.cox(Ties.EFRON).hazardRatios().get(0).ratio()),
            entry("P39", () -> logRank.expectedControl()),
            entry("P40", () -> logRank.chiSquare()),
            entry("P41", () -> lung.ratio()),
            entry("P42", () -> lung.standardError())));
  }

  @TestFactory
  Stream<DynamicTest> leukaemiaMaintenanceAndBreastCancer() {
    RatioEstimate aml = DataSet.read("aml").cox(Ties.EFRON).hazardRatios().get(0);
    DataSet staining = DataSet.read("hpa");
    CoxFit hpa = staining.cox(Ties.BRESLOW);
    LogRank logRank = LogRank.of(staining.control(), staining.treated());
    return CheckValues.rows(
        "P4[3-8]",
        Map.ofEntries(
            entry("P43", () -> aml.log()),
            entry("P44", () -> hpa.hazardRatios().get(0).log()),
            entry("P45", () -> hpa.hazardRatios().get(0).standardError()),
            entry("P46", () -> -2 * hpa.logLikelihoodNull()),
            entry("P47", () -> -2 * hpa.logLikelihood()),
            entry("P48", () -> logRank.chiSquare())));
  }

  private static CoxFit fit(SurvivalTimes control, SurvivalTimes treated, Ties ties) {
    return CoxRegression.fit(CoxData.ofArms(control, treated), ties).orElseThrow();
  }
}
