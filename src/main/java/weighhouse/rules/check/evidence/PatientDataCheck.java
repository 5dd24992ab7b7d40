package weighhouse.rules.check.evidence;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import weighhouse.effect.StandardNormal;
import weighhouse.effect.estimate.LogSymmetry;
import weighhouse.effect.estimate.RatioEstimate;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;

/** An entered hazard ratio that a refit on the patients' times in the file does not give. */
public final class PatientDataCheck implements Check {
  /** Ratios further apart than this differ by more than a choice of method for ties. */
  private static final double APART = 0.02;

  @Override
  public String name() {
    return "hazard-ratio-refit";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    List<CellAddress> ratios = EnteredRatios.in(model);
    List<Match> matches = new ArrayList<>();
    if (!ratios.isEmpty()) {
      for (List<DataColumn> table : new DataTables(subject.workbook()).all()) {
        PatientData.in(table)
            .flatMap(PatientData::fit)
            .ifPresent(fit -> compare(fit.hazardRatios().get(0), ratios, rule, model, matches));
      }
    }
    return matches;
  }

  private static void compare(
      RatioEstimate refit,
      List<CellAddress> ratios,
      Rule rule,
      ModelView model,
      List<Match> matches) {
    if (ratios.stream().anyMatch(cell -> agrees(model.value(cell), refit))) {
      return;
    }
    CellAddress nearest =
        ratios.stream()
            .min(Comparator.comparingDouble(cell -> distance(model.value(cell), refit)))
            .orElseThrow();
    double entered = Math.log(model.value(nearest));
    boolean outside =
        distance(model.value(nearest), refit)
            > StandardNormal.multiplier(0.95) * refit.standardError();
    boolean turned = Math.abs(entered + refit.log()) < Math.abs(entered - refit.log());
    Rule levelled = outside && ratios.size() == 1 ? rule : Found.as("query", rule);
    matches.add(
        Found.at(levelled, nearest)
            .with("hr", Refs.to(nearest, nearest, model.subject().workbook()))
            .saying(sentence(turned ? refit.reciprocal() : refit))
            .match());
  }

  /** The arm's code does not tell which arm the ratio is of: the nearer direction counts. */
  private static double distance(double ratio, RatioEstimate refit) {
    return Math.abs(Math.abs(Math.log(ratio)) - Math.abs(refit.log()));
  }

  private static boolean agrees(double ratio, RatioEstimate refit) {
    double half = 0.5000001 * Math.pow(10, -Math.max(LogSymmetry.decimals(ratio), 2));
    double fitted = Math.log(ratio) * refit.log() < 0 ? refit.reciprocal().ratio() : refit.ratio();
    return Math.abs(ratio - fitted) <= half + APART * fitted;
  }

  private static String sentence(RatioEstimate refit) {
    double z = StandardNormal.multiplier(0.95);
    return String.format(
        Locale.ROOT,
        "A Cox regression on the patients' times (Efron ties, arm alone) gives %.3f (95 %% interval"
            + " %.3f to %.3f).",
        refit.ratio(),
        refit.lower(z),
        refit.upper(z));
  }
}
