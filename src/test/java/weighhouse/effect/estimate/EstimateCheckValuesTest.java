package weighhouse.effect.estimate;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.effect.StandardNormal;
import weighhouse.support.CheckValues;

/** Published intervals, standard errors and indirect comparisons. */
class EstimateCheckValuesTest {
  /** As the papers and the reference figures have it, beside the exact multiplier. */
  private static final double PRINTED = 1.96;

  private static final double EXACT = StandardNormal.multiplier(0.95);

  @TestFactory
  Stream<DynamicTest> ratioOfTheHivModel() {
    RatioEstimate ratio = RatioEstimate.ofInterval(0.509, 0.365, 0.710, PRINTED);
    double natural = (0.710 - 0.365) / (2 * PRINTED);
    return CheckValues.rows(
        "H2[0-7]",
        Map.ofEntries(
            entry("H20", () -> ratio.log()),
            entry("H21", () -> ratio.standardError()),
            entry("H22", () -> LogSymmetry.of(0.509, 0.365, 0.710).estimate()),
            entry("H23", () -> (0.365 + 0.710) / 2),
            entry("H24", () -> ratio.meanOfDraws()),
            entry("H25", () -> natural),
            entry("H26", () -> 0.509 - EXACT * natural),
            entry("H27", () -> ratio.quantile(0.975))));
  }

  @TestFactory
  Stream<DynamicTest> intervals() {
    RatioEstimate one = RatioEstimate.ofInterval(0.67, 0.46, 0.98, PRINTED);
    RatioEstimate two = RatioEstimate.ofInterval(0.88, 0.71, 1.08, PRINTED);
    RatioEstimate both = one.against(two);
    double z = StandardNormal.ofTwoSidedPByFormula(0.032);
    RatioEstimate fromP =
        RatioEstimate.ofStatistic(0.30, StandardNormal.ofTwoSidedPByFormula(0.034));
    RatioEstimate d2304 = RatioEstimate.ofInterval(0.81, 0.70, 0.94, PRINTED);
    RatioEstimate eczema = new EventCounts(141, 420, 928, 13525).oddsRatio();
    RatioEstimate bladder = ObservedExpected.ofRatio(0.88, 128.81).estimate();
    return CheckValues.rows(
        "L\\d+",
        Map.ofEntries(
            entry("L01", () -> one.log()),
            entry("L02", () -> one.standardError()),
            entry("L03", () -> two.standardError()),
            entry("L04", () -> both.log()),
            entry("L05", () -> both.standardError()),
            entry("L06", () -> both.ratio()),
            entry("L07", () -> both.lower(PRINTED)),
            entry("L08", () -> both.upper(PRINTED)),
            entry("L09", () -> z),
            entry("L10", () -> 17 / z),
            entry("L11", () -> 17 - PRINTED * 17 / z),
            entry("L12", () -> 17 + PRINTED * 17 / z),
            entry("L13", () -> fromP.standardError()),
            entry("L14", () -> fromP.lower(PRINTED)),
            entry("L15", () -> fromP.upper(PRINTED)),
            entry("L16", () -> d2304.standardError()),
            entry("L17", () -> d2304.statistic()),
            entry("L18", () -> d2304.p()),
            entry("L19", () -> eczema.ratio()),
            entry("L20", () -> eczema.standardError()),
            entry("L21", () -> eczema.lower(PRINTED)),
            entry("L22", () -> eczema.upper(PRINTED)),
            entry("L23", () -> bladder.lower(PRINTED)),
            entry("L24", () -> bladder.upper(PRINTED)),
            entry("L25", () -> bladder.standardError())));
  }

  @TestFactory
  Stream<DynamicTest> indirectComparison() {
    RatioEstimate direct = RatioEstimate.ofInterval(0.64, 0.45, 0.90, PRINTED);
    RatioEstimate viaOther = RatioEstimate.ofInterval(0.37, 0.21, 0.65, PRINTED);
    RatioEstimate tmp = RatioEstimate.ofInterval(0.59, 0.45, 0.76, PRINTED);
    RatioEstimate dp = RatioEstimate.ofInterval(0.90, 0.71, 1.15, PRINTED);
    RatioEstimate indirect = tmp.against(dp);
    RatioEstimate headToHead = RatioEstimate.ofInterval(0.49, 0.26, 0.92, PRINTED);
    Pooling.Pooled mixed = Pooling.commonEffect(List.of(headToHead, indirect));
    return CheckValues.rows(
        "I\\d+",
        Map.ofEntries(
            entry("I01", () -> viaOther.against(direct).p()),
            entry("I02", () -> indirect.ratio()),
            entry("I03", () -> indirect.standardError()),
            entry("I04", () -> indirect.lower(PRINTED)),
            entry("I05", () -> indirect.upper(PRINTED)),
            entry("I06", () -> mixed.estimate().ratio()),
            entry("I07", () -> 0.45 / 0.71),
            entry("I08", () -> 0.76 / 1.15)));
  }
}
