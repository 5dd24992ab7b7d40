package weighhouse.rules.check.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import weighhouse.effect.survival.CoxData;
import weighhouse.effect.survival.CurvePair;
import weighhouse.effect.survival.ProportionalHazardsTest;
import weighhouse.effect.survival.TimeTransform;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.ratio.Found;
import weighhouse.rules.check.ratio.ModelView;
import weighhouse.rules.check.ratio.Refs;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/**
 * Survival of two arms, as curves or as patients' times, that no constant hazard ratio describes.
 * Looks only at workbooks that use one.
 */
public final class CurvesCheck implements Check {
  private static final int LEAST_POINTS = 5;
  private static final double APART = 0.02;
  private static final double CHANGE = Math.log(1.35);
  private static final double SUSPICIOUS = 0.05;
  private static final double CLEAR = 0.01;

  @Override
  public String name() {
    return "proportional-hazards";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    ModelView model = new ModelView(subject);
    List<CellAddress> ratios = EnteredRatios.in(model);
    if (ratios.isEmpty()) {
      return List.of();
    }
    List<Match> matches = new ArrayList<>();
    for (List<DataColumn> table : new DataTables(subject.workbook()).all()) {
      PatientData.in(table)
          .ifPresent(data -> patients(data, rule, ratios.get(0), subject, matches));
      for (ArmCurves curves : ArmCurves.in(table, model)) {
        curves(curves, rule, ratios.get(0), subject, matches);
      }
    }
    return matches;
  }

  private static void curves(
      ArmCurves curves, Rule rule, CellAddress ratio, Subject subject, List<Match> matches) {
    CurvePair pair = curves.pair();
    List<CurvePair.Point> points = pair.points();
    if (points.size() < LEAST_POINTS) {
      return;
    }
    List<Double> crossings = pair.crossings(APART);
    CurvePair.Point first = points.get(0);
    CurvePair.Point last = points.get(points.size() - 1);
    double change = pair.slope() * Math.log(last.time() / first.time());
    boolean crosses = !crossings.isEmpty();
    if (crosses || Math.abs(change) > CHANGE) {
      String said =
          crosses
              ? "The arms change places at " + figure(crossings.get(0)) + "."
              : "The ratio of the cumulative hazards goes from "
                  + figure(Math.exp(first.logRatio()))
                  + " at "
                  + figure(first.time())
                  + " to "
                  + figure(Math.exp(last.logRatio()))
                  + " at "
                  + figure(last.time())
                  + ".";
      Rule levelled = crosses ? rule : Found.as("query", rule);
      List<CellRange> cells = List.of(curves.first().range(), curves.second().range());
      matches.add(match(levelled, cells, ratio, said, subject));
    }
  }

  private static void patients(
      PatientData data, Rule rule, CellAddress ratio, Subject subject, List<Match> matches) {
    data.fit()
        .ifPresent(
            fit -> {
              CoxData cox = CoxData.ofArms(data.control(), data.treated());
              double p = ProportionalHazardsTest.of(cox, fit, TimeTransform.KAPLAN_MEIER).p(0);
              if (p < SUSPICIOUS) {
                String said =
                    "The Grambsch-Therneau test on the patients' times gives P = "
                        + String.format(Locale.ROOT, "%.2g", p)
                        + " (Kaplan-Meier transform).";
                Rule levelled = p < CLEAR ? rule : Found.as("query", rule);
                matches.add(match(levelled, data.cells(), ratio, said, subject));
              }
            });
  }

  private static Match match(
      Rule rule, List<CellRange> cells, CellAddress ratio, String said, Subject subject) {
    CellAddress host = cells.get(0).first();
    List<CellRange> all = new ArrayList<>(cells);
    all.add(CellRange.of(ratio));
    return new Match(
        rule,
        all,
        host,
        null,
        null,
        Map.of("hr", Refs.to(ratio, host, subject.workbook())),
        List.of(said));
  }

  private static String figure(double number) {
    return String.format(Locale.ROOT, "%.3g", number);
  }
}
