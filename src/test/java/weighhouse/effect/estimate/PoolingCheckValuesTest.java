package weighhouse.effect.estimate;

import static java.util.Map.entry;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import weighhouse.support.CheckValues;
import weighhouse.support.Reference;

/** Published meta-analyses, pooled again from the trials' data. */
class PoolingCheckValuesTest {
  /** As the reference figures of these rows have it. */
  private static final double Z = 1.959964;

  private static final double PRINTED = 1.96;

  @TestFactory
  Stream<DynamicTest> pooling() {
    List<RatioEstimate> bcg = bcg().stream().map(EventCounts::riskRatio).toList();
    Pooling.Pooled common = Pooling.commonEffect(bcg);
    Pooling.Pooled reml = Pooling.restrictedLikelihood(bcg);
    Pooling.Pooled moments = Pooling.derSimonianLaird(bcg);
    RatioEstimate stroke = Pooling.commonEffect(hartRates()).estimate();
    RatioEstimate peto = ObservedExpected.sum(hartCounts()).estimate();
    RatioEstimate all = pignon("[123]");
    RatioEstimate adjuvant = pignon("1");
    RatioEstimate neoadjuvant = pignon("2");
    RatioEstimate concomitant = pignon("3");
    RatioEstimate leukaemia = Pooling.commonEffect(leukaemia()).estimate();
    RatioEstimate blockers = Pooling.commonEffect(blockers()).estimate();
    return CheckValues.rows(
        "M\\d+",
        Map.ofEntries(
            entry("M01", () -> common.estimate().log()),
            entry("M02", () -> common.estimate().standardError()),
            entry("M03", () -> common.heterogeneity()),
            entry("M04", () -> reml.estimate().ratio()),
            entry("M05", () -> reml.estimate().lower(Z)),
            entry("M06", () -> reml.estimate().upper(Z)),
            entry("M07", () -> reml.betweenTrials()),
            entry("M08", () -> moments.betweenTrials()),
            entry("M09", () -> moments.estimate().ratio()),
            entry("M10", () -> onNaturalScale(bcg)),
            entry("M11", () -> bcg.stream().mapToDouble(t -> t.ratio()).average().orElseThrow()),
            entry("M12", () -> stroke.ratio()),
            entry("M13", () -> stroke.lower(Z)),
            entry("M14", () -> stroke.upper(Z)),
            entry("M15", () -> all.ratio()),
            entry("M16", () -> all.lower(PRINTED)),
            entry("M17", () -> all.upper(PRINTED)),
            entry("M18", () -> adjuvant.ratio()),
            entry("M19", () -> adjuvant.lower(PRINTED)),
            entry("M20", () -> adjuvant.upper(PRINTED)),
            entry("M21", () -> neoadjuvant.ratio()),
            entry("M22", () -> neoadjuvant.lower(PRINTED)),
            entry("M23", () -> neoadjuvant.upper(PRINTED)),
            entry("M24", () -> concomitant.ratio()),
            entry("M25", () -> concomitant.lower(PRINTED)),
            entry("M26", () -> concomitant.upper(PRINTED)),
            entry("M27", () -> leukaemia.ratio()),
            entry("M28", () -> leukaemia.lower(Z)),
            entry("M29", () -> leukaemia.upper(Z)),
            entry("M30", () -> blockers.log()),
            entry("M31", () -> blockers.standardError()),
            entry("M32", () -> peto.ratio()),
            entry("M33", () -> peto.lower(PRINTED)),
            entry("M34", () -> peto.upper(PRINTED))));
  }

  private static List<EventCounts> bcg() {
    return Reference.rows("data/bcg.csv").stream()
        .map(
            row ->
                new EventCounts(
                    row.number("tpos"), row.number("tneg"), row.number("cpos"), row.number("cneg")))
        .toList();
  }

  private static List<RatioEstimate> hartRates() {
    return Reference.rows("data/hart.csv").stream()
        .map(
            row ->
                new PersonTime(
                    row.number("x1i"), row.number("t1i"), row.number("x2i"), row.number("t2i")))
        .map(PersonTime::rateRatio)
        .toList();
  }

  private static List<ObservedExpected> hartCounts() {
    return Reference.rows("data/hart.csv").stream()
        .map(row -> counts(row, "x1i", "n1i", "x2i", "n2i").observedExpected())
        .toList();
  }

  private static List<RatioEstimate> blockers() {
    return Reference.rows("data/blocker.csv").stream()
        .map(row -> counts(row, "events_treated", "n_treated", "events_control", "n_control"))
        .map(EventCounts::oddsRatio)
        .toList();
  }

  private static EventCounts counts(
      Reference.Row row, String events1, String total1, String events0, String total0) {
    return new EventCounts(
        row.number(events1),
        row.number(total1) - row.number(events1),
        row.number(events0),
        row.number(total0) - row.number(events0));
  }

  private static RatioEstimate pignon(String groups) {
    List<ObservedExpected> trials =
        Reference.rows("data/pignon.csv").stream()
            .filter(row -> row.text("grp").matches(groups))
            .map(row -> new ObservedExpected(row.number("OmE"), row.number("V")))
            .toList();
    return ObservedExpected.sum(trials).estimate();
  }

  /** Steurer et al. 2006, the four trials of row M27. */
  private static List<RatioEstimate> leukaemia() {
    return List.of(
        new RatioEstimate(-0.592, 0.345),
        new RatioEstimate(-0.0791, 0.0787),
        new RatioEstimate(-0.237, 0.144),
        new RatioEstimate(0.163, 0.312));
  }

  /** The wrong way of row M10: weights from variances of the ratios themselves. */
  private static double onNaturalScale(List<RatioEstimate> trials) {
    double weights = 0;
    double sum = 0;
    for (RatioEstimate trial : trials) {
      double weight = 1 / (trial.ratio() * trial.ratio() * trial.variance());
      weights += weight;
      sum += weight * trial.ratio();
    }
    return sum / weights;
  }
}
